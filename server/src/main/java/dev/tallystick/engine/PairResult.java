package dev.tallystick.engine;

import dev.tallystick.align.Aligner;
import dev.tallystick.align.Alignment;
import dev.tallystick.align.Judgement;
import dev.tallystick.check.Checks;
import dev.tallystick.check.Finding;
import dev.tallystick.check.Levels;
import dev.tallystick.check.OnSide;
import dev.tallystick.check.Pending;
import dev.tallystick.check.Progress;
import dev.tallystick.check.Subject;
import dev.tallystick.check.Vigilance;
import dev.tallystick.pairing.Language;
import dev.tallystick.run.Cancellation;
import java.util.List;
import java.util.Optional;

/**
 * All that is known of a pair of texts.
 *
 * @param source the source, read
 * @param target the translation, read
 * @param alignment which sentences stand for which
 * @param findings what is worth telling, the source's first
 * @param pending which source sentences nobody has got to yet
 * @param progress how far the translation has come
 * @param judgement what the alignment was judged by, to judge later states of the texts by; empty
 *     if nobody will ask
 */
public record PairResult(
    Reading source,
    Reading target,
    Alignment alignment,
    List<Finding> findings,
    Pending pending,
    Progress progress,
    Optional<Judgement> judgement) {
  /** The language that the text on a side was read in. */
  public Language language(OnSide side) {
    return new Language(reading(side).language());
  }

  /**
   * Aligns and checks: a pure function of its arguments.
   *
   * @param draft whether the translation is still being written
   */
  public static PairResult of(
      Reading source, Reading target, Aligner aligner, boolean draft, Cancellation cancellation) {
    Alignment alignment = aligner.align(source.units(), target.units(), cancellation);
    return of(source, target, alignment, draft, Optional.empty());
  }

  /** Checks what was aligned. */
  static PairResult of(Reading source, Reading target, Judgement judgement, boolean draft) {
    return of(source, target, judgement.alignment(), draft, Optional.of(judgement));
  }

  private static PairResult of(
      Reading source,
      Reading target,
      Alignment alignment,
      boolean draft,
      Optional<Judgement> judgement) {
    Subject subject =
        new Subject(source.segments(), target.segments(), target.language(), alignment, draft);
    Pending pending = Pending.of(subject);
    List<Finding> findings = Checks.findings(subject, pending, Vigilance.BALANCED);
    Progress progress = Progress.of(subject);
    return new PairResult(source, target, alignment, findings, pending, progress, judgement);
  }

  /** The same with the findings that project and user want to hear of, as loudly as wanted. */
  public PairResult at(Levels levels) {
    List<Finding> told = levels.apply(sureBy(levels.vigilance()));
    return new PairResult(source, target, alignment, told, pending, progress, judgement);
  }

  /** Whether it was judged by what an earlier state of the texts has taught. */
  boolean provisional() {
    return judgement.filter(one -> !one.learntFromItself()).isPresent();
  }

  /** The same, where no later states will be judged by it. */
  PairResult last() {
    return new PairResult(source, target, alignment, findings, pending, progress, Optional.empty());
  }

  private List<Finding> sureBy(Vigilance vigilance) {
    if (vigilance == Vigilance.BALANCED) {
      return findings;
    }
    Subject subject =
        new Subject(source.segments(), target.segments(), target.language(), alignment, false);
    return Checks.findings(subject, pending, vigilance);
  }

  /** One of the two texts, read. */
  public Reading reading(OnSide side) {
    return side == OnSide.SOURCE ? source : target;
  }
}
