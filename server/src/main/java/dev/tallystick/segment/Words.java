package dev.tallystick.segment;

import com.ibm.icu.text.BreakIterator;
import com.ibm.icu.util.ULocale;
import dev.tallystick.text.Scripts;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * The words of a sentence: runs of letters and digits, in lower case, digits of any script as
 * ASCII. Where a script writes no blanks between words, they are told apart by ICU's dictionaries.
 */
public final class Words {
  private static final BreakIterator DENSE = BreakIterator.getWordInstance(ULocale.ROOT);

  private Words() {}

  /** The words in order, repeated ones as often as they stand there. */
  public static List<String> of(String sentence) {
    List<String> words = new ArrayList<>();
    StringBuilder word = new StringBuilder();
    for (int i = 0; i < sentence.length(); ) {
      int c = sentence.codePointAt(i);
      int next = i + Character.charCount(c);
      if (Scripts.isUnspaced(c)) {
        end(words, word);
        next = denseEnd(sentence, next);
        addDense(words, sentence.substring(i, next));
      } else if (belongs(c)) {
        append(word, c);
      } else {
        end(words, word);
      }
      i = next;
    }
    end(words, word);
    return words;
  }

  private static int denseEnd(String sentence, int from) {
    int at = from;
    while (at < sentence.length()
        && (Scripts.isUnspaced(sentence.codePointAt(at))
            || Character.getType(sentence.codePointAt(at)) == Character.MODIFIER_LETTER)) {
      at += Character.charCount(sentence.codePointAt(at));
    }
    return at;
  }

  private static void addDense(List<String> words, String run) {
    BreakIterator iterator = DENSE.clone();
    iterator.setText(run);
    int start = 0;
    for (int end = iterator.next(); end != BreakIterator.DONE; end = iterator.next()) {
      if (Character.isLetterOrDigit(run.codePointAt(start))) {
        words.add(run.substring(start, end));
      }
      start = end;
    }
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
    if (Character.isLetterOrDigit(c)) {
      return true;
    }
    int type = Character.getType(c); // the vowels of many scripts are marks
    return type == Character.NON_SPACING_MARK || type == Character.COMBINING_SPACING_MARK;
  }
}
