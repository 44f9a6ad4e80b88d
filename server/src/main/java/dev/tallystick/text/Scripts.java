package dev.tallystick.text;

import java.lang.Character.UnicodeScript;

/** Scripts whose writers put no blanks between words. */
public final class Scripts {
  private Scripts() {}

  /** Whether a character is of one of them. */
  public static boolean isUnspaced(int codePoint) {
    if (codePoint < 0xE00) {
      return false;
    }
    return switch (UnicodeScript.of(codePoint)) {
      case HAN, HIRAGANA, KATAKANA, BOPOMOFO, THAI, LAO, KHMER, MYANMAR -> true;
      default -> false;
    };
  }

  /** Whether a character is of one of them in which a line may break before any letter. */
  public static boolean breaksAnywhere(int codePoint) {
    if (codePoint < 0x1100) {
      return false;
    }
    return switch (UnicodeScript.of(codePoint)) {
      case HAN, HIRAGANA, KATAKANA, BOPOMOFO -> true;
      default -> false;
    };
  }
}
