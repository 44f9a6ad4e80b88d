package dev.tallystick.engine;

import dev.tallystick.text.Scripts;
import dev.tallystick.text.Span;
import java.lang.Character.UnicodeScript;
import java.util.Optional;

/** Where to show that nothing stands at a place: editors draw no empty stretch. */
public final class Gap {
  /** Where no blanks are written a run of letters is no word but half a sentence. */
  private static final int LONGEST = 20;

  private Gap() {}

  /** The word that ends at or before a place, else the first one behind it; empty without any. */
  public static Optional<Span> word(String text, int place) {
    int end = place;
    while (end > 0 && !inWord(text.codePointBefore(end))) {
      end -= Character.charCount(text.codePointBefore(end));
    }
    if (end > 0) {
      return Optional.of(new Span(wordStart(text, end), end));
    }
    int start = place;
    while (start < text.length() && !inWord(text.codePointAt(start))) {
      start += Character.charCount(text.codePointAt(start));
    }
    return start == text.length()
        ? Optional.empty()
        : Optional.of(new Span(start, wordEnd(text, start)));
  }

  private static int wordStart(String text, int end) {
    int last = text.codePointBefore(end);
    int start = end - Character.charCount(last);
    while (start > 0 && end - start < LONGEST && joins(text.codePointBefore(start), last)) {
      start -= Character.charCount(text.codePointBefore(start));
    }
    return start;
  }

  private static int wordEnd(String text, int start) {
    int first = text.codePointAt(start);
    int end = start + Character.charCount(first);
    while (end < text.length() && end - start < LONGEST && joins(text.codePointAt(end), first)) {
      end += Character.charCount(text.codePointAt(end));
    }
    return end;
  }

  /** Whether a letter belongs to the word of another: in unspaced scripts, of one script only. */
  private static boolean joins(int letter, int word) {
    return inWord(letter)
        && (!Scripts.isUnspaced(word) || UnicodeScript.of(letter) == UnicodeScript.of(word));
  }

  private static boolean inWord(int c) {
    return Character.isLetterOrDigit(c)
        || Character.getType(c) == Character.NON_SPACING_MARK
        || Character.getType(c) == Character.COMBINING_SPACING_MARK;
  }
}
