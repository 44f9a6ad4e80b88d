package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Finds what is no prose within a block of reStructuredText, in one way from left to right. */
final class RstMarks {
  /** Marks that open a quotation somewhere, and those that close it in some language. */
  private static final String QUOTES =
      "\"'(<[{\u201C\u201D\u201E\u2018\u2019\u201A\u00AB\u00BB\u2039\u203A";

  private static final List<String> CLOSING_QUOTES =
      List.of(
          "\"",
          "'",
          ")",
          ">",
          "]",
          "}",
          "\u201D\u201E",
          "\u201D",
          "\u201C\u201D",
          "\u2019\u201A",
          "\u2019",
          "\u2018\u2019",
          "\u00BB",
          "\u00AB\u00BB",
          "\u203A",
          "\u2039\u203A");

  private final String prose;
  private final boolean[] marks;
  private final boolean[] escaped;
  private final List<Inline> inlines;
  private final Map<String, Integer> found = new HashMap<>();
  private int at;

  /** Behind a mark that has just closed: there another one may begin. */
  private int fresh;

  private RstMarks(String prose, List<Inline> inlines) {
    this.prose = prose;
    this.inlines = inlines;
    this.marks = new boolean[prose.length()];
    this.escaped = new boolean[prose.length() + 1];
    for (int i = 0; i < prose.length(); i++) {
      escaped[i + 1] = prose.charAt(i) == '\\' && !escaped[i];
    }
  }

  /** Which characters of a block are marks, and what is marked; its lines end in LF. */
  static boolean[] of(String prose, List<Inline> inlines) {
    RstMarks read = new RstMarks(prose, inlines);
    while (read.at < prose.length()) {
      read.step();
    }
    return read.marks;
  }

  private void step() {
    boolean taken =
        switch (prose.charAt(at)) {
          case '\\' -> escape();
          case '*' -> prose.startsWith("**", at) ? between("**") : between("*");
          case '`' -> prose.startsWith("``", at) ? literal() : interpreted(at, "");
          case '_' -> inlineTarget();
          case '|' -> substitution();
          case '[' -> footnote();
          case ':' -> role();
          default -> reference();
        };
    if (!taken) {
      at++;
    }
  }

  /** A backslash takes away what the next character means; a blank behind it vanishes with it. */
  private boolean escape() {
    unescape(at, at + 1);
    at = Math.min(at + 2, prose.length());
    return true;
  }

  private boolean between(String mark) {
    int close = opens(at, mark.length()) ? next(mark, at + mark.length() + 1) : -1;
    if (close < 0) {
      at += mark.length();
      return true;
    }
    unescape(at, close);
    boolean strong = mark.length() > 1;
    return enclose(at, close, mark, strong ? Inline.Kind.STRONG : Inline.Kind.EMPHASIS);
  }

  private boolean literal() {
    int close = opens(at, 2) ? next("``", at + 3) : -1;
    if (close < 0) {
      at += 2;
      return true;
    }
    return enclose(at, close, "``", Inline.Kind.CODE);
  }

  /** Text in backquotes: a reference if an underscore follows, else as its role says. */
  private boolean interpreted(int start, String role) {
    int tick = start + (role.isEmpty() ? 0 : role.length() + 2);
    int close = opens(start, tick + 1 - start) ? next("`", tick + 2) : -1;
    if (close < 0) {
      at = tick + 1;
      return true;
    }
    unescape(tick, close);
    int suffix = suffixEnd(close + 1);
    boolean refers = prose.charAt(close + 1) == '_';
    boolean roleBehind = role.isEmpty() && !refers && suffix > close + 1;
    mark(start, tick + 1);
    mark(close, suffix);
    String name = refers ? "ref" : roleBehind ? prose.substring(close + 2, suffix - 1) : role;
    RstRole shown = RstRole.of(name, refers);
    shown.mark(prose, marks, tick + 1, close);
    add(shown.kind(), start, suffix);
    return closed(suffix);
  }

  private boolean inlineTarget() {
    int close = prose.startsWith("_`", at) && opens(at, 2) ? next("`", at + 3) : -1;
    if (close < 0) {
      return false;
    }
    unescape(at, close);
    mark(at, at + 2);
    mark(close, close + 1);
    return closed(close + 1);
  }

  private boolean substitution() {
    int close = opens(at, 1) ? next("|", at + 2) : -1;
    if (close < 0) {
      return false;
    }
    mark(at, at + 1);
    int behind = close + 1;
    while (behind < close + 3 && prose.charAt(behind) == '_') {
      behind++;
    }
    mark(close, behind);
    add(Inline.Kind.PLACEHOLDER, at, behind);
    return closed(behind);
  }

  /** A reference to a footnote or to a book. */
  private boolean footnote() {
    int label = at + 1;
    boolean auto = prose.startsWith("#", label) || prose.startsWith("*", label);
    int end = RstSyntax.nameEnd(prose, auto ? label + 1 : label, prose.length());
    if (!begins(at) || end == label || !prose.startsWith("]_", end) || !ends(end + 2)) {
      return false;
    }
    mark(at, end + 2);
    return closed(end + 2);
  }

