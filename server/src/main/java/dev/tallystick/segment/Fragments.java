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

  private Fragments() {}

  /** Whether two neighbours in a block are one sentence, one of them being a fragment. */
  static boolean joins(String first, String second) {
    int least = startsDense(first) ? LEAST_DENSE : LEAST;
    return letters(first, least) < least || letters(second, least) < least;
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
    return text.codePoints()
        .filter(Character::isLetter)
        .limit(1)
        .anyMatch(c -> Scripts.isUnspaced(c) || UnicodeScript.of(c) == UnicodeScript.HANGUL);
  }
}
