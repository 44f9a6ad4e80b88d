package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Something marked within running text.
 *
 * @param kind what it is
 * @param span all of it in the file, its marks included; may reach beyond the block it begins in
 */
public record Inline(Kind kind, Span span) {
  /** In the order of the file, of those that begin at one place the longest first. */
  static final Comparator<Inline> ORDER =
      Comparator.<Inline>comparingInt(inline -> inline.span().start())
          .thenComparing(inline -> -inline.span().end())
          .thenComparing(Inline::kind);

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
   * @param inlines in any order; one that no block has a part in is dropped
   */
  static List<Block> spread(List<Block> blocks, List<Inline> inlines) {
    if (inlines.isEmpty()) {
      return List.copyOf(blocks);
    }
    List<Inline> sorted = inlines.stream().distinct().sorted(ORDER).toList();
    List<Block> marked = new ArrayList<>(blocks.size());
    int next = 0;
    for (Block block : blocks) {
      List<Inline> inside = new ArrayList<>();
      while (next < sorted.size() && sorted.get(next).span().start() < block.extent().end()) {
        Inline inline = sorted.get(next++);
        if (inline.span().end() > block.extent().start()) {
          inside.add(inline);
        }
      }
      marked.add(block.with(inside));
    }
    return List.copyOf(marked);
  }
}