  private boolean role() {
    int end = RstSyntax.nameEnd(prose, at + 1, prose.length());
    boolean role = begins(at) && end > at + 1 && prose.startsWith(":`", end);
    if (!role || prose.startsWith("``", end + 1)) {
      return false;
    }
    return interpreted(at, prose.substring(at + 1, end));
  }

  /** A word with an underscore behind it. */
  private boolean reference() {
    int end = begins(at) ? RstSyntax.nameEnd(prose, at, prose.length()) : at;
    if (end == at) {
      return false;
    }
    int behind = end;
    while (behind < end + 2 && prose.charAt(behind) == '_') {
      behind++;
    }
    if (behind > end && ends(behind)) {
      mark(end, behind);
      add(Inline.Kind.LINK, at, behind);
      return closed(behind);
    }
    at = behind;
    return true;
  }

  private void add(Inline.Kind kind, int from, int to) {
    inlines.add(new Inline(kind, new Span(from, to)));
  }

  private boolean enclose(int open, int close, String mark, Inline.Kind kind) {
    int length = mark.length();
    add(kind, open, close + length);
    mark(open, open + length);
    mark(close, close + length);
    return closed(close + length);
  }

  private boolean closed(int behind) {
    at = behind;
    fresh = behind;
    return true;
  }

  /** Offset of the next such mark that closes something; the offsets asked for a mark rise. */
  private int next(String mark, int from) {
    int close = found.getOrDefault(mark, 0);
    if (close < 0 || close >= from) {
      return close;
    }
    close = prose.indexOf(mark, from);
    while (close >= 0 && !closes(mark, close)) {
      close = prose.indexOf(mark, close + 1);
    }
    found.put(mark, close);
    return close;
  }

  private boolean closes(String mark, int close) {
    boolean literal = mark.equals("``");
    int behind = close + mark.length();
    if (isSpace(close - 1) || escaped[close] && !literal) {
      return false;
    }
    return switch (mark) {
      case "`" -> ends(suffixEnd(behind));
      case "|" -> ends(behind) || prose.charAt(behind) == '_';
      default -> ends(behind);
    };
  }

  /** Offset behind the underscores or the role that follow a closing backquote. */
  private int suffixEnd(int from) {
    if (prose.charAt(from) == '_') {
      return prose.charAt(from + 1) == '_' ? from + 2 : from + 1;
    }
    int end = prose.charAt(from) == ':' ? RstSyntax.nameEnd(prose, from + 1, prose.length()) : from;
    return end > from + 1 && prose.charAt(end) == ':' ? end + 1 : from;
  }

  /** Whether a mark of a length at an offset opens something. */
  private boolean opens(int from, int length) {
    return begins(from) && !isSpace(from + length) && !isQuoted(from, from + length);
  }

  /** Whether a mark may stand behind what is before it. */
  private boolean begins(int from) {
    if (from == fresh || isSpace(from - 1)) {
      return true;
    }
    char before = prose.charAt(from - 1);
    return before < 0x80 ? "-/:\"'(<[{".indexOf(before) >= 0 : isPunctuation(before, true);
  }

  /** Whether a mark may stand before what follows. */
  private boolean ends(int behind) {
    char next = prose.charAt(behind);
    return Characters.isSpace(next)
        || (next < 0x80 ? "-/:.,;!?\\\"')]}>".indexOf(next) >= 0 : isPunctuation(next, false));
  }

  private static boolean isPunctuation(char c, boolean opening) {
    return switch (Character.getType(c)) {
      case Character.START_PUNCTUATION -> opening;
      case Character.END_PUNCTUATION -> !opening;
      case Character.INITIAL_QUOTE_PUNCTUATION,
          Character.FINAL_QUOTE_PUNCTUATION,
          Character.DASH_PUNCTUATION,
          Character.OTHER_PUNCTUATION ->
          true;
      default -> false;
    };
  }

  /** Whether quotation marks or brackets right around a mark show that the mark itself is meant. */
  private boolean isQuoted(int from, int behind) {
    int pair = from == fresh ? -1 : QUOTES.indexOf(prose.charAt(from - 1));
    return pair >= 0 && CLOSING_QUOTES.get(pair).indexOf(prose.charAt(behind)) >= 0;
  }

  /** Marks the backslashes of a stretch, and the blanks that they take away. */
  private void unescape(int from, int to) {
    for (int i = from; i < to; i++) {
      if (prose.charAt(i) == '\\' && !escaped[i]) {
        mark(i, isSpace(i + 1) ? i + 2 : i + 1);
      }
    }
  }

  private boolean isSpace(int offset) {
    return Characters.isSpace(prose.charAt(offset));
  }

  private void mark(int from, int to) {
    Arrays.fill(marks, from, to, true);
  }
}
