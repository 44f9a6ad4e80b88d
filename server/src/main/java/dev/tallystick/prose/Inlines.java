package dev.tallystick.prose;

import org.commonmark.node.Code;
import org.commonmark.node.HardLineBreak;
import org.commonmark.node.Node;
import org.commonmark.node.SoftLineBreak;
import org.commonmark.node.SourceSpan;
import org.commonmark.node.Text;

/**
 * Picks the prose out of the inline nodes of one block. It goes by their places in the source
 * alone; what they say of their content is decoded.
 */
final class Inlines {
  private final String file;
  private final Origin origin;
  private final int limit;
  private final Pieces pieces;

  private Inlines(String file, Origin origin, int limit) {
    this.file = file;
    this.origin = origin;
    this.limit = limit;
    this.pieces = new Pieces(file);
  }

  /**
   * The prose of a block.
   *
   * @param origin where the block's characters come from
   * @param limit offset in the file behind the block
   */
  static Pieces of(String file, Node block, Origin origin, int limit) {
    Inlines inlines = new Inlines(file, origin, limit);
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
      addCode(node);
    } else if (node instanceof SoftLineBreak || node instanceof HardLineBreak) {
      pieces.addLineBreak(origin.of(inputBefore(node)), limit);
    }
    return true;
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
