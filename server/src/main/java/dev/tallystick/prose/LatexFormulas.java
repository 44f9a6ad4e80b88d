package dev.tallystick.prose;

import dev.tallystick.prose.LatexToken.Kind;
import java.util.List;

/**
 * Formulas. One in a line stays in its sentence, without blanks and with its delimiters, so that a
 * letter alone is not taken for an abbreviation. Of one on lines of its own a single character
 * stays, and the mark that it ends with: it may end the sentence.
 */
final class LatexFormulas {
  private static final String ENDS = ",;:";

  private final String file;
  private final List<LatexToken> tokens;
  private final LatexLinks links;
  private final LatexFlow flow;

  LatexFormulas(String file, List<LatexToken> tokens, LatexLinks links, LatexFlow flow) {
    this.file = file;
    this.tokens = tokens;
    this.links = links;
    this.flow = flow;
  }

  /** Takes in a formula, or what is never shown; the index behind it, or the same if none is. */
  int read(int index) {
    LatexToken token = tokens.get(index);
    if (!links.isClosed(index)) {
      return index;
    }
    int close = links.close(index);
    switch (token.kind()) {
      case DOLLAR -> {
        if (token.name().length() > 1) {
          display(index, close);
        } else {
          inLine(index, close);
        }
      }
      case BEGIN -> {
        if (!LatexNames.isEnvironment(LatexNames.MATHS, token.name())) {
          return index;
        }
        display(index, close);
      }
      case COMMAND -> {
        switch (token.name()) {
          case "(" -> inLine(index, close);
          case "[" -> display(index, close);
          default -> flow.mark(token.start(), tokens.get(close).end()); // what is never shown
        }
      }
      default -> {
        return index;
      }
    }
    return close + 1;
  }

  private void inLine(int open, int close) {
    int last = last(open, close);
    boolean stops = last > open && Characters.isStop(lastCharacter(last));
    for (int i = open; i <= (stops ? last : close); i++) {
      LatexToken token = tokens.get(i);
      if (!token.is(Kind.BLANK) && !token.is(Kind.COMMENT)) {
        boolean stop = stops && i == last;
        flow.copied(token.start(), stop ? token.end() - 1 : token.end());
        flow.sign(stop ? token.end() - 1 : token.end(), token.end());
      }
    }
    flow.mark(tokens.get(open).start(), tokens.get(close).end());
  }

  private void display(int open, int close) {
    LatexToken first = tokens.get(open);
    flow.blank(first.start(), first.start() + 1, false);
    flow.copied(first.start(), first.start() + 1);
    int last = last(open, close);
    char mark = lastCharacter(last);
    if (last > open && (Characters.isStop(mark) || ENDS.indexOf(mark) >= 0)) {
      flow.sign(tokens.get(last).end() - 1, tokens.get(last).end());
    }
    LatexToken end = tokens.get(close);
    flow.mark(first.start(), end.end());
    flow.blank(end.start(), end.start() + 1, false);
  }

  /** Index of the last token that shows something. */
  private int last(int open, int close) {
    int last = close - 1;
    while (last > open && (tokens.get(last).is(Kind.BLANK) || tokens.get(last).is(Kind.COMMENT))) {
      last--;
    }
    return last;
  }

  private char lastCharacter(int index) {
    return file.charAt(tokens.get(index).end() - 1);
  }
}
