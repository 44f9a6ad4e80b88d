package dev.tallystick.check;

import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.function.IntPredicate;

/**
 * Neighbouring sentences; verbatim blocks between them belong to the run but count for nothing.
 *
 * @param from index of the first sentence
 * @param to index behind the last one
 */
record Run(int from, int to) {
  /** The longest runs of sentences that a condition holds for, none of them empty. */
  static List<Run> of(List<Segment> segments, IntPredicate holds) {
    List<Run> runs = new ArrayList<>();
    int from = -1;
    int to = -1;
    for (int i = 0; i < segments.size(); i++) {
      if (segments.get(i).verbatim()) {
        continue;
      }
      if (holds.test(i)) {
        from = from < 0 ? i : from;
        to = i + 1;
      } else if (from >= 0) {
        runs.add(new Run(from, to));
        from = -1;
      }
    }
    if (from >= 0) {
      runs.add(new Run(from, to));
    }
    return runs;
  }

  /** Number of sentences. */
  int sentences(List<Segment> segments) {
    int count = 0;
    for (Segment segment : segments.subList(from, to)) {
      count += segment.verbatim() ? 0 : 1;
    }
    return count;
  }

  /** From the first sentence's start to the last one's end. */
  Span span(List<Segment> segments) {
    return segments.get(from).span().cover(segments.get(to - 1).span());
  }
}
