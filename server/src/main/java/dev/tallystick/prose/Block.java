package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.List;

/**
 * A unit of layout that no sentence crosses. A footnote may lie inside of another block, behind
 * which it comes; all others lie behind each other. No two have prose in common.
 *
 * @param kind what it is
 * @param level depth: 1 to 6 for a heading, the nesting from 1 for a list item or a quotation, 0
 *     otherwise
 * @param extent the whole block in the file, its marks included
 * @param pieces its prose in order: stretches of the file that do not touch, none empty; none at
 *     all if the block is verbatim
 */
public record Block(Kind kind, int level, Span extent, List<Span> pieces) {
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

  /** Keeps the pieces unchangeable. */
  public Block {
    pieces = List.copyOf(pieces);
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
