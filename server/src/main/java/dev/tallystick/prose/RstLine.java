package dev.tallystick.prose;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;

/**
 * A line of reStructuredText, or the part of one that a body or a cell takes up, without the white
 * space around it.
 *
 * @param start UTF-16 offset of its first character
 * @param end offset behind its last one; the same as {@code start} if the line is blank
 * @param column where it starts, tabs reaching to the next multiple of 8
 */
record RstLine(int start, int end, int column) {
  /** All lines of a file, in order. */
  static List<RstLine> all(Text text) {
    String file = text.string();
    List<RstLine> lines = new ArrayList<>(text.lines());
    for (int i = 0; i < text.lines(); i++) {
      int start = text.lineStart(i);
      boolean mark = i == 0 && file.startsWith("\uFEFF");
      lines.add(of(file, mark ? start + 1 : start, text.lineEnd(i), 0));
    }
    return lines;
  }

  /** What lies between two offsets of a line. */
  static RstLine of(String file, int from, int to, int column) {
    int end = to;
    while (end > from && Characters.isSpace(file.charAt(end - 1))) {
      end--;
    }
    int at = from;
    int columns = column;
    while (at < end && isIndent(file.charAt(at))) {
      columns = Characters.columnAfter(columns, file.charAt(at++));
    }
    return new RstLine(at, end, columns);
  }

  /** The rest of it behind an offset. */
  RstLine behind(String file, int offset) {
    int columns = column;
    int at = start;
    while (at < offset) {
      int c = file.codePointAt(at);
      columns = Characters.columnAfter(columns, c);
      at += Character.charCount(c);
    }
    return of(file, Math.min(at, end), end, columns);
  }

  /** The same as if it stood in another column. */
  RstLine in(int other) {
    return new RstLine(start, end, other);
  }

  boolean isBlank() {
    return start == end;
  }

  Span span() {
    return new Span(start, end);
  }

  String words(String file) {
    return file.substring(start, end);
  }

  /** Columns that it takes up. */
  int width(String file) {
    int columns = column;
    for (int at = start; at < end; at += Character.charCount(file.codePointAt(at))) {
      columns = Characters.columnAfter(columns, file.codePointAt(at));
    }
    return columns - column;
  }

  private static boolean isIndent(char c) {
    return Characters.isBlank(c) || c == '\f' || c == 0x0B;
  }
}
