package dev.tallystick.text;

/**
 * Keeps text of a file from turning the message around it: an isolate of UAX #9 that takes its
 * direction from its own first strong character. Embeddings and overrides inside end with it by the
 * rules of that annex; isolates inside are balanced here.
 */
public final class Isolate {
  private static final char FIRST_OF_OPENING = '\u2066';
  private static final char FIRST_STRONG = '\u2068';
  private static final char ENDS = '\u2069';

  private Isolate() {}

  /** The text between the marks of an isolate. */
  public static String of(String text) {
    return FIRST_STRONG + text + ENDS;
  }

  /** The text without marks that would end an isolate around it, and with those that it lacks. */
  public static String balanced(String text) {
    StringBuilder balanced = new StringBuilder();
    int open = 0;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (c == ENDS && open == 0) {
        continue;
      }
      open += opens(c) ? 1 : c == ENDS ? -1 : 0;
      balanced.append(c);
    }
    return balanced.append(String.valueOf(ENDS).repeat(open)).toString();
  }

  private static boolean opens(char c) {
    return c >= FIRST_OF_OPENING && c <= FIRST_STRONG;
  }
}
