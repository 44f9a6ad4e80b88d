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
    for (int i = sentence.length() - 1; i >= 0; i--) {
      char c = sentence.charAt(i);
      if (STOPS.indexOf(c) >= 0) {
        return STOP;
      }
      if (QUESTIONS.indexOf(c) >= 0) {
        return QUESTION;
      }
      if (EXCLAMATIONS.indexOf(c) >= 0) {
        return EXCLAMATION;
      }
      if (COLONS.indexOf(c) >= 0) {
        return COLON;
      }
      if (!closes(c)) {
        return OPEN;
      }
    }
    return OPEN;
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
