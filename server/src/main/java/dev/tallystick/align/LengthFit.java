package dev.tallystick.align;

/**
 * Fits a length model to weighted pairs of lengths by maximum likelihood, for Student's t by the
 * usual reweighting: a pair far off counts less, so that a few wrong links do no harm.
 */
final class LengthFit {
  private static final double[] POWERS = {0.8, 1.1, 1.4, 1.7, 2};
  private static final double[] FREEDOMS = {2, 4, 8, 30};
  private static final int STEPS = 8;

  /** Below this weight of pairs only the spread is fitted. */
  private static final double ENOUGH = 60;

  /** So many pairs of the published spread are mixed in. */
  private static final double PRIOR = 5;

  private final double[] source;
  private final double[] target;
  private final double[] weight;
  private final double start;
  private int count;

  /** For at most {@code most} pairs; {@code start} is the ratio if there is nothing to fit. */
  LengthFit(int most, double start) {
    this.source = new double[most];
    this.target = new double[most];
    this.weight = new double[most];
    this.start = start;
  }

  /** Adds a link by its lengths and posterior; beyond the number foreseen it is left out. */
  void add(double l1, double l2, double posterior) {
    if (count < source.length) {
      source[count] = Math.max(1, l1);
      target[count] = l2;
      weight[count++] = posterior;
    }
  }

  LengthModel fit() {
    double ratio = ratio();
    double total = 0;
    for (int i = 0; i < count; i++) {
      total += weight[i];
    }
    if (total < ENOUGH) {
      return model(ratio, 1, 4);
    }
    LengthModel best = null;
    double likeliest = Double.NEGATIVE_INFINITY;
    for (double power : POWERS) {
      for (double freedom : FREEDOMS) {
        LengthModel model = model(ratio, power, freedom);
        double likelihood = likelihood(model);
        if (likelihood > likeliest) {
          likeliest = likelihood;
          best = model;
        }
      }
    }
    return best;
  }

  private double ratio() {
    double l1 = 0;
    double l2 = 0;
    for (int i = 0; i < count; i++) {
      l1 += weight[i] * source[i];
      l2 += weight[i] * target[i];
    }
    return l1 > 0 && l2 > 0 ? l2 / l1 : start;
  }

  private LengthModel model(double ratio, double power, double freedom) {
    double[] unit = new double[count];
    double typical = 0;
    double total = 0;
    for (int i = 0; i < count; i++) {
      double off = target[i] - ratio * source[i];
      unit[i] = off * off / Math.pow(source[i], power);
      typical += weight[i] * source[i];
      total += weight[i];
    }
    // The published spread holds at a power of 1 and a ratio of 1; carried over to this power it
    // gives the same deviation at the average length.
    double average = total > 0 ? typical / total : 100;
    double prior = 6.8 * ratio * ratio * Math.pow(average, 1 - power);
    double spread = prior;
    for (int step = 0; step < STEPS; step++) {
      double sum = PRIOR * prior;
      for (int i = 0; i < count; i++) {
        sum += weight[i] * (freedom + 1) / (freedom + unit[i] / spread) * unit[i];
      }
      spread = sum / (total + PRIOR);
    }
    return new LengthModel(ratio, spread, power, freedom);
  }

  private double likelihood(LengthModel model) {
    double nu = model.freedom();
    double constant = LengthTable.constant(nu);
    double sum = 0;
    for (int i = 0; i < count; i++) {
      double variance = model.variance(source[i]);
      double off = target[i] - model.ratio() * source[i];
      double tail = (nu + 1) / 2 * Math.log1p(off * off / variance / nu);
      sum += weight[i] * (constant - Math.log(variance) / 2 - tail);
    }
    return sum;
  }
}
