package dev.tallystick.align;

/** Computes rows of a table from those before or behind, by integers and in a fixed order. */
final class Filling {
  private final Table table;
  private final int shapes;
  private final int[] worth;
  private final double[] weight;
  private int count;
  private int best;
  private final int[] offset = new int[Side.LONGEST_BLOCK + 1];
  private final double[] scale = new double[Side.LONGEST_BLOCK + 1];
  private int[] bests = new int[64];
  private double[] sums = new double[64];

  Filling(Table table) {
    this.table = table;
    this.shapes = table.shapes;
    this.worth = new int[shapes + 5];
    this.weight = new double[shapes + 5];
  }

  private void add(int parts, double sum) {
    if (parts > Fixed.DEAD) {
      worth[count] = parts;
      weight[count++] = sum;
      best = Math.max(best, parts);
    }
  }

  private void clear() {
    count = 0;
    best = Fixed.NOWHERE;
  }

  private void put(int cell) {
    double sum = 0;
    for (int i = 0; i < count; i++) {
      sum += weight[i] * Fixed.exp(worth[i] - best);
    }
    bests[cell] = best;
    sums[cell] = sum;
  }

  private int room(int row) {
    int width = table.way.high[row] - table.way.low[row] + 1;
    if (bests.length < width) {
      bests = new int[2 * width];
      sums = new double[2 * width];
    }
    return width;
  }

  /** What leads to a row; whether that is something else than was known. */
  boolean before(int row) {
    Way way = table.way;
    int width = room(row);
    int block = table.target.blockEndingAt[row];
    int farthest = Math.max(Math.min(row, Shape.MOST), block >= 0 ? row - block : 0);
    for (int up = 1; up <= farthest; up++) {
      Cells.Half half = up == 1 ? null : table.rows[row - up + 1].before;
      offset[up] = up == 1 ? 0 : offset[up - 1] - half.step;
      scale[up] = up == 1 ? 1 : scale[up - 1] / half.scale;
    }
    boolean leavesOut = row < way.targets;
    int low = way.low[row];
    for (int cell = 0; cell < width; cell++) {
      int column = low + cell;
      clear();
      if (row == 0 && column == 0) {
        add(0, 1);
      }
      for (int shape = 0; shape < shapes; shape++) {
        linkTo(row, column, shape);
      }
      if (leavesOut && cell > 0) {
        int start = table.source.blockEndingAt[column];
        addCell(cell - 1, table.omission(column - 1));
        if (start >= low) {
          addCell(start - low, table.omittedBlock[column - start]);
        }
      }
      if (row > 0) {
        addFrom(row, 1, column, table.addition(row - 1));
        if (block >= 0) {
          addFrom(row, row - block, column, table.addedBlock[row - block]);
        }
      }
      put(cell);
    }
    return table.rows[row].before.take(bests, sums, width);
  }

  private void linkTo(int row, int column, int shape) {
    int up = table.down[shape];
    int from = row - up;
    int start = column - table.right[shape];
    if (from >= 0 && table.way.low[from] <= start && start <= table.way.high[from]) {
      int cell = start - table.way.low[from];
      Cells cells = table.rows[from];
      int link = cells.links[cell * shapes + shape];
      int known = cells.before.best[cell];
      if (link > Fixed.DEAD && known > Fixed.DEAD) {
        add(known + offset[up] + link, cells.before.sum[cell] * scale[up]);
      }
    }
  }

  /** A way within the row. */
  private void addCell(int cell, int parts) {
    if (bests[cell] > Fixed.DEAD) {
      add(bests[cell] + parts, sums[cell]);
    }
  }

  private void addFrom(int row, int up, int column, int parts) {
    int from = row - up;
    if (table.way.low[from] <= column && column <= table.way.high[from]) {
      Cells.Half half = table.rows[from].before;
      int cell = column - table.way.low[from];
      if (half.best[cell] > Fixed.DEAD) {
        add(half.best[cell] + offset[up] + parts, half.sum[cell] * scale[up]);
      }
    }
  }

  /** What leads on from a row; whether that is something else than was known. */
  boolean behind(int row) {
    Way way = table.way;
    int width = room(row);
    int low = way.low[row];
    boolean end = row == way.targets;
    int block = end ? -1 : table.target.blockStartingAt[row];
    setOffsetsBehind(row, block);
    for (int cell = width - 1; cell >= 0; cell--) {
      int column = low + cell;
      clear();
      if (end) {
        add(table.ending(column), 1);
      } else {
        for (int shape = 0; shape < shapes; shape++) {
          linkOn(row, cell, shape);
        }
        if (cell < width - 1) {
          int blockEnd = table.source.blockStartingAt[column];
          addCell(cell + 1, table.omission(column));
          if (blockEnd >= 0 && blockEnd <= way.high[row]) {
            addCell(blockEnd - low, table.omittedBlock[blockEnd - column]);
          }
        }
        addOn(row, 1, column, table.addition(row));
        if (block >= 0) {
          addOn(row, block - row, column, table.addedBlock[block - row]);
        }
      }
      put(cell);
    }
    return table.rows[row].behind.take(bests, sums, width);
  }

  private void setOffsetsBehind(int row, int block) {
    int farthest =
        Math.max(Math.min(table.way.targets - row, Shape.MOST), block >= 0 ? block - row : 0);
    for (int on = 1; on <= farthest; on++) {
      Cells.Half half = on == 1 ? null : table.rows[row + on - 1].behind;
      offset[on] = on == 1 ? 0 : offset[on - 1] - half.step;
      scale[on] = on == 1 ? 1 : scale[on - 1] / half.scale;
    }
  }

  private void linkOn(int row, int cell, int shape) {
    int on = table.down[shape];
    int to = row + on;
    int link = table.rows[row].links[cell * shapes + shape];
    if (link > Fixed.DEAD) {
      addOn(row, on, table.way.low[row] + cell + table.right[shape], link);
    }
  }

  private void addOn(int row, int on, int column, int parts) {
    int to = row + on;
    if (to <= table.way.targets && table.way.low[to] <= column && column <= table.way.high[to]) {
      Cells.Half half = table.rows[to].behind;
      int cell = column - table.way.low[to];
      if (half.best[cell] > Fixed.DEAD) {
        add(half.best[cell] + offset[on] + parts, half.sum[cell] * scale[on]);
      }
    }
  }

  /**
   * What a move to a cell {@code on} rows below leads to, in the units of {@code row}'s best chain
   * on from it before it was made relative; {@link Fixed#NOWHERE} if it leads nowhere. Offsets are
   * those of the last call of {@link #face}.
   */
  int onward(int row, int on, int column, int parts) {
    int to = row + on;
    if (to > table.way.targets || column < table.way.low[to] || column > table.way.high[to]) {
      return Fixed.NOWHERE;
    }
    int known = table.rows[to].behind.best[column - table.way.low[to]];
    return parts > Fixed.DEAD && known > Fixed.DEAD ? known + offset[on] + parts : Fixed.NOWHERE;
  }

  /** Sets the offsets for moves down from a row. */
  void face(int row) {
    setOffsetsBehind(row, row < table.way.targets ? table.target.blockStartingAt[row] : -1);
  }

  /** The sum over all chains on from a cell below, on the scale of {@link #onward}. */
  double sumOnward(int row, int on, int column) {
    Cells.Half half = table.rows[row + on].behind;
    return half.sum[column - table.way.low[row + on]] * scale[on];
  }
}
