package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.List;

/** Picks the prose out of the lines of one block of AsciiDoc. */
final class AsciiDocInlines {
  private AsciiDocInlines() {}

  /**
   * The prose of a block.
   *
   * @param lines its stretches of the file, one a line
   */
  static List<Span> of(String file, List<Span> lines) {
    StringBuilder joined = new StringBuilder();
    for (Span line : lines) {
      joined.append(file, line.start(), line.end()).append('\n');
    }
    boolean[] marks = AsciiDocMarks.of(joined.toString());
    Pieces pieces = new Pieces(file);
    int before = 0;
    for (int i = 0; i < lines.size(); i++) {
      Span line = lines.get(i);
      if (pieces.end() > 0) {
        pieces.addLineBreak(pieces.end(), line.start());
      }
      for (int at = line.start(); at < line.end(); at++) {
        if (!marks[before + at - line.start()]) {
          pieces.add(at, at + 1);
        }
      }
      before += line.length() + 1;
    }
    return pieces.spans();
  }
}
