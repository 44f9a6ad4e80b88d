package dev.tallystick.prose;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Reads a table that is drawn with bars, dashes and plus signs. */
final class RstGrid {
  /** The cells that are open, by the column of the bar before them. */
  private final TreeMap<Integer, Open> open = new TreeMap<>();

  private final List<RstTable.Cell> cells = new ArrayList<>();

  /** A cell, and the columns of the bars before and behind it. */
  private record Open(int left, int right, RstTable.Cell cell) {}

  private RstGrid() {}

  /**
   * The table whose upper border is the line with this index.
   *
   * @param base the column that its lines begin in
   */
  static RstTable read(String file, List<RstLine> lines, int top, int base) {
    RstGrid grid = new RstGrid();
    int end = top;
    while (end < lines.size() && isPart(file, lines.get(end), base)) {
      end++;
    }
    RstRow row = new RstRow(file, lines.get(top));
    for (int i = top; i < end; i++) {
      RstRow below = i + 1 < end ? new RstRow(file, lines.get(i + 1)) : null;
      if (i == top) {
        grid.open(row, below, base, row.end() - 1);
      } else {
        grid.read(row, below, i);
      }
      row = below;
    }
    return new RstTable(grid.cells, end);
  }

  private static boolean isPart(String file, RstLine line, int base) {
    return !line.isBlank() && line.column() == base && "+|".indexOf(file.charAt(line.start())) >= 0;
  }

  /** Opens cells below a border, from one bar that goes on below to the next. */
  private void open(RstRow border, RstRow below, int from, int to) {
    int left = from;
    for (int column = from + 1; column <= to && below != null; column++) {
      boolean corner = border.at(column) == '+' && isBar(below.at(column));
      if (corner || column == to) {
        open.put(left, new Open(left, column, new RstTable.Cell()));
        cells.add(open.get(left).cell());
        left = column;
      }
    }
  }

  private void read(RstRow row, RstRow below, int index) {
    List<Open> closed = new ArrayList<>();
    List<Open> going = new ArrayList<>();
    boolean aligned = true;
    for (Map.Entry<Integer, Open> entry : open.headMap(row.end()).entrySet()) {
      Open cell = entry.getValue();
      if (isBorder(row, cell)) {
        closed.add(cell);
      } else {
        going.add(cell);
        aligned &= isBar(row.at(cell.right()));
      }
    }
    if (aligned) {
      going.forEach(cell -> cell.cell().add(row.cut(cell.left() + 1, cell.right()), index));
    } else {
      addByBars(row, going, index);
    }
    close(closed, row, below);
  }

  /** Of a line that is not drawn rightly: one cell after the other from bar to bar. */
  private static void addByBars(RstRow row, List<Open> going, int index) {
    int next = 0;
    int left = going.get(0).left();
    for (int column = left + 1; column <= row.end() && next < going.size(); column++) {
      boolean last = next + 1 == going.size();
      char mark = row.at(column);
      if (column == row.end() || mark == '|' && (!last || column + 1 == row.end())) {
        going.get(next++).cell().add(row.cut(left + 1, column), index);
        left = column;
      }
    }
  }

  private void close(List<Open> closed, RstRow border, RstRow below) {
    closed.forEach(cell -> open.remove(cell.left()));
    int at = 0;
    while (at < closed.size()) {
      int from = at;
      while (at + 1 < closed.size() && closed.get(at).right() == closed.get(at + 1).left()) {
        at++;
      }
      open(border, below, closed.get(from).left(), closed.get(at).right());
      at++;
    }
  }

  private static boolean isBorder(RstRow row, Open cell) {
    if (row.at(cell.left()) != '+' || row.at(cell.right()) != '+') {
      return false;
    }
    for (int column = cell.left() + 1; column < cell.right(); column++) {
      if ("-=+".indexOf(row.at(column)) < 0) {
        return false;
      }
    }
    return true;
  }

  private static boolean isBar(char c) {
    return c == '|' || c == '+';
  }
}
