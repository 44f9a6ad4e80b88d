package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.List;
import java.util.function.Function;

/** Picks the prose out of the lines of one block whose marks are known. */
final class MarkedLines {
  private MarkedLines() {}

  /**
   * The prose of a block.
   *
   * @param lines its stretches of the file, one a line
   * @param marks tells of the lines, each with an LF at its end, which characters are no prose
   */
  static List<Span> prose(String file, List<Span> lines, Function<String, boolean[]> marks) {
    StringBuilder joined = new StringBuilder();
    for (Span line : lines) {
      joined.append(file, line.start(), line.end()).append('\n');
    }
    boolean[] marked = marks.apply(joined.toString());
    Pieces pieces = new Pieces(file);
    int before = 0;
    for (Span line : lines) {
      if (pieces.end() > 0) {
        pieces.addLineBreak(pieces.end(), line.start());
      }
      for (int at = line.start(); at < line.end(); at++) {
        if (!marked[before + at - line.start()]) {
          pieces.add(at, at + 1);
        }
      }
      before += line.length() + 1;
    }
    return pieces.spans();
  }
}
