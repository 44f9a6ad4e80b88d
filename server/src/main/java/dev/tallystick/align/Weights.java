package dev.tallystick.align;

import java.util.Arrays;

/**
 * The posteriors of a settled table. The share of a move is its worth among all moves that cover
 * the same target unit, or that stand in the same row: exactly one of them is in each chain. So
 * nothing far away is asked, and what an edit does not touch stays as it is.
 */
final class Weights {
  /** Cells whose chains lie this far below the best one hold nothing worth mentioning. */
  private static final int NEGLIGIBLE = -40 * Fixed.ONE;

  private final Table table;
  private final Way way;

  /** Rows whose matches may be others since somebody cleared this. */
  final Table.Stretch changed = new Table.Stretch();

  private double[] sourceNull;
  private double[] targetNull;

  Weights(Table table) {
    this.table = table;
    this.way = table.way;
    this.sourceNull = new double[way.sources];
    this.targetNull = new double[way.targets];
  }

  /** The texts are others now: makes room. */
  void replace(Change inSource, Change inTarget) {
    sourceNull = replaced(sourceNull, inSource);
    targetNull = replaced(targetNull, inTarget);
  }

  private static double[] replaced(double[] values, Change change) {
    double[] all = new double[values.length + change.shift()];
    int behind = change.from() + change.removed();
    System.arraycopy(values, 0, all, 0, change.from());
    System.arraycopy(values, behind, all, change.from() + change.added(), values.length - behind);
    return all;
  }

  /**
   * Brings all up to date.
   *
   * @param seam the first source unit that is another one than before; past all if none is
   */
  void update(int seam) {
    Table.Stretch touched = table.touched;
    if (!touched.isEmpty()) {
      int first = Math.max(0, touched.from - Table.AROUND);
      int last = Math.min(way.targets, touched.to + Table.AROUND);
      measure(first, Math.min(way.targets, touched.to));
      for (int row = first; row < last; row++) {
        table.rows[row].shares.all = all(row);
      }
      links(first, last);
      targets(first, last);
      changed.add(first, last);
      sources(first, last, seam);
    } else if (seam < way.sources) {
      sources(way.targets, way.targets, seam);
    }
    touched.clear();
  }

  /** What the moves from each row of a stretch are worth, beside the best chain. */
  private void measure(int from, int to) {
    int node = way.nodeAbove(from);
    int at = way.first[node] - way.low[node];
    int best = table.rows[node].before.best[at] + table.rows[node].behind.best[at];
    for (int row = node; row <= to; row++) {
      if (row >= from) {
        measureRow(row, best);
      }
      if (row < to) {
        best += table.rows[row].behind.step - table.rows[row + 1].before.step;
      }
    }
  }

  private void measureRow(int row, int best) {
    Cells cells = table.rows[row];
    Cells.Shares shares = cells.shares;
    int width = way.high[row] - way.low[row] + 1;
    Arrays.fill(shares.covering, 0);
    shares.addedBlock = 0;
    shares.added = 0;
    shares.omitted = shares.omitted.length == width ? shares.omitted : new double[width];
    Arrays.fill(shares.omitted, 0);
    table.filling.face(row);
    for (int cell = 0; cell < width; cell++) {
      int before = cells.before.best[cell];
      int behind = cells.behind.best[cell];
      if (before > Fixed.DEAD && behind > Fixed.DEAD && before + behind - best > NEGLIGIBLE) {
        if (row < way.targets) {
          measureLinks(row, cell, best);
          measureNulls(row, cell, best);
        } else {
          shares.omitted[cell] =
              Fixed.exp(Math.min(0, before + behind - best))
                  * cells.before.sum[cell]
                  * cells.behind.sum[cell];
        }
      }
    }
  }

  /** The worth of a move down, beside that of the best chain through the row. */
  private double down(int row, int cell, int on, int column, int parts, int best) {
    Cells cells = table.rows[row];
    int onward = table.filling.onward(row, on, column, parts);
    if (onward == Fixed.NOWHERE) {
      return 0;
    }
    int worth = cells.before.best[cell] + onward - cells.behind.step - best;
    return Fixed.exp(Math.min(0, worth))
        * cells.before.sum[cell]
        * (table.filling.sumOnward(row, on, column) / cells.behind.scale);
  }

  private double link(int row, int cell, int shape, int best) {
    int link = table.rows[row].links[cell * table.shapes + shape];
    int column = way.low[row] + cell + table.right[shape];
    return down(row, cell, table.down[shape], column, link, best);
  }

  private void measureLinks(int row, int cell, int best) {
    double[] covering = table.rows[row].shares.covering;
    for (int shape = 0; shape < table.shapes; shape++) {
      double weight = link(row, cell, shape, best);
      for (int unit = 0; weight > 0 && unit < table.down[shape]; unit++) {
        covering[unit] += weight;
      }
    }
  }

