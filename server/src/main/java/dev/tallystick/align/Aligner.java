package dev.tallystick.align;

import dev.tallystick.run.Cancellation;
import java.util.List;

/** The two models, by the names they have on the command line. */
public enum Aligner {
  /** Gale and Church (1993), with their parameters. */
  PUBLISHED {
    @Override
    Side side(List<Unit> units) {
      return new Side(units, Unit::codePoints);
    }

    @Override
    Alignment align(Sides sides, Cancellation cancellation) {
      Scorer scorer = new Published(sides.source().lengthBefore, sides.target().lengthBefore);
      Band band = Looks.steady(scorer, sides, cancellation);
      LengthModel lengths =
          new LengthModel(Published.RATIO, Published.SPREAD, 1, Double.POSITIVE_INFINITY);
      Lattice lattice = Lattice.banded(scorer, sides, band, cancellation);
      Weighed weighed = Weighed.of(lattice, lattice.chain(), cancellation);
      return weighed.alignment(List.of(), lengths);
    }
  },

  /**
   * Fitted to the pair. A first look with general parameters finds the way through both texts; then
   * the parameters are learnt from the posteriors around it, and the links judged again.
   */
  ADAPTIVE {
    @Override
    Alignment align(Sides sides, Cancellation cancellation) {
      return Judgement.learnt(sides, cancellation).alignment();
    }
  };

  /** Aligns two texts. Either may be empty. */
  public Alignment align(List<Unit> source, List<Unit> target, Cancellation cancellation) {
    return align(new Sides(side(source), side(target)), cancellation);
  }

  Side side(List<Unit> units) {
    return new Side(units);
  }

  abstract Alignment align(Sides sides, Cancellation cancellation);
}
