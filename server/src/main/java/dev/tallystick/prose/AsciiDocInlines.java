package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;

/** Picks the prose out of the lines of one block of AsciiDoc, and what is marked in it. */
final class AsciiDocInlines {
  private AsciiDocInlines() {}

  /**
   * A block with its prose; it has no pieces if there is none.
   *
   * @param lines its stretches of the file, one a line
   */
  static Block block(Block.Kind kind, int level, Span extent, String file, List<Span> lines) {
    List<Inline> marked = new ArrayList<>();
    List<Span> pieces = MarkedLines.prose(file, lines, prose -> AsciiDocMarks.of(prose, marked));
    return new Block(kind, level, extent, pieces).with(MarkedLines.inFile(marked, lines));
  }
}
