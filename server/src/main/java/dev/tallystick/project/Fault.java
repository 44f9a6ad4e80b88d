package dev.tallystick.project;

import dev.tallystick.text.Problem;
import dev.tallystick.text.Span;
import java.io.EOFException;
import java.io.IOException;

/**
 * A place where JSON is broken, said in words.
 *
 * @param json the text
 * @param read how much of it the parser has taken
 * @param quoted where the string starts that it is in; -1 outside of one
 */
record Fault(String json, int read, int quoted) {
  private static final String NOT_BEHIND = " What stands behind this place does not count.";

  Problem problem(IOException e) {
    if (quoted >= 0) {
      return inString();
    }
    if (e instanceof EOFException) {
      String message = "The file ends too early: a bracket or a brace is not closed.";
      return new Problem(lastWord(), message);
    }
    if (String.valueOf(e.getMessage()).startsWith("Nesting limit")) {
      String message = "Brackets and braces are nested too deep here." + NOT_BEHIND;
      return new Problem(new Span(read - 1, read), message);
    }
    return new Problem(place(), what(json.charAt(place().start())) + NOT_BEHIND);
  }

  private Problem inString() {
    int last = json.codePointBefore(read);
    boolean lineEnd = last == '\n' || last == '\r';
    int backslash = json.lastIndexOf('\\', read - 1);
    if (lineEnd || read == json.length()) {
      int end = lineEnd ? read - 1 : read;
      return new Problem(
          new Span(quoted, end), "A quotation mark is missing at the end." + NOT_BEHIND);
    }
    if (last < ' ') {
      return new Problem(
          new Span(read - 1, read), "A tab must be written as \\t in a text." + NOT_BEHIND);
    }
    int start = Math.max(quoted, backslash);
    String message =
        "This means nothing. Between folders write /; a backslash is written twice." + NOT_BEHIND;
    boolean half = read < json.length() && Character.isLowSurrogate(json.charAt(read));
    return new Problem(new Span(start, half ? read + 1 : read), message);
  }

  private static String what(char c) {
    return c == '\'' || Character.isLetter(c)
        ? "Texts stand between double quotation marks: \"...\"."
        : "This cannot stand here. Perhaps a comma, a colon or a bracket is missing before it.";
  }

  /** The word or string at which the parser gave up; it may have read a part of it. */
  private Span place() {
    int start = read - 1;
    if (Character.isLowSurrogate(json.charAt(start)) && start > 0) {
      start--;
    }
    while (start > 0 && isWord(json.charAt(start)) && isWord(json.charAt(start - 1))) {
      start--;
    }
    char c = json.charAt(start);
    int closing = c == '"' || c == '\'' ? json.indexOf(c, start + 1) : -1;
    int line = json.indexOf('\n', start);
    if (closing > 0 && (line < 0 || closing < line)) {
      return new Span(start, closing + 1);
    }
    int end = isWord(c) ? wordEnd(json, start) : json.offsetByCodePoints(start, 1);
    return new Span(start, end);
  }

  private Span lastWord() {
    int end = json.length();
    while (end > 1 && Character.isWhitespace(json.charAt(end - 1))) {
      end--;
    }
    return new Span(json.offsetByCodePoints(end, -1), end);
  }

  /** Where a number or a word without quotation marks ends. */
  static int wordEnd(String json, int from) {
    int end = from;
    while (end < json.length() && isWord(json.charAt(end))) {
      end++;
    }
    return end;
  }

  private static boolean isWord(char c) {
    return Character.isLetterOrDigit(c) || c == '-' || c == '+' || c == '.' || c == '_';
  }
}
