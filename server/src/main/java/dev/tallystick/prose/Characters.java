package dev.tallystick.prose;

import dev.tallystick.text.Scripts;

/** What a character is to a reader of lines. */
final class Characters {
  private static final int TAB_STOP = 8;
  private static final String STOPS = ".!?\u2026\u3002\uFF01\uFF1F\uFF61\u061F\u06D4\u0964\u0965";

  private Characters() {}

  static boolean isLineEnd(int c) {
    return c == '\n' || c == '\r';
  }

  /** A blank inside a line as Markdown has it. */
  static boolean isBlank(int c) {
    return c == ' ' || c == '\t';
  }

  /** White space of any kind: no-break and ideographic space, line ends. */
  static boolean isSpace(int c) {
    return Character.isWhitespace(c) || Character.isSpaceChar(c);
  }

  /** ASCII punctuation: what a backslash can escape in Markdown. */
  static boolean isEscapable(int c) {
    return c > ' ' && c < 0x7F && !Character.isLetterOrDigit(c);
  }

  /** A character that ends a sentence. */
  static boolean isStop(int c) {
    return STOPS.indexOf(c) >= 0;
  }

  /** A mark that may follow the stop of a sentence that it closes. */
  static boolean isClosing(int c) {
    return c == '"'
        || c == '\''
        || switch (Character.getType(c)) {
          case Character.END_PUNCTUATION,
              Character.FINAL_QUOTE_PUNCTUATION,
              Character.INITIAL_QUOTE_PUNCTUATION ->
              true;
          default -> false;
        };
  }

  /** A mark that ends what somebody says in Japanese, where no stop stands before it. */
  static boolean isCornerBracket(int c) {
    return c == 0x300D || c == 0x300F;
  }

  /** Whether a line may break before and behind this character without a space: Han and kana. */
  static boolean isSpaceless(int c) {
    return Scripts.breaksAnywhere(c) || c >= 0x3000 && c <= 0x303F || c >= 0xFF01 && c <= 0xFF60;
  }

  /** The column behind a character that starts at {@code column}. */
  static int columnAfter(int column, int c) {
    if (c >= ' ' && c < 0x7F) {
      return column + 1;
    }
    if (c == '\t') {
      return column + TAB_STOP - column % TAB_STOP;
    }
    return switch (Character.getType(c)) {
      case Character.NON_SPACING_MARK, Character.ENCLOSING_MARK, Character.FORMAT -> column;
      default -> column + (isWide(c) ? 2 : 1);
    };
  }

  private static boolean isWide(int c) {
    return c >= 0x1100 && c <= 0x115F
        || c >= 0x2E80 && c <= 0xA4CF
        || c >= 0xAC00 && c <= 0xD7A3
        || c >= 0xF900 && c <= 0xFAFF
        || c >= 0xFE30 && c <= 0xFE6F
        || c >= 0xFF01 && c <= 0xFF60
        || c >= 0xFFE0 && c <= 0xFFE6
        || c >= 0x1F300 && c <= 0x1FAFF
        || c >= 0x20000 && c <= 0x3FFFD;
  }
}
