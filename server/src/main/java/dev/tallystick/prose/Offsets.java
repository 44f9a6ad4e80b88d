package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.Arrays;
import java.util.List;

/** The way between the prose of a block, as one string, and the file. */
public final class Offsets {
  private final List<Span> pieces;
  private final int[] before;

  /** For a block that is made of these pieces, of which there is one at least. */
  public Offsets(List<Span> pieces) {
    this.pieces = pieces;
    this.before = new int[pieces.size()];
    int length = 0;
    for (int i = 0; i < before.length; i++) {
      before[i] = length;
      length += pieces.get(i).length();
    }
  }

  /** The stretch of the file from the first to the last character of a stretch of prose. */
  public Span inFile(Span prose) {
    return new Span(offset(prose.start()), offset(prose.end() - 1) + 1);
  }

  /** The stretch of prose that lies in a stretch of the file; may be empty. */
  public Span inProse(Span file) {
    int start = proseBefore(file.start());
    return new Span(start, Math.max(start, proseBefore(file.end())));
  }

  private int offset(int inProse) {
    int found = Arrays.binarySearch(before, inProse);
    int piece = found >= 0 ? found : -found - 2;
    return pieces.get(piece).start() + inProse - before[piece];
  }

  /** How many characters of prose stand before an offset into the file. */
  private int proseBefore(int inFile) {
    int low = 0;
    int high = pieces.size();
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (pieces.get(middle).start() < inFile) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    if (low == 0) {
      return 0;
    }
    Span piece = pieces.get(low - 1);
    return before[low - 1] + Math.min(inFile, piece.end()) - piece.start();
  }
}
