package dev.tallystick.engine;

import dev.tallystick.align.Aligner;
import dev.tallystick.run.Cancellation;

/** What a worker does with the two texts of a pair. */
@FunctionalInterface
public interface Examiner {
  /** Aligns and checks. */
  Examiner ADAPTIVE =
      (source, target, draft, cancellation) ->
          PairResult.of(source, target, Aligner.ADAPTIVE, draft, cancellation);

  /**
   * A pure function of the two texts.
   *
   * @param draft whether the translation is still being written
   */
  PairResult examine(Reading source, Reading target, boolean draft, Cancellation cancellation);
}
