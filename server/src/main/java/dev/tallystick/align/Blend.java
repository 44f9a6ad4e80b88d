package dev.tallystick.align;

/** Adds up ways to one cell: the best one as a log, and all of them relative to the best. */
final class Blend {
  /** Ways this far below the best one add less than a double can hold beside it. */
  private static final double NEGLIGIBLE = -36;

  private final double[] logs;
  private final double[] weights;
  private int count;

  /** The log of the best way, or {@link Row#NOWHERE}. */
  double best;

  /** The move that the best way ends with; of equals the first added. */
  byte move;

  /** Creates one for so many ways at most. */
  Blend(int ways) {
    this.logs = new double[ways];
    this.weights = new double[ways];
    clear();
  }

  void clear() {
    count = 0;
    best = Row.NOWHERE;
    move = Row.NO_MOVE;
  }

  /** Adds a way worth {@code log}, standing for {@code weight} times that much in the sum. */
  void add(int by, double log, double weight) {
    if (log == Row.NOWHERE) {
      return;
    }
    logs[count] = log;
    weights[count++] = weight;
    if (log > best) {
      best = log;
      move = (byte) by;
    }
  }

  /** The sum of all ways, relative to the best one; 0 if there is none. */
  double sum() {
    double sum = 0;
    for (int i = 0; i < count; i++) {
      double below = logs[i] - best;
      if (below > NEGLIGIBLE) {
        sum += weights[i] * Math.exp(below);
      }
    }
    return sum;
  }
}
