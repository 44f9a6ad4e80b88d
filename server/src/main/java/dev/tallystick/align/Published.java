package dev.tallystick.align;

import java.util.List;
import org.apache.commons.math3.special.Erf;

/**
 * The model of Gale and Church, "A Program for Aligning Sentences in Bilingual Corpora",
 * Computational Linguistics 19(1), 1993: the cost of a link is {@code -log P(delta | match) - log
 * P(type)}, delta the length difference in standard deviations. It is the reference that the
 * adaptive model is measured against; a dropped sentence it never finds, since it charges the
 * missing length to the empty side too.
 *
 * <p>Delta is taken over the mean of both lengths, the form of the paper's own program (its listing
 * from memory, as in the checked values of the tests), so that an empty side is defined.
 */
final class Published implements Scorer {
  /** Target characters for one source character; the paper's program uses 1. */
  static final double RATIO = 1;

  /** Variance of the target length at one character (section 4). */
  static final double SPREAD = 6.8;

  /** Beyond so many deviations the tail is taken from its series: doubles end at 38. */
  private static final double FAR = 30;

  /** Table 5, unsplit: each of two mirrored types is given the share of both together. */
  private static final double NULL_SHARE = 0.0099;

  private static final List<Shape> SHAPES =
      List.of(
          new Shape(1, 1, 0.89),
          new Shape(2, 1, 0.089),
          new Shape(1, 2, 0.089),
          new Shape(2, 2, 0.011));

  private final int[] source;
  private final int[] target;

  /** Takes the sums of lengths before each unit of either side. */
  Published(int[] sourceSums, int[] targetSums) {
    this.source = sourceSums;
    this.target = targetSums;
  }

  /** Length difference in standard deviations; 0 if both are empty. */
  static double delta(double l1, double l2, double ratio, double spread) {
    double mean = (l1 + l2 / ratio) / 2;
    return mean == 0 ? 0 : (l2 - ratio * l1) / Math.sqrt(spread * mean);
  }

  /**
   * Natural log of the probability of a difference at least this large. By the complementary error
   * function: one minus the distribution function has no digits left from 8 deviations on.
   */
  static double logProbability(double delta) {
    double z = Math.abs(delta);
    return z < FAR ? Math.log(Erf.erfc(z / Math.sqrt(2))) : logTail(z);
  }

  /** The asymptotic series of both tails of the normal distribution. */
  private static double logTail(double z) {
    double square = z * z;
    double series = Math.log1p((-1 + 3 / square) / square);
    return Math.log(2) - square / 2 - Math.log(z * Math.sqrt(2 * Math.PI)) + series;
  }

  /** Cost of a link in natural logs; {@code share} is that of its type. */
  static double cost(double l1, double l2, double share) {
    return -logProbability(delta(l1, l2, RATIO, SPREAD)) - Math.log(share);
  }

  @Override
  public List<Shape> shapes() {
    return SHAPES;
  }

  @Override
  public void links(int targetAt, int sourceAt, double[] into, int at) {
    for (int shape = 0; shape < SHAPES.size(); shape++) {
      Shape taken = SHAPES.get(shape);
      int sourceEnd = sourceAt + taken.sources();
      int targetEnd = targetAt + taken.targets();
      if (sourceEnd < source.length && targetEnd < target.length) {
        int l1 = source[sourceEnd] - source[sourceAt];
        int l2 = target[targetEnd] - target[targetAt];
        into[at + shape] = -cost(l1, l2, taken.share());
      } else {
        into[at + shape] = Row.NOWHERE;
      }
    }
  }

  @Override
  public double omission(int at) {
    return -cost(source[at + 1] - source[at], 0, NULL_SHARE);
  }

  @Override
  public double addition(int at) {
    return -cost(0, target[at + 1] - target[at], NULL_SHARE);
  }

  /** The published model knows no blocks. */
  @Override
  public double omittedBlock(int units) {
    return Row.NOWHERE;
  }

  @Override
  public double addedBlock(int units) {
    return Row.NOWHERE;
  }

  /** The published model has no free end: what is left over is worth all its omissions. */
  @Override
  public double unfinished() {
    return Row.NOWHERE;
  }
}
