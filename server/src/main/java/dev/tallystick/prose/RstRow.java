package dev.tallystick.prose;

import java.util.Arrays;

/** A line of a table by its columns. */
final class RstRow {
  private final String file;
  private final RstLine line;
  private final int[] offsets;
  private final int width;

  RstRow(String file, RstLine line) {
    this.file = file;
    this.line = line;
    this.width = line.width(file);
    this.offsets = new int[width + 1];
    int column = line.column();
    for (int at = line.start(); at < line.end(); ) {
      int c = file.codePointAt(at);
      int next = Characters.columnAfter(column, c);
      Arrays.fill(offsets, column - line.column(), next - line.column(), at);
      column = next;
      at += Character.charCount(c);
    }
    offsets[width] = line.end();
  }

  /** The column behind its last one. */
  int end() {
    return line.column() + width;
  }

  /** The first UTF-16 unit of the character in a column; a blank outside of the line. */
  char at(int column) {
    int index = column - line.column();
    char found = index < 0 || index >= width ? ' ' : file.charAt(offsets[index]);
    return Characters.isBlank(found) ? ' ' : found;
  }

  /** What begins in these columns, without the blanks around it. */
  RstLine cut(int from, int to) {
    int start = boundary(from);
    int end = Math.max(start, boundary(to));
    return RstLine.of(file, offsets[start], offsets[end], line.column() + start);
  }

  private int boundary(int column) {
    int index = Math.max(0, Math.min(width, column - line.column()));
    while (index > 0 && index < width && offsets[index] == offsets[index - 1]) {
      index++;
    }
    return index;
  }
}
