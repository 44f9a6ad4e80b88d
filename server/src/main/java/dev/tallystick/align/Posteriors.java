package dev.tallystick.align;

import dev.tallystick.run.Cancellation;
import java.util.ArrayList;
import java.util.List;

/**
 * How probable each link is, by the forward-backward algorithm: the share of the worth of all
 * chains through it.
 */
final class Posteriors {
  /** Cells whose chains lie this far below the best one hold no link worth mentioning (nats). */
  private static final double NEGLIGIBLE = -14;

  /** How far below the best chain through its row one may lie and still be looked at (nats). */
  private static final double REACH = 20;

  private final Lattice lattice;
  private final Scorer scorer;
  private final int shapes;
  private final int targets;
  private final int sources;
  private final Row[] onward;
  private final double totalBest;
  private final double totalSum;

  /** Fills the backward table inside the band of the forward one. */
  Posteriors(Lattice lattice, Cancellation cancellation) {
    this.lattice = lattice;
    this.scorer = lattice.scorer();
    this.targets = lattice.target().size();
    this.sources = lattice.source().size();
    this.shapes = scorer.shapes().size();
    this.onward = new Row[targets + 1];
    for (int row = targets; row >= 0; row--) {
      cancellation.check();
      onward[row] = new Row(lattice.row(row).first, lattice.row(row).last);
      fill(row);
    }
    this.totalBest = onward[0].best[0];
    this.totalSum = onward[0].sum[0];
  }

  /** Receives a two-sided link and its posterior. */
  @FunctionalInterface
  interface Visitor {
    void link(int shape, int target, int source, double posterior);
  }

  /** Visits the two-sided links of at least this posterior, in order of their first target unit. */
  void links(double least, Visitor visitor) {
    for (int row = 0; row < targets; row++) {
      Row forward = lattice.row(row);
      for (int column = forward.first; column <= forward.last; column++) {
        int at = column - forward.first;
        if (through(row, at) - totalBest > NEGLIGIBLE) {
          for (int shape = 0; shape < shapes; shape++) {
            double posterior = link(shape, row, column);
            if (posterior >= least) {
              visitor.link(shape, row, column, posterior);
            }
          }
        }
      }
    }
  }

  /**
   * Where to look again with other parameters: narrow where one chain is far ahead of all others,
   * wide where it is not.
   */
  Band band() {
    int[] first = new int[targets + 1];
    int[] last = new int[targets + 1];
    for (int row = 0; row <= targets; row++) {
      int to = lattice.row(row).last - lattice.row(row).first;
      double best = Row.NOWHERE;
      for (int at = 0; at <= to; at++) {
        best = Math.max(best, through(row, at));
      }
      int from = 0;
      while (through(row, from) < best - REACH) {
        from++;
      }
      while (through(row, to) < best - REACH) {
        to--;
      }
      first[row] = lattice.row(row).first + from;
      last[row] = lattice.row(row).first + to;
    }
    return Band.passable(first, last);
  }

  /** The worth of the best chain through a cell. */
  private double through(int row, int at) {
    return lattice.row(row).best[at] + onward[row].best[at];
  }

  private double worth(int row, int at, int shape) {
    return lattice.row(row).links[at * shapes + shape];
  }

  /** Posterior of one two-sided link. */
  double link(int shape, int row, int column) {
    int toRow = row + lattice.down(shape);
    int toColumn = column + lattice.right(shape);
    if (toRow > targets || !onward[toRow].has(toColumn)) {
      return 0;
    }
    Row forward = lattice.row(row);
    int from = column - forward.first;
    int to = toColumn - onward[toRow].first;
    double best = forward.best[from] + worth(row, from, shape) + onward[toRow].best[to];
    return share(best, forward.sum[from] * onward[toRow].sum[to]);
  }

  /** For each source unit the posterior that it is left out. */
  double[] sourceNull() {
    double[] nulls = new double[sources];
    for (int row = 0; row <= targets && lattice.leavesOut(row); row++) {
      Row forward = lattice.row(row);
      for (int column = forward.first; column < forward.last; column++) {
        nulls[column] += move(row, column, row, column + 1, scorer.omission(column));
        int end = lattice.source().blockStartingAt[column];
        if (end >= 0 && end <= forward.last) {
          addAll(
              nulls, column, end, move(row, column, row, end, scorer.omittedBlock(end - column)));
        }
      }
    }
    if (!lattice.leavesOut(targets)) {
      addUnfinished(nulls);
    }
    return capped(nulls);
  }

