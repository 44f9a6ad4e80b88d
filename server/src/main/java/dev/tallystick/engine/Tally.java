package dev.tallystick.engine;

import dev.tallystick.check.OnSide;
import dev.tallystick.segment.Segment;
import java.util.List;
import java.util.function.IntPredicate;
import java.util.function.IntUnaryOperator;

/** Counts the sentences of one side of a pair. A verbatim block is none. */
final class Tally {
  private final String language;
  private final int size;
  private final int[] sentences;
  private final int[] matched;
  private final int[] added;
  private final int[] missing;
  private final int[] pending;

  private Tally(FilePair files, PairResult result, OnSide side) {
    States states = States.of(result);
    List<Segment> own = result.reading(side).segments();
    List<Segment> source = result.source().segments();
    language = files.language(side.other()).name();
    size = own.size();
    sentences = sums(own, i -> i, i -> true);
    matched = sums(own, i -> i, i -> states.at(side, i).matched());
    added = sums(own, i -> i, i -> states.at(side, i) == State.ADDED);
    IntUnaryOperator place = side == OnSide.SOURCE ? i -> i : states::place;
    missing = sums(source, place, i -> states.at(OnSide.SOURCE, i) == State.MISSING);
    pending = sums(source, place, i -> states.at(OnSide.SOURCE, i) == State.PENDING);
  }

  static Tally of(FilePair files, PairResult result, OnSide side) {
    return new Tally(files, result, side);
  }

  /**
   * How many of some sentences are such.
   *
   * @param place where on this side a sentence counts: the index of a segment, or -1 for the place
   *     before the first
   * @return how many count before each place, from -1 to the size
   */
  private int[] sums(List<Segment> segments, IntUnaryOperator place, IntPredicate such) {
    int[] sums = new int[size + 2];
    for (int i = 0; i < segments.size(); i++) {
      if (!segments.get(i).verbatim() && such.test(i)) {
        sums[place.applyAsInt(i) + 2]++;
      }
    }
    for (int i = 1; i < sums.length; i++) {
      sums[i] += sums[i - 1];
    }
    return sums;
  }

  /** The sentences of a section. */
  Count of(Section section) {
    return between(section.from(), section.to());
  }

  /** All sentences, with those that would come before the first. */
  Count whole() {
    return between(-1, size);
  }

  private Count between(int from, int to) {
    return new Count(
        language,
        between(sentences, from, to),
        between(matched, from, to),
        between(added, from, to),
        between(missing, from, to),
        between(pending, from, to));
  }

  private static int between(int[] sums, int from, int to) {
    return sums[to + 1] - sums[from + 1];
  }
}
