package dev.tallystick.project;

import dev.tallystick.text.Problem;
import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;

/**
 * Slips that no JSON may hold and that are plain to see: comments, and a comma behind the last
 * member of an object or a list.
 *
 * @param amended the text with a blank for each character of them, so that all places stay
 * @param problems each slip
 */
record Slips(String amended, List<Problem> problems) {
  private static final String COMMENT =
      "JSON has no comments. Take it out; until then it is passed over.";
  private static final String COMMA =
      "Nothing comes after this comma. Take it out; until then it is passed over.";

  /** Finds them. */
  static Slips in(String json) {
    Finder finder = new Finder(json);
    for (int at = 0; at < json.length(); ) {
      at = finder.next(at);
    }
    return new Slips(finder.amended.toString(), finder.problems);
  }

  /** Goes through a text. */
  private static final class Finder {
    private final String json;
    private final StringBuilder amended;
    private final List<Problem> problems = new ArrayList<>();
    private int comma = -1;

    Finder(String json) {
      this.json = json;
      this.amended = new StringBuilder(json);
    }

    /** Looks at what stands at a place; where the next thing stands. */
    int next(int at) {
      char c = json.charAt(at);
      int end = behindComment(at);
      if (end > at) {
        amend(at, end, COMMENT);
        return end;
      }
      if ((c == '}' || c == ']') && comma >= 0) {
        amend(comma, comma + 1, COMMA);
      }
      if (" \t\r\n".indexOf(c) < 0) {
        comma = c == ',' ? at : -1;
      }
      return c == '"' ? behindString(at) : at + 1;
    }

    private void amend(int from, int to, String message) {
      amended.replace(from, to, " ".repeat(to - from));
      problems.add(new Problem(new Span(from, to), message));
    }

    /** Where a comment ends, its line end left out; the place itself if none starts there. */
    private int behindComment(int at) {
      if (json.startsWith("/*", at)) {
        int end = json.indexOf("*/", at + 2);
        return end < 0 ? json.length() : end + 2;
      }
      return json.startsWith("//", at) || json.startsWith("#", at) ? lineEnd(at) : at;
    }

    private int lineEnd(int from) {
      int end = from;
      while (end < json.length() && json.charAt(end) != '\n' && json.charAt(end) != '\r') {
        end++;
      }
      return end;
    }

    /** A string without its closing mark ends with the line. */
    private int behindString(int at) {
      int lineEnd = lineEnd(at);
      for (int i = at + 1; i < lineEnd; i++) {
        if (json.charAt(i) == '\\') {
          i++;
        } else if (json.charAt(i) == '"') {
          return i + 1;
        }
      }
      return lineEnd;
    }
  }
}
