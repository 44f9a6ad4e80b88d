package dev.tallystick.prose;

import dev.tallystick.text.Span;

/** A block of plain text while its lines are read. */
final class PlainBlock {
  private final Block.Kind kind;
  private final int level;
  private final int start;
  private final Pieces pieces;

  PlainBlock(String file, Block.Kind kind, int level, int start) {
    this.kind = kind;
    this.level = level;
    this.start = start;
    this.pieces = new Pieces(file);
  }

  boolean is(Block.Kind wanted) {
    return kind == wanted;
  }

  /** Takes in the prose of a line, and the line break before it unless it is the first. */
  void append(int from, int to) {
    if (pieces.end() > 0) {
      pieces.addLineBreak(pieces.end(), from);
    }
    pieces.add(from, to);
  }

  /** The finished block, which ends where its last line does. */
  Block build() {
    return build(pieces.end());
  }

  Block build(int end) {
    return new Block(kind, level, new Span(start, end), pieces.spans());
  }
}
