package dev.tallystick.aid;

import dev.tallystick.text.Edit;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Whole lines that are replaced, so that nobody has to count columns.
 *
 * @param from the first line, counted from 0
 * @param to the line behind the last one; it need not exist
 * @param replacement the new lines with their ends; the last has one if the old last one had
 */
public record LineEdit(int from, int to, String replacement) {
  /**
   * Makes edits of whole lines of edits anywhere.
   *
   * @param edits in a text, none overlapping another; of those at one place the first comes first
   */
  static List<LineEdit> of(Text text, List<Edit> edits) {
    List<Edit> sorted = new ArrayList<>(edits);
    sorted.sort(Comparator.comparing(Edit::span));
    List<LineEdit> lines = new ArrayList<>();
    int next = 0;
    while (next < sorted.size()) {
      int behind = next + 1;
      while (behind < sorted.size()
          && firstLine(text, sorted.get(behind)) <= lastLine(text, sorted.get(behind - 1))) {
        behind++;
      }
      lines.add(joined(text, sorted.subList(next, behind)));
      next = behind;
    }
    return lines;
  }

  /** One of edits that share lines. */
  private static LineEdit joined(Text text, List<Edit> edits) {
    int from = firstLine(text, edits.get(0));
    int to = lastLine(text, edits.get(edits.size() - 1)) + 1;
    StringBuilder lines = new StringBuilder();
    int at = text.lineStart(from);
    for (Edit edit : edits) {
      lines.append(text.string(), at, edit.span().start()).append(edit.replacement());
      at = edit.span().end();
    }
    int end = to < text.lines() ? text.lineStart(to) : text.length();
    return new LineEdit(from, to, lines.append(text.string(), at, end).toString());
  }

  private static int firstLine(Text text, Edit edit) {
    return text.place(edit.span().start()).line();
  }

  private static int lastLine(Text text, Edit edit) {
    return text.place(edit.span().end()).line();
  }
}
