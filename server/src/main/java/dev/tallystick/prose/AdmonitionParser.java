package dev.tallystick.prose;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.commonmark.node.CustomBlock;
import org.commonmark.parser.block.AbstractBlockParserFactory;
import org.commonmark.parser.block.BlockParserFactory;
import org.commonmark.parser.block.BlockStart;
import org.commonmark.parser.block.MatchedBlockParser;
import org.commonmark.parser.block.ParserState;

/**
 * An admonition with a title between quotation marks and an indented body, as Python-Markdown has
 * them; also one that folds, and a tab.
 */
final class AdmonitionParser extends IndentedParser {
  private static final Pattern NOTE =
      Pattern.compile(
          "(?:!!!|\\?\\?\\?\\+?)[ \\t]++[\\w-][\\w \\t-]*+(?:\"(.*)\"[ \\t]*+)?"
              + "|===[!+]?[ \\t]++\"(.*)\"[ \\t]*+");

  private AdmonitionParser() {
    super(new Admonition());
  }

  /** The title and the body. */
  static final class Admonition extends CustomBlock {}

  static BlockParserFactory factory() {
    return new AbstractBlockParserFactory() {
      @Override
      public BlockStart tryStart(ParserState state, MatchedBlockParser matched) {
        CharSequence line = state.getLine().getContent();
        Matcher note = NOTE.matcher(line).region(state.getNextNonSpaceIndex(), line.length());
        if (state.getIndent() >= INDENT || !note.matches()) {
          return BlockStart.none();
        }
        int group = note.start(1) >= 0 ? 1 : 2;
        int from = Math.max(note.start(group), 0);
        return note.start(group) < 0
            ? BlockStart.of(new AdmonitionParser()).atIndex(line.length())
            : BlockStart.of(new AdmonitionParser(), new MarkedLine(note.end(group) - from))
                .atIndex(from);
      }
    };
  }
}
