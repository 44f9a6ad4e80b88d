package dev.tallystick.prose;

import java.util.Set;
import org.commonmark.parser.beta.InlineContentParser;
import org.commonmark.parser.beta.InlineContentParserFactory;
import org.commonmark.parser.beta.InlineParserState;
import org.commonmark.parser.beta.ParsedInline;
import org.commonmark.parser.beta.Scanner;

/** Passes over tags and expressions in a block of MDX; what stands between two tags is prose. */
final class MdxInline implements InlineContentParser {
  /** So many marks without an end may be looked for in a block, so that time stays linear. */
  private static final int MOST_MISSES = 16;

  private int misses;

  static InlineContentParserFactory factory() {
    return new InlineContentParserFactory() {
      @Override
      public Set<Character> getTriggerCharacters() {
        return Set.of('<', '{');
      }

      @Override
      public InlineContentParser create() {
        return new MdxInline();
      }
    };
  }

  @Override
  public ParsedInline tryParse(InlineParserState state) {
    Scanner scanner = state.scanner();
    MdxMark mark = new MdxMark();
    MdxMark.State read = MdxMark.State.OPEN;
    while (misses < MOST_MISSES && read == MdxMark.State.OPEN && scanner.hasNext()) {
      read = mark.take(scanner.peek());
      scanner.next();
    }
    misses += read == MdxMark.State.OPEN ? 1 : 0;
    return read == MdxMark.State.CLOSED
        ? ParsedInline.of(new Passed(), scanner.position())
        : ParsedInline.none();
  }
}
