package dev.tallystick.align;

/**
 * A length model, tabulated: what a link needs of it costs a few array reads. Lengths beyond the
 * tables are computed.
 */
final class LengthTable {
  private static final int LONGEST = 1024;
  private static final int STEPS = 32;
  private static final int FARTHEST = 32;
  private static final double[] LOG = logs();

  private final LengthModel model;
  private final double constant;
  private final double[] deviation = new double[LONGEST];
  private final double[] logDeviation = new double[LONGEST];
  private final double[] kernel = new double[FARTHEST * STEPS + 2];

  LengthTable(LengthModel model) {
    this.model = model;
    this.constant = constant(model.freedom());
    for (int l = 0; l < LONGEST; l++) {
      deviation[l] = model.deviation(l);
      logDeviation[l] = Math.log(deviation[l]);
    }
    for (int z = 0; z < kernel.length; z++) {
      kernel[z] = tail((double) z / STEPS);
    }
  }

  /** Natural log of the density of a target length, given the source length. */
  double logDensity(int source, int target) {
    double sd = source < LONGEST ? deviation[source] : model.deviation(source);
    double logSd = source < LONGEST ? logDeviation[source] : Math.log(sd);
    double z = Math.abs(target - model.ratio() * source) / sd;
    double shape = z < FARTHEST ? between(z * STEPS) : tail(z);
    return constant - logSd + shape;
  }

  /**
   * Natural log of the factor that makes the area under Student's t one, for whole degrees of
   * freedom: Gamma((nu+1)/2) / Gamma(nu/2) / sqrt(nu pi). The ratio of gamma functions follows from
   * ratio(1) = 1 / sqrt(pi) and ratio(nu) ratio(nu+1) = nu / 2.
   */
  static double constant(double freedom) {
    double ratio = 1 / Math.sqrt(Math.PI);
    for (int nu = 1; nu < freedom; nu++) {
      ratio = nu / 2.0 / ratio;
    }
    return Math.log(ratio / Math.sqrt(freedom * Math.PI));
  }

  /** Natural log of a length; that of 2 for shorter ones. */
  static double log(int length) {
    return length < LONGEST ? LOG[length] : Math.log(length);
  }

  private double between(double at) {
    int step = (int) at;
    double part = at - step;
    return kernel[step] + part * (kernel[step + 1] - kernel[step]);
  }

  private double tail(double z) {
    double nu = model.freedom();
    return -(nu + 1) / 2 * Math.log(1 + z * z / nu);
  }

  private static double[] logs() {
    double[] logs = new double[LONGEST];
    for (int l = 0; l < LONGEST; l++) {
      logs[l] = Math.log(Math.max(l, 2));
    }
    return logs;
  }
}
