package dev.tallystick.align;

import dev.tallystick.run.Cancellation;
import java.util.List;

/** The best chain with the posteriors of its matches and of all nulls. */
record Weighed(List<Match> matches, double[] sourceNull, double[] targetNull) {
  static Weighed of(Lattice lattice, List<Match> chain, Cancellation cancellation) {
    Posteriors posteriors = new Posteriors(lattice, cancellation);
    double[] sourceNull = posteriors.sourceNull();
    double[] targetNull = posteriors.targetNull();
    List<Match> matches = posteriors.confident(chain, sourceNull, targetNull);
    return new Weighed(matches, sourceNull, targetNull);
  }

  Alignment alignment(Evidence evidence, Fit fit) {
    List<Move> moves = Moves.find(evidence, sourceNull, targetNull, matches);
    return alignment(moves, fit.lengths());
  }

  Alignment alignment(List<Move> moves, LengthModel lengths) {
    return new Alignment(matches, sourceNull, targetNull, moves, lengths);
  }
}
