package dev.tallystick.aid;

import dev.tallystick.align.Match;
import dev.tallystick.align.Move;
import dev.tallystick.engine.PairResult;
import java.util.Arrays;

/** Where in the translation the counterpart of a source sentence is, or would be. */
final class Places {
  private final int[] first;
  private final int[] last;
  private final int[] before;
  private final boolean[] moved;

  Places(PairResult result) {
    int size = result.source().segments().size();
    first = new int[size];
    last = new int[size];
    before = new int[size];
    moved = new boolean[size];
    for (Match match : result.alignment().matches()) {
      boolean twoSided = match.twoSided();
      int from = match.sourceFrom();
      int to = match.sourceTo();
      Arrays.fill(first, from, to, twoSided ? match.targetFrom() : -1);
      Arrays.fill(last, from, to, twoSided ? match.targetTo() - 1 : -1);
      Arrays.fill(before, from, to, match.targetFrom() - 1);
    }
    for (Move move : result.alignment().moves()) {
      moved[move.source()] = true;
    }
  }

  /** Whether something stands for a source segment, there or elsewhere. */
  boolean matched(int index) {
    return inPlace(index) || moved[index];
  }

  /** Whether something stands for it in the order of the source. */
  boolean inPlace(int index) {
    return first[index] >= 0;
  }

  /** The first target segment of its match, if it is in place. */
  int first(int index) {
    return first[index];
  }

  /** The last target segment of its match, if it is in place. */
  int last(int index) {
    return last[index];
  }

  /** The target segment that its counterpart stands, or would stand, behind; -1 if first. */
  int before(int index) {
    return before[index];
  }
}
