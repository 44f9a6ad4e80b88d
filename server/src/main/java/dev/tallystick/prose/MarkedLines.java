package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Picks the prose out of the lines of one block, and what is marked in it. */
final class MarkedLines {
  private MarkedLines() {}

  /** Knows the marks of a format. */
  @FunctionalInterface
  interface Marker {
    /**
     * Which characters of the lines of a block are no prose.
     *
     * @param joined the lines, each with an LF at its end
     * @param inlines takes what is marked, with offsets into {@code joined}
     */
    boolean[] marks(String joined, List<Inline> inlines);
  }

  /**
   * A block with its prose; it has no pieces if there is none.
   *
   * @param lines its stretches of the file, one a line
   */
  static Block block(
      Block.Kind kind, int level, Span extent, String file, List<Span> lines, Marker marker) {
    StringBuilder joined = new StringBuilder();
    for (Span line : lines) {
      joined.append(file, line.start(), line.end()).append('\n');
    }
    List<Inline> inlines = new ArrayList<>();
    boolean[] marks = marker.marks(joined.toString(), inlines);
    Pieces pieces = new Pieces(file);
    int before = 0;
    for (Span line : lines) {
      if (pieces.end() > 0) {
        pieces.addLineBreak(pieces.end(), line.start());
      }
      for (int at = line.start(); at < line.end(); at++) {
        if (!marks[before + at - line.start()]) {
          pieces.add(at, at + 1);
        }
      }
      before += line.length() + 1;
    }
    return new Block(kind, level, extent, pieces.spans()).with(inFile(inlines, lines));
  }

  /** The inlines with the places that they have in the file, in order. */
  private static List<Inline> inFile(List<Inline> joined, List<Span> lines) {
    int[] before = new int[lines.size()];
    for (int i = 1; i < before.length; i++) {
      before[i] = before[i - 1] + lines.get(i - 1).length() + 1;
    }
    List<Inline> inFile = new ArrayList<>();
    for (Inline inline : joined) {
      int start = offset(inline.span().start(), before, lines);
      int end = offset(inline.span().end() - 1, before, lines) + 1;
      inFile.add(new Inline(inline.kind(), new Span(start, end)));
    }
    return inFile;
  }

  private static int offset(int inJoined, int[] before, List<Span> lines) {
    int found = Arrays.binarySearch(before, inJoined);
    int line = found >= 0 ? found : -found - 2;
    return lines.get(line).start() + inJoined - before[line];
  }
}
