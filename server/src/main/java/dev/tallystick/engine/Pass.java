package dev.tallystick.engine;

/**
 * A look at many pairs that are not open, such as the first one at a folder, and how far it has
 * come. Those that are open are done at once, and again at each keystroke.
 */
final class Pass {
  /** Fewer pairs than these are done before anyone could read how far they are. */
  private static final int FEW = 4;

  private final Audience audience;
  private int total;
  private int done;

  Pass(Audience audience) {
    this.audience = audience;
  }

  /** So many pairs are still to be examined. */
  void left(int pairs) {
    if (total == 0 && pairs <= FEW) {
      return;
    }
    boolean more = pairs > total;
    total = Math.max(total, pairs);
    if (more || total - pairs != done) {
      done = total - pairs;
      audience.pass(done, total);
    }
    if (pairs == 0) {
      total = 0;
      done = 0;
    }
  }
}
