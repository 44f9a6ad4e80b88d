package dev.tallystick.prose;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.commonmark.ext.gfm.tables.TableRow;
import org.commonmark.node.BlockQuote;
import org.commonmark.node.FencedCodeBlock;
import org.commonmark.node.Heading;
import org.commonmark.node.HtmlBlock;
import org.commonmark.node.IndentedCodeBlock;
import org.commonmark.node.ListItem;
import org.commonmark.node.Node;
import org.commonmark.node.Paragraph;
import org.commonmark.node.SourceSpan;
import org.commonmark.parser.Parser;

/**
 * CommonMark with tables, footnotes, task lists, front matter, and the admonitions and shortcodes
 * of those who write documentation; also MDX.
 */
final class Markdown {
  private final String file;
  private final int base;
  private final List<Block> blocks = new ArrayList<>();
  private final List<Inline> inlines = new ArrayList<>();

  private Markdown(String file, int base) {
    this.file = file;
    this.base = base;
  }

  static List<Block> blocks(Text text, FrontMatterKeys keys) {
    FrontMatter data = FrontMatter.of(text);
    Markdown markdown = new Markdown(text.string(), data.end());
    markdown.blocks.addAll(data.blocks(keys));
    markdown.read(MarkdownSyntax.MARKDOWN, markdown.file.substring(data.end()));
    return Inline.spread(markdown.blocks, markdown.inlines);
  }

  /** The same for MDX, where imports and exports are verbatim. */
  static List<Block> ofMdx(Text text, FrontMatterKeys keys) {
    FrontMatter data = FrontMatter.of(text);
    Markdown markdown = new Markdown(text.string(), data.end());
    markdown.blocks.addAll(data.blocks(keys));
    StringBuilder input = new StringBuilder(markdown.file);
    for (Span script : MdxScripts.of(text, data.end())) {
      markdown.blocks.add(new Block(Block.Kind.VERBATIM, 0, script, List.of()));
      for (int at = script.start(); at < script.end(); at++) {
        input.setCharAt(at, Characters.isLineEnd(input.charAt(at)) ? input.charAt(at) : ' ');
      }
    }
    markdown.read(MarkdownSyntax.MDX, input.substring(data.end()));
    markdown.blocks.sort(Comparator.comparing(Block::extent));
    return Inline.spread(markdown.blocks, markdown.inlines);
  }

  private void read(Parser parser, String input) {
    Node document = parser.parse(input);
    Node node = document.getFirstChild();
    while (node != null) {
      node = Nodes.next(node, enter(node), document);
    }
  }

  /** Reads a node; whether its children are to be read as well. */
  private boolean enter(Node node) {
    if (node instanceof Heading heading) {
      addProse(Block.Kind.HEADING, heading.getLevel(), extent(node), prose(node));
    } else if (node instanceof Paragraph) {
      addParagraph(node, prose(node));
    } else if (node instanceof TableRow) {
      addCells(node);
    } else if (node instanceof MarkedLine.Titled) {
      addProse(Block.Kind.PARAGRAPH, 0, extent(node), prose(node));
    } else if (node instanceof HtmlBlock html) {
      addHtml(html);
    } else if (node instanceof FencedCodeBlock || node instanceof IndentedCodeBlock) {
      addVerbatim(node);
    } else {
      return true;
    }
    return false;
  }

  private void addProse(Block.Kind kind, int level, Span extent, List<Span> pieces) {
    if (!pieces.isEmpty()) {
      blocks.add(new Block(kind, level, extent, pieces));
    }
  }

  private List<Span> prose(Node node) {
    return Inlines.of(file, node, this::offset, extent(node).end(), inlines).spans();
  }

