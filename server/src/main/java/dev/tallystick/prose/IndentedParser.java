package dev.tallystick.prose;

import org.commonmark.node.Block;
import org.commonmark.parser.block.AbstractBlockParser;
import org.commonmark.parser.block.BlockContinue;
import org.commonmark.parser.block.ParserState;

/** Reads a block that goes on as long as its lines are blank or indented, and holds any others. */
abstract class IndentedParser extends AbstractBlockParser {
  /** Columns; a line that is indented so far opens no such block. */
  static final int INDENT = 4;

  private final Block block;

  IndentedParser(Block block) {
    this.block = block;
  }

  @Override
  public final Block getBlock() {
    return block;
  }

  @Override
  public final boolean isContainer() {
    return true;
  }

  @Override
  public final boolean canContain(Block child) {
    return true;
  }

  @Override
  public final BlockContinue tryContinue(ParserState state) {
    if (state.isBlank()) {
      return BlockContinue.atIndex(state.getNextNonSpaceIndex());
    }
    return state.getIndent() >= INDENT
        ? BlockContinue.atColumn(state.getColumn() + INDENT)
        : BlockContinue.none();
  }
}
