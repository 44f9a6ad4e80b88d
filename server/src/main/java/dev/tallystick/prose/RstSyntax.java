package dev.tallystick.prose;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** What the lines of reStructuredText begin with. An offset of -1 says that they do not. */
final class RstSyntax {
  private static final int NONE = -1;
  private static final int SHORTEST_RULE = 4;
  private static final String PUNCTUATION = "!\"#$%&'()*+,-./:;<=>?@[\\]^_`{|}~";
  private static final Pattern BULLET = Pattern.compile("[-+*\\u2022\\u2023\\u2043](?:[ \\t]++|$)");
  private static final Pattern ENUMERATOR =
      Pattern.compile(
          "(\\(?)(\\d{1,9}|[A-Za-z]|[IVXLCDM]{1,12}|[ivxlcdm]{1,12}|#)([.)])(?:[ \\t]++|$)");
  private static final Pattern OPTION =
      Pattern.compile(
          "(?:[-+][A-Za-z0-9](?: ?(?:[A-Za-z][\\w-]*+|<[^<>]++>))?"
              + "|(?:--|/)[A-Za-z0-9][\\w-]*+(?:[ =](?:[A-Za-z][\\w-]*+|<[^<>]++>))?)");
  private static final Pattern OPTION_END = Pattern.compile("(, )|[ \\t]{2,}|\\t|[ ]?$");
  private static final Pattern GRID = Pattern.compile("\\+-[-+]*+(?<=-\\+)$");
  private static final Pattern ATTRIBUTION =
      Pattern.compile("(?:---?(?!-)|\\u2014)[ \\t]*+(?=\\S)");

  private RstSyntax() {}

  /** Offset behind the mark of an item. */
  static int bullet(String file, RstLine line) {
    return end(BULLET, file, line);
  }

  /**
   * Offset behind the number of an item. A line that goes on in the next is an item only if the
   * next one counts on.
   */
  static int enumerator(String file, RstLine line, Optional<RstLine> next, boolean indented) {
    Matcher first = matcher(ENUMERATOR, file, line);
    if (!first.lookingAt() || !closes(first)) {
      return NONE;
    }
    if (next.isEmpty() || next.get().isBlank() || indented) {
      return first.end();
    }
    Matcher second = matcher(ENUMERATOR, file, next.get());
    return second.lookingAt() && counts(first, second) ? first.end() : NONE;
  }

  private static boolean closes(Matcher enumerator) {
    return enumerator.group(1).isEmpty() || enumerator.group(3).equals(")");
  }

  private static boolean counts(Matcher one, Matcher two) {
    String first = one.group(2);
    String second = two.group(2);
    boolean number = Character.isDigit(first.charAt(0));
    return one.group(1).equals(two.group(1))
        && one.group(3).equals(two.group(3))
        && (second.equals("#")
            || Character.isDigit(second.charAt(0)) == number
                && !first.equals("#")
                && (!number || Integer.parseInt(second) == Integer.parseInt(first) + 1));
  }

  /** Offset of the colon behind the name of a field. */
  static int field(String file, RstLine line) {
    int at = line.start();
    if (line.end() - at < 3 || file.charAt(at) != ':' || ": \t".indexOf(file.charAt(at + 1)) >= 0) {
      return NONE;
    }
    for (at++; at < line.end(); at++) {
      char c = file.charAt(at);
      char next = at + 1 < line.end() ? file.charAt(at + 1) : ' ';
      if (c == '\\') {
        at++;
      } else if (c == ':' && Characters.isBlank(next)) {
        return file.charAt(at - 1) == ' ' ? NONE : at;
      } else if (c == ':' && next == '`') {
        return NONE;
      }
    }
    return NONE;
  }

  /** Offset behind the options of a program and the blanks that part them from what they do. */
  static int options(String file, RstLine line) {
    Matcher option = OPTION.matcher(file);
    Matcher end = OPTION_END.matcher(file);
    int at = line.start();
    while (option.region(at, line.end()).lookingAt()) {
      if (!end.region(option.end(), line.end()).lookingAt()) {
        return NONE;
      }
      at = end.end();
      if (end.group(1) == null) {
        return at;
      }
    }
    return NONE;
  }

