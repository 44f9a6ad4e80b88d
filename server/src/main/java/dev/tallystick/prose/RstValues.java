package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;

/** Values parted by commas, as spreadsheets write them: some in quotation marks, over lines. */
final class RstValues {
  private final String file;
  private final List<List<Span>> values = new ArrayList<>();
  private List<Span> value = new ArrayList<>();
  private boolean quoted;

  private RstValues(String file) {
    this.file = file;
  }

  /** The values in order, each by its stretches, one a line; none for what is empty. */
  static List<List<Span>> read(String file, List<RstLine> lines) {
    RstValues read = new RstValues(file);
    lines.forEach(read::take);
    read.close();
    return read.values;
  }

  private void take(RstLine line) {
    int from = line.start();
    for (int at = line.start(); at < line.end(); at++) {
      char c = file.charAt(at);
      if (c == '"' && quoted && at + 1 < line.end() && file.charAt(at + 1) == '"') {
        at++;
      } else if (c == '"') {
        add(from, at);
        quoted = !quoted;
        from = at + 1;
      } else if (c == ',' && !quoted) {
        add(from, at);
        close();
        from = at + 1;
      }
    }
    add(from, line.end());
    if (!quoted) {
      close();
    }
  }

  private void add(int from, int to) {
    RstLine part = RstLine.of(file, from, to, 0);
    if (!part.isBlank()) {
      value.add(part.span());
    }
  }

  private void close() {
    if (!value.isEmpty()) {
      values.add(value);
      value = new ArrayList<>();
    }
  }
}
