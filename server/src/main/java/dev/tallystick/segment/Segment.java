package dev.tallystick.segment;

import dev.tallystick.prose.Block;
import dev.tallystick.prose.Times;
import dev.tallystick.text.Span;
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
 */
public record Segment(Span span, String prose, Block block, boolean opens) {
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

  /** When it is on the screen: that of all the cues that it stands in. Empty if nothing tells. */
  public Optional<Times> shown() {
    return block.shown(span);
  }
}