  /** A paragraph; in a box for tasks, or below the mark of an alert, that is no prose. */
  private void addParagraph(Node node, List<Span> pieces) {
    ParagraphMarks.Mark mark =
        node.getPrevious() != null
            ? ParagraphMarks.Mark.NONE
            : node.getParent() instanceof ListItem
                ? ParagraphMarks.Mark.TASK
                : node.getParent() instanceof BlockQuote
                    ? ParagraphMarks.Mark.ALERT
                    : ParagraphMarks.Mark.NONE;
    for (ParagraphMarks.Part part : ParagraphMarks.parts(file, lines(node), pieces, mark)) {
      Span extent = new Span(firstMark(part.extent().start()), part.extent().end());
      addProse(kind(node), level(node), extent, part.pieces());
    }
  }

  private void addCells(Node row) {
    Span extent = extent(row);
    int start = offset(row.getSourceSpans().get(0).getInputIndex());
    Node cell = row.getFirstChild();
    for (Origin.CellOrigin origin : Origin.ofRow(file, start, extent.end())) {
      if (cell != null && !cell.getSourceSpans().isEmpty()) {
        Origin places = origin.countedFrom(cell.getSourceSpans().get(0));
        List<Span> pieces = Inlines.of(file, cell, places, origin.end(), inlines).spans();
        addProse(Block.Kind.CELL, 0, trim(origin.start(), origin.end()), pieces);
      }
      cell = cell == null ? null : cell.getNext();
    }
  }

  private void addHtml(HtmlBlock html) {
    if (!isComment(html.getLiteral())) {
      addVerbatim(html);
    }
  }

  private static boolean isComment(String html) {
    String rest = html.strip();
    int at = 0;
    while (rest.startsWith("<!--", at)) {
      int close = rest.indexOf("-->", at + 2);
      if (close < 0) {
        return true;
      }
      at = close + 3;
      while (at < rest.length() && Characters.isSpace(rest.charAt(at))) {
        at++;
      }
    }
    return at == rest.length();
  }

  private void addVerbatim(Node node) {
    blocks.add(new Block(Block.Kind.VERBATIM, 0, extent(node), List.of()));
  }

  private static Block.Kind kind(Node paragraph) {
    Node parent = paragraph.getParent();
    if (parent instanceof FootnoteParser.Footnote) {
      return Block.Kind.NOTE;
    }
    return parent instanceof ListItem
        ? Block.Kind.ITEM
        : parent instanceof BlockQuote ? Block.Kind.QUOTATION : Block.Kind.PARAGRAPH;
  }

  /** How many containers of the same kind as its own a paragraph is in. */
  private static int level(Node paragraph) {
    int level = 0;
    for (Node at = paragraph.getParent(); at != null; at = at.getParent()) {
      boolean same = at.getClass() == paragraph.getParent().getClass();
      level += same && (at instanceof ListItem || at instanceof BlockQuote) ? 1 : 0;
    }
    return level;
  }

  /** The lines of a node, container marks left out. */
  private List<Span> lines(Node node) {
    List<Span> lines = new ArrayList<>();
    for (SourceSpan span : node.getSourceSpans()) {
      lines.add(trim(offset(span.getInputIndex()), offset(Nodes.end(span))));
    }
    return lines;
  }

  /** From the first mark on its first line, be it its container's, to the end of its last line. */
  private Span extent(Node node) {
    int start = offset(node.getSourceSpans().get(0).getInputIndex());
    return new Span(firstMark(start), offset(Nodes.end(node)));
  }

  private int firstMark(int start) {
    int at = start;
    while (at > base && !Characters.isLineEnd(file.charAt(at - 1))) {
      at--;
    }
    while (at < start && Characters.isBlank(file.charAt(at))) {
      at++;
    }
    return at;
  }

  private Span trim(int start, int end) {
    int from = start;
    int to = end;
    while (from < to && Characters.isBlank(file.charAt(from))) {
      from++;
    }
    while (to > from && Characters.isBlank(file.charAt(to - 1))) {
      to--;
    }
    return new Span(from, to);
  }

  private int offset(int input) {
    return base + input;
  }
}
