package dev.tallystick.segment;

import com.ibm.icu.util.ULocale;
import dev.tallystick.prose.Block;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Consumer;

/**
 * Parts blocks into sentences by UAX #29, as ICU tailors it for the language; then mends the
 * borders ({@link Borders}), and joins fragments without a word of their own.
 */
public final class Segmenter {
  private static final Map<String, Borders> KNOWN = new ConcurrentHashMap<>();

  private final Borders borders;
  private final List<SrxRule> rules;

  private Segmenter(Borders borders, List<SrxRule> rules) {
    this.borders = borders;
    this.rules = rules;
  }

  /** The segmenter for a language as a BCP 47 tag; {@code und} for an unknown one. */
  public static Segmenter of(String language) {
    return of(language, Srx.NONE);
  }

  /** The same by the rules of a project, where they have any for the language. */
  public static Segmenter of(String language, Srx rules) {
    Borders borders =
        KNOWN.computeIfAbsent(language, tag -> new Borders(ULocale.forLanguageTag(tag)));
    return new Segmenter(borders, rules.rules(language));
  }

  /** Loads what the first segmenter would have to wait for: most of a second on a slow machine. */
  public static void prepare() {
    Borders english = of("en").borders;
    english.of(english.iterator(), "Fair wind. Full sails.", "Fair wind. Full sails.");
  }

  /** The sentences and verbatim blocks of a file, in its order. */
  public List<Segment> segments(Text text, List<Block> blocks, Cancellation cancellation) {
    return segments(text, blocks, problem -> {}, cancellation);
  }

  /**
   * The same.
   *
   * @param endless takes each rule of the project that does not come to an end in the text, by its
   *     place in the file of rules
   */
  public List<Segment> segments(
      Text text, List<Block> blocks, Consumer<Problem> endless, Cancellation cancellation) {
    TextBorders inText = new TextBorders(borders, rules, endless);
    Reach reach = new Reach();
    List<Segment> segments = new ArrayList<>();
    for (Block block : blocks) {
      cancellation.check();
      if (block.kind() == Block.Kind.VERBATIM) {
        segments.add(new Segment(block.extent(), "", block, true, List.of(), 0));
      } else {
        addSentences(segments, inText, reach, block, new BlockProse(text, block));
      }
    }
    return segments;
  }

  private static void addSentences(
      List<Segment> segments, TextBorders borders, Reach reach, Block block, BlockProse prose) {
    List<Segment.Marked> inlines = prose.inlines();
    List<Span> sentences = sentences(borders, prose);
    int next = 0;
    for (int i = 0; i < sentences.size(); i++) {
      Span sentence = sentences.get(i);
      String words = sentence.of(prose.string());
      boolean last = i == sentences.size() - 1;
      List<Segment.Marked> inside = new ArrayList<>();
      while (next < inlines.size()
          && (last || inlines.get(next).prose().start() < sentences.get(i + 1).start())) {
        inside.add(inlines.get(next++).in(sentence));
      }
      Span span = prose.inFile(sentence);
      segments.add(new Segment(span, words, block, i == 0, inside, reach.of(words, inside)));
    }
  }

  /** The sentences of a block, white space trimmed; fragments join. */
  private static List<Span> sentences(TextBorders borders, BlockProse block) {
    String prose = block.string();
    List<Span> spans = new ArrayList<>();
    BitSet ends = borders.of(block);
    ends.set(prose.length());
    int start = 0;
    for (int end = ends.nextSetBit(0); end >= 0; end = ends.nextSetBit(end + 1)) {
      Span trimmed = Blank.trim(prose, start, end);
      if (!trimmed.isEmpty()) {
        addOrJoin(spans, prose, trimmed, borders.replaced());
      }
      start = end;
    }
    if (!borders.replaced()) {
      joinLastNumber(spans, prose);
    }
    boolean wordless = spans.size() == 1 && Fragments.letters(spans.get(0).of(prose), 1) == 0;
    return wordless ? List.of() : spans;
  }

  /** A number with nothing behind it that it could be the number of. */
  private static void joinLastNumber(List<Span> spans, String prose) {
    int last = spans.size() - 1;
    if (last > 0 && Fragments.isNumber(spans.get(last).of(prose))) {
      Span number = spans.remove(last);
      spans.set(last - 1, spans.get(last - 1).cover(number));
    }
  }

  private static void addOrJoin(List<Span> spans, String prose, Span next, boolean replaced) {
    int last = spans.size() - 1;
    if (last >= 0 && joins(spans.get(last).of(prose), next.of(prose), replaced)) {
      spans.set(last, spans.get(last).cover(next));
    } else {
      spans.add(next);
    }
  }

  /** What a project parts stays apart, if there is a letter or digit in either. */
  private static boolean joins(String first, String second, boolean replaced) {
    return replaced
        ? Fragments.letters(first, 1) == 0 || Fragments.letters(second, 1) == 0
        : Fragments.joins(first, second);
  }
}
