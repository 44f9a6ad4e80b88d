package dev.tallystick.segment;

import dev.tallystick.prose.Block;
import dev.tallystick.prose.Inline;
import dev.tallystick.prose.Times;
import dev.tallystick.text.Span;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * One sentence, or one verbatim block.
 *
 * @param span where it stands in the file, without the white space around it; marks inside (a star,
 *     a link's address) lie in the span but not in the prose
 * @param prose what is to be translated, each line break a blank; empty for a verbatim block
 * @param block the block it stands in
 * @param opens whether it is the first of its block
 * @param inlines what is marked in it, in order; what runs over several sentences is in the first
 * @param length how long it reads, in characters; see {@link Reach}
 */
public record Segment(
    Span span, String prose, Block block, boolean opens, List<Marked> inlines, int length) {
  /** Keeps the list unchangeable. */
  public Segment {
    inlines = List.copyOf(inlines);
  }

  /**
   * An inline of a sentence.
   *
   * @param inline what it is, and where in the file
   * @param prose the stretch of the sentence's prose that lies in it; empty if none does
   */
  public record Marked(Inline inline, Span prose) {
    /** The same as the sentence has it that stands there in the prose of its block. */
    Marked in(Span sentence) {
      int start = Math.min(Math.max(prose.start(), sentence.start()), sentence.end());
      int end = Math.max(start, Math.min(prose.end(), sentence.end()));
      return new Marked(inline, new Span(start - sentence.start(), end - sentence.start()));
    }
  }

  /** Offset behind a segment; behind a note, the end of the text that it stands in if later. */
  public static int end(List<Segment> all, int index) {
    int end = all.get(index).span().end();
    for (int i = index; i > 0 && all.get(i).block().kind() == Block.Kind.NOTE; i--) {
      end = Math.max(end, all.get(i - 1).span().end());
    }
    return end;
  }

  /** Whether it is a verbatim block and no sentence. */
  public boolean verbatim() {
    return block.kind() == Block.Kind.VERBATIM;
  }

  /**
   * How much it says, in letters of an alphabet: its length, where a character of a dense script
   * counts for several.
   */
  public int weight() {
    return length + Density.surplus(prose);
  }

  /** Its prose with a blank in place of each character of what is copied. */
  public String withoutCopied() {
    char[] left = null;
    for (Marked marked : inlines) {
      if (marked.inline().kind().isCopied()) {
        left = left == null ? prose.toCharArray() : left;
        Arrays.fill(left, marked.prose().start(), marked.prose().end(), ' ');
      }
    }
    return left == null ? prose : new String(left);
  }

  /** How it ends. A mark in what is copied closes nothing. */
  public Closing closing() {
    int last = Closing.last(prose);
    for (Marked marked : inlines) {
      if (marked.inline().kind().isCopied() && marked.prose().contains(last)) {
        return Closing.OPEN;
      }
    }
    return Closing.of(prose);
  }

  /** When it is on the screen: that of all the cues that it stands in. Empty if nothing tells. */
  public Optional<Times> shown() {
    return block.shown(span);
  }
}
