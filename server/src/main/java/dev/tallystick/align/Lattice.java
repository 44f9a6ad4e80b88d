package dev.tallystick.align;

import dev.tallystick.run.Cancellation;
import java.util.Arrays;
import java.util.List;

/**
 * All chains of links from the start of both texts to their end, weighed against each other.
 *
 * <p>A cell (row, column) is the state in which the first {@code row} target units and the first
 * {@code column} source units are explained. A two-sided link leads from a cell down and to the
 * right; leaving out a source unit or a whole block leads to the right, target units without a
 * source down. In the last row nothing is left out one by one: whatever source is left there counts
 * as not translated yet, at one price ({@link Scorer#unfinished()}).
 *
 * <p>This is the forward table: the worth of all chains from the start to each cell. It gives the
 * best chain ({@link #chain()}, after Viterbi); with the backward table the posterior of every link
 * follows ({@link Posteriors}).
 */
final class Lattice {
  /** No model leaves out a unit for less (nats). */
  private static final double CHEAPEST_OMISSION = 2;

  /** The most columns that a first look keeps beyond those that links lead to. */
  private static final int WIDEST = 1000;

  private final Scorer scorer;
  private final Side source;
  private final Side target;
  private final int shapes;
  private final int[] down;
  private final int[] right;
  private final boolean sums;
  private final Row[] rows;

  private Lattice(Scorer scorer, Sides sides, boolean sums) {
    this.scorer = scorer;
    this.source = sides.source();
    this.target = sides.target();
    this.shapes = scorer.shapes().size();
    this.down = scorer.shapes().stream().mapToInt(Shape::targets).toArray();
    this.right = scorer.shapes().stream().mapToInt(Shape::sources).toArray();
    this.sums = sums;
    this.rows = new Row[target.size() + 1];
  }

  /**
   * A first look: the band is found on the way, and only the best chain can be asked for.
   *
   * @param reach how far below its row's best a cell may lie and still be gone on from (nats)
   */
  static Lattice wide(Scorer scorer, Sides sides, double reach, Cancellation cancellation) {
    Lattice lattice = new Lattice(scorer, sides, false);
    for (int row = 0; row < lattice.rows.length; row++) {
      cancellation.check();
      lattice.rows[row] = new Row(lattice.reachedFirst(row), lattice.reachedLast(row, reach));
      lattice.fill(row, reach);
      double floor = lattice.rows[row].highest() - reach;
      lattice.rows[row] = lattice.rows[row].above(floor);
      lattice.judge(row, floor);
      lattice.forget(row);
    }
    return lattice;
  }

  /** The forward table inside a band. */
  static Lattice banded(Scorer scorer, Sides sides, Band band, Cancellation cancellation) {
    Lattice lattice = new Lattice(scorer, sides, true);
    for (int row = 0; row < lattice.rows.length; row++) {
      cancellation.check();
      lattice.rows[row] = new Row(band.first()[row], band.last()[row]);
      lattice.fill(row, Double.POSITIVE_INFINITY);
      lattice.judge(row, Row.NOWHERE);
    }
    return lattice;
  }

  Row row(int row) {
    return rows[row];
  }

  Side source() {
    return source;
  }

  Side target() {
    return target;
  }

  Scorer scorer() {
    return scorer;
  }

  int down(int shape) {
    return down[shape];
  }

  int right(int shape) {
    return right[shape];
  }

  /** Worth of ending in a cell of the last row. */
  double ending(int column) {
    return column == source.size() ? 0 : scorer.unfinished();
  }

  /** Whether source units may be left out one by one between these two target units. */
  boolean leavesOut(int row) {
    return row < target.size() || scorer.unfinished() == Row.NOWHERE;
  }

  private int reachedFirst(int row) {
    int first = row == 0 ? 0 : source.size();
    for (int above = Math.max(0, row - Shape.MOST); above < row; above++) {
      first = Math.min(first, rows[above].first);
    }
    return first;
  }

