package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.jsoup.nodes.Element;
import org.jsoup.nodes.Range;

/**
 * Makes blocks of what a marked-up file shows, taken in from left to right. White space collapses
 * as it does in a browser; what a browser shows as a space or a new line parts words here too, if
 * need be by the first character of its mark.
 */
final class MarkupFlow {
  private static final int NONE = -1;

  /** What browsers drop without a break in the text. */
  private static final String EMPTY_TAG = "</>";

  private final String file;
  private final Set<Element> parents;
  private final Set<String> entities;
  private final List<Block> blocks = new ArrayList<>();
  private final List<Block> notes = new ArrayList<>();
  private final List<Span> waiting = new ArrayList<>();
  private MarkupContext open;
  private Pieces pieces;
  private int first;

  /** Index of the last block that is no note; -1 if there is none. */
  private int main = -1;

  private int blank = NONE;
  private boolean realBlank;
  private boolean lineEnds;
  private boolean hasWords;
  private boolean hasCopied;
  private boolean isFixed;

  /** How a stretch of the file is read. */
  enum As {
    /** As text, in which there may be references. */
    TEXT,
    /** As the value of an attribute. */
    ATTRIBUTE,
    /** As text in which an ampersand is one. */
    LITERAL
  }

  /**
   * An empty flow.
   *
   * @param parents the elements that have others inside that no sentence crosses
   * @param entities those that an XML file declares; {@code null} in HTML
   */
  MarkupFlow(String file, Set<Element> parents, Set<String> entities) {
    this.file = file;
    this.parents = parents;
    this.entities = entities;
  }

  /** All blocks so far. */
  List<Block> finish() {
    close();
    return List.copyOf(blocks);
  }

  /** Takes in a stretch of text. */
  void text(Span text, MarkupContext context, As as) {
    int at = text.start();
    while (at < text.end()) {
      boolean refers = file.charAt(at) == '&' && as != As.LITERAL;
      int behind = refers ? reference(at, text.end(), context, as) : at;
      if (behind == at && as == As.TEXT && file.startsWith(EMPTY_TAG, at)) {
        behind = at + EMPTY_TAG.length();
      }
      at = behind > at ? behind : character(at, text.end(), context);
    }
  }

  /** Takes in a character; the offset behind it. */
  private int character(int at, int limit, MarkupContext context) {
    int code = file.codePointAt(at);
    int end = Math.min(at + Character.charCount(code), limit);
    if (Characters.isSpace(code)) {
      addBlank(at, true);
    } else if (!isNothing(at, file.charAt(at))) {
      add(at, end, context, code);
    }
    return end;
  }

  /** Takes in a reference; the offset behind it, or that of its ampersand if there is none. */
  private int reference(int at, int limit, MarkupContext context, As as) {
    CharacterReference reference;
    if (entities == null) {
      reference = CharacterReference.at(file, at, limit, as == As.ATTRIBUTE);
    } else {
      int name = CharacterReference.behindEntity(file, at, limit, entities);
      if (name > at) {
        // What it stands for is not known; the same name stands for it on both sides.
        text(new Span(at + 1, name - 1), context.marked(false, true, context.fixed()), As.LITERAL);
        return name;
      }
      reference = CharacterReference.inXml(file, at, limit);
    }
    if (reference == null) {
      return at;
    }
    add(reference, context);
    return reference.end();
  }

  /** A byte-order mark, or what browsers drop. */
  private static boolean isNothing(int at, char c) {
    return c == 0 || at == 0 && c == '\uFEFF';
  }

  private void add(CharacterReference reference, MarkupContext context) {
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

  private void add(int from, int to, MarkupContext context, int character) {
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

  private void start(int from, MarkupContext context) {
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

  /**
   * Takes in the blocks of a note; they come behind the block that the note stands in. What is
   * copied as it stands in a note is left out, as only notes may lie inside another block.
   */
  void addNotes(List<Block> inside, MarkupContext place) {
    boolean waits = open != null && open.block() == place.block();
    if (!waits) {
      close();
    }
    for (Block block : inside) {
      if (block.kind() != Block.Kind.VERBATIM) {
        Block note = new Block(Block.Kind.NOTE, 0, block.extent(), block.pieces());
        (waits ? notes : blocks).add(note);
      }
    }
  }

  /** Ends the block that is open. */
  void close() {
    int end = 0;
    if (open != null) {
      end = pieces.end();
      add(block(new Span(first, end)));
      for (Block note : notes) {
        blocks.add(note);
        end = Math.max(end, note.extent().end());
      }
      notes.clear();
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
    text(value, MarkupContext.of(null), As.ATTRIBUTE);
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
    before = Math.max(before, main < 0 ? 0 : blocks.get(main).extent().end());
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
    if (main >= 0 && blocks.get(main).extent().end() > block.extent().start()) {
      Block before = blocks.get(main);
      int end = before.pieces().get(before.pieces().size() - 1).end();
      Span extent = new Span(before.extent().start(), end);
      blocks.set(main, new Block(before.kind(), before.level(), extent, before.pieces()));
    }
    main = blocks.size();
    blocks.add(block);
  }
}
