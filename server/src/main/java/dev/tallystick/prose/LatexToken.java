package dev.tallystick.prose;

/**
 * A stretch of a LaTeX file that is read as one.
 *
 * @param kind what it is
 * @param start offset of its first character
 * @param end offset behind it
 * @param name of a command (without its backslash and star), an environment or a delimiter; what
 *     stands between the delimiters of code; else empty
 */
record LatexToken(Kind kind, int start, int end, String name) {
  /** What a token is. */
  enum Kind {
    /** Characters that stand for themselves. */
    TEXT,
    /** White space inside a paragraph. */
    BLANK,
    /** White space with a blank line: a border of paragraphs. */
    BORDER,
    /** A comment, with the end of its line and the indent of the next one, which TeX drops too. */
    COMMENT,
    /** A command, without what it is given. */
    COMMAND,
    /** An opening brace. */
    OPEN,
    /** A closing brace. */
    CLOSE,
    /** An opening bracket. */
    BRACKET,
    /** A closing bracket. */
    BRACKET_END,
    /** What parts the cells of a row. */
    CELL,
    /** What opens or closes a formula: one or two dollars. */
    DOLLAR,
    /** The begin of an environment, without what it is given. */
    BEGIN,
    /** The end of one. */
    END,
    /** Code in a line. */
    CODE,
    /** A whole environment that is copied as it stands. */
    VERBATIM
  }

  boolean is(Kind wanted) {
    return kind == wanted;
  }

  boolean is(Kind wanted, String wantedName) {
    return kind == wanted && name.equals(wantedName);
  }
}
