package dev.tallystick.prose;

import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.Deque;
import java.util.HashMap;
import java.util.Map;

/** Where the ends of marks are, found once for all so that reading takes linear time. */
final class AsciiDocBrackets {
  private final String prose;
  private final int[] wordEnds;
  private final int[] closes;
  private final int[] partners;
  private final Map<String, Integer> found = new HashMap<>();
  private int plus;

  /** Looks through a block whose last character is a line end. */
  AsciiDocBrackets(String prose) {
    this.prose = prose;
    int length = prose.length();
    wordEnds = new int[length + 1];
    closes = new int[length + 1];
    partners = new int[length + 1];
    Arrays.fill(partners, -1);
    wordEnds[length] = length - 1;
    closes[length] = -1;
    for (int i = length - 1; i >= 0; i--) {
      char c = prose.charAt(i);
      boolean escaped = i > 0 && prose.charAt(i - 1) == '\\';
      wordEnds[i] = c == '[' || c == ']' || Characters.isSpace(c) ? i : wordEnds[i + 1];
      closes[i] = c == ']' && !escaped ? i : closes[i + 1];
    }
    pairUp();
  }

  private void pairUp() {
    Deque<Integer> open = new ArrayDeque<>();
    for (int i = 0; i < prose.length(); i++) {
      char c = prose.charAt(i);
      if (c == '\\') {
        i++;
      } else if (c == '[') {
        open.push(i);
      } else if (c == ']' && !open.isEmpty()) {
        partners[open.peek()] = i;
        partners[i] = open.pop();
      }
    }
  }

  /** Offset of the first blank or bracket from an offset on. */
  int wordEnd(int from) {
    return wordEnds[from];
  }

  /** Offset of the first closing bracket from an offset on; -1 if there is none. */
  int close(int from) {
    return closes[from];
  }

  /** Offset of the bracket that belongs to this one, in either direction; -1 if none does. */
  int balanced(int bracket) {
    return partners[bracket];
  }

  /** Offset of the next such mark; the offsets asked for a mark must rise. -1 if there is none. */
  int next(String mark, int from) {
    int at = found.getOrDefault(mark, 0);
    if (at >= 0 && (at < from || !prose.startsWith(mark, at))) {
      at = prose.indexOf(mark, from);
      found.put(mark, at);
    }
    return at;
  }

  /** Offset of the plus signs that close those at an offset; -1 if none do. */
  int closingPlus(int at, int count) {
    if (count > 1) {
      return next("+".repeat(count), at + count);
    }
    char before = at == 0 ? ' ' : prose.charAt(at - 1);
    if (isWord(before) || before == ';' || before == ':' || isBlank(at + 1)) {
      return -1;
    }
    plus = Math.max(plus, at + 2);
    while (plus < prose.length() && !closesPlus(plus)) {
      plus++;
    }
    return plus < prose.length() ? plus : -1;
  }

  private boolean closesPlus(int i) {
    return prose.charAt(i) == '+' && !isBlank(i - 1) && !isWord(prose.charAt(i + 1));
  }

  private boolean isBlank(int i) {
    return Characters.isSpace(prose.charAt(i));
  }

  static boolean isWord(char c) {
    return c == '_' || Character.isLetterOrDigit(c);
  }
}
