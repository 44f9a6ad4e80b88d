package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.jsoup.nodes.Element;
import org.jsoup.nodes.Range;

/**
 * Makes blocks of what a page shows, taken in from left to right. White space collapses as it does
 * in a browser; what a browser shows as a space or a new line parts words here too, if need be by
 * the first character of its mark.
 */
final class HtmlFlow {
  private static final int NONE = -1;

  /** What browsers drop without a break in the text. */
  private static final String EMPTY_TAG = "</>";

  private final String file;
  private final Set<Element> parents;
  private final List<Block> blocks = new ArrayList<>();
  private final List<Span> waiting = new ArrayList<>();
  private HtmlContext open;
  private Pieces pieces;
  private int first;
  private int blank = NONE;
  private boolean realBlank;
  private boolean lineEnds;
  private boolean hasWords;
  private boolean hasCopied;
  private boolean isFixed;

  /**
   * An empty flow.
   *
   * @param parents the elements that have others inside that no sentence crosses
   */
  HtmlFlow(String file, Set<Element> parents) {
    this.file = file;
    this.parents = parents;
  }

  /** All blocks so far. */
  List<Block> finish() {
    close();
    return List.copyOf(blocks);
  }

  /** Takes in a stretch of text, or the value of an attribute that reads as text. */
  void text(Span text, HtmlContext context, boolean attribute) {
    int at = text.start();
    while (at < text.end()) {
      char c = file.charAt(at);
      HtmlReference reference = c == '&' ? HtmlReference.at(file, at, text.end(), attribute) : null;
      if (reference != null) {
        add(reference, context);
        at = reference.end();
      } else if (!attribute && file.startsWith(EMPTY_TAG, at)) {
        at += EMPTY_TAG.length();
      } else {
        int code = file.codePointAt(at);
        int end = Math.min(at + Character.charCount(code), text.end());
        if (Characters.isSpace(code)) {
          addBlank(at, true);
        } else if (!isNothing(at, c)) {
          add(at, end, context, code);
        }
        at = end;
      }
    }
  }

  /** A byte-order mark, or what browsers drop. */
  private static boolean isNothing(int at, char c) {
    return c == 0 || at == 0 && c == '\uFEFF';
  }

  private void add(HtmlReference reference, HtmlContext context) {
    if (reference.isBlank()) {
      addBlank(reference.start(), false);
    } else if (!reference.isInsideWords() && (!reference.isQuotationMark() || followsWord())) {
      int at = reference.standIn(file);
      add(at, at + 1, context, reference.character());
    }
  }

  private boolean followsWord() {
    return open != null
        && blank == NONE
        && Character.isLetterOrDigit(file.codePointBefore(pieces.end()));
  }

  private void add(int from, int to, HtmlContext context, int character) {
    if (open != null && open.block() != context.block()) {
      close();
    }
    if (open == null) {
      start(from, context);
    } else if (blank != NONE) {
      pieces.add(blank, blank + 1);
    }
    pieces.add(from, to);
    blank = NONE;
    lineEnds = false;
    if (Character.isLetterOrDigit(character)) {
      hasCopied |= context.code() || context.fixed();
      hasWords |= !context.code() && !context.fixed();
      isFixed &= context.fixed();
    }
  }

  private void start(int from, HtmlContext context) {
    open = context;
    pieces = new Pieces(file);
    first = from;
    blank = NONE;
    hasWords = false;
    hasCopied = false;
    isFixed = true;
  }

  /**
   * Parts words.
   *
   * @param at offset of the white space, or of a mark that stands for some
   * @param real whether it is white space, which is the better sign for it
   */
  void addBlank(int at, boolean real) {
    if (open != null && (blank == NONE || real && !realBlank)) {
      blank = at;
      realBlank = real;
    }
  }

  /** Ends a line; two in a row part paragraphs. */
  void addLineEnd(int at) {
    if (open != null && lineEnds) {
      close();
    } else {
      addBlank(at, false);
      lineEnds = true;
    }
  }

  /**
   * Takes in the value of an attribute as a block of its own, unless words of a sentence stand
   * around it: blocks do not overlap.
   */
  void attribute(Span value) {
    waiting.add(value);
    if (open == null) {
      close();
    }
  }

  /** Ends the block that is open. */
  void close() {
    int end = 0;
    if (open != null) {
      end = pieces.end();
      add(block(new Span(first, end)));
      open = null;
      lineEnds = false;
    }
    List<Span> values = List.copyOf(waiting);
    waiting.clear();
    for (Span value : values) {
      if (value.start() >= end) {
        addValue(value);
      }
    }
  }

  private void addValue(Span value) {
    text(value, HtmlContext.of(null), true);
    if (open != null) {
      close();
    }
  }

  private Block block(Span extent) {
    boolean copied =
        open.kind() == Block.Kind.VERBATIM
            || hasCopied && !hasWords && (isFixed || open.kind() != Block.Kind.HEADING);
    return copied
        ? new Block(Block.Kind.VERBATIM, 0, extent, List.of())
        : new Block(open.kind(), open.level(), withTags(extent), pieces.spans());
  }

  /** With the tags of the element, if it has no other blocks inside. */
  private Span withTags(Span prose) {
    Element element = open.block();
    if (element == null || parents.contains(element)) {
      return prose;
    }
    int before = blocks.isEmpty() ? 0 : blocks.get(blocks.size() - 1).extent().end();
    Range tag = element.sourceRange();
    Range endTag = element.endSourceRange();
    boolean opens = tag.endPos() > tag.startPos() && tag.startPos() >= before;
    boolean closes = endTag.endPos() > endTag.startPos();
    return new Span(
        opens ? Math.min(tag.startPos(), prose.start()) : prose.start(),
        closes ? Math.max(endTag.endPos(), prose.end()) : prose.end());
  }

  /** Adds a block; if the one before it would reach into it, that one ends with its prose. */
  private void add(Block block) {
    int last = blocks.size() - 1;
    if (last >= 0 && blocks.get(last).extent().end() > block.extent().start()) {
      Block before = blocks.get(last);
      int end = before.pieces().get(before.pieces().size() - 1).end();
      Span extent = new Span(before.extent().start(), end);
      blocks.set(last, new Block(before.kind(), before.level(), extent, before.pieces()));
    }
    blocks.add(block);
  }
}
