package dev.tallystick.prose;

import java.util.ArrayList;
import java.util.List;
import org.commonmark.node.SourceSpan;

/** Where in the file the characters come from that the Markdown parser has read. */
@FunctionalInterface
interface Origin {
  /** Offset in the file of the character at an offset of the parser's input. */
  int of(int input);

  /**
   * The origins of the cells of one table row. In a row the parser's own offsets slip: by one
   * behind each escaped bar, and by the blanks that a tab before the first bar stands for.
   *
   * @param start offset in the file where the row starts, container marks left out
   * @param end offset behind its last character
   */
  static List<CellOrigin> ofRow(String file, int start, int end) {
    List<CellOrigin> cells = new ArrayList<>();
    int from = start;
    while (from < end && Characters.isBlank(file.charAt(from))) {
      from++;
    }
    if (from < end && file.charAt(from) == '|') {
      from++;
    }
    while (from < end) {
      CellOrigin cell = CellOrigin.from(file, from, end);
      cells.add(cell);
      from = cell.end() + 1;
    }
    return cells;
  }

  /**
   * One cell.
   *
   * @param start offset in the file of its first character
   * @param end offset of the bar behind it
   * @param bars offsets of the escaped bars inside, in order
   */
  record CellOrigin(int start, int end, List<Integer> bars) {
    private static CellOrigin from(String file, int start, int end) {
      List<Integer> bars = new ArrayList<>();
      int at = start;
      while (at < end && file.charAt(at) != '|') {
        if (file.startsWith("\\|", at)) {
          at++;
          bars.add(at);
        }
        at++;
      }
      return new CellOrigin(start, Math.min(at, end), bars);
    }

    /** The origin of offsets that the parser counts from where it believes the cell to start. */
    Origin countedFrom(SourceSpan believed) {
      int[] offsets = new int[end - start - bars.size() + 1];
      int next = 0;
      int offset = start;
      for (int bar : bars) {
        while (offset < bar - 1) {
          offsets[next++] = offset++;
        }
        offsets[next++] = bar;
        offset = bar + 1;
      }
      while (next < offsets.length) {
        offsets[next++] = offset++;
      }
      return input -> offsets[Math.min(input - believed.getInputIndex(), offsets.length - 1)];
    }
  }
}
