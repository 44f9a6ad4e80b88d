package dev.tallystick.align;

import dev.tallystick.run.Cancellation;
import java.util.List;

/**
 * How two texts are aligned, and what that was learnt from. Learning takes several looks at both
 * texts; judging others by what was learnt takes one, along the way that is known. What comes out
 * depends on the texts judged and on those learnt from, and on nothing in between.
 */
public final class Judgement {
  /** A band is moved to the best way in it so often, if that is another one each time. */
  private static final int MOST_LOOKS = 8;

  private final Calibration calibration;
  private final List<Unit> source;
  private final List<Unit> target;
  private final Alignment alignment;
  private final boolean own;

  private Judgement(Calibration calibration, Sides sides, Alignment alignment, boolean own) {
    this.calibration = calibration;
    this.source = List.of(sides.source().units);
    this.target = List.of(sides.target().units);
    this.alignment = alignment;
    this.own = own;
  }

  /** Learns from two texts and judges them by that: a pure function of the texts. */
  public static Judgement learnt(List<Unit> source, List<Unit> target, Cancellation cancellation) {
    return learnt(new Sides(new Side(source), new Side(target)), cancellation);
  }

  static Judgement learnt(Sides sides, Cancellation cancellation) {
    Calibration.Learnt learnt = Calibration.learnt(sides, cancellation);
    Calibration calibration = learnt.calibration();
    Lexis lexis = new Lexis(calibration.lexicon(), sides, learnt.band());
    Evidence evidence = Evidence.calibrated(sides, calibration, lexis);
    List<Match> chain = Lattice.banded(evidence, sides, learnt.band(), cancellation).chain();
    return new Judgement(calibration, sides, along(calibration, sides, chain, cancellation), true);
  }

  /** Judges other texts by the same; the nearer they are to these, the quicker. */
  public Judgement of(List<Unit> newSource, List<Unit> newTarget, Cancellation cancellation) {
    Sides sides = new Sides(new Side(newSource), new Side(newTarget));
    List<Match> guess =
        Guess.of(
            alignment.matches(),
            Guess.Change.between(source, newSource),
            Guess.Change.between(target, newTarget),
            newSource.size(),
            newTarget.size());
    return new Judgement(calibration, sides, along(calibration, sides, guess, cancellation), false);
  }

  /** Looks along a chain until that is the best one in the band around it. */
  private static Alignment along(
      Calibration calibration, Sides sides, List<Match> guess, Cancellation cancellation) {
    List<Match> chain = guess;
    for (int look = 1; ; look++) {
      Band band = Band.around(chain, sides);
      Lexis lexis = new Lexis(calibration.lexicon(), sides, band);
      Evidence evidence = Evidence.calibrated(sides, calibration, lexis);
      Lattice lattice = Lattice.banded(evidence, sides, band, cancellation);
      List<Match> best = lattice.chain();
      if (best.equals(chain) || look == MOST_LOOKS) {
        return Weighed.of(lattice, best, cancellation).alignment(evidence, calibration.fit());
      }
      chain = best;
    }
  }

  /** Which units stand for which. */
  public Alignment alignment() {
    return alignment;
  }

  /** Whether it was learnt from the very texts that it judges. */
  public boolean learntFromItself() {
    return own;
  }

  /** Whether other texts are near enough to those that it was learnt from. */
  public boolean suits(List<Unit> newSource, List<Unit> newTarget) {
    return calibration.suits(newSource, newTarget);
  }
}
