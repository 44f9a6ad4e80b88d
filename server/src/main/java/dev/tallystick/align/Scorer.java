package dev.tallystick.align;

import java.util.List;

/**
 * What one link is worth, as a natural logarithm. Indices are those of the first unit of each side.
 */
interface Scorer {
  /** The two-sided links that there are. */
  List<Shape> shapes();

  /**
   * Puts the worth of each shape's link from these units on into {@code into}, from {@code at} on;
   * {@link Row#NOWHERE} where a text ends before the link does.
   */
  void links(int target, int source, double[] into, int at);

  /** Worth of leaving out a source unit. */
  double omission(int source);

  /** Worth of a target unit that stands for nothing. */
  double addition(int target);

  /** Worth of leaving out a whole block of so many source units at once. */
  double omittedBlock(int units);

  /** Worth of a whole block of so many target units that stands for nothing. */
  double addedBlock(int units);

  /**
   * Worth of ending where source units are left over, however many; {@link Row#NOWHERE} if each of
   * them has to be left out by itself.
   */
  double unfinished();
}
