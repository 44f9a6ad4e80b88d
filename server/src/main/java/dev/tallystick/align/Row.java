package dev.tallystick.align;

import java.util.Arrays;

/**
 * One row of a lattice: for each of its cells the worth of all chains that lead there (or on from
 * there), kept as the best chain's natural log and the sum over all chains relative to it.
 */
final class Row {
  /** Where no chain leads. */
  static final double NOWHERE = Double.NEGATIVE_INFINITY;

  /** The move into a cell that no chain leads to, or that a chain starts in. */
  static final byte NO_MOVE = -1;

  final int first;
  final int last;

  /** For each cell the last move of the best chain to it. */
  final byte[] move;

  /** Null once the row has been passed in a first look; so are the next two. */
  double[] best;

  double[] sum;

  /** Worth of the links that start in each cell, as many for each as there are shapes. */
  double[] links;

  Row(int first, int last) {
    int width = Math.max(0, last - first + 1);
    this.first = first;
    this.last = last;
    this.move = new byte[width];
    this.best = new double[width];
    this.sum = new double[width];
    Arrays.fill(move, NO_MOVE);
    Arrays.fill(best, NOWHERE);
  }

  private Row(Row row, int first, int last) {
    int from = first - row.first;
    int to = last - row.first + 1;
    this.first = first;
    this.last = last;
    this.move = Arrays.copyOfRange(row.move, from, to);
    this.best = Arrays.copyOfRange(row.best, from, to);
    this.sum = Arrays.copyOfRange(row.sum, from, to);
  }

  boolean has(int column) {
    return first <= column && column <= last;
  }

  /** The best worth of any cell. */
  double highest() {
    double highest = NOWHERE;
    for (double cell : best) {
      highest = Math.max(highest, cell);
    }
    return highest;
  }

  /** The row without the cells at either end that lie below a floor. */
  Row above(double floor) {
    int from = first;
    while (from < last && best[from - first] < floor) {
      from++;
    }
    int to = last;
    while (to > from && best[to - first] < floor) {
      to--;
    }
    return new Row(this, from, to);
  }

  /** Keeps the moves only. */
  void forget() {
    best = null;
    sum = null;
    links = null;
  }
}
