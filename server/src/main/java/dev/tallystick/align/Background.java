package dev.tallystick.align;

/**
 * How long the sentences of a text are, whatever they translate: log-normal. A link is worth what
 * its source says about the target's length beyond this; a null move, which says nothing, is worth
 * nothing more than its share.
 */
final class Background {
  private static final double LEAST_VARIANCE = 0.05;

  /** Lengths beyond the table are computed. */
  private static final int LONGEST = 1024;

  private final Side side;
  private final double mean;
  private final double variance;
  private final double[] densities;

  /** Learns from a text, and judges it. */
  Background(Side side) {
    double sum = 0;
    double squares = 0;
    for (Unit unit : side.units) {
      double log = Math.log(Math.max(1, unit.length()));
      sum += log;
      squares += log * log;
    }
    int n = Math.max(1, side.size());
    this.side = side;
    this.mean = sum / n;
    this.variance = Math.max(LEAST_VARIANCE, squares / n - mean * mean);
    this.densities = new double[LONGEST];
    for (int length = 0; length < LONGEST; length++) {
      densities[length] = computed(length);
    }
  }

  private Background(Side side, Background learnt) {
    this.side = side;
    this.mean = learnt.mean;
    this.variance = learnt.variance;
    this.densities = learnt.densities;
  }

  /** What was learnt, to judge another text by. */
  Background of(Side other) {
    return new Background(other, this);
  }

  /** Natural log of the density of the lengths of these units. */
  double logDensity(int from, int to) {
    double sum = 0;
    for (int unit = from; unit < to; unit++) {
      int length = side.units[unit].length();
      sum += length < LONGEST ? densities[length] : computed(length);
    }
    return sum;
  }

  private double computed(int length) {
    double log = Math.log(Math.max(1, length));
    double off = log - mean;
    return -log - 0.5 * Math.log(2 * Math.PI * variance) - off * off / 2 / variance;
  }
}
