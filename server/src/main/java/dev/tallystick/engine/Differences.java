package dev.tallystick.engine;

import dev.tallystick.text.Edit;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;

/** What happened between two states of a text, seen as one edit. */
final class Differences {
  private Differences() {}

  /** The shortest single replacement that makes {@code after} of {@code before}. */
  static Edit between(Text before, Text after) {
    String a = before.string();
    String b = after.string();
    int most = Math.min(a.length(), b.length());
    int same = 0;
    while (same < most && a.charAt(same) == b.charAt(same)) {
      same++;
    }
    int tail = 0;
    while (tail < most - same
        && a.charAt(a.length() - 1 - tail) == b.charAt(b.length() - 1 - tail)) {
      tail++;
    }
    Span gone = new Span(same, a.length() - tail);
    return new Edit(gone, b.substring(same, b.length() - tail));
  }
}
