package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;

/** Picks the prose out of the lines of one block whose marks are known. */
final class MarkedLines {
  private MarkedLines() {}

  /**
   * The prose of a block.
   *
   * @param lines its stretches of the file, one a line
   * @param marks tells of the lines, each with an LF at its end, which characters are no prose
   */
  static List<Span> prose(String file, List<Span> lines, Function<String, boolean[]> marks) {
    StringBuilder joined = new StringBuilder();
    for (Span line : lines) {
      joined.append(file, line.start(), line.end()).append('\n');
    }
    boolean[] marked = marks.apply(joined.toString());
    Pieces pieces = new Pieces(file);
    int before = 0;
    for (Span line : lines) {
      if (pieces.end() > 0) {
        pieces.addLineBreak(pieces.end(), line.start());
      }
      for (int at = line.start(); at < line.end(); at++) {
        if (!marked[before + at - line.start()]) {
          pieces.add(at, at + 1);
        }
      }
      before += line.length() + 1;
    }
    return pieces.spans();
  }

  /**
   * The inlines of a block with the places that they have in the file.
   *
   * @param marked inlines by offsets into the lines, each with an LF at its end; none is empty
   */
  static List<Inline> inFile(List<Inline> marked, List<Span> lines) {
    int[] before = new int[lines.size()];
    for (int i = 1; i < before.length; i++) {
      before[i] = before[i - 1] + lines.get(i - 1).length() + 1;
    }
    List<Inline> inFile = new ArrayList<>();
    for (Inline inline : marked) {
      int start = offset(inline.span().start(), before, lines);
      int end = offset(inline.span().end() - 1, before, lines) + 1;
      inFile.add(new Inline(inline.kind(), new Span(start, end)));
    }
    return inFile;
  }

  private static int offset(int inLines, int[] before, List<Span> lines) {
    int found = Arrays.binarySearch(before, inLines);
    int line = found >= 0 ? found : -found - 2;
    return lines.get(line).start() + inLines - before[line];
  }
}
