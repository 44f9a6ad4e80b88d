package dev.tallystick.prose;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;

/** The lines of a file without the white space around each. */
final class TrimmedLines {
  private TrimmedLines() {}

  /** One span a line, in order, without line ends and byte-order mark; empty for a blank line. */
  static List<Span> of(Text text) {
    String file = text.string();
    List<Span> lines = new ArrayList<>(text.lines());
    for (int i = 0; i < text.lines(); i++) {
      int start = text.lineStart(i);
      int end = text.lineEnd(i);
      if (i == 0 && file.startsWith("\uFEFF")) {
        start++;
      }
      while (start < end && Characters.isSpace(file.charAt(start))) {
        start++;
      }
      while (end > start && Characters.isSpace(file.charAt(end - 1))) {
        end--;
      }
      lines.add(new Span(start, end));
    }
    return lines;
  }
}
