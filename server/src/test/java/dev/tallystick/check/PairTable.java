package dev.tallystick.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;

/**
 * Two Markdown texts beside each other, in a notation whose layout is what is expected of them. A
 * row is one match, its cells parted by {@code |} (a line that starts with the bar goes on with the
 * row above). Within a cell {@code /} parts sentences, and {@code -} means that nothing is there.
 *
 * <p>{@code ¶} at the start of a row starts a block on both sides, before a sentence within a cell
 * on that side; behind it may stand {@code ##}, {@code -}, {@code >}, or code between three
 * backquotes. {@code !code} at the end of a row is a finding, {@code !...} says that the one above
 * goes on, {@code ~} that the row is pending. A line that starts with {@code #} is a comment.
 */
final class PairTable {
  private final StringBuilder source = new StringBuilder();
  private final StringBuilder target = new StringBuilder();
  private final Marks sourceMarks = new Marks(new TreeSet<>(), new TreeSet<>());
  private final Marks targetMarks = new Marks(new TreeSet<>(), new TreeSet<>());
  private final List<String> rows = new ArrayList<>();
  private boolean sourceOpens = true;
  private boolean targetOpens = true;

  /**
   * Where the table has its paragraph marks, by the offsets of the sentences behind them.
   *
   * @param rows at the start of a row
   * @param cells within a cell
   */
  record Marks(Set<Integer> rows, Set<Integer> cells) {}

  PairTable(String table) {
    String joined = table.replaceAll("(?m)^ *#.*\n", "").replaceAll("\n\\s*\\| ", " | ");
    joined.lines().map(String::strip).filter(line -> !line.isEmpty()).forEach(this::addRow);
  }

  /** The source, lines ended by LF. */
  String source() {
    return source + "\n";
  }

  /** The translation. */
  String target() {
    return target + "\n";
  }

  /** The table without comments, each row in the layout of {@link PairPrint}. */
  String canonical() {
    return String.join("\n", rows) + "\n";
  }

  /** The paragraph marks of a side. */
  Marks marks(OnSide side) {
    return side == OnSide.SOURCE ? sourceMarks : targetMarks;
  }

  private void addRow(String row) {
    int bar = row.indexOf(" | ");
    if (bar < 0) {
      throw new IllegalArgumentException("row without two cells: " + row);
    }
    String left = row.substring(0, bar).strip();
    String right = row.substring(bar + 3).strip();
    String marks = "";
    int mark = marks(right);
    if (mark < right.length()) {
      marks = " " + right.substring(mark).strip();
      right = right.substring(0, mark).strip();
    }
    rows.add(spaced(left) + "\n    | " + spaced(right) + marks);
    boolean opens = left.startsWith("¶");
    left = opens ? left.substring(1).strip() : left;
    sourceOpens |= opens;
    targetOpens |= opens;
    sourceOpens = write(left, source, sourceMarks, opens, sourceOpens);
    targetOpens = write(right, target, targetMarks, opens, targetOpens);
  }

  private static String spaced(String cell) {
    return cell.replaceAll("¶ *", "¶ ");
  }

  private static int marks(String cell) {
    String[] words = cell.split(" ");
    int end = cell.length();
    for (int i = words.length - 1; i > 0 && words[i].matches("![a-z]+|!\\.\\.\\.|~"); i--) {
      end -= words[i].length() + 1;
    }
    return end;
  }

  /** Writes a cell; returns whether the next one on this side has to start a block. */
  private static boolean write(
      String cell, StringBuilder text, Marks marks, boolean marked, boolean opens) {
    if (cell.equals("-")) {
      return opens;
    }
    boolean first = true;
    for (String part : cell.split(" / ")) {
      String stripped = part.strip();
      boolean starts = stripped.startsWith("¶");
      String sentence = starts ? stripped.substring(1).strip() : stripped;
      if (text.length() > 0) {
        text.append(starts || first && opens ? "\n\n" : separator(text));
      }
      int offset = text.length() + marker(sentence);
      if (starts) {
        marks.cells().add(offset);
      } else if (first && marked) {
        marks.rows().add(offset);
      }
      text.append(sentence.replaceAll("^```(.*)```$", "```\n$1\n```"));
      first = false;
    }
    return false;
  }

  /** Chinese and Japanese sentences follow each other without a blank. */
  private static String separator(StringBuilder text) {
    return "。！？」".indexOf(text.charAt(text.length() - 1)) >= 0 ? "" : " ";
  }

  private static int marker(String sentence) {
    return sentence.length() - sentence.replaceFirst("^(#+|-|>) ", "").length();
  }
}
