package dev.tallystick.prose;

import dev.tallystick.prose.LatexToken.Kind;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** Parts a LaTeX file into its tokens, in one way from left to right. */
final class LatexTokens {
  private static final String SPECIAL = "\\{}[]$%&";
  private static final int LONGEST_NAME = 60;

  private final String file;
  private final List<LatexToken> tokens = new ArrayList<>();
  private final LineSearch search;

  /** Environments whose end is not found from here on. */
  private final Set<String> endless = new HashSet<>();

  private int at;

  /** Whether a comment took the end of the line before. */
  private boolean atLineStart;

  private LatexTokens(String file) {
    this.file = file;
    this.search = new LineSearch(file);
  }

  static List<LatexToken> of(String file) {
    LatexTokens read = new LatexTokens(file);
    read.at = file.startsWith("\uFEFF") ? 1 : 0;
    while (read.at < file.length()) {
      read.step();
    }
    return read.tokens;
  }

  private void step() {
    char c = file.charAt(at);
    if (isBlank(c)) {
      blank();
      return;
    }
    boolean lineStart = atLineStart;
    atLineStart = false;
    switch (c) {
      case '\\' -> command();
      case '%' -> comment();
      case '{' -> add(Kind.OPEN, at + 1);
      case '}' -> add(Kind.CLOSE, at + 1);
      case '[' -> add(Kind.BRACKET, at + 1);
      case ']' -> add(Kind.BRACKET_END, at + 1);
      case '&' -> add(Kind.CELL, at + 1);
      case '$' -> {
        int end = file.startsWith("$$", at) ? at + 2 : at + 1;
        add(Kind.DOLLAR, end, file.substring(at, end));
      }
      default -> text();
    }
    atLineStart |= lineStart && c == '%';
  }

  private static boolean isBlank(char c) {
    return c <= ' ' || c == '\u2028' || c == '\u2029' || c == '\u0085';
  }

  private void blank() {
    int breaks = atLineStart ? 1 : 0;
    int end = at;
    while (end < file.length() && isBlank(file.charAt(end))) {
      char c = file.charAt(end);
      boolean second = c == '\n' && end > at && file.charAt(end - 1) == '\r';
      breaks += Characters.isLineEnd(c) && !second ? 1 : 0;
      end++;
    }
    add(breaks > 1 ? Kind.BORDER : Kind.BLANK, end);
    atLineStart = false;
  }

  private void comment() {
    int end = at;
    while (end < file.length() && !Characters.isLineEnd(file.charAt(end))) {
      end++;
    }
    atLineStart = end < file.length();
    end = Math.min(end + (file.startsWith("\r\n", end) ? 2 : 1), file.length());
    while (end < file.length() && Characters.isBlank(file.charAt(end))) {
      end++;
    }
    add(Kind.COMMENT, end);
  }

  private void text() {
    int end = at;
    while (end < file.length()
        && !isBlank(file.charAt(end))
        && SPECIAL.indexOf(file.charAt(end)) < 0) {
      end++;
    }
    add(Kind.TEXT, end);
  }

  private void command() {
    int end = at + 1;
    while (end < file.length() && isLetter(file.charAt(end))) {
      end++;
    }
    if (end == at + 1) {
      symbol();
      return;
    }
    String name = file.substring(at + 1, end);
    if (name.equals("begin") && environment(Kind.BEGIN, end)
        || name.equals("end") && environment(Kind.END, end)
        || LatexNames.command(name).equals(LatexNames.CODE) && code(name, end)) {
      return;
    }
    add(Kind.COMMAND, file.startsWith("*", end) ? end + 1 : end, name);
  }

  /** A backslash before a character that is no letter; before white space it stands alone. */
  private void symbol() {
    int next = at + 1;
    if (next == file.length() || isBlank(file.charAt(next))) {
      add(Kind.COMMAND, next, " ");
      return;
    }
    int end = next + Character.charCount(file.codePointAt(next));
    String name = file.substring(next, end);
    boolean star = name.equals("\\") && file.startsWith("*", end);
    add(Kind.COMMAND, star ? end + 1 : end, name);
  }

  private static boolean isLetter(char c) {
    return c >= 'a' && c <= 'z' || c >= 'A' && c <= 'Z';
  }

  private boolean environment(Kind kind, int behind) {
    int open = behind;
    while (open < file.length() && Characters.isBlank(file.charAt(open))) {
      open++;
    }
    int close = open;
    while (close < file.length()
        && close - open < LONGEST_NAME
        && file.charAt(close) != '}'
        && !isBlank(file.charAt(close))) {
      close++;
    }
    if (!file.startsWith("{", open) || !file.startsWith("}", close)) {
      return false;
    }
    String name = file.substring(open + 1, close);
    boolean hidden = LatexNames.isEnvironment(LatexNames.HIDDEN, name);
    if (kind == Kind.BEGIN && (hidden || LatexNames.isEnvironment(LatexNames.VERBATIM, name))) {
      String end = "\\end{" + name + "}";
      int found = endless.contains(name) ? -1 : file.indexOf(end, close + 1);
      if (found >= 0) {
        add(hidden ? Kind.COMMENT : Kind.VERBATIM, found + end.length(), name);
        return true;
      }
      endless.add(name);
    }
    add(kind, close + 1, name);
    return true;
  }

  /** Code in a line, if it ends on the same one. */
  private boolean code(String name, int behind) {
    int open = file.startsWith("*", behind) ? behind + 1 : behind;
    if (!name.equalsIgnoreCase("verb")) {
      open = file.startsWith("[", open) ? search.next(']', open) + 1 : open;
      boolean language = name.equals("mintinline") && open > 0 && file.startsWith("{", open);
      open = language ? search.next('}', open) + 1 : open;
    }
    if (open <= 0 || open >= file.length()) {
      return false;
    }
    char delimiter = file.charAt(open);
    if (delimiter >= 0x7F || isBlank(delimiter) || isLetter(delimiter)) {
      return false;
    }
    int close = search.next(delimiter == '{' ? '}' : delimiter, open + 1);
    if (close < 0) {
      return false;
    }
    add(Kind.CODE, close + 1, file.substring(open + 1, close));
    return true;
  }

  private void add(Kind kind, int end) {
    add(kind, end, "");
  }

  private void add(Kind kind, int end, String name) {
    tokens.add(new LatexToken(kind, at, end, name));
    at = end;
  }

  /** Finds characters on a line; what it has looked over once for one it does not again. */
  private static final class LineSearch {
    private final String file;
    private final int[] from = new int[0x80];
    private final int[] to = new int[0x80];

    LineSearch(String file) {
      this.file = file;
    }

    /** Offset of the first such character at or behind an offset on its line; -1 if none. */
    int next(char wanted, int start) {
      if (start < from[wanted] || start > to[wanted] || to[wanted] == 0) {
        int end = start;
        while (end < file.length()
            && file.charAt(end) != wanted
            && !Characters.isLineEnd(file.charAt(end))) {
          end++;
        }
        from[wanted] = start;
        to[wanted] = end;
      }
      int found = to[wanted];
      return found < file.length() && file.charAt(found) == wanted ? found : -1;
    }
  }
}
