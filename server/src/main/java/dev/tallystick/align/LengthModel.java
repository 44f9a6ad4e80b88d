package dev.tallystick.align;

/**
 * How long the translation of a text is: Student's t around {@code ratio * l1} with a variance of
 * {@code spread * l1^power}. With a power of 1 and endless freedom it is the normal model of Gale
 * and Church (1993).
 *
 * @param ratio target characters for one source character
 * @param spread variance of the target length at one source character
 * @param power how the variance grows with the source length
 * @param freedom degrees of freedom of the tails
 */
public record LengthModel(double ratio, double spread, double power, double freedom) {
  /** The published spread, before anything is known of a pair (Gale and Church 1993, section 4). */
  static LengthModel start(double ratio) {
    return new LengthModel(ratio, 6.8, 1, 4);
  }

  /** Expected target length for a source length, in characters. */
  public double expected(double source) {
    return ratio * source;
  }

  /** Standard deviation of the target length for a source length, in characters. */
  public double deviation(double source) {
    return Math.sqrt(variance(source));
  }

  /** The same with so many degrees of freedom at least. */
  LengthModel withFreedom(double least) {
    return new LengthModel(ratio, spread, power, Math.max(least, freedom));
  }

  double variance(double source) {
    return spread * Math.pow(Math.max(source, 1), power);
  }
}
