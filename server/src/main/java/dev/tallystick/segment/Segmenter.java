package dev.tallystick.segment;

import com.ibm.icu.text.BreakIterator;
import com.ibm.icu.util.ULocale;
import dev.tallystick.prose.Block;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;

/**
 * Parts blocks into sentences by UAX #29, as ICU tailors it for the language; then mends borders
 * that are none: behind an abbreviation or a Burmese comma, and around fragments without a word of
 * their own.
 */
public final class Segmenter {
  /** A full stop to Unicode (Sentence_Terminal), but Burmese, Mon and Shan use it as a comma. */
  private static final char LITTLE_SECTION = '\u104A';

  private final ULocale locale;
  private final Abbreviations abbreviations;

  private Segmenter(ULocale locale, Abbreviations abbreviations) {
    this.locale = locale;
    this.abbreviations = abbreviations;
  }

  /** The segmenter for a language as a BCP 47 tag; {@code und} for an unknown one. */
  public static Segmenter of(String language) {
    ULocale locale = ULocale.forLanguageTag(language);
    return new Segmenter(locale, Abbreviations.of(locale));
  }

  /** Loads what the first segmenter would have to wait for: most of a second on a slow machine. */
  public static void prepare() {
    of("en").borders(BreakIterator.getSentenceInstance(ULocale.ENGLISH), "Fair wind. Full sails.");
  }

  /** The sentences and verbatim blocks of a file, in its order. */
  public List<Segment> segments(Text text, List<Block> blocks, Cancellation cancellation) {
    BreakIterator sentences = BreakIterator.getSentenceInstance(locale);
    List<Segment> segments = new ArrayList<>();
    for (Block block : blocks) {
      cancellation.check();
      if (block.kind() == Block.Kind.VERBATIM) {
        segments.add(new Segment(block.extent(), "", block, true));
      } else {
        addSentences(segments, sentences, block, new BlockProse(text, block));
      }
    }
    return segments;
  }

  private void addSentences(
      List<Segment> segments, BreakIterator sentences, Block block, BlockProse prose) {
    boolean opens = true;
    for (Span sentence : borders(sentences, prose.string())) {
      String words = sentence.of(prose.string());
      segments.add(new Segment(prose.inFile(sentence), words, block, opens));
      opens = false;
    }
  }

  /** The sentences of a block, white space trimmed; stretches without a letter or digit join. */
  private List<Span> borders(BreakIterator sentences, String prose) {
    List<Span> spans = new ArrayList<>();
    sentences.setText(prose);
    int start = 0;
    for (int end = sentences.next(); end != BreakIterator.DONE; end = sentences.next()) {
      if (end < prose.length() && goesOn(prose, end)) {
        continue;
      }
      Span trimmed = Blank.trim(prose, start, end);
      if (!trimmed.isEmpty()) {
        addOrJoin(spans, prose, trimmed);
      }
      start = end;
    }
    boolean wordless = spans.size() == 1 && Fragments.letters(spans.get(0).of(prose), 1) == 0;
    return wordless ? List.of() : spans;
  }

  /** Whether the sentence goes on behind a border that UAX #29 sees. */
  private boolean goesOn(String prose, int end) {
    int to = Blank.trim(prose, 0, end).end();
    return to > 0 && prose.charAt(to - 1) == LITTLE_SECTION || abbreviations.endAt(prose, end);
  }

  private static void addOrJoin(List<Span> spans, String prose, Span next) {
    int last = spans.size() - 1;
    if (last >= 0 && Fragments.joins(spans.get(last).of(prose), next.of(prose))) {
      spans.set(last, spans.get(last).cover(next));
    } else {
      spans.add(next);
    }
  }
}
