package dev.tallystick.engine;

import dev.tallystick.align.Match;
import dev.tallystick.align.Move;
import dev.tallystick.check.OnSide;
import dev.tallystick.segment.Segment;
import java.nio.file.Path;
import java.util.BitSet;
import java.util.List;

/**
 * Counts the sentences of one side of a pair. A verbatim block is none.
 *
 * @param language the English name of the other side's language
 * @param sentences the indices of the sentences among the segments
 * @param matched those of them that have a counterpart
 */
record Tally(String language, BitSet sentences, BitSet matched) {
  static Tally of(Settled pair, Path file) {
    OnSide side = pair.files().side(file);
    boolean source = side == OnSide.SOURCE;
    BitSet matched = new BitSet();
    for (Match match : pair.result().alignment().matches()) {
      if (match.twoSided()) {
        matched.set(
            source ? match.sourceFrom() : match.targetFrom(),
            source ? match.sourceTo() : match.targetTo());
      }
    }
    for (Move move : pair.result().alignment().moves()) {
      matched.set(source ? move.source() : move.target());
    }
    BitSet sentences = sentences(pair.reading(file).segments());
    matched.and(sentences);
    return new Tally(pair.files().language(side.other()).name(), sentences, matched);
  }

  private static BitSet sentences(List<Segment> segments) {
    BitSet sentences = new BitSet();
    for (int i = 0; i < segments.size(); i++) {
      sentences.set(i, !segments.get(i).verbatim());
    }
    return sentences;
  }

  Heading.Count of(Section section) {
    return new Heading.Count(language, count(matched, section), count(sentences, section));
  }

  private static int count(BitSet set, Section section) {
    return set.get(section.from(), section.to()).cardinality();
  }
}
