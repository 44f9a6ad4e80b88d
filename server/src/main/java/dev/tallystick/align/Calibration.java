package dev.tallystick.align;

import dev.tallystick.run.Cancellation;
import java.util.List;

/**
 * What the two texts of a pair have taught: all that their links are judged by beside the sentences
 * themselves. It knows no places, so texts that were edited since can be judged by it as well.
 *
 * @param fit the parameters
 * @param background how long the sentences of the translation are
 * @param lexicon what its words stand for
 * @param rarity how rare the words are that stood in both texts
 * @param lengths the lengths of single sentences that stand for each other
 * @param merged those of several
 * @param sources how many units the source had
 * @param targets how many the translation had
 */
record Calibration(
    Fit fit,
    Background background,
    Lexicon lexicon,
    Rarity rarity,
    LengthTable lengths,
    LengthTable merged,
    int sources,
    int targets) {
  /** The first knows the common shapes only, the second the words that both texts have. */
  private static final int ROUNDS = 3;

  /** Texts that grew or shrank by more than one in so many units, and one, are others by now. */
  private static final int SHARE = 5;

  /** What was learnt, and the best chain while it was. */
  record Learnt(Calibration calibration, List<Match> chain) {}

  /** Learns from two texts: a pure function of them. */
  static Learnt learnt(Sides sides, Cancellation cancellation) {
    SharedWords shared = new SharedWords(sides.source(), sides.target());
    Evidence.Texts known = Evidence.Texts.of(sides, shared);
    Fit fit = Fit.start(ratio(sides), sides);
    boolean timed = fit.clock() != null;
    Scorer coarse = Evidence.coarse(known, fit);
    Band band = Looks.first(coarse, shared, sides, cancellation);
    Stems source = new Stems(sides.source());
    Stems target = new Stems(sides.target());
    Lexicon lexicon = null;
    List<Match> chain = List.of();
    for (int round = 0; round < ROUNDS; round++) {
      Scorer scorer = round == 0 ? coarse : Evidence.full(known, fit);
      Lattice lattice = Lattice.banded(scorer, sides, band, cancellation);
      Posteriors posteriors = new Posteriors(lattice, cancellation);
      fit = Refit.from(posteriors, lattice, fit);
      band = posteriors.band();
      chain = round == ROUNDS - 1 ? lattice.chain() : chain;
      if (round > 0) {
        cancellation.check();
        lexicon = Lexicon.learnt(posteriors, source, target);
        known = known.with(new Lexis(lexicon, sides, band));
      }
      timed |= fit.clock() != null;
    }
    return timed && fit.clock() == null
        ? learnt(sides.untimed(), cancellation) // they misled: as if there were none
        : new Learnt(of(fit, known.background(), lexicon, shared.rarity(), sides), chain);
  }

  private static Calibration of(
      Fit fit, Background background, Lexicon lexicon, Rarity rarity, Sides sides) {
    return new Calibration(
        fit,
        background,
        lexicon,
        rarity,
        new LengthTable(fit.lengths()),
        Evidence.merged(fit.lengths()),
        sides.source().size(),
        sides.target().size());
  }

  /** The ratio of average sentence lengths: unlike that of totals, a missing half leaves it. */
  private static double ratio(Sides sides) {
    Side source = sides.source();
    Side target = sides.target();
    double l1 = (double) source.length(0, source.size()) / Math.max(1, source.size());
    double l2 = (double) target.length(0, target.size()) / Math.max(1, target.size());
    return l1 > 0 && l2 > 0 ? l2 / l1 : 1;
  }

  /** Whether two texts are still much the same as those that it was learnt from. */
  boolean suits(List<Unit> source, List<Unit> target) {
    return near(sources, source.size()) && near(targets, target.size());
  }

  private static boolean near(int before, int now) {
    return Math.abs(now - before) <= 1 + before / SHARE;
  }
}
