package dev.tallystick.prose;

/** One tag or one expression of MDX while its characters are read. */
final class MdxMark {
  private static final char NONE = 0;

  private int length;
  private boolean tag;
  private boolean comment;
  private boolean escaped;
  private char quote = NONE;
  private char before = NONE;
  private int braces;

  /** How far a mark has come. */
  enum State {
    /** It goes on. */
    OPEN,
    /** It is complete. */
    CLOSED,
    /** There is none. */
    NOTHING
  }

  /** Takes the next character; the first one is {@code <} or an opening brace. */
  State take(char c) {
    State state = length++ == 0 ? begin(c) : tag && length == 2 ? beginTag(c) : goOn(c);
    before = c;
    return state;
  }

  private State begin(char c) {
    tag = c == '<';
    braces = tag ? 0 : 1;
    return State.OPEN;
  }

  private static State beginTag(char c) {
    if (c == '>') {
      return State.CLOSED;
    }
    boolean name = Character.isLetter(c) || c == '_' || c == '$' || c == '/';
    return name ? State.OPEN : State.NOTHING;
  }

  private State goOn(char c) {
    if (comment) {
      comment = !(before == '*' && c == '/');
    } else if (quote != NONE) {
      readQuoted(c);
    } else if (braces == 0) {
      return readTag(c);
    } else {
      return readExpression(c);
    }
    return State.OPEN;
  }

  private void readQuoted(char c) {
    if (escaped) {
      escaped = false;
    } else if (c == '\\' && braces > 0) {
      escaped = true;
    } else if (c == quote) {
      quote = NONE;
    }
  }

  private State readTag(char c) {
    switch (c) {
      case '"', '\'' -> quote = c;
      case '{' -> braces = 1;
      case '>' -> {
        return State.CLOSED;
      }
      case '<' -> {
        return State.NOTHING;
      }
      default -> {
        // A name, a blank, an equals sign.
      }
    }
    return State.OPEN;
  }

  private State readExpression(char c) {
    switch (c) {
      case '"', '\'', '`' -> quote = c;
      case '{' -> braces++;
      case '}' -> {
        return --braces > 0 || tag ? State.OPEN : State.CLOSED;
      }
      case '*' -> comment = before == '/';
      default -> {
        // Whatever it says.
      }
    }
    return State.OPEN;
  }
}
