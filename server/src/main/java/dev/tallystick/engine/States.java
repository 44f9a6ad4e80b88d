package dev.tallystick.engine;

import dev.tallystick.align.Match;
import dev.tallystick.align.Move;
import dev.tallystick.check.Code;
import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import dev.tallystick.check.Untranslated;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import java.util.Arrays;
import java.util.List;

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
    List<Finding> runs =
        result.findings().stream().filter(finding -> finding.code() == Code.UNTRANSLATED).toList();
    if (runs.isEmpty()) {
      return;
    }
    List<Segment> segments = result.target().segments();
    int[] copyOf = Untranslated.copies(result.source().segments(), segments, result.alignment());
    int next = 0;
    for (int t = 0; t < copyOf.length && next < runs.size(); t++) {
      Span span = segments.get(t).span();
      if (copyOf[t] >= 0 && span.overlaps(runs.get(next).span())) {
        target[t] = State.UNTRANSLATED;
        source[copyOf[t]] = State.UNTRANSLATED;
      }
      next += span.end() >= runs.get(next).span().end() ? 1 : 0;
    }
  }

  /** All sentences of a side; a verbatim block is none. */
  Count count(OnSide side, String otherLanguage) {
    int[] own = numbers(side);
    int[] ofSource = side == OnSide.SOURCE ? own : numbers(OnSide.SOURCE);
    return new Count(
        otherLanguage,
        Arrays.stream(own).sum(),
        own[State.MATCHED.ordinal()]
            + own[State.MOVED.ordinal()]
            + own[State.UNTRANSLATED.ordinal()],
        own[State.ADDED.ordinal()],
        ofSource[State.MISSING.ordinal()],
        ofSource[State.PENDING.ordinal()]);
  }

  /** How many sentences of a side are in each state. */
  private int[] numbers(OnSide side) {
    List<Segment> segments = result.reading(side).segments();
    State[] states = side == OnSide.SOURCE ? source : target;
    int[] numbers = new int[State.values().length];
    for (int i = 0; i < states.length; i++) {
      numbers[states[i].ordinal()] += segments.get(i).verbatim() ? 0 : 1;
    }
    return numbers;
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
