package dev.tallystick.align;

/**
 * How much likelier a class on the source side makes a class on the target side: a table of
 * ln(P(target class | source class) / P(target class)), from smoothed counts. Used for the way
 * sentences close and for the kind of block they stand in.
 */
final class Affinity {
  /** Counts that each class starts with. */
  private static final double SMOOTHING = 5;

  /** The part of them that a class gives to itself; the rest goes by general frequency. */
  private static final double FAITHFUL = 0.6;

  private final double[][] logRatio;

  private Affinity(double[][] logRatio) {
    this.logRatio = logRatio;
  }

  /** From counts of (source class, target class) and of target classes overall. */
  static Affinity of(double[][] counts, double[] targetCounts) {
    int classes = counts.length;
    double total = classes;
    for (double count : targetCounts) {
      total += count;
    }
    double[][] logRatio = new double[classes][classes];
    for (int source = 0; source < classes; source++) {
      double row = SMOOTHING;
      for (double count : counts[source]) {
        row += count;
      }
      for (int target = 0; target < classes; target++) {
        double general = (targetCounts[target] + 1) / total;
        double own = source == target ? FAITHFUL : 0;
        double prior = SMOOTHING * (own + (1 - FAITHFUL) * general);
        logRatio[source][target] = Math.log((counts[source][target] + prior) / row / general);
      }
    }
    return new Affinity(logRatio);
  }

  /** Natural log of the likelihood ratio. */
  double logRatio(int source, int target) {
    return logRatio[source][target];
  }
}
