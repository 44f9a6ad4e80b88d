package dev.tallystick.align;

/**
 * Follows the best chain through a table from what leads on from each cell; of equals it takes the
 * move that comes first: a link by the order of shapes, then what is left out.
 */
final class Trace {
  private final Table table;
  private final Way way;

  /** The rows in which the way is another one than before. */
  final Table.Stretch changed = new Table.Stretch();

  private int row;
  private int column;

  /** Whether the way comes into the row by a doubtful link. */
  private int into;

  Trace(Table table) {
    this.table = table;
    this.way = table.way;
  }

  /** From above the rows in which something has changed to where the known way goes on. */
  void run(int from, int to) {
    row = way.nodeAbove(from - Table.AROUND);
    column = way.first[row];
    into = row == 0 ? 0 : way.trouble[row] - (way.last[row] - way.first[row]);
    int start = row;
    while (row < way.targets) {
      if (row > to && row > start && way.node[row] && way.first[row] == column) {
        put(row, column, way.last[row], true, into + way.last[row] - column);
        return;
      }
      step();
    }
    put(row, column, column, true, into);
  }

  /** Through the row, and on to the next row of the way. */
  private void step() {
    table.filling.face(row);
    int entered = column;
    int next = move();
    while (next == 0) {
      next = move();
    }
    put(row, entered, leaves, true, into + leaves - entered);
    boolean links = column > leaves;
    for (int inside = row + 1; inside < row + next; inside++) {
      put(inside, leaves, column, false, links ? 0 : 1);
    }
    into = links && !doubtful ? 0 : 1;
    row += next;
  }

  private int leaves;
  private boolean doubtful;

  /** Makes the best move; answers by how many rows. */
  private int move() {
    Cells cells = table.rows[row];
    int cell = column - way.low[row];
    int best = cells.behind.best[cell] + cells.behind.step;
    leaves = column;
    for (int shape = 0; shape < table.shapes; shape++) {
      int link = cells.links[cell * table.shapes + shape];
      int down = table.down[shape];
      int to = column + table.right[shape];
      if (table.filling.onward(row, down, to, link) == best) {
        doubtful = link < 0 || Way.isTrouble(down, table.right[shape]);
        column = to;
        return down;
      }
    }
    return leaveOut(cells.behind, cell, best);
  }

  private int leaveOut(Cells.Half behind, int cell, int best) {
    boolean more = column < way.high[row];
    if (more && behind.best[cell + 1] + behind.step + table.omission(column) == best) {
      column++;
      return 0;
    }
    int end = more ? table.source.blockStartingAt[column] : -1;
    if (end >= 0
        && end <= way.high[row]
        && behind.best[cell + end - column] + behind.step + table.omittedBlock[end - column]
            == best) {
      column = end;
      return 0;
    }
    int block = table.target.blockStartingAt[row];
    if (block >= 0
        && table.filling.onward(row, 1, column, table.addition(row)) != best
        && table.filling.onward(row, block - row, column, table.addedBlock[block - row]) == best) {
      return block - row;
    }
    return 1;
  }

  private void put(int at, int first, int last, boolean node, int trouble) {
    if (way.first[at] != first
        || way.last[at] != last
        || way.node[at] != node
        || way.trouble[at] != trouble) {
      way.first[at] = first;
      way.last[at] = last;
      way.node[at] = node;
      way.trouble[at] = trouble;
      changed.add(at, at);
    }
  }
}
