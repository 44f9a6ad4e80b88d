package dev.tallystick.segment;

import dev.tallystick.prose.Block;
import dev.tallystick.prose.Inline;
import dev.tallystick.prose.Offsets;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** The prose of a block as one line, with the way back to the file. */
final class BlockProse {
  /**
   * Stands for what is copied: a letter that is neither a small nor a capital one, as the letters
   * of code say nothing about where sentences begin, and that no abbreviation has.
   */
  private static final char COPIED = 'ƻ';

  private final String raw;
  private final String string;
  private final Offsets offsets;
  private final List<Segment.Marked> inlines;

  BlockProse(Text text, Block block) {
    this.raw = block.prose(text.string());
    this.string = oneLine(raw);
    this.offsets = new Offsets(block.pieces());
    this.inlines = inlines(block);
  }

  private List<Segment.Marked> inlines(Block block) {
    if (block.inlines().isEmpty()) {
      return List.of();
    }
    List<Segment.Marked> marked = new ArrayList<>();
    for (Inline inline : block.inlines()) {
      marked.add(new Segment.Marked(inline, offsets.inProse(inline.span())));
    }
    return marked;
  }

  /** The prose; a line end is a blank for each of its characters, so offsets stay. */
  String string() {
    return string;
  }

  /** The prose with its line ends as they are. */
  String raw() {
    return raw;
  }

  /** What is marked, by its place in the prose, in order. */
  List<Segment.Marked> inlines() {
    return inlines;
  }

  /** The prose with a word in place of what is copied, of the same length. */
  String plain() {
    char[] plain = null;
    for (Segment.Marked marked : inlines) {
      Span copied = Blank.trim(string, marked.prose().start(), marked.prose().end());
      if (marked.inline().kind().isCopied() && !copied.isEmpty()) {
        plain = plain == null ? string.toCharArray() : plain;
        Arrays.fill(plain, copied.start(), copied.end(), COPIED);
      }
    }
    return plain == null ? string : new String(plain);
  }

  /** The stretch of the file from the first to the last character of this stretch of prose. */
  Span inFile(Span span) {
    return offsets.inFile(span);
  }

  private static String oneLine(String prose) {
    return prose
        .replace('\n', ' ')
        .replace('\r', ' ')
        .replace('\u0085', ' ')
        .replace('\u2028', ' ')
        .replace('\u2029', ' ');
  }
}
