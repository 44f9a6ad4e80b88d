package dev.tallystick.align;

/**
 * How long the sentences of a text are, whatever they translate: log-normal. A link is worth what
 * its source says about the target's length beyond this; a null move, which says nothing, is worth
 * nothing more than its share.
 */
final class Background {
  private static final double LEAST_VARIANCE = 0.05;

  private final double[] logBefore;

  Background(Side side) {
    double sum = 0;
    double squares = 0;
    for (Unit unit : side.units) {
      double log = log(unit);
      sum += log;
      squares += log * log;
    }
    int n = Math.max(1, side.size());
    double mean = sum / n;
    double variance = Math.max(LEAST_VARIANCE, squares / n - mean * mean);
    this.logBefore = new double[side.size() + 1];
    for (int i = 0; i < side.size(); i++) {
      double log = log(side.units[i]);
      double density =
          -log
              - 0.5 * Math.log(2 * Math.PI * variance)
              - (log - mean) * (log - mean) / 2 / variance;
      logBefore[i + 1] = logBefore[i] + density;
    }
  }

  /** Natural log of the density of the lengths of these units. */
  double logDensity(int from, int to) {
    return logBefore[to] - logBefore[from];
  }

  private static double log(Unit unit) {
    return Math.log(Math.max(1, unit.length()));
  }
}
