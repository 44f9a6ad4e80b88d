package dev.tallystick.prose;

import dev.tallystick.prose.LatexToken.Kind;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Which token closes what another one opens. A blank line closes nothing properly: what is open
 * there was never closed, so what is being written does no harm beyond its paragraph.
 */
final class LatexLinks {
  private static final int NONE = -1;

  /** What ends text that is never shown, over as many paragraphs as it takes. */
  private static final String HIDDEN_END = "fi";

  private final List<LatexToken> tokens;
  private final int[] close;
  private final int[] lineEnd;
  private final int[] blanks;

  /** The links between the tokens of a file. */
  LatexLinks(String file, List<LatexToken> tokens) {
    this.tokens = tokens;
    this.close = new int[tokens.size()];
    this.lineEnd = new int[tokens.size()];
    this.blanks = new int[tokens.size() + 1];
    Arrays.fill(close, NONE);
    linkBrackets();
    linkMaths(file);
    for (int i = 0; i < tokens.size(); i++) {
      blanks[i + 1] = blanks[i] + (tokens.get(i).is(Kind.BLANK) ? 1 : 0);
    }
  }

  /** Braces and brackets; a bracket is closed on the same depth of braces only. */
  private void linkBrackets() {
    int[] open = new int[tokens.size()];
    int depth = 0;
    for (int i = 0; i < tokens.size(); i++) {
      switch (tokens.get(i).kind()) {
        case OPEN, BRACKET -> open[depth++] = i;
        case CLOSE -> {
          while (depth > 0 && tokens.get(open[depth - 1]).is(Kind.BRACKET)) {
            depth--;
          }
          if (depth > 0) {
            close[open[--depth]] = i;
          }
        }
        case BRACKET_END -> {
          if (depth > 0 && tokens.get(open[depth - 1]).is(Kind.BRACKET)) {
            close[open[--depth]] = i;
          }
        }
        case BORDER -> depth = 0;
        default -> {}
      }
    }
  }

  /** Formulas, environments that stand inside a paragraph, and the ends of lines. */
  private void linkMaths(String file) {
    Map<String, Integer> next = new HashMap<>();
    int border = tokens.size();
    int line = tokens.size();
    int last = tokens.size();
    for (int i = tokens.size() - 1; i >= 0; i--) {
      LatexToken token = tokens.get(i);
      String opens = opens(token);
      int found = opens.isEmpty() ? last : next.getOrDefault(opens, last);
      close[i] = found < border || opens.equals(HIDDEN_END) && found < last ? found : close[i];
      String closes = closes(token);
      if (!closes.isEmpty()) {
        next.put(closes, i);
      }
      border = token.is(Kind.BORDER) ? i : border;
      line = endsLine(file, token) ? i : line;
      lineEnd[i] = line;
    }
  }

  private static String opens(LatexToken token) {
    return switch (token.kind()) {
      case DOLLAR -> token.name();
      case BEGIN -> "end " + token.name();
      case COMMAND ->
          token.name().equals("(")
              ? ")"
              : token.name().equals("[") ? "]" : token.name().equals("iffalse") ? HIDDEN_END : "";
      default -> "";
    };
  }

  private static String closes(LatexToken token) {
    return switch (token.kind()) {
      case DOLLAR, COMMAND -> token.name();
      case END -> "end " + token.name();
      default -> "";
    };
  }

  private static boolean endsLine(String file, LatexToken token) {
    return switch (token.kind()) {
      case BORDER, COMMENT -> true;
      case BLANK -> token.end() > lineBreak(file, token);
      default -> false;
    };
  }

  /** Offset of the first line end in a stretch of white space; that behind it if it has none. */
  static int lineBreak(String file, LatexToken blank) {
    int at = blank.start();
    while (at < blank.end() && !Characters.isLineEnd(file.charAt(at))) {
      at++;
    }
    return at;
  }

  /** Index of the token that closes what one opens; -1 if none does in its paragraph. */
  int close(int index) {
    return close[index];
  }

  boolean isClosed(int index) {
    return close[index] >= 0;
  }

  /** Index of the first token from one on that ends a line; their number if none does. */
  int lineEnd(int index) {
    return lineEnd[index];
  }

  /** Whether a blank parts words between two tokens. */
  boolean hasBlank(int open, int close) {
    int from = tokens.get(open + 1).is(Kind.BLANK) ? open + 2 : open + 1;
    int to = tokens.get(close - 1).is(Kind.BLANK) ? close - 1 : close;
    return from < to && blanks[to] > blanks[from];
  }
}
