package dev.tallystick.segment;

import dev.tallystick.text.Span;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The sentences of blocks in an earlier state of a text. A block in which the same stands has the
 * same sentences, wherever it stands; so an edit costs the parting of the blocks that it touches.
 */
public final class KnownSentences {
  private final Map<Content, List<Span>> before;
  private final Map<Content, List<Span>> now = new HashMap<>();

  private KnownSentences(Map<Content, List<Span>> before) {
    this.before = before;
  }

  /** Of a text that nobody has parted yet. */
  public static KnownSentences none() {
    return new KnownSentences(Map.of());
  }

  /** For the next state of the text, once this one is parted. */
  public KnownSentences next() {
    return new KnownSentences(now);
  }

  /** The same again, where this was given up. */
  public KnownSentences again() {
    return new KnownSentences(before);
  }

  /** All that borders are found by. */
  private record Content(Borders rules, String raw, String plain) {}

  List<Span> of(BlockProse block, TextBorders borders) {
    if (!borders.independent()) {
      return Segmenter.sentences(borders, block);
    }
    Content content = new Content(borders.own(), block.raw(), block.plain());
    List<Span> known = before.get(content);
    List<Span> sentences = known == null ? Segmenter.sentences(borders, block) : known;
    now.put(content, sentences);
    return sentences;
  }
}
