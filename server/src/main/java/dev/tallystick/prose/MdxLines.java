package dev.tallystick.prose;

import java.util.ArrayList;
import java.util.List;
import org.commonmark.node.Block;
import org.commonmark.parser.InlineParser;
import org.commonmark.parser.SourceLine;
import org.commonmark.parser.SourceLines;
import org.commonmark.parser.block.AbstractBlockParser;
import org.commonmark.parser.block.AbstractBlockParserFactory;
import org.commonmark.parser.block.BlockContinue;
import org.commonmark.parser.block.BlockParserFactory;
import org.commonmark.parser.block.BlockStart;
import org.commonmark.parser.block.MatchedBlockParser;
import org.commonmark.parser.block.ParserState;

/**
 * Lines of MDX with nothing but tags and expressions, which part what stands above from what stands
 * below. A tag over several lines ends at a blank line at the latest.
 */
final class MdxLines extends AbstractBlockParser {
  private final MarkedLine.Titled block = new MarkedLine.Titled();
  private final List<SourceLine> lines = new ArrayList<>();
  private MdxMark open;

  static BlockParserFactory factory() {
    return new AbstractBlockParserFactory() {
      @Override
      public BlockStart tryStart(ParserState state, MatchedBlockParser matched) {
        CharSequence line = state.getLine().getContent();
        int start = state.getNextNonSpaceIndex();
        MdxLines lines = new MdxLines();
        return lines.read(line, start) ? BlockStart.of(lines).atIndex(start) : BlockStart.none();
      }
    };
  }

  /** Reads marks from an offset on; whether there is nothing else on the line. */
  private boolean read(CharSequence line, int start) {
    for (int at = start; at < line.length(); at++) {
      char c = line.charAt(at);
      if (open == null && Characters.isSpace(c)) {
        continue;
      }
      if (open == null && c != '<' && c != '{') {
        return false;
      }
      open = open == null ? new MdxMark() : open;
      MdxMark.State state = open.take(c);
      if (state == MdxMark.State.NOTHING) {
        return false;
      }
      open = state == MdxMark.State.CLOSED ? null : open;
    }
    return true;
  }

  @Override
  public Block getBlock() {
    return block;
  }

  @Override
  public BlockContinue tryContinue(ParserState state) {
    if (open == null || state.isBlank()) {
      return BlockContinue.none();
    }
    open.take('\n');
    if (!read(state.getLine().getContent(), state.getIndex())) {
      open = null;
    }
    return BlockContinue.atIndex(state.getIndex());
  }

  @Override
  public void addLine(SourceLine line) {
    lines.add(line);
  }

  @Override
  public void parseInlines(InlineParser inlines) {
    inlines.parse(SourceLines.of(lines), block);
  }
}
