package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.commonmark.node.Code;
import org.commonmark.node.Emphasis;
import org.commonmark.node.HardLineBreak;
import org.commonmark.node.HtmlInline;
import org.commonmark.node.Image;
import org.commonmark.node.Link;
import org.commonmark.node.Node;
import org.commonmark.node.SoftLineBreak;
import org.commonmark.node.SourceSpan;
import org.commonmark.node.StrongEmphasis;
import org.commonmark.node.Text;

/**
 * Picks the prose out of the inline nodes of one block, and keeps what they mark. It goes by their
 * places in the source alone; what they say of their content is decoded.
 */
final class Inlines {
  private final String file;
  private final Origin origin;
  private final int limit;
  private final Pieces pieces;
  private final List<Inline> marked;

  /** Tags of HTML that are open: where each starts in the file, by its name. */
  private final Map<String, Integer> openTags = new HashMap<>();

  private Inlines(String file, Origin origin, int limit, List<Inline> marked) {
    this.file = file;
    this.origin = origin;
    this.limit = limit;
    this.pieces = new Pieces(file);
    this.marked = marked;
  }

  /**
   * The prose of a block.
   *
   * @param origin where the block's characters come from
   * @param limit offset in the file behind the block
   * @param marked takes what is marked in it
   */
  static Pieces of(String file, Node block, Origin origin, int limit, List<Inline> marked) {
    Inlines inlines = new Inlines(file, origin, limit, marked);
    Node node = block.getFirstChild();
    while (node != null) {
      node = Nodes.next(node, inlines.enter(node), block);
    }
    return inlines.pieces;
  }

  /** Reads a node; whether its children are to be read as well. */
  private boolean enter(Node node) {
    if (node instanceof Text text) {
      addText(text);
    } else if (node instanceof Code) {
      mark(Inline.Kind.CODE, node);
      addCode(node);
    } else if (node instanceof SoftLineBreak || node instanceof HardLineBreak) {
      pieces.addLineBreak(origin.of(inputBefore(node)), limit);
    } else if (node instanceof HtmlInline || node instanceof Passed) {
      addMark(node);
    } else if (node instanceof Link) {
      mark(Inline.Kind.LINK, node);
    } else if (node instanceof Emphasis) {
      mark(Inline.Kind.EMPHASIS, node);
    } else if (node instanceof StrongEmphasis) {
      mark(Inline.Kind.STRONG, node);
    } else if (node instanceof Image) {
      mark(Inline.Kind.IMAGE, node);
    }
    return true;
  }

  private void mark(Inline.Kind kind, Node node) {
    if (!node.getSourceSpans().isEmpty()) {
      marked.add(new Inline(kind, new Span(start(node), end(node))));
    }
  }

  /** Offset in the file of the first character of a node. */
  private int start(Node node) {
    return origin.of(node.getSourceSpans().get(0).getInputIndex());
  }

  /** Offset in the file behind its last character. */
  private int end(Node node) {
    return origin.of(Nodes.end(node) - 1) + 1;
  }

  /** Takes in a tag, or what a generator of sites puts something in place of. */
  private void addMark(Node node) {
    if (node.getSourceSpans().isEmpty()) {
      return;
    }
    String literal = file.substring(start(node), end(node));
    if (literal.startsWith("<")) {
      addTag(node, literal);
    } else if (literal.length() > 1 && "#.:/".indexOf(literal.charAt(1)) < 0) {
      mark(Inline.Kind.PLACEHOLDER, node);
    }
  }

  /** Pairs up the tags of HTML: an element begins and ends with a node of its own each. */
  private void addTag(Node html, String literal) {
    boolean closes = literal.startsWith("</");
    int from = closes ? 2 : 1;
    int to = from;
    while (to < literal.length() && Character.isLetterOrDigit(literal.charAt(to))) {
      to++;
    }
    String tag = literal.substring(from, to).toLowerCase(Locale.ROOT);
    Inline.Kind kind = HtmlTags.inline(tag);
    if (kind == null) {
      return;
    }
    if (!closes) {
      openTags.putIfAbsent(tag, start(html));
    } else if (openTags.containsKey(tag)) {
      marked.add(new Inline(kind, new Span(openTags.remove(tag), end(html))));
    }
  }

  /** Adds text; what reads as it is written and has no marks goes in whole, as nearly all does. */
  private void addText(Text text) {
    String literal = text.getLiteral();
    for (SourceSpan span : text.getSourceSpans()) {
      if (span.getLength() == literal.length()
          && literal.indexOf('\\') < 0
          && literal.indexOf('[') < 0
          && literal.indexOf('|') < 0) {
        int start = span.getInputIndex();
        pieces.add(origin.of(start), origin.of(Nodes.end(span) - 1) + 1);
      } else {
        addMarked(span);
      }
    }
  }

  /** Adds text without the backslashes that escape and without references to footnotes. */
  private void addMarked(SourceSpan span) {
    int end = Nodes.end(span);
    int at = span.getInputIndex();
    while (at < end) {
      char c = charAt(at);
      boolean more = at + 1 < end;
      if (c == '\\' && more && Characters.isEscapable(charAt(at + 1))) {
        add(at + 1);
        at += 2;
      } else if (c == '[' && more && charAt(at + 1) == '^' && referenceEnd(at + 2, end) > 0) {
        at = referenceEnd(at + 2, end);
      } else {
        add(at++);
      }
    }
  }

  /** Offset behind the bracket that closes a footnote's label; 0 if none does. */
  private int referenceEnd(int label, int end) {
    int at = label;
    while (at < end && charAt(at) != '[' && charAt(at) != ']' && !Characters.isSpace(charAt(at))) {
      at++;
    }
    return at > label && at < end && charAt(at) == ']' ? at + 1 : 0;
  }

  /** Adds what is between the backticks; a line break inside is prose like any other. */
  private void addCode(Node code) {
    int ticks = 0;
    int first = code.getSourceSpans().get(0).getInputIndex();
    int behind = Nodes.end(code);
    while (charAt(first + ticks) == '`') {
      ticks++;
    }
    for (SourceSpan span : code.getSourceSpans()) {
      if (span.getInputIndex() != first) {
        pieces.addLineBreak(pieces.end(), limit);
      }
      int end = Math.min(Nodes.end(span), behind - ticks);
      for (int at = Math.max(span.getInputIndex(), first + ticks); at < end; at++) {
        add(at);
      }
    }
  }

  private void add(int input) {
    pieces.add(origin.of(input), origin.of(input) + 1);
  }

  private char charAt(int input) {
    return file.charAt(origin.of(input));
  }

  /** An input offset on the line that a line break ends, behind what comes before the break. */
  private static int inputBefore(Node lineBreak) {
    Node before = lineBreak.getPrevious();
    if (before != null && !before.getSourceSpans().isEmpty()) {
      return Nodes.end(before);
    }
    return lineBreak.getParent().getSourceSpans().get(0).getInputIndex();
  }
}
