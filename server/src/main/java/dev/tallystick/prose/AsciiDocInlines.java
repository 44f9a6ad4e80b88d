package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;

/** Makes blocks of the lines of a block of AsciiDoc: one of its own, and one of each footnote. */
final class AsciiDocInlines {
  private AsciiDocInlines() {}

  /**
   * A block with its prose, and behind it one for each of its footnotes, which lie in its extent.
   * Those without prose are left out.
   *
   * @param lines the stretches of the file that the block has, one a line
   */
  static List<Block> blocks(
      Block.Kind kind, int level, Span extent, String file, List<Span> lines) {
    List<AsciiDocNote> notes = new ArrayList<>();
    List<Span> apart = new ArrayList<>();
    MarkedLines.Marker marker =
        (joined, inlines) -> {
          boolean[] marks = AsciiDocMarks.of(joined, inlines, notes);
          notes.forEach(note -> apart.add(note.whole()));
          return marks;
        };
    List<Block> blocks = new ArrayList<>();
    add(blocks, MarkedLines.block(kind, level, extent, file, lines, marker, apart));
    MarkedLines.Places places = new MarkedLines.Places(lines);
    for (AsciiDocNote note : notes) {
      add(blocks, note(file, places.inFile(note.whole()), places.lines(note.text())));
    }
    return blocks;
  }

  /** A note in a note has no place where it could be shown. */
  private static Block note(String file, Span extent, List<Span> lines) {
    MarkedLines.Marker marker =
        (joined, inlines) -> AsciiDocMarks.of(joined, inlines, new ArrayList<>());
    return MarkedLines.block(Block.Kind.NOTE, 0, extent, file, lines, marker, List.of());
  }

  private static void add(List<Block> blocks, Block block) {
    if (!block.pieces().isEmpty()) {
      blocks.add(block);
    }
  }
}