  /** As far as links lead, and beyond that as far as leaving out source units could pay. */
  private int reachedLast(int row, double reach) {
    if (row == target.size() && leavesOut(row)) {
      return source.size();
    }
    double omitted = Math.min(WIDEST, reach / CHEAPEST_OMISSION);
    return (int) Math.min(source.size(), linkedLast(row) + omitted);
  }

  private int linkedLast(int row) {
    int last = 0;
    for (int above = Math.max(0, row - Shape.MOST); above < row; above++) {
      last = Math.max(last, rows[above].last + Shape.MOST);
    }
    return last;
  }

  /** Lets go of the row that no link or added block can lead from any more. */
  private void forget(int row) {
    int passed = row - Side.LONGEST_BLOCK;
    if (passed >= 0) {
      rows[passed].forget();
    }
  }

  private void fill(int row, double reach) {
    Row cells = rows[row];
    Blend ways = new Blend(shapes + 5);
    int linked = row == target.size() ? source.size() : linkedLast(row);
    double bestOfRow = Row.NOWHERE;
    for (int column = cells.first; column <= cells.last; column++) {
      int at = column - cells.first;
      ways.clear();
      if (row == 0 && column == 0) {
        ways.add(Row.NO_MOVE, 0, 1);
      }
      addLinks(ways, row, column);
      addNulls(ways, row, column);
      cells.best[at] = ways.best;
      cells.move[at] = ways.move;
      cells.sum[at] = sums ? ways.sum() : 1;
      bestOfRow = Math.max(bestOfRow, ways.best);
      if (column > linked && ways.best < bestOfRow - reach) {
        break; // from here on only omissions lead further, and they have become too many
      }
    }
  }

  private void addLinks(Blend ways, int row, int column) {
    for (int shape = 0; shape < shapes; shape++) {
      int fromRow = row - down[shape];
      int fromColumn = column - right[shape];
      if (fromRow >= 0 && rows[fromRow].has(fromColumn)) {
        Row from = rows[fromRow];
        int cell = fromColumn - from.first;
        ways.add(shape, from.best[cell] + from.links[cell * shapes + shape], from.sum[cell]);
      }
    }
  }

  private void addNulls(Blend ways, int row, int column) {
    if (column > 0 && leavesOut(row)) {
      int start = source.blockEndingAt[column];
      add(ways, omission(), rows[row], column - 1, scorer.omission(column - 1));
      add(ways, omittedBlock(), rows[row], start, scorer.omittedBlock(column - start));
    }
    if (row > 0) {
      int start = target.blockEndingAt[row];
      add(ways, addition(), rows[row - 1], column, scorer.addition(row - 1));
      if (start >= 0) {
        add(ways, addedBlock(), rows[start], column, scorer.addedBlock(row - start));
      }
    }
  }

  private static void add(Blend ways, int move, Row from, int column, double worth) {
    if (from.has(column)) {
      int cell = column - from.first;
      ways.add(move, from.best[cell] + worth, from.sum[cell]);
    }
  }

  /** The numbers of the null moves, behind those of the shapes. */
  int omission() {
    return shapes;
  }

  int omittedBlock() {
    return shapes + 1;
  }

  int addition() {
    return shapes + 2;
  }

  int addedBlock() {
    return shapes + 3;
  }

  /** Judges the links that start in the cells of a row, where they are worth going on from. */
  private void judge(int row, double floor) {
    Row cells = rows[row];
    cells.links = new double[cells.best.length * shapes];
    for (int at = 0; at < cells.best.length; at++) {
      if (cells.best[at] >= floor && cells.best[at] != Row.NOWHERE) {
        scorer.links(row, cells.first + at, cells.links, at * shapes);
      } else {
        Arrays.fill(cells.links, at * shapes, (at + 1) * shapes, Row.NOWHERE);
      }
    }
  }

  /**
   * The best chain; of equals the one whose last link comes first in the list of shapes, a link
   * before a null move. Its confidences are 1: this table knows nothing of the other chains.
   */
  List<Match> chain() {
    return new BestChain(this).matches();
  }
}
