package dev.tallystick.align;

/** What the words of two units say. */
@FunctionalInterface
interface UnitWords {
  /** How much likelier they make each other, on the scale of likelihoods of independent words. */
  double alike(int s, int t);
}
