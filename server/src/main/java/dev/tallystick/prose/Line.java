package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * One line of a plain text. Offsets are UTF-16 offsets into the file, widths are columns of a
 * terminal, counted from behind the marks of a quotation.
 *
 * @param mark offset of its first character that is not white space
 * @param quotes how many marks of a quotation open it, as in a letter that answers another one
 * @param start offset of its first character behind those marks that is not white space
 * @param text offset of its prose, behind the list marker if it has one
 * @param end offset behind its last character that is not white space
 * @param indent columns before {@code start}
 * @param width columns to {@code end}
 * @param number number of its list marker; 0 for a bullet, -1 if it opens no list item
 * @param isProse whether it has a letter or a digit
 * @param capitals whether it has letters in upper case and none in lower case
 */
record Line(
    int mark,
    int quotes,
    int start,
    int text,
    int end,
    int indent,
    int width,
    int number,
    boolean isProse,
    boolean capitals) {
  private static final int NO_ITEM = -1;
  private static final Pattern MARKER =
      Pattern.compile(
          "(?:[-*](?=[ \\t])|[\u2022\u2023\u25E6\u25AA\u30FB]|(\\d{1,3})(?:[.)](?=[ \\t])|\u3001))"
              + "[ \\t\u00A0\u3000]*(?=\\S)");

  /** All lines of a file, in order. */
  static List<Line> all(Text text) {
    List<Line> lines = new ArrayList<>();
    for (int i = 0; i < text.lines(); i++) {
      int start = text.lineStart(i);
      boolean mark = start == 0 && text.string().startsWith("\uFEFF");
      lines.add(scan(text.string(), mark ? 1 : start, text.lineEnd(i)));
    }
    return keepSequences(lines);
  }

  boolean isItem() {
    return number != NO_ITEM;
  }

  boolean isBlank() {
    return start == end;
  }

  /** Whether nothing but marks like {@code ----} is on the line. */
  boolean isRule() {
    return !isProse && !isBlank();
  }

  /** Whether the line is the one that the writer's name and address stand below in a letter. */
  boolean opensSignature(String file) {
    return quotes == 0 && indent == 0 && end - start == 2 && file.startsWith("--", start);
  }

  /** Whether the line ends as a sentence does. */
  boolean stops(String file) {
    if (Characters.isCornerBracket(file.charAt(end - 1))) {
      return true;
    }
    int at = end;
    while (at > start && Characters.isClosing(file.charAt(at - 1))) {
      at--;
    }
    return at > start && Characters.isStop(file.charAt(at - 1));
  }

  /** Columns of the first word: what a line above would have needed to take it. */
  int firstWordWidth(String file) {
    int first = file.codePointAt(start);
    if (Characters.isSpaceless(first)) {
      return Characters.columnAfter(0, first);
    }
    int columns = 0;
    for (int at = start; at < end; at += Character.charCount(file.codePointAt(at))) {
      int c = file.codePointAt(at);
      if (Characters.isSpace(c) || Characters.isSpaceless(c)) {
        break;
      }
      columns = Characters.columnAfter(columns, c);
    }
    return columns;
  }

  /** Whether a line is in the same quotation. */
  boolean isBeside(Line other) {
    return quotes == other.quotes;
  }

  private static Line scan(String file, int begin, int end) {
    int last = end;
    while (last > begin && Characters.isSpace(file.charAt(last - 1))) {
      last--;
    }
    int mark = -1;
    int depth = 0;
    int behind = begin;
    for (int at = begin; at < last && isQuoteMark(file.charAt(at)); at++) {
      if (file.charAt(at) == '>') {
        mark = depth++ == 0 ? at : mark;
        behind = at + 1;
      }
    }
    boolean blank = depth > 0 && behind < last && file.charAt(behind) == ' ';
    return scan(file, blank ? behind + 1 : behind, last, mark, depth);
  }

  private static boolean isQuoteMark(char c) {
    return c == '>' || Characters.isBlank(c);
  }

  private static Line scan(String file, int begin, int end, int mark, int quotes) {
    int column = 0;
    int start = begin;
    while (start < end && Characters.isSpace(file.charAt(start))) {
      column = Characters.columnAfter(column, file.charAt(start++));
    }
    return classify(file, start, end, column, quotes == 0 ? start : mark, quotes);
  }

  private static Line classify(String file, int start, int end, int indent, int mark, int quotes) {
    int width = indent;
    boolean prose = false;
    int upper = 0;
    boolean lower = false;
    for (int at = start; at < end; ) {
      char unit = file.charAt(at);
      if (lower && unit >= ' ' && unit < 0x7F) {
        width++; // nearly all of most texts
        at++;
        continue;
      }
      int c = file.codePointAt(at);
      at += Character.charCount(c);
      width = Characters.columnAfter(width, c);
      prose |= Character.isLetterOrDigit(c);
      upper += Character.isUpperCase(c) ? 1 : 0;
      lower |= Character.isLowerCase(c);
    }
    Matcher marker = MARKER.matcher(file).region(start, end);
    boolean item = prose && marker.lookingAt();
    int text = item ? marker.end() : start;
    boolean capitals = upper > 1 && !lower;
    int number = item ? number(marker) : NO_ITEM;
    return new Line(mark, quotes, start, text, end, indent, width, number, prose, capitals);
  }

  private static int number(Matcher marker) {
    return marker.group(1) == null ? 0 : Integer.parseInt(marker.group(1));
  }

  /**
   * A number opens an item only beside its neighbour in the count, so that a line that happens to
   * begin with the day of a date stays prose.
   */
  private static List<Line> keepSequences(List<Line> lines) {
    List<Integer> numbered = new ArrayList<>();
    for (int i = 0; i < lines.size(); i++) {
      if (lines.get(i).number > 0) {
        numbered.add(i);
      }
    }
    List<Line> kept = new ArrayList<>(lines);
    for (int i = 0; i < numbered.size(); i++) {
      Line line = lines.get(numbered.get(i));
      boolean follows = i > 0 && lines.get(numbered.get(i - 1)).number == line.number - 1;
      boolean leads =
          i + 1 < numbered.size() && lines.get(numbered.get(i + 1)).number == line.number + 1;
      if (!follows && !leads) {
        kept.set(numbered.get(i), line.withoutMarker());
      }
    }
    return kept;
  }

  private Line withoutMarker() {
    return new Line(mark, quotes, start, start, end, indent, width, NO_ITEM, isProse, capitals);
  }
}
