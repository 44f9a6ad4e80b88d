package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;

/** Gathers the prose of one block from left to right; stretches that touch become one piece. */
final class Pieces {
  private final String file;
  private final List<Span> closed = new ArrayList<>();
  private int start;
  private int end;

  Pieces(String file) {
    this.file = file;
  }

  /** Adds a stretch of the file; whatever of it is already there is ignored. */
  void add(int from, int to) {
    int first = Math.max(from, end);
    if (first >= to) {
      return;
    }
    if (first > end || start == end) {
      close();
      start = first;
    }
    end = to;
  }

  /**
   * Adds the first line break at or behind {@code from}, without the blanks before it.
   *
   * @param limit offset that the line break must not reach beyond
   */
  void addLineBreak(int from, int limit) {
    int at = Math.max(from, end);
    while (at < limit && !Characters.isLineEnd(file.charAt(at))) {
      at++;
    }
    trimBlanks();
    int behind = at;
    if (behind < limit) {
      behind += file.startsWith("\r\n", at) ? 2 : 1;
    }
    add(at, Math.min(behind, limit));
  }

  /** Offset behind the last stretch; 0 as long as there is none. */
  int end() {
    return end;
  }

  /** The pieces; an empty list if there is nothing but white space. */
  List<Span> spans() {
    close();
    start = end;
    return isBlank() ? List.of() : List.copyOf(closed);
  }

  private void trimBlanks() {
    while (start < end && Characters.isBlank(file.charAt(end - 1))) {
      end--;
    }
  }

  private void close() {
    if (start < end) {
      closed.add(new Span(start, end));
    }
  }

  private boolean isBlank() {
    for (Span piece : closed) {
      for (int at = piece.start(); at < piece.end(); at++) {
        if (!Characters.isSpace(file.charAt(at))) {
          return false;
        }
      }
    }
    return true;
  }
}
