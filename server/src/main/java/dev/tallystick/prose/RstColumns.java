package dev.tallystick.prose;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Reads a table whose columns lie below runs of equals signs. */
final class RstColumns {
  private final String file;
  private final List<RstLine> lines;
  private final int left;
  private final List<Integer> columns;
  private final List<RstTable.Cell> cells = new ArrayList<>();

  /** Index of the first line of the row that is being read. */
  private int from;

  private RstColumns(String file, List<RstLine> lines, int top) {
    this.file = file;
    this.lines = lines;
    this.left = lines.get(top).column();
    this.columns = runs(lines.get(top));
    this.from = top + 1;
  }

  /** The table whose upper border is the line with this index. */
  static RstTable read(String file, List<RstLine> lines, int top) {
    RstColumns table = new RstColumns(file, lines, top);
    Optional<Integer> bottom = table.bottom(top);
    int end = bottom.orElseGet(() -> behindText(lines, top));
    for (int i = top + 1; i < end; i++) {
      table.read(i);
    }
    table.close(end, table.columns);
    return new RstTable(table.cells, bottom.isPresent() ? end + 1 : end);
  }

  /** The second border below the upper one, or one with a blank line below, else any. */
  private Optional<Integer> bottom(int top) {
    Optional<Integer> found = Optional.empty();
    for (int i = top + 1; i < lines.size(); i++) {
      if (isBorder(lines.get(i))) {
        if (found.isPresent() || i + 1 == lines.size() || lines.get(i + 1).isBlank()) {
          return Optional.of(i);
        }
        found = Optional.of(i);
      }
    }
    return found;
  }

  /** A table without an end goes as far as its text. */
  private static int behindText(List<RstLine> lines, int top) {
    int end = top + 1;
    while (end < lines.size() && !lines.get(end).isBlank()) {
      end++;
    }
    return end;
  }

  private void read(int at) {
    RstLine line = lines.get(at);
    if (line.isBlank()) {
      return;
    }
    if (isBorder(line)) {
      close(at, columns);
      from = at + 1;
    } else if (line.column() == left && RstSyntax.isSpanLine(file, line)) {
      close(at, runs(line));
      from = at + 1;
    } else if (line.column() < secondColumn()) {
      close(at, columns);
      from = at;
    }
  }

  private boolean isBorder(RstLine line) {
    return line.column() == left && RstSyntax.isBorder(file, line);
  }

  private int secondColumn() {
    return columns.size() > 1 ? columns.get(1) : Integer.MAX_VALUE;
  }

  /** Takes the row that ends before a line. */
  private void close(int end, List<Integer> starts) {
    List<RstTable.Cell> row = new ArrayList<>();
    for (int i = from; i < end; i++) {
      if (!lines.get(i).isBlank()) {
        cut(new RstRow(file, lines.get(i)), i, starts, row);
      }
    }
    cells.addAll(row);
  }

  private static void cut(RstRow line, int index, List<Integer> starts, List<RstTable.Cell> row) {
    int start = 0;
    for (int k = 0; k < starts.size() && start < line.end(); k++) {
      boolean last = k + 1 == starts.size();
      int end = last ? line.end() : boundary(line, Math.max(start, starts.get(k + 1)));
      if (k == row.size()) {
        row.add(new RstTable.Cell());
      }
      row.get(k).add(line.cut(start, end), index);
      start = end;
    }
  }

  /** Where a column begins on a line; text that is too long for the one before pushes it away. */
  private static int boundary(RstRow line, int column) {
    int at = column;
    if (line.at(at - 1) != ' ') {
      while (at < line.end() && (line.at(at - 1) != ' ' || line.at(at - 2) != ' ')) {
        at++;
      }
    }
    return at;
  }

  private List<Integer> runs(RstLine border) {
    List<Integer> starts = new ArrayList<>();
    int column = border.column();
    for (int at = border.start(); at < border.end(); at++) {
      boolean first = at == border.start() || Characters.isBlank(file.charAt(at - 1));
      if (first && !Characters.isBlank(file.charAt(at))) {
        starts.add(column);
      }
      column = Characters.columnAfter(column, file.charAt(at));
    }
    return starts;
  }
}
