package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.Arrays;
import java.util.List;

/**
 * Marks of bold, italic and the like: one on either side of whole words, two anywhere, and those of
 * what stands higher or lower.
 */
final class AsciiDocQuotes {
  private static final String KINDS = "*_`#^~";
  private static final int NONE = -1;

  private final String prose;
  private final boolean[] marks;
  private final AsciiDocBrackets brackets;
  private final List<Inline> marked;
  private final int[] open = new int[KINDS.length()];
  private final int[] openTwice = new int[KINDS.length()];

  AsciiDocQuotes(String prose, boolean[] marks, AsciiDocBrackets brackets, List<Inline> marked) {
    this.prose = prose;
    this.marks = marks;
    this.brackets = brackets;
    this.marked = marked;
    Arrays.fill(open, NONE);
    Arrays.fill(openTwice, NONE);
  }

  /** Reads the marks at an offset; the offset behind them. */
  int read(int at) {
    char c = prose.charAt(at);
    int kind = KINDS.indexOf(c);
    if (c == '^' || c == '~') {
      readRaised(kind, at);
      return at + 1;
    }
    if (prose.charAt(at + 1) == c) {
      readTwice(kind, at);
      return at + 2;
    }
    boolean closes = open[kind] >= 0 && at > open[kind] + 1 && !isBlank(at - 1) && !isWord(at + 1);
    if (closes) {
      close(open, kind, at, 1);
    } else if (open[kind] < 0 && opens(at)) {
      open[kind] = at;
    }
    return at + 1;
  }

  private boolean opens(int at) {
    char before = at == 0 ? ' ' : prose.charAt(at - 1);
    return !AsciiDocBrackets.isWord(before)
        && before != ';'
        && before != ':'
        && before != '}'
        && !isBlank(at + 1);
  }

  private void readTwice(int kind, int at) {
    if (openTwice[kind] >= 0 && at > openTwice[kind] + 2) {
      close(openTwice, kind, at, 2);
    } else if (openTwice[kind] < 0) {
      openTwice[kind] = at;
    }
  }

  private void readRaised(int kind, int at) {
    int from = open[kind];
    boolean word = from >= 0 && at > from + 1;
    for (int i = from + 1; word && i < at; i++) {
      word = !isBlank(i);
    }
    if (word) {
      close(open, kind, at, 1);
    } else {
      open[kind] = at;
    }
  }

  private void close(int[] opened, int kind, int at, int count) {
    int from = opened[kind];
    opened[kind] = NONE;
    addMarked(KINDS.charAt(kind), new Span(from, at + count));
    for (int i = 0; i < count; i++) {
      marks[from + i] = true;
      marks[at + i] = true;
    }
    int role = from > 0 && prose.charAt(from - 1) == ']' ? brackets.balanced(from - 1) : NONE;
    for (int i = from - 1; role >= 0 && i >= role; i--) {
      marks[i] = true;
    }
  }

  private void addMarked(char mark, Span span) {
    switch (mark) {
      case '*' -> marked.add(new Inline(Inline.Kind.STRONG, span));
      case '_' -> marked.add(new Inline(Inline.Kind.EMPHASIS, span));
      case '`' -> marked.add(new Inline(Inline.Kind.CODE, span));
      default -> {
        // Highlighted, or higher or lower than the line: nothing that a translation has to keep.
      }
    }
  }

  private boolean isBlank(int at) {
    return Characters.isSpace(prose.charAt(at));
  }

  private boolean isWord(int at) {
    return AsciiDocBrackets.isWord(prose.charAt(at));
  }
}
