package dev.tallystick.engine;

import dev.tallystick.align.Aligner;
import dev.tallystick.run.Cancellation;

/** What a worker does with the two texts of a pair. */
@FunctionalInterface
public interface Examiner {
  /** Aligns and checks a translation that is still being written. */
  Examiner DRAFT =
      (source, target, cancellation) ->
          PairResult.of(source, target, Aligner.ADAPTIVE, true, cancellation);

  /** A pure function of the two texts. */
  PairResult examine(Reading source, Reading target, Cancellation cancellation);
}
