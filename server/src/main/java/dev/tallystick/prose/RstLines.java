package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The lines of a body, and which of them is to be read next. */
final class RstLines {
  private final List<RstLine> lines;
  private final int base;
  private int at;

  /**
   * Begins with the first line.
   *
   * @param base column that those begin in which belong to nothing above
   */
  RstLines(List<RstLine> lines, int base) {
    this.lines = lines;
    this.base = base;
  }

  List<RstLine> all() {
    return lines;
  }

  int at() {
    return at;
  }

  void goTo(int index) {
    at = index;
  }

  boolean hasMore() {
    return at < lines.size();
  }

  RstLine current() {
    return lines.get(at);
  }

  /** A line so many below the current one, or above it; empty if there is none. */
  Optional<RstLine> following(int count) {
    int index = at + count;
    return index >= 0 && index < lines.size() ? Optional.of(lines.get(index)) : Optional.empty();
  }

  /** Whether the next line is blank, or there is none. */
  boolean isAlone() {
    return following(1).map(RstLine::isBlank).orElse(true);
  }

  /** Whether the next line belongs to the current one by its indentation. */
  boolean hasIndented() {
    return isIndented(at + 1);
  }

  boolean isIndented(int index) {
    return isText(index) && lines.get(index).column() > base;
  }

  /** Whether there is a line with this index that is not blank. */
  boolean isText(int index) {
    return index < lines.size() && !lines.get(index).isBlank();
  }

  /** Index behind the last indented line from an index on; the index itself if there is none. */
  int behindIndented(int from) {
    int end = from;
    int behind = from;
    while (end < lines.size() && (lines.get(end).isBlank() || isIndented(end))) {
      end++;
      behind = lines.get(end - 1).isBlank() ? behind : end;
    }
    return behind;
  }

  /** Takes the indented lines from an index on. */
  List<RstLine> takeIndented(int from) {
    int end = behindIndented(from);
    at = end;
    return lines.subList(from, end);
  }

  /** Takes the rest of the current line, and what is indented below. */
  List<RstLine> takeContent(RstLine rest) {
    List<RstLine> below = takeIndented(at + 1);
    return together(rest.in(column(below).orElse(rest.column())), below);
  }

  /** Takes the rest of the current line, and the lines below that begin no less deep. */
  List<RstLine> takeAsDeepAs(RstLine rest) {
    int from = at + 1;
    int end = from;
    while (end < lines.size()
        && (lines.get(end).isBlank() || lines.get(end).column() >= rest.column())) {
      end++;
    }
    at = end;
    return together(rest, lines.subList(from, end));
  }

  /** Index of the next blank line, or behind all. */
  int behindText() {
    int end = at;
    while (isText(end)) {
      end++;
    }
    return end;
  }

  /** Takes what stands as it is: indented, or with the same mark at the start of each line. */
  Optional<Span> takeLiteral(String file) {
    int from = at;
    while (from < lines.size() && !isText(from)) {
      from++;
    }
    int end = isIndented(from) ? behindIndented(from) : from;
    if (end == from && from > at && isText(from)) {
      char mark = file.charAt(lines.get(from).start());
      while (RstSyntax.isPunctuation(mark)
          && isText(end)
          && file.charAt(lines.get(end).start()) == mark) {
        end++;
      }
    }
    if (end == from) {
      return Optional.empty();
    }
    at = end;
    return Optional.of(extent(lines.subList(from, end)));
  }

  private static List<RstLine> together(RstLine first, List<RstLine> below) {
    List<RstLine> all = new ArrayList<>(below.size() + 1);
    all.add(first);
    all.addAll(below);
    return all;
  }

  /** The column that the outermost of some lines begin in; empty if all are blank. */
  static Optional<Integer> column(List<RstLine> lines) {
    return lines.stream()
        .filter(line -> !line.isBlank())
        .map(RstLine::column)
        .min(Integer::compare);
  }

  /** From the first to the last of some lines that are not blank. */
  static Span extent(List<RstLine> lines) {
    List<RstLine> text = lines.stream().filter(line -> !line.isBlank()).toList();
    return text.get(0).span().cover(text.get(text.size() - 1).span());
  }
}
