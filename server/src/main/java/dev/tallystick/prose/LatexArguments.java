package dev.tallystick.prose;

import dev.tallystick.prose.LatexToken.Kind;
import java.util.List;
import java.util.regex.Pattern;

/** What LaTeX commands are given: where it ends, and whether it is prose. */
final class LatexArguments {
  /** When a slide shows something: {@code <2->}. */
  private static final Pattern OVERLAY = Pattern.compile("<[-+\\d,|.@:a-z]*>");

  private static final Pattern LENGTH =
      Pattern.compile("=?-?\\d*\\.?\\d+(?:pt|em|ex|cm|mm|in|pc|bp|sp|fill?)?");
  private static final Pattern WORD = Pattern.compile("\\p{L}[-\\p{L}\\d'.,/+]*");
  private static final Pattern UNIT = Pattern.compile("=.*|.*[a-z]");
  private static final Pattern TRIM_START = Pattern.compile("\\([lr]+");
  private static final Pattern TRIM_GOES_ON = Pattern.compile("[lr]+");
  private static final Pattern TRIM_END = Pattern.compile("[lr]*\\)");
  private static final Pattern TRIM = Pattern.compile("\\([lr\\d.]*\\)");

  private final String file;
  private final List<LatexToken> tokens;
  private final LatexLinks links;

  LatexArguments(String file, List<LatexToken> tokens, LatexLinks links) {
    this.file = file;
    this.tokens = tokens;
    this.links = links;
  }

  /** Index behind the options at an index, and behind comments. */
  int behindOptions(int from) {
    int next = behindComments(from);
    while (is(Kind.BRACKET, next) && links.isClosed(next) || matches(OVERLAY, next)) {
      next = is(Kind.BRACKET, next) ? links.close(next) + 1 : next + 1;
      next = behindComments(next);
    }
    return next;
  }

  /** Index behind what says when a slide shows an item. */
  int behindOverlay(int from) {
    return matches(OVERLAY, from) ? from + 1 : from;
  }

  private int behindComments(int from) {
    int next = from;
    while (is(Kind.COMMENT, next)) {
      next++;
    }
    return next;
  }

  /** Index of what stands at an index, or behind the blank there. */
  int behindBlank(int from) {
    int next = behindComments(from);
    return is(Kind.BLANK, next) ? behindComments(next + 1) : next;
  }

  /** Index behind a group in braces; one that is never closed has one word. */
  int behindGroup(int open) {
    if (links.isClosed(open)) {
      return links.close(open) + 1;
    }
    int next = open + 1;
    while (next < tokens.size()
        && !is(Kind.BLANK, next)
        && !is(Kind.BORDER, next)
        && !is(Kind.COMMENT, next)) {
      next++;
    }
    return next;
  }

  /** Index behind all that a command takes which shows nothing. */
  int behindSilent(int from) {
    int next = from;
    while (true) {
      next = behindOptions(next);
      if (is(Kind.OPEN, next)) {
        next = behindGroup(next);
      } else if (matches(TRIM, next) || matches(LENGTH, next)) {
        next++;
      } else if (matches(TRIM_START, next) && is(Kind.OPEN, next + 1)) {
        next = behindTrim(next + 1);
      } else {
        return next == from ? behindLength(from) : next;
      }
    }
  }

  /** Behind how a rule is trimmed by lengths in braces: {@code (l{2pt}r)}. */
  private int behindTrim(int from) {
    int next = from;
    while (is(Kind.OPEN, next) || matches(TRIM_GOES_ON, next)) {
      next = is(Kind.OPEN, next) ? behindGroup(next) : next + 1;
    }
    return matches(TRIM_END, next) ? next + 1 : next;
  }

  /** Behind a length with a blank before it, as in {@code \vskip 3pt}. */
  private int behindLength(int from) {
    int next = behindBlank(from);
    return matches(LENGTH, next) && matches(UNIT, next) ? next + 1 : from;
  }

  /** Index behind what defines a command. */
  int behindDefinition(int from) {
    int next = from;
    while (true) {
      next = behindOptions(next);
      if (is(Kind.OPEN, next)) {
        next = behindGroup(next);
      } else if (is(Kind.COMMAND, next) || isParameter(next)) {
        next++;
      } else {
        return next;
      }
    }
  }

  private boolean isParameter(int index) {
    if (!is(Kind.TEXT, index)) {
      return false;
    }
    char c = file.charAt(tokens.get(index).start());
    return c == '#' || c == '=';
  }

  /** Index behind the space that a new line asks for. */
  int behindSpacing(int from) {
    boolean length =
        is(Kind.BRACKET, from)
            && links.isClosed(from)
            && (is(Kind.COMMAND, from + 1) || matches(LENGTH, from + 1));
    return length ? links.close(from) + 1 : from;
  }

  boolean isEmpty(int open) {
    return links.close(open) == open + 1;
  }

  /**
   * Whether what an unknown command is given is prose: words parted by blanks, or where text has
   * come before, a single word.
   *
   * @param inText whether text has come before
   */
  boolean isProse(int open, boolean inText) {
    int close = links.close(open);
    if (close == open + 1) {
      return false;
    }
    if (close < 0) {
      return true;
    }
    if (links.hasBlank(open, close)) {
      return !is(Kind.TEXT, open + 1) || text(open + 1).indexOf('=') < 0;
    }
    return close == open + 2 && is(Kind.TEXT, open + 1) && isWord(text(open + 1), inText);
  }

  /** Keys are of ASCII and often have a colon or an underscore. */
  private static boolean isWord(String text, boolean inText) {
    return text.codePoints().anyMatch(c -> c > 0x7F && Character.isLetter(c))
        || inText && WORD.matcher(text).matches();
  }

  /** Whether text goes on on the same line behind a group. */
  boolean goesOn(int open) {
    int next = links.close(open) + 1;
    boolean blank = is(Kind.BLANK, next) && links.lineEnd(next) > next;
    return is(Kind.TEXT, next) || is(Kind.CLOSE, next) || blank && is(Kind.TEXT, next + 1);
  }

  /** Whether a token is there and is of a kind. */
  boolean is(Kind kind, int index) {
    return index < tokens.size() && tokens.get(index).is(kind);
  }

  private boolean matches(Pattern pattern, int index) {
    return is(Kind.TEXT, index) && pattern.matcher(text(index)).matches();
  }

  private String text(int index) {
    return file.substring(tokens.get(index).start(), tokens.get(index).end());
  }
}
