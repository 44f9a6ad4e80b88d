package dev.tallystick.align;

import dev.tallystick.run.Cancellation;
import java.util.List;

/**
 * Judges one state of a pair after the other by the same calibration. What comes out depends on the
 * texts and the calibration; what was judged before only makes it quick. One thread at a time:
 * another waits.
 */
final class Live {
  /** With more new sentences at once the way is looked for from the start. */
  private static final int MANY = 40;

  private final Calibration calibration;
  private List<Unit> source = List.of();
  private List<Unit> target = List.of();
  private Table table;
  private Weights weights;
  private Matches matches;

  Live(Calibration calibration) {
    this.calibration = calibration;
  }

  Calibration calibration() {
    return calibration;
  }

  /** Judges texts; near to those before, that cannot be cancelled. */
  synchronized Alignment judge(
      List<Unit> newSource, List<Unit> newTarget, Cancellation cancellation) {
    cancellation.check();
    Change inSource = Change.between(source, newSource);
    Change inTarget = Change.between(target, newTarget);
    if (table == null || inSource.added() > MANY || inTarget.added() > MANY) {
      Sides sides = new Sides(new Side(newSource), new Side(newTarget));
      return judge(sides, first(sides, cancellation), cancellation);
    }
    Table edited = table;
    table = null; // whatever happens on the way, nothing half done is gone on from
    Sides sides =
        new Sides(
            edited.source.replaced(inSource, newSource),
            edited.target.replaced(inTarget, newTarget));
    new TableEdit(edited).apply(inSource, inTarget, sides);
    edited.settle(Cancellation.NONE);
    weights.replace(inSource, inTarget);
    weights.update(inSource.isNone() ? Integer.MAX_VALUE : inSource.from());
    return take(edited, newSource, newTarget, inSource, inTarget);
  }

  /** The way through texts of which nothing is known but the calibration. */
  private List<Match> first(Sides sides, Cancellation cancellation) {
    SharedWords shared = new SharedWords(sides.source(), sides.target());
    Evidence coarse = Evidence.coarse(Evidence.Texts.of(sides, shared), calibration.fit());
    Band band = Looks.first(coarse, shared, sides, cancellation);
    Lexis lexis = new Lexis(calibration.lexicon(), sides, band);
    Evidence evidence = Evidence.calibrated(sides, calibration, lexis);
    return Lattice.banded(evidence, sides, band, cancellation).chain();
  }

  /** Judges texts through which the way may lead along a chain. */
  synchronized Alignment judge(Sides sides, List<Match> guess, Cancellation cancellation) {
    table = null;
    Table made = new Table(calibration, sides, guess);
    made.settle(cancellation);
    weights = new Weights(made);
    weights.update(0);
    matches = new Matches(made, weights);
    Change none = new Change(0, 0, 0);
    return take(made, List.of(sides.source().units), List.of(sides.target().units), none, none);
  }

  private Alignment take(
      Table settled, List<Unit> newSource, List<Unit> newTarget, Change inSource, Change inTarget) {
    table = settled;
    source = newSource;
    target = newTarget;
    List<Match> chain = matches.update(inSource, inTarget);
    double[] sourceNull = weights.sourceNull();
    double[] targetNull = weights.targetNull();
    List<Move> moves = Moves.find(settled.evidence, sourceNull, targetNull, chain);
    return new Alignment(chain, sourceNull, targetNull, moves, calibration.fit().lengths());
  }
}
