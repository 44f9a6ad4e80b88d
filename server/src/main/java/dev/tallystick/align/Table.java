package dev.tallystick.align;

import dev.tallystick.run.Cancellation;
import java.util.List;

/**
 * All chains of links through two texts, as in a {@link Lattice}, but kept up with edits at a cost
 * that depends on the edit alone.
 *
 * <p>Each row is kept relative to its own best cell, by whole numbers ({@link Fixed}), so it is the
 * same wherever it stands. After an edit the rows around it are filled anew, and from there on only
 * until rows come out exactly as they are known: all others rest on the same and would, too. The
 * band is a function of the way ({@link Way}); where the way changes the band does, until both stay
 * as they are. So a table that went through edits equals one that was made from the texts as they
 * are then, cell by cell, if both come to the same way.
 *
 * <p>What must hold for that: a link is worth what its sentences and the calibration say, whatever
 * stands before or behind; sums run in a fixed order; nothing stored refers to a whole text.
 */
final class Table {
  /** Ways are moved to the best in their band so often at most. */
  private static final int MOST_ROUNDS = 60;

  /** How far from where borders of blocks change a link, or what is left out, may change. */
  static final int AROUND = Side.LONGEST_BLOCK + Shape.MOST;

  final int shapes = Shape.ADAPTIVE.size();
  final int[] down = Shape.ADAPTIVE.stream().mapToInt(Shape::targets).toArray();
  final int[] right = Shape.ADAPTIVE.stream().mapToInt(Shape::sources).toArray();
  final int[] omittedBlock = new int[Side.LONGEST_BLOCK + 1];
  final int[] addedBlock = new int[Side.LONGEST_BLOCK + 1];

  final Calibration calibration;
  final Way way;
  final Lexis lexis;
  final Filling filling = new Filling(this);
  final Stretch touched = new Stretch();

  Side source;
  Side target;
  Evidence evidence;
  Cells[] rows;

  private final Stretch forward = new Stretch();
  private final Stretch backward = new Stretch();
  private final Stretch stale = new Stretch();

  /** A table along a guessed way; to be settled. */
  Table(Calibration calibration, Sides sides, List<Match> guess) {
    this.calibration = calibration;
    this.source = sides.source();
    this.target = sides.target();
    this.way = new Way(guess, source.size(), target.size());
    this.lexis = new Lexis(calibration.lexicon(), sides, new Band(way.low, way.high));
    this.evidence = Evidence.calibrated(sides, calibration, lexis);
    this.rows = new Cells[target.size() + 1];
    for (int row = 0; row < rows.length; row++) {
      rows[row] = new Cells();
    }
    for (int units = 0; units < omittedBlock.length; units++) {
      omittedBlock[units] = Fixed.of(evidence.omittedBlock(units));
      addedBlock[units] = Fixed.of(evidence.addedBlock(units));
    }
    dirty(0, target.size());
    stale.add(0, target.size());
  }

  int omission(int unit) {
    return Fixed.of(evidence.omission(unit));
  }

  int addition(int unit) {
    return Fixed.of(evidence.addition(unit));
  }

  int ending(int column) {
    return column == way.sources ? 0 : Fixed.of(evidence.unfinished());
  }

  /** These rows may come out otherwise. */
  void dirty(int from, int to) {
    int first = Math.max(0, from);
    int last = Math.min(way.targets, to);
    forward.add(first, last);
    backward.add(first, last);
    touched.add(first, last);
  }

  /** The band of these rows may be another one. */
  void restless(int from, int to) {
    stale.add(from, to);
  }

  /** The texts are others now; where, those say who call. */
  void texts(Sides sides) {
    source = sides.source();
    target = sides.target();
    evidence = Evidence.calibrated(sides, calibration, lexis);
  }

  /** Fills what has to be filled, and finds the best way. */
  void settle(Cancellation cancellation) {
    boolean moved = true;
    for (int round = 0; moved && round < MOST_ROUNDS; round++) {
      moved = false;
      reband();
      if (!backward.isEmpty()) {
        Stretch changed = fillBehind(cancellation);
        Trace trace = new Trace(this);
        trace.run(changed.from, changed.to);
        if (!trace.changed.isEmpty()) {
          moved = true;
          touched.add(trace.changed.from, trace.changed.to);
          stale.add(trace.changed.from - Way.REACH, trace.changed.to + Way.REACH);
        }
      }
    }
    fillBefore(cancellation);
  }

  /** Gives rows the band that their way has. */
  private void reband() {
    if (!stale.isEmpty()) {
      reband(stale.from, stale.to, Cells.Columns.SAME);
      stale.clear();
    }
  }

  /** The same, where source units were replaced. */
  void reband(int from, int to, Cells.Columns moved) {
    int first = Math.max(0, from);
    int last = Math.min(way.targets, to);
    int[] radii = way.radii(first, last);
    for (int row = first; row <= last; row++) {
      int low = way.low(row, radii[row - first]);
      int high = way.high(row, radii[row - first]);
      if (moved != Cells.Columns.SAME || low != way.low[row] || high != way.high[row]) {
        rows[row].reshape(way.low[row], low, high - low + 1, right, moved);
        way.low[row] = low;
        way.high[row] = high;
        dirty(row, row);
      }
    }
  }

  /** Fills what leads on from rows, upwards; answers which rows came out otherwise, or may have. */
  private Stretch fillBehind(Cancellation cancellation) {
    Stretch changed = new Stretch();
    changed.add(backward.from, backward.to);
    int until = backward.from;
    for (int row = backward.to; row >= Math.max(0, until); row--) {
      cancellation.check();
      judge(row);
      if (filling.behind(row)) {
        changed.add(row, row);
        until = Math.min(until, row - Shape.MOST);
        int block = target.blockEndingAt[row];
        until = block >= 0 ? Math.min(until, block) : until;
      }
    }
    backward.clear();
    touched.add(changed.from, changed.to);
    return changed;
  }

  /** Fills what leads to rows, downwards. */
  private void fillBefore(Cancellation cancellation) {
    int until = forward.to;
    for (int row = forward.from; !forward.isEmpty() && row <= Math.min(way.targets, until); row++) {
      cancellation.check();
      if (filling.before(row)) {
        touched.add(row, row);
        until = Math.max(until, row + Shape.MOST);
        until = Math.max(until, target.blockStartingAt[row]);
      }
    }
    forward.clear();
  }

  /** Judges the links from a row that nobody has looked at. */
  private void judge(int row) {
    Cells cells = rows[row];
    if (!cells.complete) {
      for (int at = 0; at < cells.links.length; at += shapes) {
        evidence.complete(row, way.low[row] + at / shapes, cells.links, at);
      }
      cells.complete = true;
    }
  }

  /** Rows from one to another. */
  static final class Stretch {
    int from = Integer.MAX_VALUE;
    int to = -1;

    void add(int first, int last) {
      from = Math.min(from, first);
      to = Math.max(to, last);
    }

    boolean isEmpty() {
      return to < from;
    }

    void clear() {
      from = Integer.MAX_VALUE;
      to = -1;
    }
  }
}
