package dev.tallystick.segment;

import dev.tallystick.text.Scripts;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * The words of a sentence by which it can be recognised in a translation: runs of letters and
 * digits, in lower case, digits of any script as ASCII. Text of scripts that write no blanks
 * between words is passed over.
 */
public final class Words {
  private Words() {}

  /** The words in order, repeated ones as often as they stand there. */
  public static List<String> of(String sentence) {
    List<String> words = new ArrayList<>();
    StringBuilder word = new StringBuilder();
    for (int i = 0; i < sentence.length(); ) {
      int c = sentence.codePointAt(i);
      i += Character.charCount(c);
      if (belongs(c)) {
        append(word, c);
      } else {
        end(words, word);
      }
    }
    end(words, word);
    return words;
  }

  private static void append(StringBuilder word, int c) {
    int digit = Character.isDigit(c) ? Character.digit(c, 10) : -1;
    if (digit >= 0) {
      word.append((char) ('0' + digit));
    } else {
      word.appendCodePoint(c);
    }
  }

  private static void end(List<String> words, StringBuilder word) {
    if (word.length() > 0) {
      words.add(word.toString().toLowerCase(Locale.ROOT));
      word.setLength(0);
    }
  }

  private static boolean belongs(int c) {
    if (c < 0x80) {
      return c >= 'a' && c <= 'z' || c >= 'A' && c <= 'Z' || c >= '0' && c <= '9';
    }
    boolean inWord =
        Character.isLetterOrDigit(c) || Character.getType(c) == Character.NON_SPACING_MARK;
    return inWord && !Scripts.isUnspaced(c);
  }
}
