package dev.tallystick.text;

import java.util.Arrays;

/**
 * An unchangeable text with its line starts. Lines end in LF, CR LF or CR, as LSP has it; line ends
 * and a byte-order mark stay in the string.
 */
public final class Text {
  private final String string;
  private final int[] lineStarts;

  /** Wraps a string; the line starts are found once, in linear time. */
  public Text(String string) {
    this.string = string;
    this.lineStarts = lineStarts(string);
  }

  /** The whole text. */
  public String string() {
    return string;
  }

  /** Length in UTF-16 units. */
  public int length() {
    return string.length();
  }

  /** Number of lines; an empty text has one. */
  public int lines() {
    return lineStarts.length;
  }

  /** Line and column of an offset from 0 to {@link #length()}. */
  public Place place(int offset) {
    int at = Arrays.binarySearch(lineStarts, offset);
    int line = at >= 0 ? at : -at - 2;
    return new Place(line, offset - lineStarts[line]);
  }

  /** Offset of the first unit of a line. */
  public int lineStart(int line) {
    return lineStarts[line];
  }

  /** Offset behind the last unit of a line, its line end left out. */
  public int lineEnd(int line) {
    int end = line + 1 < lineStarts.length ? lineStarts[line + 1] : string.length();
    while (end > lineStarts[line] && isLineEnd(string.charAt(end - 1))) {
      end--;
    }
    return end;
  }

  /** The text after an edit; this one stays as it is. */
  public Text with(Edit edit) {
    Span span = edit.span();
    return new Text(
        string.substring(0, span.start()) + edit.replacement() + string.substring(span.end()));
  }

  /** The same offset, moved back by one if it lies inside a surrogate pair. */
  public int outsidePair(int offset) {
    boolean inside =
        offset > 0
            && offset < string.length()
            && Character.isLowSurrogate(string.charAt(offset))
            && Character.isHighSurrogate(string.charAt(offset - 1));
    return inside ? offset - 1 : offset;
  }

  private static boolean isLineEnd(char c) {
    return c == '\n' || c == '\r';
  }

  private static int[] lineStarts(String string) {
    boolean onlyLf = string.indexOf('\r') < 0;
    int[] starts = new int[16];
    int count = 1;
    int next = 0;
    while ((next = onlyLf ? string.indexOf('\n', next) + 1 : behindLineEnd(string, next)) > 0) {
      if (count == starts.length) {
        starts = Arrays.copyOf(starts, count * 2);
      }
      starts[count++] = next;
    }
    return Arrays.copyOf(starts, count);
  }

  /** The offset behind the next line end of any kind, or 0. */
  private static int behindLineEnd(String string, int from) {
    for (int i = from; i < string.length(); i++) {
      char c = string.charAt(i);
      if (c == '\n') {
        return i + 1;
      }
      if (c == '\r') {
        return i + 1 < string.length() && string.charAt(i + 1) == '\n' ? i + 2 : i + 1;
      }
    }
    return 0;
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Text text && text.string.equals(string);
  }

  @Override
  public int hashCode() {
    return string.hashCode();
  }

  @Override
  public String toString() {
    return string;
  }
}
