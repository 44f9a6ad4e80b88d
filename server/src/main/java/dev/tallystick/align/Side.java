package dev.tallystick.align;

import java.util.Arrays;
import java.util.List;
import java.util.function.ToIntFunction;

/** The units of one text as plain arrays with running sums, for the inner loop. */
final class Side {
  /**
   * Longer blocks are not left out as one: they are rare, and a first look would hold on to them.
   */
  static final int LONGEST_BLOCK = 40;

  final Unit[] units;

  /** Sum of the lengths before each unit, and of all at the end. */
  final int[] lengthBefore;

  /** Number of blocks opened before each unit, and of all at the end. */
  final int[] opensBefore;

  /**
   * For each node between units: where the block that ends there starts, if it has several units
   * (but no more than {@link #LONGEST_BLOCK}); else -1.
   */
  final int[] blockEndingAt;

  /** For each node: where the block that starts there ends, if it has several units; else -1. */
  final int[] blockStartingAt;

  /** Number of verbatim units before each unit, and of all at the end. */
  final int[] verbatimBefore;

  /** When the units are on the screen; null if nothing says so, or nothing sensible. */
  final Timeline timeline;

  /** The units, as long as the adaptive model takes them to be. */
  Side(List<Unit> list) {
    this(list, Unit::length);
  }

  /** The units, each as long as {@code length} says. */
  Side(List<Unit> list, ToIntFunction<Unit> length) {
    this.units = list.toArray(Unit[]::new);
    this.lengthBefore = new int[units.length + 1];
    this.opensBefore = new int[units.length + 1];
    this.blockEndingAt = new int[units.length + 1];
    this.blockStartingAt = new int[units.length + 1];
    this.timeline = Timeline.of(units);
    findBlocks();
    this.verbatimBefore = new int[units.length + 1];
    for (int i = 0; i < units.length; i++) {
      lengthBefore[i + 1] = lengthBefore[i] + length.applyAsInt(units[i]);
      opensBefore[i + 1] = opensBefore[i] + (units[i].opens() ? 1 : 0);
      verbatimBefore[i + 1] = verbatimBefore[i] + (units[i].verbatim() ? 1 : 0);
    }
  }

  private void findBlocks() {
    Arrays.fill(blockEndingAt, -1);
    Arrays.fill(blockStartingAt, -1);
    int start = 0;
    for (int end = 1; end <= units.length; end++) {
      if (end == units.length || units[end].opens()) {
        if (end - start > 1 && end - start <= LONGEST_BLOCK) {
          blockEndingAt[end] = start;
          blockStartingAt[start] = end;
        }
        start = end;
      }
    }
  }

  /** The same units, but nothing says when they are on the screen. */
  Side untimed() {
    return new Side(Arrays.stream(units).map(unit -> unit.shown(0, -1)).toList());
  }

  int size() {
    return units.length;
  }

  int length(int from, int to) {
    return lengthBefore[to] - lengthBefore[from];
  }

  /** Whether units of one link stand in different blocks. */
  boolean crossesBlocks(int from, int to) {
    return opensBefore[to] > opensBefore[from + 1];
  }

  boolean hasVerbatim(int from, int to) {
    return verbatimBefore[to] > verbatimBefore[from];
  }
}
