package dev.tallystick.prose;

import java.util.List;
import java.util.Set;
import org.commonmark.ext.gfm.tables.TablesExtension;
import org.commonmark.node.BlockQuote;
import org.commonmark.node.FencedCodeBlock;
import org.commonmark.node.Heading;
import org.commonmark.node.ListBlock;
import org.commonmark.node.ThematicBreak;
import org.commonmark.parser.IncludeSourceSpans;
import org.commonmark.parser.Parser;

/** The parsers for CommonMark with what writers of documentation add to it, and for MDX. */
final class MarkdownSyntax {
  /** Deeper nesting than any writer uses is read as text, lest it costs time or stack. */
  private static final int DEEPEST = 100;

  static final Parser MARKDOWN =
      builder()
          .customBlockParserFactory(MarkedLine.factory())
          .customInlineContentParserFactory(Shortcode.factory())
          .build();

  /** In MDX a tag is no HTML, and an indent makes no code. */
  static final Parser MDX =
      builder()
          .enabledBlockTypes(
              Set.of(
                  Heading.class,
                  ThematicBreak.class,
                  FencedCodeBlock.class,
                  BlockQuote.class,
                  ListBlock.class))
          .customBlockParserFactory(MdxLines.factory())
          .customBlockParserFactory(MarkedLine.factory())
          .customInlineContentParserFactory(MdxInline.factory())
          .build();

  private MarkdownSyntax() {}

  private static Parser.Builder builder() {
    return Parser.builder()
        .extensions(List.of(TablesExtension.create()))
        .includeSourceSpans(IncludeSourceSpans.BLOCKS_AND_INLINES)
        .maxOpenBlockParsers(DEEPEST)
        .maxInlineNesting(DEEPEST)
        .customBlockParserFactory(FootnoteParser.factory())
        .customBlockParserFactory(AdmonitionParser.factory());
  }
}
