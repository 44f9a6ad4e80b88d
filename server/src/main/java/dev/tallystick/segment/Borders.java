package dev.tallystick.segment;

import com.ibm.icu.text.BreakIterator;
import com.ibm.icu.util.ULocale;
import java.util.BitSet;

/**
 * Where sentences end: the borders of UAX #29, as ICU tailors it for the language, each moved
 * behind the marks that belong to its sentence; with {@link OwnBorders}, and without those that are
 * none.
 */
final class Borders {
  /** They stand between two meanings of a stop: an option, an address, a line of code. */
  private static final String ASCII_STOPS = "!?.";

  /** What the quoted sentence before it depends on in Japanese; no sentence starts so. */
  private static final String[] PARTICLES = {"と", "っ", "を", "の", "など", "なんて", "が、", "は、"};

  private static final String QUOTES_OF_JAPANESE = "」』”";

  /** A comma, though UAX #29 lists it with the full stop ။. */
  private static final char COMMA_OF_BURMESE = '၊';

  private final ULocale locale;
  private final Stops stops;
  private final OwnBorders own;

  /** Those of a language. */
  Borders(ULocale locale) {
    this.locale = locale;
    this.stops = new Stops(locale);
    this.own = new OwnBorders(stops.usage());
  }

  /** A fresh iterator for {@link #of}. */
  BreakIterator iterator() {
    return BreakIterator.getSentenceInstance(locale);
  }

  /**
   * The places in a block of prose where a sentence ends, its end left out.
   *
   * @param raw the same with its line ends as they stand in the file
   */
  BitSet of(BreakIterator iterator, String prose, String raw) {
    Marks marks = new Marks(prose);
    NearStops near = new NearStops(prose);
    BitSet borders = own.of(prose, raw, marks, near);
    iterator.setText(near.string());
    for (int at = iterator.next(); at < near.length() && at > 0; at = iterator.next()) {
      borders.set(marks.close(marks.stopBefore(near.inProse(at))));
    }
    for (int at = borders.nextSetBit(0); at >= 0; at = borders.nextSetBit(at + 1)) {
      if (marks.skip(at) == prose.length() || goesOn(prose, marks, at)) {
        borders.clear(at);
      }
    }
    return borders;
  }

  /** Whether the sentence goes on behind a border. */
  private boolean goesOn(String prose, Marks marks, int border) {
    int stop = marks.stopBefore(border);
    int next = marks.skip(border);
    char mark = prose.charAt(stop - 1);
    if (mark == COMMA_OF_BURMESE) {
      return true;
    }
    boolean ascii = ASCII_STOPS.indexOf(mark) >= 0;
    if (ascii && next == border && !marks.isDense(next)) {
      return !marks.isMark(next); // "v2.X", "page?id=7"
    }
    if (mark == '.' && stop == border) {
      return stops.goesOn(prose, stop, next);
    }
    if (stop == border) {
      return false;
    }
    // "Stop!" and left. UAX #29 lets lower case count behind a full stop only.
    return ascii && Character.isLowerCase(prose.charAt(next))
        || next == border && depends(prose, next);
  }

  private static boolean depends(String prose, int at) {
    if (QUOTES_OF_JAPANESE.indexOf(prose.charAt(at - 1)) >= 0) {
      for (String particle : PARTICLES) {
        if (prose.startsWith(particle, at)) {
          return true;
        }
      }
    }
    return false;
  }
}
