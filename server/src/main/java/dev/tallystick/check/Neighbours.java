package dev.tallystick.check;

import dev.tallystick.align.Match;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import java.util.Arrays;
import java.util.List;

/** For sentences of one side without a counterpart: what stands around the gap on the other. */
final class Neighbours {
  private final List<Segment> other;
  private final int[] before;

  /** Which sentence of the other side the gap of each sentence of this side lies behind. */
  Neighbours(Subject subject, OnSide side) {
    boolean source = side == OnSide.SOURCE;
    this.other = source ? subject.target() : subject.source();
    this.before = new int[source ? subject.source().size() : subject.target().size()];
    for (Match match : subject.alignment().matches()) {
      if (source) {
        Arrays.fill(before, match.sourceFrom(), match.sourceTo(), match.targetFrom() - 1);
      } else {
        Arrays.fill(before, match.targetFrom(), match.targetTo(), match.sourceFrom() - 1);
      }
    }
  }

  /** The empty stretch on the other side where the counterpart of a run would stand. */
  Span gap(Run run) {
    int index = before[run.from()];
    int at = index < 0 ? 0 : Segment.end(other, index);
    return new Span(at, at);
  }

  /** The prose of the last sentence before the gap; empty if there is none. */
  String proseBefore(Run run) {
    for (int i = before[run.from()]; i >= 0; i--) {
      if (!other.get(i).verbatim()) {
        return other.get(i).prose();
      }
    }
    return "";
  }

  /** The prose of the first sentence behind the gap; empty if there is none. */
  String proseBehind(Run run) {
    for (int i = before[run.to() - 1] + 1; i < other.size(); i++) {
      if (!other.get(i).verbatim()) {
        return other.get(i).prose();
      }
    }
    return "";
  }
}
