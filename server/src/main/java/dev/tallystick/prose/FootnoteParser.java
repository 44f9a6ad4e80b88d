package dev.tallystick.prose;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.commonmark.node.CustomBlock;
import org.commonmark.parser.block.AbstractBlockParserFactory;
import org.commonmark.parser.block.BlockParserFactory;
import org.commonmark.parser.block.BlockStart;
import org.commonmark.parser.block.MatchedBlockParser;
import org.commonmark.parser.block.ParserState;

/** The text of a footnote as GitHub has them: behind its label, further paragraphs indented. */
final class FootnoteParser extends IndentedParser {
  private static final Pattern LABEL = Pattern.compile("\\[\\^[^\\[\\]\\s]++]:[ \\t]*+");

  private FootnoteParser() {
    super(new Footnote());
  }

  /** What stands below the label. */
  static final class Footnote extends CustomBlock {}

  static BlockParserFactory factory() {
    return new AbstractBlockParserFactory() {
      @Override
      public BlockStart tryStart(ParserState state, MatchedBlockParser matched) {
        CharSequence line = state.getLine().getContent();
        Matcher label = LABEL.matcher(line).region(state.getNextNonSpaceIndex(), line.length());
        return state.getIndent() < INDENT && label.lookingAt()
            ? BlockStart.of(new FootnoteParser()).atIndex(label.end())
            : BlockStart.none();
      }
    };
  }
}
