package dev.tallystick.prose;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.commonmark.node.Block;
import org.commonmark.node.CustomBlock;
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
 * A line of marks between blocks, of which at most a title is prose: the colons before and behind a
 * directive, shortcodes and attributes that have a line to themselves.
 */
final class MarkedLine extends AbstractBlockParser {
  private static final Pattern DIRECTIVE =
      Pattern.compile(":{3,}+[ \\t]*+(?:\\{[^{}]*+\\}|[\\w-]++)?+[ \\t]*+");
  private static final Pattern ATTRIBUTES = Pattern.compile("\\{[^{}]*+\\}$");
  private static final int CODE_INDENT = 4;

  private final Titled block = new Titled();
  private final int length;
  private SourceLine line;

  /** The line. */
  static final class Titled extends CustomBlock {}

  /** A line whose title has this length, from where the line is begun to be read. */
  MarkedLine(int length) {
    this.length = length;
  }

  static BlockParserFactory factory() {
    return new AbstractBlockParserFactory() {
      @Override
      public BlockStart tryStart(ParserState state, MatchedBlockParser matched) {
        String line = state.getLine().getContent().toString();
        int start = state.getNextNonSpaceIndex();
        if (state.getIndent() >= CODE_INDENT) {
          return BlockStart.none();
        }
        if (line.startsWith("{", start)) {
          return Shortcode.isAlone(line, start)
              ? BlockStart.of(new MarkedLine(0)).atIndex(line.length())
              : BlockStart.none();
        }
        Matcher directive = DIRECTIVE.matcher(line).region(start, line.length());
        return directive.lookingAt() ? title(line, directive.end()) : BlockStart.none();
      }
    };
  }

  /** Behind the name of a directive: its title, in brackets or not, perhaps with attributes. */
  private static BlockStart title(String line, int start) {
    String title = line.substring(start).stripTrailing();
    Matcher attributes = ATTRIBUTES.matcher(title);
    if (attributes.find()) {
      title = title.substring(0, attributes.start()).stripTrailing();
    }
    if (title.endsWith(":::")) {
      title = title.replaceFirst(":++$", "").stripTrailing();
    }
    boolean bracketed = title.startsWith("[") && title.endsWith("]");
    int length = bracketed ? title.length() - 2 : title.length();
    return BlockStart.of(new MarkedLine(length)).atIndex(bracketed ? start + 1 : start);
  }

  @Override
  public Block getBlock() {
    return block;
  }

  @Override
  public BlockContinue tryContinue(ParserState state) {
    return BlockContinue.none();
  }

  @Override
  public void addLine(SourceLine added) {
    line = added.substring(0, Math.min(length, added.getContent().length()));
  }

  @Override
  public void parseInlines(InlineParser inlines) {
    if (line != null && line.getContent().length() > 0) {
      inlines.parse(SourceLines.of(line), block);
    }
  }
}
