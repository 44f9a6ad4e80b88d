package dev.tallystick.segment;

import dev.tallystick.text.Span;

/** White space in the sense of all scripts, the byte-order mark included. */
final class Blank {
  private Blank() {}

  static boolean is(char c) {
    return c <= ' '
        || c > 0x7F && (Character.isWhitespace(c) || Character.isSpaceChar(c) || c == '\uFEFF');
  }

  /** The stretch without the white space at either end; empty if there is nothing else. */
  static Span trim(CharSequence text, int start, int end) {
    int from = start;
    int to = end;
    while (from < to && is(text.charAt(from))) {
      from++;
    }
    while (to > from && is(text.charAt(to - 1))) {
      to--;
    }
    return new Span(from, to);
  }
}
