package dev.tallystick.align;

import dev.tallystick.run.Cancellation;
import java.util.List;

/**
 * How two texts are aligned, and what that was learnt from. Learning takes several looks at both
 * texts; judging others by what was learnt takes one, along the way that is known. What comes out
 * depends on the texts judged and on those learnt from, and on nothing in between.
 */
public final class Judgement {
  private final Live live;
  private final List<Unit> source;
  private final List<Unit> target;
  private final Alignment alignment;
  private final boolean own;

  private Judgement(
      Live live, List<Unit> source, List<Unit> target, Alignment alignment, boolean own) {
    this.live = live;
    this.source = source;
    this.target = target;
    this.alignment = alignment;
    this.own = own;
  }

  /** Learns from two texts and judges them by that: a pure function of the texts. */
  public static Judgement learnt(List<Unit> source, List<Unit> target, Cancellation cancellation) {
    return learnt(new Sides(new Side(source), new Side(target)), cancellation);
  }

  static Judgement learnt(Sides sides, Cancellation cancellation) {
    Calibration.Learnt learnt = Calibration.learnt(sides, cancellation);
    Live live = new Live(learnt.calibration());
    return new Judgement(
        live,
        List.of(sides.source().units),
        List.of(sides.target().units),
        live.judge(sides, learnt.chain(), cancellation),
        true);
  }

  /** Judges other texts by the same; the nearer they are to these, the quicker. */
  public Judgement of(List<Unit> newSource, List<Unit> newTarget, Cancellation cancellation) {
    Alignment judged = live.judge(newSource, newTarget, cancellation);
    return new Judgement(live, newSource, newTarget, judged, own && same(newSource, newTarget));
  }

  private boolean same(List<Unit> newSource, List<Unit> newTarget) {
    return Change.between(source, newSource).isNone() && Change.between(target, newTarget).isNone();
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
    return live.calibration().suits(newSource, newTarget);
  }
}
