package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * A unit of layout that no sentence crosses.
 *
 * @param kind what it is
 * @param level depth: 1 to 6 for a heading, the nesting from 1 for a list item or a quotation, 0
 *     otherwise
 * @param extent the whole block in the file, its marks included
 * @param pieces its prose in order: stretches of the file that do not touch, none empty; none at
 *     all if the block is verbatim
 * @param inlines what is marked in its prose, in the order of the file; none if it is verbatim
 */
public record Block(Kind kind, int level, Span extent, List<Span> pieces, List<Inline> inlines) {
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
    /** Code and the like, copied as it stands: a landmark without prose. */
    VERBATIM
  }

  /** Keeps the lists unchangeable. */
  public Block {
    pieces = List.copyOf(pieces);
    inlines = List.copyOf(inlines);
  }

  /** A block in which nothing is marked. */
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
    return new Block(kind, level, extent, pieces, all);
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
