package dev.tallystick.engine;

import dev.tallystick.align.Judgement;
import dev.tallystick.run.Cancellation;
import java.util.Optional;

/** What a worker does with the two texts of a pair. */
@FunctionalInterface
public interface Examiner {
  /** Aligns and checks. */
  Examiner ADAPTIVE =
      (source, target, draft, known, cancellation) -> {
        Judgement judgement =
            known
                .filter(before -> before.suits(source.units(), target.units()))
                .map(before -> before.of(source.units(), target.units(), cancellation))
                .orElseGet(() -> Judgement.learnt(source.units(), target.units(), cancellation));
        return PairResult.of(source, target, judgement, draft);
      };

  /**
   * A pure function of the two texts, and of those that what is known was learnt from.
   *
   * @param draft whether the translation is still being written
   * @param known what an earlier state of the texts has taught; empty if these are to be learnt
   *     from, which takes longer
   */
  PairResult examine(
      Reading source,
      Reading target,
      boolean draft,
      Optional<Judgement> known,
      Cancellation cancellation);
}
