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
    return MarkedLines.prose(file, lines, AsciiDocMarks::of);
  }
}
