package dev.tallystick.check;

import java.util.Arrays;

/** How sure a finding over several sentences is. */
final class Confidence {
  private Confidence() {}

  /** The mean of the posteriors of a run's sentences. */
  static double of(double[] posteriors, Run run) {
    return Arrays.stream(posteriors, run.from(), run.to()).average().orElse(0);
  }
}
