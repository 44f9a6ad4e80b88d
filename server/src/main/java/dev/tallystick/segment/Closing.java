package dev.tallystick.segment;

/** How a sentence ends, behind closing quotation marks and brackets. */
public enum Closing {
  /** A letter, a comma, anything else. */
  OPEN,
  /** A full stop of any script, or an ellipsis. */
  STOP,
  /** A question mark. */
  QUESTION,
  /** An exclamation mark. */
  EXCLAMATION,
  /** A colon. */
  COLON;

  private static final String STOPS = ".…。．｡।॥۔։።။។᠃༎";
  private static final String QUESTIONS = "?？؟;՞፧⁇";
  private static final String EXCLAMATIONS = "!！՜‼";
  private static final String COLONS = ":：";

  /** The closing of a sentence. */
  public static Closing of(String sentence) {
    int last = last(sentence);
    return last < 0 ? OPEN : of(sentence.charAt(last));
  }

  /** The place of the last character that is no closing mark; -1 if there is none. */
  static int last(String sentence) {
    int at = sentence.length() - 1;
    while (at >= 0 && of(sentence.charAt(at)) == OPEN && closes(sentence.charAt(at))) {
      at--;
    }
    return at;
  }

  private static Closing of(char c) {
    if (STOPS.indexOf(c) >= 0) {
      return STOP;
    }
    if (QUESTIONS.indexOf(c) >= 0) {
      return QUESTION;
    }
    if (EXCLAMATIONS.indexOf(c) >= 0) {
      return EXCLAMATION;
    }
    return COLONS.indexOf(c) >= 0 ? COLON : OPEN;
  }

  private static boolean closes(char c) {
    return switch (Character.getType(c)) {
      case Character.END_PUNCTUATION,
          Character.FINAL_QUOTE_PUNCTUATION,
          Character.INITIAL_QUOTE_PUNCTUATION ->
          true;
      default -> c == '"' || c == '\'' || c == '“' || c == '*' || c == '_' || Blank.is(c);
    };
  }
}
