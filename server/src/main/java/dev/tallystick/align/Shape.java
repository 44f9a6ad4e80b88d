package dev.tallystick.align;

import java.util.List;

/**
 * How many sentences of each side a two-sided link ties together, with the share of such links.
 *
 * @param sources number of source sentences, at least 1
 * @param targets number of target sentences, at least 1
 * @param share share among all links, before anything is known of a pair
 */
record Shape(int sources, int targets, double share) {
  /** The most sentences that a link has on one side. */
  static final int MOST = 6;

  /** So many shapes at the start of the list are the common ones. */
  static final int COMMON = 6;

  /**
   * The shapes of the adaptive model. The shares of 1-1, 2-1 and 2-2 lie near those of Gale and
   * Church (1993), table 5; the rest are our own.
   */
  static final List<Shape> ADAPTIVE =
      List.of(
          new Shape(1, 1, 0.89),
          new Shape(2, 1, 0.03),
          new Shape(1, 2, 0.03),
          new Shape(2, 2, 0.01),
          new Shape(3, 1, 0.006),
          new Shape(1, 3, 0.006),
          new Shape(3, 2, 0.003),
          new Shape(2, 3, 0.003),
          new Shape(4, 1, 0.002),
          new Shape(1, 4, 0.002),
          new Shape(5, 1, 0.001),
          new Shape(1, 5, 0.001),
          new Shape(6, 1, 0.0005),
          new Shape(1, 6, 0.0005));
}