  /** Posterior of a one-sided move between two cells. */
  private double move(int row, int column, int toRow, int toColumn, double worth) {
    Row forward = lattice.row(row);
    Row after = onward[toRow];
    if (!after.has(toColumn)) {
      return 0;
    }
    int from = column - forward.first;
    int to = toColumn - after.first;
    return share(forward.best[from] + worth + after.best[to], forward.sum[from] * after.sum[to]);
  }

  private static void addAll(double[] nulls, int from, int to, double posterior) {
    for (int i = from; i < to; i++) {
      nulls[i] += posterior;
    }
  }

  private void addUnfinished(double[] nulls) {
    Row end = lattice.row(targets);
    double ended = 0;
    for (int source = end.first; source < nulls.length; source++) {
      if (source <= end.last) {
        int at = source - end.first;
        ended += share(end.best[at] + lattice.ending(source), end.sum[at]);
      }
      nulls[source] += ended;
    }
  }

  /** For each target unit the posterior that it stands for nothing. */
  double[] targetNull() {
    double[] nulls = new double[targets];
    for (int row = 0; row < targets; row++) {
      Row forward = lattice.row(row);
      int end = lattice.target().blockStartingAt[row];
      for (int column = forward.first; column <= forward.last; column++) {
        nulls[row] += move(row, column, row + 1, column, scorer.addition(row));
        if (end >= 0) {
          addAll(nulls, row, end, move(row, column, end, column, scorer.addedBlock(end - row)));
        }
      }
    }
    return capped(nulls);
  }

  /** The matches of a chain, each with its posterior. */
  List<Match> confident(List<Match> chain, double[] sourceNull, double[] targetNull) {
    List<Match> matches = new ArrayList<>(chain.size());
    for (Match match : chain) {
      double confidence;
      if (match.targets() == 0) {
        confidence = sourceNull[match.sourceFrom()];
      } else if (match.sources() == 0) {
        confidence = targetNull[match.targetFrom()];
      } else {
        confidence = Math.min(1, link(shape(match), match.targetFrom(), match.sourceFrom()));
      }
      matches.add(
          new Match(
              match.sourceFrom(),
              match.sourceTo(),
              match.targetFrom(),
              match.targetTo(),
              confidence));
    }
    return matches;
  }

  private int shape(Match match) {
    int shape = 0;
    while (lattice.right(shape) != match.sources() || lattice.down(shape) != match.targets()) {
      shape++;
    }
    return shape;
  }

  private double share(double best, double sum) {
    return best == Row.NOWHERE ? 0 : Math.exp(best - totalBest) * sum / totalSum;
  }

  /** Rounding may carry a sum of shares past 1. */
  private static double[] capped(double[] shares) {
    for (int i = 0; i < shares.length; i++) {
      shares[i] = Math.min(1, shares[i]);
    }
    return shares;
  }

  private void fill(int row) {
    Row cells = onward[row];
    boolean end = row == targets;
    Blend ways = new Blend(shapes + 4);
    for (int column = cells.last; column >= cells.first; column--) {
      int at = column - cells.first;
      ways.clear();
      if (end) {
        ways.add(Row.NO_MOVE, lattice.ending(column), 1);
      } else {
        addLinks(ways, row, at);
        addTo(ways, onward[row + 1], column, scorer.addition(row));
        int blockEnd = lattice.target().blockStartingAt[row];
        if (blockEnd >= 0) {
          addTo(ways, onward[blockEnd], column, scorer.addedBlock(blockEnd - row));
        }
      }
      if (column < cells.last && lattice.leavesOut(row)) {
        addTo(ways, cells, column + 1, scorer.omission(column));
        int blockEnd = lattice.source().blockStartingAt[column];
        addTo(ways, cells, blockEnd, scorer.omittedBlock(blockEnd - column));
      }
      cells.best[at] = ways.best;
      cells.sum[at] = ways.sum();
    }
  }

  private static void addTo(Blend ways, Row after, int column, double worth) {
    if (after.has(column)) {
      int to = column - after.first;
      ways.add(Row.NO_MOVE, after.best[to] + worth, after.sum[to]);
    }
  }

  private void addLinks(Blend ways, int row, int at) {
    int column = onward[row].first + at;
    for (int shape = 0; shape < shapes; shape++) {
      int toRow = row + lattice.down(shape);
      int toColumn = column + lattice.right(shape);
      if (toRow <= targets && onward[toRow].has(toColumn)) {
        int to = toColumn - onward[toRow].first;
        ways.add(shape, onward[toRow].best[to] + worth(row, at, shape), onward[toRow].sum[to]);
      }
    }
  }
}
