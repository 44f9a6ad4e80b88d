package dev.tallystick.engine;

import dev.tallystick.align.Match;
import dev.tallystick.align.Move;
import dev.tallystick.check.Code;
import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** How it stands with each sentence, and verbatim block, of a pair. */
final class States {
  private final PairResult result;
  private final State[] source;
  private final State[] target;
  private final int[] places;

  private States(PairResult result) {
    this.result = result;
    this.source = new State[result.source().segments().size()];
    this.target = new State[result.target().segments().size()];
    this.places = new int[source.length];
    Arrays.fill(source, State.MISSING);
    Arrays.fill(target, State.ADDED);
    result.alignment().matches().forEach(this::take);
    takeUntranslated();
    result.alignment().moves().forEach(this::take);
  }

  static States of(PairResult result) {
    return new States(result);
  }

  private void take(Match match) {
    for (int s = match.sourceFrom(); s < match.sourceTo(); s++) {
      places[s] = Math.min(match.targetFrom() + s - match.sourceFrom(), match.targetTo() - 1);
      if (result.pending().source(s)) {
        source[s] = State.PENDING;
      } else if (match.twoSided()) {
        source[s] = State.MATCHED;
      }
    }
    if (match.twoSided()) {
      for (int t = match.targetFrom(); t < match.targetTo(); t++) {
        int s = Math.min(match.sourceFrom() + t - match.targetFrom(), match.sourceTo() - 1);
        target[t] = source[s];
      }
    }
  }

  private void take(Move move) {
    source[move.source()] = State.MOVED;
    target[move.target()] = State.MOVED;
  }

  private void takeUntranslated() {
    Set<Span> here = new HashSet<>();
    Set<Span> there = new HashSet<>();
    for (Finding finding : result.findings()) {
      if (finding.code() == Code.UNTRANSLATED) {
        here.add(finding.span());
        there.add(finding.counterpart());
      }
    }
    mark(target, result.target().segments(), here);
    mark(source, result.source().segments(), there);
  }

  private static void mark(State[] states, List<Segment> segments, Set<Span> untranslated) {
    for (int i = 0; i < states.length && !untranslated.isEmpty(); i++) {
      if (untranslated.contains(segments.get(i).span())) {
        states[i] = State.UNTRANSLATED;
      }
    }
  }

  /** The state of a segment by its index. */
  State at(OnSide side, int index) {
    return side == OnSide.SOURCE ? source[index] : target[index];
  }

  /**
   * The index of the target segment that the counterpart of a source segment is, or would stand
   * behind; -1 if it would come first.
   */
  int place(int index) {
    return places[index];
  }
}
