package dev.tallystick.check;

import dev.tallystick.text.Scripts;

/**
 * How much text there is, as translators count it: words between blanks, and each letter for itself
 * in scripts that write no blanks.
 */
public final class WordCount {
  private WordCount() {}

  /** Number of words of a sentence. */
  public static int of(String prose) {
    int words = 0;
    boolean inWord = false;
    for (int i = 0; i < prose.length(); ) {
      int c = prose.codePointAt(i);
      i += Character.charCount(c);
      if (isUnspaced(c)) {
        words++;
        inWord = false;
      } else if (Character.isLetterOrDigit(c)) {
        words += inWord ? 0 : 1;
        inWord = true;
      } else if (Character.isWhitespace(c) || Character.isSpaceChar(c)) {
        inWord = false;
      }
    }
    return words;
  }

  /** Number of letters of scripts that write no blanks. */
  static int unspaced(String prose) {
    return (int) prose.codePoints().filter(WordCount::isUnspaced).count();
  }

  private static boolean isUnspaced(int c) {
    return Scripts.isUnspaced(c) && Character.isLetter(c);
  }
}
