package dev.tallystick.segment;

import dev.tallystick.prose.Block;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.Arrays;
import java.util.List;

/** The prose of a block as one line, with the way back to the file. */
final class BlockProse {
  private final String raw;
  private final String string;
  private final List<Span> pieces;
  private final int[] before;

  BlockProse(Text text, Block block) {
    this.raw = block.prose(text.string());
    this.string = oneLine(raw);
    this.pieces = block.pieces();
    this.before = new int[pieces.size()];
    int length = 0;
    for (int i = 0; i < before.length; i++) {
      before[i] = length;
      length += pieces.get(i).length();
    }
  }

  /** The prose; a line end is a blank for each of its characters, so offsets stay. */
  String string() {
    return string;
  }

  /** The prose with its line ends as they are. */
  String raw() {
    return raw;
  }

  /** The stretch of the file from the first to the last character of this stretch of prose. */
  Span inFile(Span span) {
    return new Span(offset(span.start()), offset(span.end() - 1) + 1);
  }

  private int offset(int inProse) {
    int found = Arrays.binarySearch(before, inProse);
    int piece = found >= 0 ? found : -found - 2;
    return pieces.get(piece).start() + inProse - before[piece];
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