  /** Whether a line consists of a mark, alone or with text behind a blank. */
  static boolean isMark(String file, RstLine line, String mark) {
    int behind = line.start() + mark.length();
    return behind <= line.end()
        && file.startsWith(mark, line.start())
        && (behind == line.end() || Characters.isBlank(file.charAt(behind)));
  }

  /** Whether a line is made of one mark of punctuation, as above and below titles. */
  static boolean isAdornment(String file, RstLine line) {
    if (line.isBlank()) {
      return false;
    }
    char mark = file.charAt(line.start());
    int at = line.start();
    while (at < line.end() && file.charAt(at) == mark) {
      at++;
    }
    return at == line.end() && PUNCTUATION.indexOf(mark) >= 0;
  }

  static boolean isPunctuation(char c) {
    return PUNCTUATION.indexOf(c) >= 0;
  }

  /** Whether marks of punctuation are enough of them to part what is above from what is below. */
  static boolean isRule(RstLine adornment) {
    return adornment.span().length() >= SHORTEST_RULE;
  }

  /** Whether a line is long enough to make a title of another. */
  static boolean fits(String file, RstLine title, RstLine adornment) {
    return isRule(adornment) || title.width(file) <= adornment.span().length();
  }

  /** Whether a line begins a table that is drawn. */
  static boolean isGrid(String file, RstLine line) {
    return matcher(GRID, file, line).lookingAt();
  }

  /** Whether a line is above, below or in the midst of a table that is not drawn. */
  static boolean isBorder(String file, RstLine line) {
    return isRuns(file, line, '=', false);
  }

  /** Whether a line in such a table tells which columns the cells above share. */
  static boolean isSpanLine(String file, RstLine line) {
    return isRuns(file, line, '-', line.span().length() > 1);
  }

  private static boolean isRuns(String file, RstLine line, char mark, boolean one) {
    boolean two = one;
    for (int at = line.start(); at < line.end(); at++) {
      char c = file.charAt(at);
      two |= c != mark;
      if (c != mark && !Characters.isBlank(c)) {
        return false;
      }
    }
    return two;
  }

  /** Offset behind the dashes before the name of who is quoted. */
  static int attribution(String file, RstLine line) {
    return end(ATTRIBUTION, file, line);
  }

  /** Whether a line announces that what follows stands as it is: {@code ::} at its end. */
  static boolean announces(String file, RstLine line) {
    int at = line.end() - 2;
    if (at < line.start() || !file.startsWith("::", at)) {
      return false;
    }
    int slashes = at;
    while (slashes > line.start() && file.charAt(slashes - 1) == '\\') {
      slashes--;
    }
    return (at - slashes) % 2 == 0;
  }

  /** An announcing line without its mark; one colon stays behind a word. */
  static RstLine announced(String file, RstLine line) {
    int at = line.end() - 2;
    boolean word = at > line.start() && !Characters.isSpace(file.charAt(at - 1));
    return RstLine.of(file, line.start(), word ? at + 1 : at, line.column());
  }

  /**
   * Offset behind a name of letters and digits with single marks in between; {@code from} if none.
   */
  static int nameEnd(String file, int from, int limit) {
    int at = from;
    while (at < limit && isNameCharacter(file.charAt(at))) {
      at++;
      boolean joint = at + 1 < limit && "-._+:".indexOf(file.charAt(at)) >= 0;
      if (joint && isNameCharacter(file.charAt(at + 1))) {
        at++;
      }
    }
    return at;
  }

  private static boolean isNameCharacter(char c) {
    return Character.isLetterOrDigit(c);
  }

  private static int end(Pattern pattern, String file, RstLine line) {
    Matcher matcher = matcher(pattern, file, line);
    return matcher.lookingAt() ? matcher.end() : NONE;
  }

  private static Matcher matcher(Pattern pattern, String file, RstLine line) {
    return pattern.matcher(file).region(line.start(), line.end());
  }
}
