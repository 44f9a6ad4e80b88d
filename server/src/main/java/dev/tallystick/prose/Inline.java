package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * Something marked within running text.
 *
 * @param kind what it is
 * @param span all of it in the file, its marks included; may reach beyond the block it begins in
 */
public record Inline(Kind kind, Span span) implements Comparable<Inline> {
  /** What an inline is. */
  public enum Kind {
    /** Words that are stressed, usually in italics. */
    EMPHASIS,
    /** Words that matter, usually in bold. */
    STRONG,
    /** Words that lead somewhere. */
    LINK,
    /** A picture; its description is prose. */
    IMAGE,
    /** A character by its name or number. */
    REFERENCE,
    /** Code, keys, and what is marked as not to be translated. */
    CODE,
    /** An address that is shown, of a page or of a mailbox. */
    ADDRESS,
    /** What a program puts a value in place of. */
    PLACEHOLDER;

    /** Whether it is copied as it stands, so that a stop in it ends no sentence. */
    public boolean isCopied() {
      return compareTo(CODE) >= 0;
    }
  }

  /**
   * Hands each inline to the block that it begins in, or else to the first that it reaches into.
   *
   * @param blocks in the order of the file
   * @param inlines in any order, some perhaps twice; one that no block has a part in is dropped
   */
  static List<Block> spread(List<Block> blocks, List<Inline> inlines) {
    if (inlines.isEmpty()) {
      return List.copyOf(blocks);
    }
    List<Inline> sorted = new ArrayList<>(inlines);
    Collections.sort(sorted);
    List<Block> marked = new ArrayList<>(blocks.size());
    int next = 0;
    for (Block block : blocks) {
      List<Inline> inside = new ArrayList<>();
      while (next < sorted.size() && sorted.get(next).span().start() < block.extent().end()) {
        Inline inline = sorted.get(next++);
        boolean again = !inside.isEmpty() && inside.get(inside.size() - 1).equals(inline);
        if (inline.span().end() > block.extent().start() && !again) {
          inside.add(inline);
        }
      }
      marked.add(block.with(inside));
    }
    return List.copyOf(marked);
  }

  /** In the order of the file, of those that begin at one place the longest first. */
  @Override
  public int compareTo(Inline other) {
    int byStart = Integer.compare(span.start(), other.span.start());
    int byEnd = byStart != 0 ? byStart : Integer.compare(other.span.end(), span.end());
    return byEnd != 0 ? byEnd : kind.compareTo(other.kind);
  }
}
