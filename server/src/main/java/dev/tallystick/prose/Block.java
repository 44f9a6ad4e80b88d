package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;

/**
 * A unit of layout that no sentence crosses. No two have prose in common.
 *
 * @param kind what it is
 * @param level depth: 1 to 6 for a heading, the nesting from 1 for a list item or a quotation, 0
 *     otherwise
 * @param extent the whole block in the file, its marks included; only cells of a table side by side
 *     overlap
 * @param pieces its prose in order: stretches of the file that do not touch, none empty; none at
 *     all if the block is verbatim
 * @param timed where the format says when text is on the screen: stretches that hold all of the
 *     prose of which it is known, in order; else none
 * @param inlines what is marked in its prose, in the order of the file; none if it is verbatim
 */
public record Block(
    Kind kind, int level, Span extent, List<Span> pieces, List<Timed> timed, List<Inline> inlines) {
  /** What a block is. */
  public enum Kind {
    /** Running text. */
    PARAGRAPH,
    /** A title of a section. */
    HEADING,
    /** A paragraph in a list. */
    ITEM,
    /** A cell of a table. */
    CELL,
    /** A paragraph in a quotation. */
    QUOTATION,
    /** A footnote or the like: it may stand inside the block before it, between its pieces. */
    NOTE,
    /** A value of the front matter. */
    METADATA,
    /** Code and the like, copied as it stands: a landmark without prose. */
    VERBATIM
  }

  /** Keeps the lists unchangeable. */
  public Block {
    pieces = List.copyOf(pieces);
    timed = List.copyOf(timed);
    inlines = List.copyOf(inlines);
  }

  /** A block in which nothing is marked. */
  public Block(Kind kind, int level, Span extent, List<Span> pieces, List<Timed> timed) {
    this(kind, level, extent, pieces, timed, List.of());
  }

  /** The same of a format that knows no times. */
  public Block(Kind kind, int level, Span extent, List<Span> pieces) {
    this(kind, level, extent, pieces, List.of());
  }

  /** The same with more inlines, in any order. A verbatim block has none. */
  Block with(List<Inline> more) {
    if (more.isEmpty() || kind == Kind.VERBATIM) {
      return this;
    }
    List<Inline> all = new ArrayList<>(inlines);
    all.addAll(more);
    Collections.sort(all);
    return new Block(kind, level, extent, pieces, timed, all);
  }

  /**
   * When a stretch of the block is on the screen: from the first cue that it stands in to the last.
   * Empty where the file does not say.
   */
  public Optional<Times> shown(Span stretch) {
    Times shown = null;
    for (int i = firstBehind(stretch.start()); i < timed.size(); i++) {
      Timed next = timed.get(i);
      if (next.span().start() >= stretch.end()) {
        break;
      }
      shown = shown == null ? next.times() : shown.cover(next.times());
    }
    return Optional.ofNullable(shown);
  }

  /** Index of the first timed stretch that ends behind an offset; how many there are if none. */
  private int firstBehind(int offset) {
    int low = 0;
    int high = timed.size();
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (timed.get(middle).span().end() <= offset) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low;
  }

  /** The prose as one string: the pieces of {@code file} put together. */
  public String prose(CharSequence file) {
    if (pieces.size() == 1) {
      return pieces.get(0).of(file);
    }
    StringBuilder prose = new StringBuilder();
    for (Span piece : pieces) {
      prose.append(file, piece.start(), piece.end());
    }
    return prose.toString();
  }
}
