package dev.tallystick.segment;

import dev.tallystick.text.Scripts;
import java.lang.Character.UnicodeScript;

/**
 * Stretches too short to be sentences: an ellipsis, a number in a list, a closing bracket that UAX
 * #29 cut off. They join the sentence beside them.
 */
final class Fragments {
  /** A sentence has so many letters and digits at least... */
  private static final int LEAST = 4;

  /** ...or so many where one letter is a syllable or a word. */
  private static final int LEAST_DENSE = 2;

  /** A number of a heading or list has at most so many digits between stops; a year has more. */
  private static final int MOST_DIGITS = 3;

  /** A word of so many small letters before a stop is hardly an abbreviation. */
  private static final int WORD = 4;

  private Fragments() {}

  /** Whether two neighbours in a block are one sentence, one of them being a fragment. */
  static boolean joins(String first, String second) {
    return isNumber(first)
        || isFragment(first)
        || isFragment(second) && !(isNumber(second) && !abbreviates(first));
  }

  private static boolean isFragment(String text) {
    int least = startsDense(text) ? LEAST_DENSE : LEAST;
    return letters(text, least) < least;
  }

  /** Whether it is the number of what comes behind it, such as "2." or "9.5.1." */
  static boolean isNumber(String text) {
    int digits = 0;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      digits = c >= '0' && c <= '9' ? digits + 1 : 0;
      if (c != '.' && digits == 0 || digits > MOST_DIGITS) {
        return false;
      }
    }
    return text.endsWith(".") && text.length() > 1 && text.charAt(0) != '.';
  }

  /** Whether it may end in an abbreviation that has the number behind it: "Abb." */
  private static boolean abbreviates(String text) {
    int end = text.length() - 1;
    if (end < WORD || text.charAt(end) != '.') {
      return end >= 0 && text.charAt(end) == '.';
    }
    if (!Character.isLetterOrDigit(text.charAt(end - 1))) {
      return false;
    }
    for (int i = end - WORD; i < end; i++) {
      if (!Character.isLowerCase(text.charAt(i))) {
        return true;
      }
    }
    return false;
  }

  /** Number of letters and digits, counted up to {@code enough}. */
  static int letters(String text, int enough) {
    int letters = 0;
    for (int i = 0; i < text.length() && letters < enough; ) {
      int c = text.codePointAt(i);
      letters += Character.isLetterOrDigit(c) ? 1 : 0;
      i += Character.charCount(c);
    }
    return letters;
  }

  private static boolean startsDense(String text) {
    for (int i = 0; i < text.length(); ) {
      int c = text.codePointAt(i);
      if (Character.isLetter(c)) {
        return c >= 0x80 && (Scripts.isUnspaced(c) || UnicodeScript.of(c) == UnicodeScript.HANGUL);
      }
      i += Character.charCount(c);
    }
    return false;
  }
}
