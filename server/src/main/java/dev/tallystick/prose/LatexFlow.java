package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;

/**
 * Makes blocks of the prose of a LaTeX file, taken in from left to right. The notes inside a block
 * follow it as blocks of their own.
 */
final class LatexFlow {
  private static final int NONE = -1;

  private final String file;
  private final LatexPlaces places;
  private final List<Block> blocks = new ArrayList<>();
  private final List<Block> notes = new ArrayList<>();
  private final Deque<Part> around = new ArrayDeque<>();
  private Part part;

  /** A block in the making. */
  private static final class Part {
    private final Pieces pieces;
    private final List<Inline> inlines = new ArrayList<>();
    private Block.Kind kind;
    private int level;
    private int start = NONE;
    private int end = NONE;
    private int blank = NONE;
    private int blankEnd;
    private boolean standIn;
    private boolean hasProse;
    private boolean hasWords;
    private boolean hasCopied;

    /** An empty one; a kind of {@code null} is that of the place where its prose starts. */
    Part(String file, Block.Kind kind) {
      this.pieces = new Pieces(file);
      this.kind = kind;
    }

    void cover(int from, int to) {
      start = start == NONE ? from : start;
      end = Math.max(end, to);
    }
  }

  LatexFlow(String file, LatexPlaces places) {
    this.file = file;
    this.places = places;
    this.part = new Part(file, null);
  }

  List<Block> finish() {
    closeAll();
    return List.copyOf(blocks);
  }

  /** Whether the block has prose already. */
  boolean isOpen() {
    return part.hasProse;
  }

  boolean isInNote() {
    return !around.isEmpty();
  }

  /** Starts a block of some kind, by a mark at an offset; in a note it stays a note. */
  void begin(Block.Kind kind, int level, int from) {
    close();
    part.kind = isInNote() ? Block.Kind.NOTE : kind;
    part.level = isInNote() ? 0 : level;
    part.cover(from, from);
  }

  /** Marks that are no prose, but part of the block. */
  void mark(int from, int to) {
    part.cover(from, to);
  }

  /** Prose as it stands. */
  void text(int from, int to) {
    add(from, to);
    part.hasWords =
        part.hasWords || file.substring(from, to).codePoints().anyMatch(Character::isLetterOrDigit);
  }

  /** A command or sign that stands for something unknown, which alone is no prose. */
  void sign(int from, int to) {
    add(from, to);
  }

  /** Formulas and code: alone they are copied. */
  void copied(int from, int to) {
    add(from, to);
    if (from < to) {
      addCode(new Span(from, to));
    }
    part.hasCopied = true;
  }

  /** The parts of a formula come one by one. */
  private void addCode(Span span) {
    int last = part.inlines.size() - 1;
    Span before = last < 0 ? null : part.inlines.get(last).span();
    if (before != null && file.substring(before.end(), span.start()).isBlank()) {
      part.inlines.set(last, new Inline(Inline.Kind.CODE, before.cover(span)));
    } else {
      part.inlines.add(new Inline(Inline.Kind.CODE, span));
    }
  }

  private void add(int from, int to) {
    if (from >= to) {
      return;
    }
    if (part.blank != NONE) {
      part.pieces.add(part.blank, part.blankEnd);
      part.blank = NONE;
    }
    if (part.kind == null) {
      part.kind = places.kind();
      part.level = places.level(part.kind);
    }
    part.pieces.add(from, to);
    part.cover(from, to);
    part.hasProse = true;
  }

  /**
   * Parts words.
   *
   * @param real whether it is white space, and not a mark that stands for some
   */
  void blank(int from, int to, boolean real) {
    if (part.hasProse && (part.blank == NONE || real && part.standIn)) {
      part.blank = from;
      part.blankEnd = to;
      part.standIn = !real;
    }
  }

  /** Begins a note by marks; what comes is its text until it ends. */
  void openNote(int from, int to) {
    part.cover(from, to);
    around.push(part);
    part = new Part(file, Block.Kind.NOTE);
    part.cover(from, to);
  }

  /** Ends a note; the text around it goes on. */
  void closeNote(int end) {
    part.cover(end, end);
    close();
    part = around.pop();
    part.cover(end, end);
  }

  /** A whole environment that is copied as it stands. */
  void verbatim(LatexToken token) {
    if (isInNote()) {
      mark(token.start(), token.end());
      part.hasCopied = true;
    } else {
      close();
      blocks.add(
          new Block(Block.Kind.VERBATIM, 0, new Span(token.start(), token.end()), List.of()));
    }
  }

  /** Ends the block, or in a note the part of it that is open. */
  void close() {
    boolean note = isInNote();
    if (part.hasWords) {
      Block block =
          new Block(part.kind, part.level, new Span(part.start, part.end), part.pieces.spans());
      (note ? notes : blocks).add(block.with(part.inlines));
    } else if (part.hasCopied && !note) {
      blocks.add(new Block(Block.Kind.VERBATIM, 0, new Span(part.start, part.end), List.of()));
    }
    part = new Part(file, note ? Block.Kind.NOTE : null);
    if (!note) {
      notes.sort(Comparator.comparingInt(one -> one.extent().start()));
      blocks.addAll(notes);
      notes.clear();
    }
  }

  /** Ends the block and all notes in it. */
  void closeAll() {
    while (isInNote()) {
      closeNote(Math.max(part.end, 0));
    }
    close();
  }
}
