package dev.tallystick.align;

/**
 * How exactly the translations of a pair begin on time, or end on time: Student's t with 4 degrees
 * of freedom around the moment that the source makes one expect, but with the share {@code stray}
 * the moment is any other, as that of a unit without a source is.
 *
 * @param spread scale of the t (seconds)
 * @param stray share of links whose moment has nothing to do with the source, from 0 to 1
 * @param free density of a moment that has nothing to do with the source (per second)
 */
record Jitter(double spread, double stray, double free) {
  static final double FREEDOM = 4;

  /** Gamma(5/2) / Gamma(2) / sqrt(4 pi). */
  private static final double PEAK = 0.375;

  /**
   * The density of a moment that follows the one before it at the target's own pace, in a Poisson
   * process: of {@code rate e^(-rate wait)} the geometric mean, {@code rate / e}, so that a long
   * silence proves no more than a short one.
   *
   * @param median the wait that half of them keep below (seconds)
   */
  static double free(double median) {
    return Math.log(2) / median / Math.E;
  }

  Jitter with(double newSpread, double newStray) {
    return new Jitter(newSpread, newStray, free);
  }

  /** The log of how much likelier the source makes a moment so far off (seconds). */
  double logRatio(double off) {
    return Math.log(stray + timely(off));
  }

  /** How probable it is that a moment so far off comes from the source. */
  double share(double off) {
    double timely = timely(off);
    return timely / (timely + stray);
  }

  /** What t gives this distance in the estimate of its spread. */
  double weight(double off) {
    double z = off / spread;
    return (FREEDOM + 1) / (FREEDOM + z * z);
  }

  private double timely(double off) {
    double z = off / spread;
    double tail = 1 + z * z / FREEDOM;
    double density = PEAK / spread / (tail * tail * Math.sqrt(tail));
    return (1 - stray) * density / free;
  }
}
