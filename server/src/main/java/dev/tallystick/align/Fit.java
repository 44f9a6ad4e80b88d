package dev.tallystick.align;

/**
 * The parameters of one pair.
 *
 * @param lengths how long a translation is
 * @param logShares natural log of the share of each two-sided shape, as in {@link Shape#ADAPTIVE}
 * @param closes how the closing marks of both sides go together
 * @param kinds how the kinds of block of both sides go together
 * @param clock when a translation is on the screen; null where the times say nothing
 */
record Fit(LengthModel lengths, double[] logShares, Affinity closes, Affinity kinds, Clock clock) {
  /** What is assumed before anything is known but the ratio of lengths. */
  static Fit start(double ratio, Sides sides) {
    Side target = sides.target();
    return new Fit(
        LengthModel.start(ratio),
        Shape.ADAPTIVE.stream().mapToDouble(shape -> Math.log(shape.share())).toArray(),
        Affinity.of(new double[Unit.CLOSES][Unit.CLOSES], closes(target)),
        Affinity.of(new double[Unit.KINDS][Unit.KINDS], kinds(target)),
        sides.timed() ? ClockSearch.byTimes(sides) : null);
  }

  double logShare(int shape) {
    return logShares[shape];
  }

  static double[] closes(Side side) {
    double[] counts = new double[Unit.CLOSES];
    for (Unit unit : side.units) {
      counts[unit.close()]++;
    }
    return counts;
  }

  static double[] kinds(Side side) {
    double[] counts = new double[Unit.KINDS];
    for (Unit unit : side.units) {
      counts[unit.kind()]++;
    }
    return counts;
  }
}
