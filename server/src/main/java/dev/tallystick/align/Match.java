package dev.tallystick.align;

/**
 * Sentences that stand for each other, or sentences of one side that nothing stands for.
 *
 * @param sourceFrom index of the first source unit
 * @param sourceTo index behind the last one; equal to {@code sourceFrom} if there is none
 * @param targetFrom index of the first target unit
 * @param targetTo index behind the last one; equal to {@code targetFrom} if there is none
 * @param confidence posterior probability of this match, from 0 to 1
 */
public record Match(int sourceFrom, int sourceTo, int targetFrom, int targetTo, double confidence) {
  /** Number of source units. */
  public int sources() {
    return sourceTo - sourceFrom;
  }

  /** Number of target units. */
  public int targets() {
    return targetTo - targetFrom;
  }

  /** Whether both sides have something. */
  public boolean twoSided() {
    return sources() > 0 && targets() > 0;
  }
}
