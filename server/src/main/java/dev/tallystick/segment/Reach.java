package dev.tallystick.segment;

import com.ibm.icu.text.BreakIterator;
import com.ibm.icu.util.ULocale;
import dev.tallystick.prose.Inline;
import java.util.List;

/**
 * How long a sentence reads: in characters as a reader counts them (grapheme clusters, UAX #29),
 * white space in a row as one. What is copied is as long on both sides, however much longer or
 * shorter the language of the other side is; so it counts for little, and the same in every length.
 * For one text.
 */
final class Reach {
  /**
   * What is copied counts for no more than a short word. Of 1, 4, 8, 16 and all of it, 4 left the
   * least doubt in the alignment of published pages.
   */
  private static final int MOST_COPIED = 4;

  private BreakIterator clusters;

  /** The length of a sentence. */
  int of(String prose, List<Segment.Marked> inlines) {
    char[] all = prose.toCharArray(); // a fresh process reads it much faster than a string
    int length = 0;
    int at = 0;
    for (Segment.Marked marked : inlines) {
      int from = marked.prose().start();
      int to = marked.prose().end();
      boolean whole = marked.inline().kind().compareTo(Inline.Kind.REFERENCE) >= 0;
      if (whole && from >= at && from < to) {
        int most = marked.inline().kind().isCopied() ? MOST_COPIED : 1;
        length += characters(all, at, from) + Math.min(most, characters(all, from, to));
        at = to;
      }
    }
    return length + characters(all, at, all.length);
  }

  private int characters(char[] all, int from, int to) {
    int count = 0;
    boolean blank = false;
    for (int i = from; i < to; i++) {
      char c = all[i];
      if (c >= 0x7F && !standsAlone(c)) {
        return clusters(new String(all, from, to - from));
      }
      boolean another = c <= ' ' || c >= 0x7F && Blank.is(c);
      count += blank & another ? 0 : 1;
      blank = another;
    }
    return count;
  }

  /** Whether a character is always one cluster beside others of which this is true. */
  private static boolean standsAlone(char c) {
    return c < 0x300
        || c >= 0x370 && c <= 0x482 // Greek, Cyrillic
        || c >= 0x48A && c <= 0x590
        || c >= 0x5D0 && c <= 0x5EA // Hebrew
        || c >= 0x620 && c <= 0x64A // Arabic
        || c >= 0x2010 && c <= 0x2027
        || c >= 0x3000 && c <= 0x3029
        || c >= 0x3041 && c <= 0x3096 // Kana
        || c >= 0x309B && c <= 0xA48C // and Han
        || c >= 0xAC00 && c <= 0xD7A3 // Hangul
        || c >= 0xFF01 && c <= 0xFF9D;
  }

  private int clusters(String text) {
    if (clusters == null) {
      clusters = BreakIterator.getCharacterInstance(ULocale.ROOT);
    }
    clusters.setText(text);
    int count = 0;
    boolean blank = false;
    int start = 0;
    for (int end = clusters.next(); end != BreakIterator.DONE; end = clusters.next()) {
      boolean another = Blank.is(text.charAt(start));
      count += blank && another ? 0 : 1;
      blank = another;
      start = end;
    }
    return count;
  }
}
