package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The parts that a link's worth is made of, on small examples. */
class EvidencePartsTest {
  @Test
  void aClassMakesItselfLikelierBeforeAnythingIsCounted() {
    Affinity affinity = Affinity.of(new double[3][3], new double[] {50, 30, 20});
    for (int source = 0; source < 3; source++) {
      for (int target = 0; target < 3; target++) {
        assertEquals(source == target, affinity.logRatio(source, target) > 0);
      }
    }
    // The rarer a class, the more it says.
    assertTrue(affinity.logRatio(2, 2) > affinity.logRatio(0, 0));
  }

  @Test
  void countsOverruleTheAssumption() {
    double[][] counts = {{0, 90}, {40, 0}};
    Affinity affinity = Affinity.of(counts, new double[] {40, 90});
    assertTrue(affinity.logRatio(0, 1) > 0);
    assertTrue(affinity.logRatio(1, 0) > 0);
    assertTrue(affinity.logRatio(0, 0) < 0);
  }

  /** The probabilities behind the ratios make up one for each source class. */
  @Test
  void ratiosComeFromADistribution() {
    double[] general = {9, 4, 2};
    Affinity affinity = Affinity.of(new double[][] {{5, 1, 0}, {2, 3, 1}, {2, 0, 1}}, general);
    for (int source = 0; source < 3; source++) {
      double sum = 0;
      for (int target = 0; target < 3; target++) {
        sum += Math.exp(affinity.logRatio(source, target)) * (general[target] + 1) / 18;
      }
      assertEquals(1, sum, 1e-9);
    }
  }

  @Test
  void aBandFollowsItsChain() {
    List<Match> chain = new ArrayList<>();
    for (int i = 0; i < 50; i++) {
      chain.add(new Match(i, i + 1, i, i + 1, 1));
    }
    chain.add(new Match(50, 51, 50, 50, 1));
    for (int i = 50; i < 100; i++) {
      chain.add(new Match(i + 1, i + 2, i, i + 1, 1));
    }
    Sides sides = Sample.sides(Sample.units(new int[101]), Sample.units(new int[100]));
    Band band = Band.around(chain, sides);
    assertEquals(20 - 6, band.first()[20]);
    assertEquals(20 + 6, band.last()[20]);
    assertEquals(80 + 1 - 6, band.first()[80]);
    assertEquals(80 + 1 + 6, band.last()[80]);
    assertEquals(50 - 24, band.first()[50]);
    assertEquals(50 + 1 + 24, band.last()[50]);
  }

  @Test
  void aBandStaysInTheText() {
    Sides sides = Sample.sides(Sample.units(50, 60), Sample.units(40, 30, 40));
    Band band = Band.around(List.of(new Match(0, 2, 0, 3, 1)), sides);
    assertArrayEquals(new int[] {0, 0, 0, 0}, band.first());
    assertArrayEquals(new int[] {2, 2, 2, 2}, band.last());
  }

  @Test
  void waysAreAddedUpBesideTheBest() {
    Blend blend = new Blend(4);
    assertEquals(Double.NEGATIVE_INFINITY, blend.best);
    assertEquals(0, blend.sum());
    blend.add(3, -5, 1);
    blend.add(1, -4, 1);
    blend.add(2, Double.NEGATIVE_INFINITY, 1);
    blend.add(0, -4, 2);
    assertEquals(-4, blend.best);
    assertEquals(1, blend.move);
    assertEquals(3 + Math.exp(-1), blend.sum(), 1e-12);
    blend.clear();
    assertEquals(Row.NO_MOVE, blend.move);
    assertEquals(0, blend.sum());
  }

  @Test
  void aRowIsCutDownToWhatLiesAboveAFloor() {
    Row row = new Row(3, 7);
    double[] worth = {-90, -3, -80, -1, -70};
    System.arraycopy(worth, 0, row.best, 0, 5);
    assertEquals(-1, row.highest());
    Row cut = row.above(-10);
    assertEquals(4, cut.first);
    assertEquals(6, cut.last);
    assertArrayEquals(new double[] {-3, -80, -1}, cut.best);
    assertTrue(cut.has(4) && !cut.has(3) && !cut.has(7));
  }

  @Test
  void usualLengthsAreLikelierThanOddOnes() {
    Background background = new Background(new Side(Sample.units(60, 80, 100, 120, 9, 80)));
    assertTrue(background.logDensity(1, 2) > background.logDensity(4, 5));
    assertEquals(
        background.logDensity(0, 3),
        background.logDensity(0, 1) + background.logDensity(1, 3),
        1e-12);
  }

  @Test
  void blocksOfSeveralUnitsAreFound() {
    Side side =
        new Side(
            List.of(
                Sample.unit(5, true),
                Sample.unit(6),
                Sample.unit(7, true),
                Sample.verbatim(1),
                Sample.unit(8, true),
                Sample.unit(9),
                Sample.unit(10)));
    assertArrayEquals(new int[] {2, -1, -1, -1, 7, -1, -1, -1}, side.blockStartingAt);
    assertArrayEquals(new int[] {-1, -1, 0, -1, -1, -1, -1, 4}, side.blockEndingAt);
    assertTrue(side.crossesBlocks(1, 3));
    assertTrue(!side.crossesBlocks(4, 7));
    assertTrue(side.hasVerbatim(2, 4) && !side.hasVerbatim(4, 7));
    assertEquals(13, side.length(1, 3));
  }
}