  private void measureNulls(int row, int cell, int best) {
    Cells cells = table.rows[row];
    Cells.Shares shares = cells.shares;
    int column = way.low[row] + cell;
    double added = down(row, cell, 1, column, table.addition(row), best);
    shares.added += added;
    shares.covering[0] += added;
    int block = table.target.blockStartingAt[row];
    if (block >= 0) {
      int units = block - row;
      shares.addedBlock += down(row, cell, units, column, table.addedBlock[units], best);
    }
    if (column < way.high[row]) {
      shares.omitted[cell] += across(cells, cell, cell + 1, table.omission(column), best);
      int end = table.source.blockStartingAt[column];
      if (end >= 0 && end <= way.high[row]) {
        int to = end - way.low[row];
        double all = across(cells, cell, to, table.omittedBlock[end - column], best);
        for (int unit = cell; all > 0 && unit < to; unit++) {
          shares.omitted[unit] += all;
        }
      }
    }
  }

  private static double across(Cells cells, int from, int to, int parts, int best) {
    if (cells.behind.best[to] <= Fixed.DEAD) {
      return 0;
    }
    int worth = cells.before.best[from] + parts + cells.behind.best[to] - best;
    return Fixed.exp(Math.min(0, worth)) * cells.before.sum[from] * cells.behind.sum[to];
  }

  /** All that covers the target unit behind a row. */
  private double all(int row) {
    double all = 0;
    double turned = 1;
    int block = blockOver(row);
    int farthest = Math.max(block, Math.min(row, Shape.MOST - 1));
    for (int up = 0; up <= farthest; up++) {
      Cells cells = table.rows[row - up];
      if (up > 0) {
        turned *= cells.behind.scale / table.rows[row - up + 1].before.scale;
      }
      if (up < Shape.MOST) {
        all += turned * cells.shares.covering[up];
      }
      if (up == block) {
        all += turned * cells.shares.addedBlock;
      }
    }
    return all;
  }

  /**
   * How many rows above a unit the block starts that it is in; -1 if that is not left out whole.
   */
  private int blockOver(int row) {
    for (int up = 0; up < Side.LONGEST_BLOCK && up <= row; up++) {
      int end = table.target.blockStartingAt[row - up];
      if (end > row) {
        return up;
      }
      if (end >= 0 || table.target.units[row - up].opens()) {
        return -1;
      }
    }
    return -1;
  }

  private void targets(int first, int last) {
    for (int row = first; row < last; row++) {
      Cells.Shares shares = table.rows[row].shares;
      double posterior = shares.added / shares.all;
      int block = blockOver(row);
      if (block >= 0) {
        Cells.Shares start = table.rows[row - block].shares;
        posterior += start.addedBlock / start.all;
      }
      targetNull[row] = posterior;
    }
  }

  private void sources(int first, int last, int seam) {
    int from = seam;
    int to = last == way.targets || seam < way.sources ? way.sources : 0;
    for (int row = first; row <= last; row++) {
      from = Math.min(from, way.low[row]);
      to = Math.max(to, way.high[row]);
    }
    changed.add(way.firstRowReaching(from), way.lastRowReaching(to));
    Arrays.fill(sourceNull, Math.min(from, to), to, 0);
    int end = Math.min(way.targets - 1, way.lastRowReaching(to));
    for (int row = way.firstRowReaching(from); row <= end; row++) {
      Cells.Shares shares = table.rows[row].shares;
      int stop = Math.min(to, way.high[row]);
      for (int column = Math.max(from, way.low[row]); column < stop; column++) {
        sourceNull[column] += shares.omitted[column - way.low[row]] / shares.all;
      }
    }
    unfinished(from, to);
  }

  /** Adds what ends before a unit. */
  private void unfinished(int from, int to) {
    int row = way.targets;
    double[] weights = table.rows[row].shares.omitted;
    double all = 0;
    for (double weight : weights) {
      all += weight;
    }
    double ended = 0;
    for (int column = way.low[row]; column < to; column++) {
      ended += column <= way.high[row] ? weights[column - way.low[row]] / all : 0;
      if (column >= from) {
        sourceNull[column] += ended;
      }
    }
  }

  double[] sourceNull() {
    return capped(sourceNull);
  }

  double[] targetNull() {
    return capped(targetNull);
  }

  private static double[] capped(double[] posteriors) {
    double[] capped = new double[posteriors.length];
    for (int i = 0; i < capped.length; i++) {
      capped[i] = Math.min(1, posteriors[i]);
    }
    return capped;
  }

  /** The posterior of a link of the best chain. */
  private double posterior(int row, int next) {
    int shape = 0;
    int right = way.first[next] - way.last[row];
    while (table.down[shape] != next - row || table.right[shape] != right) {
      shape++;
    }
    Cells cells = table.rows[row];
    int cell = way.last[row] - way.low[row];
    int best = cells.before.best[cell] + cells.behind.best[cell];
    table.filling.face(row);
    return Math.min(1, link(row, cell, shape, best) / cells.shares.all);
  }

  /** The posteriors of the links of the best chain. */
  private void links(int first, int last) {
    for (int row = first; row < last; row++) {
      int next = way.node[row] ? way.nodeBelow(row) : row;
      if (next > row && way.first[next] > way.last[row]) {
        table.rows[row].shares.link = posterior(row, next);
      }
    }
  }

  /** Posterior of the link of the best chain from a row. */
  double link(int row) {
    return table.rows[row].shares.link;
  }

  /** Posterior that a source unit is left out. */
  double omitted(int unit) {
    return Math.min(1, sourceNull[unit]);
  }

  /** Posterior that a target unit stands for nothing. */
  double added(int unit) {
    return Math.min(1, targetNull[unit]);
  }
}
