package dev.tallystick.align;

/**
 * Natural logarithms as whole numbers, so that sums are exact in whatever order they come, and
 * equal where they are equal.
 */
final class Fixed {
  /** One nat. */
  static final int ONE = 1 << 13;

  /** Where no chain leads. */
  static final int NOWHERE = -(1 << 30);

  /** What is worth no more than this leads nowhere: nobody leaves out so many sentences. */
  static final int DEAD = NOWHERE / 2;

  private static final int FINE = 11;
  private static final double[] COARSE_POWERS = powers(60 * ONE >> FINE, 1 << FINE);
  private static final double[] FINE_POWERS = powers(1 << FINE, 1);

  private Fixed() {}

  /** The nearest whole number of parts. */
  static int of(double nats) {
    return nats < DEAD / ONE ? NOWHERE : (int) Math.rint(nats * ONE);
  }

  /**
   * The exponential of what is not above 0; nothing below -60 nats. From tables, since what {@link
   * Math#exp} gives may differ in the last bit from machine to machine.
   */
  static double exp(int parts) {
    int coarse = -parts >>> FINE;
    return coarse >= COARSE_POWERS.length
        ? 0
        : COARSE_POWERS[coarse] * FINE_POWERS[-parts & (1 << FINE) - 1];
  }

  private static double[] powers(int size, int step) {
    double[] powers = new double[size];
    for (int i = 0; i < size; i++) {
      powers[i] = StrictMath.exp(-(double) i * step / ONE);
    }
    return powers;
  }
}
