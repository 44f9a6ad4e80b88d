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
    this.verbatimBefore = new int[units.length + 1];
    for (int i = 0; i < units.length; i++) {
      count(i, length.applyAsInt(units[i]));
    }
    findBlocks();
  }

  private void findBlocks() {
    Arrays.fill(blockEndingAt, -1);
    Arrays.fill(blockStartingAt, -1);
    int start = 0;
    for (int end = 1; end <= units.length; end++) {
      if (end == units.length || opensBefore[end + 1] > opensBefore[end]) {
        if (end - start > 1 && end - start <= LONGEST_BLOCK) {
          blockEndingAt[end] = start;
          blockStartingAt[start] = end;
        }
        start = end;
      }
    }
  }

  /** Whether blocks begin and end at a node as they did at a node of another text. */
  boolean sameBlocks(int node, Side other, int otherNode) {
    int ending = blockEndingAt[node] < 0 ? 0 : node - blockEndingAt[node];
    int starting = blockStartingAt[node] < 0 ? 0 : blockStartingAt[node] - node;
    int otherEnding =
        other.blockEndingAt[otherNode] < 0 ? 0 : otherNode - other.blockEndingAt[otherNode];
    int otherStarting =
        other.blockStartingAt[otherNode] < 0 ? 0 : other.blockStartingAt[otherNode] - otherNode;
    return ending == otherEnding && starting == otherStarting;
  }

  /** The text after a change; nothing says any more when its units are on the screen. */
  Side replaced(Change change, List<Unit> now) {
    return change.isNone() ? this : new Side(this, change, now);
  }

  private Side(Side before, Change change, List<Unit> now) {
    int size = now.size();
    this.units = now.toArray(Unit[]::new);
    this.lengthBefore = Arrays.copyOf(before.lengthBefore, size + 1);
    this.opensBefore = Arrays.copyOf(before.opensBefore, size + 1);
    this.verbatimBefore = Arrays.copyOf(before.verbatimBefore, size + 1);
    this.blockEndingAt = new int[size + 1];
    this.blockStartingAt = new int[size + 1];
    this.timeline = null;
    int end = change.from() + change.added();
    for (int i = change.from(); i < end; i++) {
      count(i, units[i].length());
    }
    shift(lengthBefore, before.lengthBefore, end, change.shift());
    shift(opensBefore, before.opensBefore, end, change.shift());
    shift(verbatimBefore, before.verbatimBefore, end, change.shift());
    findBlocks();
  }

  /** What lies behind a change, from a node on, of which the value is known. */
  private static void shift(int[] sums, int[] before, int from, int shift) {
    int more = sums[from] - before[from - shift];
    for (int i = from + 1; i < sums.length; i++) {
      sums[i] = before[i - shift] + more;
    }
  }

  private void count(int unit, int length) {
    lengthBefore[unit + 1] = lengthBefore[unit] + length;
    opensBefore[unit + 1] = opensBefore[unit] + (units[unit].opens() ? 1 : 0);
    verbatimBefore[unit + 1] = verbatimBefore[unit] + (units[unit].verbatim() ? 1 : 0);
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
