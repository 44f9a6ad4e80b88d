package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.run.Cancellation;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The table that is kept up with edits against the one that is made anew. */
class TableTest {
  /** Small enough that every band holds all cells; whole numbers cost some digits. */
  @Test
  void itComesToWhatAllChainsComeTo() {
    for (int seed = 0; seed < 250; seed++) {
      Sides sides = Sample.unrelated(7_000 + seed, 5).sides();
      Calibration calibration = Calibration.learnt(sides, Cancellation.NONE).calibration();
      Band all = everything(sides);
      Lexis lexis = new Lexis(calibration.lexicon(), sides, all);
      Evidence evidence = Evidence.calibrated(sides, calibration, lexis);
      AllChains chains = new AllChains(evidence, sides);
      Alignment judged = new Live(calibration).judge(sides, List.of(), Cancellation.NONE);
      String told = "pair " + seed;
      assertEquals(chains.best, chains.worth(certain(judged.matches())), 2e-3, told);
      Posteriors posteriors =
          new Posteriors(
              Lattice.banded(evidence, sides, all, Cancellation.NONE), Cancellation.NONE);
      assertArrayEquals(posteriors.sourceNull(), judged.sourceNull(), 1e-3, told);
      assertArrayEquals(posteriors.targetNull(), judged.targetNull(), 1e-3, told);
      for (Match match : judged.matches()) {
        if (match.twoSided()) {
          double expected =
              chains.link(
                  match.sourceFrom(), match.sourceTo(), match.targetFrom(), match.targetTo());
          assertEquals(expected, match.confidence(), 1e-3, told);
        }
      }
    }
  }

  private static List<Match> certain(List<Match> matches) {
    return matches.stream()
        .map(m -> new Match(m.sourceFrom(), m.sourceTo(), m.targetFrom(), m.targetTo(), 1))
        .toList();
  }

  private static Band everything(Sides sides) {
    int[] last = new int[sides.target().size() + 1];
    Arrays.fill(last, sides.source().size());
    return new Band(new int[last.length], last);
  }

  /** A chapter that is missing leads through a row as wide as the chapter. */
  @Test
  void aMissingChapterIsPassedOver() {
    Sample sample = Sample.faithful(5, 400);
    List<Unit> target = new ArrayList<>(sample.target);
    target.subList(100, 250).clear();
    Judgement judgement = Judgement.learnt(sample.source, target, Cancellation.NONE);
    long left = judgement.alignment().matches().stream().filter(m -> m.targets() == 0).count();
    assertEquals(150, left);
    Judgement whole = judgement.of(sample.source, sample.target, Cancellation.NONE);
    assertTrue(whole.alignment().matches().stream().allMatch(Match::twoSided));
    assertTrue(!whole.learntFromItself());
  }

  @Test
  void powersComeFromTables() {
    for (int parts = 0; parts > -61 * Fixed.ONE; parts -= 997) {
      double exact = parts < -60 * Fixed.ONE ? 0 : Math.exp((double) parts / Fixed.ONE);
      assertEquals(exact, Fixed.exp(parts), 1e-14);
    }
    assertEquals(Fixed.NOWHERE, Fixed.of(Double.NEGATIVE_INFINITY));
    assertEquals(-3 * Fixed.ONE, Fixed.of(-3));
  }
}
