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
    if (total() < ENOUGH) {
      return new Scaled(ratio, 1).model(4);
    }
    LengthModel best = null;
    double likeliest = Double.NEGATIVE_INFINITY;
    for (double power : POWERS) {
      Scaled scaled = new Scaled(ratio, power);
      for (double freedom : FREEDOMS) {
        LengthModel model = scaled.model(freedom);
        double likelihood = scaled.likelihood(model);
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

  private double total() {
    double total = 0;
    for (int i = 0; i < count; i++) {
      total += weight[i];
    }
    return total;
  }

  /** The pairs as they look if the variance grows with one power of the source length. */
  private final class Scaled {
    private final double ratio;
    private final double power;
    private final double total = total();

    /** For each pair the square of its error, over the power of its source length. */
    private final double[] errors = new double[count];

    /** Weighted sum of the logs of that power. */
    private final double logs;

    Scaled(double ratio, double power) {
      this.ratio = ratio;
      this.power = power;
      double sum = 0;
      for (int i = 0; i < count; i++) {
        double off = target[i] - ratio * source[i];
        double log = power * Math.log(source[i]);
        errors[i] = off * off * Math.exp(-log);
        sum += weight[i] * log;
      }
      this.logs = sum;
    }

    LengthModel model(double freedom) {
      double prior = prior();
      double spread = prior;
      for (int step = 0; step < STEPS; step++) {
        double sum = PRIOR * prior;
        for (int i = 0; i < count; i++) {
          sum += weight[i] * (freedom + 1) / (freedom + errors[i] / spread) * errors[i];
        }
        spread = sum / (total + PRIOR);
      }
      return new LengthModel(ratio, spread, power, freedom);
    }

    /**
     * The published spread holds at a power of 1 and a ratio of 1; carried over to this power it
     * gives the same deviation at the average length.
     */
    private double prior() {
      double typical = 0;
      for (int i = 0; i < count; i++) {
        typical += weight[i] * source[i];
      }
      double average = total > 0 ? typical / total : 100;
      return 6.8 * ratio * ratio * Math.pow(average, 1 - power);
    }

    double likelihood(LengthModel model) {
      double nu = model.freedom();
      double scale = 1 / (model.spread() * nu);
      double tails = 0;
      for (int i = 0; i < count; i++) {
        tails += weight[i] * Math.log(1 + errors[i] * scale);
      }
      double peaks = total * (LengthTable.constant(nu) - Math.log(model.spread()) / 2) - logs / 2;
      return peaks - (nu + 1) / 2 * tails;
    }
  }
}
