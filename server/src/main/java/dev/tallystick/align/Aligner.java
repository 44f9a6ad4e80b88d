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
      Band band = steadyLook(scorer, sides, cancellation);
      LengthModel lengths =
          new LengthModel(Published.RATIO, Published.SPREAD, 1, Double.POSITIVE_INFINITY);
      Weighed weighed = Weighed.of(scorer, band, sides, cancellation);
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
      Evidence.Texts texts = Evidence.Texts.of(sides);
      Fit fit = Fit.start(ratio(sides), sides);
      boolean timed = fit.clock() != null;
      Scorer coarse = Evidence.coarse(texts, fit);
      Band band =
          Anchors.band(texts.shared().anchors(), sides)
              .orElseGet(() -> firstLook(coarse, sides, cancellation));
      Stems source = new Stems(sides.source());
      Stems target = new Stems(sides.target());
      Evidence.Texts known = texts;
      for (int round = 0; round < ROUNDS; round++) {
        Scorer scorer = round == 0 ? coarse : Evidence.full(known, fit);
        Lattice lattice = Lattice.banded(scorer, sides, band, cancellation);
        Posteriors posteriors = new Posteriors(lattice, cancellation);
        fit = Refit.from(posteriors, lattice, fit);
        band = posteriors.band();
        if (round > 0) {
          known = texts.with(Lexis.learnt(posteriors, source, target, band));
        }
        timed |= fit.clock() != null;
      }
      if (timed && fit.clock() == null) {
        return align(sides.untimed(), cancellation); // they misled: as if there were none
      }
      Evidence evidence = Evidence.full(known, fit);
      Weighed weighed = Weighed.of(evidence, band, sides, cancellation);
      return weighed.alignment(weighed.moves(evidence), fit.lengths());
    }
  };

  /** The first knows the common shapes only, the second the words that both texts have. */
  private static final int ROUNDS = 3;

  /** How far below its row's best a cell may lie in the first look, and in the last (nats). */
  private static final double NEAR = 60;

  private static final double FAR = 960;

  /** The most that rows times reach may come to. */
  private static final double EFFORT = 6e6;

  /** So large a share of the target left out, or of the source, and the first look goes on. */
  private static final double SUSPICIOUS = 0.02;

  /** Aligns two texts. Either may be empty. */
  public Alignment align(List<Unit> source, List<Unit> target, Cancellation cancellation) {
    return align(new Sides(side(source), side(target)), cancellation);
  }

  Side side(List<Unit> units) {
    return new Side(units);
  }

  abstract Alignment align(Sides sides, Cancellation cancellation);

  /** The ratio of average sentence lengths: unlike that of totals, a missing half leaves it. */
  private static double ratio(Sides sides) {
    Side source = sides.source();
    Side target = sides.target();
    double l1 = (double) source.length(0, source.size()) / Math.max(1, source.size());
    double l2 = (double) target.length(0, target.size()) / Math.max(1, target.size());
    return l1 > 0 && l2 > 0 ? l2 / l1 : 1;
  }

  /**
   * The band around the way through both texts. Where the way found leaves out much, it may have
   * been lost at a gap, and is looked for again from farther off.
   */
  private static Band firstLook(Scorer scorer, Sides sides, Cancellation cancellation) {
    List<Match> chain = List.of();
    for (double reach = NEAR; reach <= far(sides); reach *= 2) {
      chain = Lattice.wide(scorer, sides, reach, cancellation).chain();
      if (leftOut(chain, sides.target().size()) <= SUSPICIOUS * sides.target().size()) {
        break;
      }
    }
    return Band.around(chain, sides);
  }

  /**
   * The band around a way that a look from farther off does not change. The published model has one
   * ratio for all languages; where that is far from the pair's, ways that come to nothing are the
   * cheaper ones at first, and a near look loses the best without leaving anything out.
   */
  private static Band steadyLook(Scorer scorer, Sides sides, Cancellation cancellation) {
    List<Match> near = Lattice.wide(scorer, sides, NEAR, cancellation).chain();
    List<Match> farther = Lattice.wide(scorer, sides, 2 * NEAR, cancellation).chain();
    boolean steady = near.equals(farther);
    return Band.around(
        steady ? near : Lattice.wide(scorer, sides, far(sides), cancellation).chain(), sides);
  }

  /** The larger a text, the less can be spent on looking far. */
  private static double far(Sides sides) {
    return Math.max(NEAR, Math.min(FAR, EFFORT / (1 + sides.target().size())));
  }

  /** Units without a counterpart, but for the source behind the end of the translation. */
  private static int leftOut(List<Match> chain, int targets) {
    int count = 0;
    for (Match match : chain) {
      count += match.twoSided() || match.targetFrom() == targets ? 0 : 1;
    }
    return count;
  }

  /** The best chain with the posteriors of its matches and of all nulls. */
  private record Weighed(List<Match> matches, double[] sourceNull, double[] targetNull) {
    static Weighed of(Scorer scorer, Band band, Sides sides, Cancellation cancellation) {
      Lattice lattice = Lattice.banded(scorer, sides, band, cancellation);
      Posteriors posteriors = new Posteriors(lattice, cancellation);
      double[] sourceNull = posteriors.sourceNull();
      double[] targetNull = posteriors.targetNull();
      List<Match> matches = posteriors.confident(lattice.chain(), sourceNull, targetNull);
      return new Weighed(matches, sourceNull, targetNull);
    }

    List<Move> moves(Evidence evidence) {
      return Moves.find(evidence, sourceNull, targetNull, matches);
    }

    Alignment alignment(List<Move> moves, LengthModel lengths) {
      return new Alignment(matches, sourceNull, targetNull, moves, lengths);
    }
  }
}
