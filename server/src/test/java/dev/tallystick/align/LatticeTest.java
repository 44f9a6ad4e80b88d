package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.run.Cancellation;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The tables against chains counted one by one, and the laws of posteriors. */
class LatticeTest {
  private static final int PAIRS = 250;

  @Test
  void theAdaptiveModelWeighsAllChains() {
    for (int seed = 0; seed < PAIRS; seed++) {
      Sides sides = Sample.unrelated(seed, 4).sides();
      Evidence.Texts texts = Evidence.Texts.of(sides);
      assertAllChains(Evidence.full(texts, Fit.start(1.1, sides)), sides, seed);
    }
  }

  @Test
  void thePublishedModelWeighsAllChains() {
    for (int seed = 0; seed < PAIRS; seed++) {
      Sides sides = Sample.unrelated(1_000 + seed, 4).sides();
      assertAllChains(published(sides), sides, seed);
    }
  }

  private static void assertAllChains(Scorer scorer, Sides sides, int seed) {
    AllChains all = new AllChains(scorer, sides);
    Lattice lattice = Lattice.banded(scorer, sides, everything(sides), Cancellation.NONE);
    Posteriors posteriors = new Posteriors(lattice, Cancellation.NONE);
    assertEquals(all.best, all.worth(lattice.chain()), 1e-9, () -> "pair " + seed);
    List<Shape> shapes = scorer.shapes();
    for (int shape = 0; shape < shapes.size(); shape++) {
      for (int t = 0; t < sides.target().size(); t++) {
        for (int s = 0; s < sides.source().size(); s++) {
          int sEnd = s + shapes.get(shape).sources();
          int tEnd = t + shapes.get(shape).targets();
          double expected = all.link(s, sEnd, t, tEnd);
          assertEquals(expected, posteriors.link(shape, t, s), 1e-9, () -> "pair " + seed);
        }
      }
    }
    double[] omitted = posteriors.sourceNull();
    for (int s = 0; s < omitted.length; s++) {
      assertEquals(all.omitted(s), omitted[s], 1e-9, () -> "pair " + seed);
    }
    double[] added = posteriors.targetNull();
    for (int t = 0; t < added.length; t++) {
      assertEquals(all.added(t), added[t], 1e-9, () -> "pair " + seed);
    }
  }

  /** Each unit is in one link, or left out: the probabilities of these make up one. */
  @Test
  void posteriorsOfAUnitAddUpToOne() {
    for (int seed = 0; seed < 40; seed++) {
      Sides sides = Sample.unrelated(2_000 + seed, 30).sides();
      Evidence.Texts texts = Evidence.Texts.of(sides);
      Scorer adaptive = Evidence.full(texts, Fit.start(0.9, sides));
      for (Scorer scorer : List.of(adaptive, published(sides))) {
        Lattice lattice = Lattice.banded(scorer, sides, everything(sides), Cancellation.NONE);
        assertAddUp(new Posteriors(lattice, Cancellation.NONE), scorer, sides);
      }
    }
  }

  private static void assertAddUp(Posteriors posteriors, Scorer scorer, Sides sides) {
    double[] ofSource = posteriors.sourceNull();
    double[] ofTarget = posteriors.targetNull();
    for (int shape = 0; shape < scorer.shapes().size(); shape++) {
      Shape taken = scorer.shapes().get(shape);
      for (int t = 0; t < ofTarget.length; t++) {
        for (int s = 0; s < ofSource.length; s++) {
          double posterior = posteriors.link(shape, t, s);
          assertTrue(posterior >= 0 && posterior <= 1 + 1e-9, "posterior " + posterior);
          if (posterior > 0) {
            add(ofSource, s, s + taken.sources(), posterior);
            add(ofTarget, t, t + taken.targets(), posterior);
          }
        }
      }
    }
    Arrays.stream(ofSource).forEach(sum -> assertEquals(1, sum, 1e-6));
    Arrays.stream(ofTarget).forEach(sum -> assertEquals(1, sum, 1e-6));
  }

  private static void add(double[] sums, int from, int to, double posterior) {
    for (int i = from; i < to; i++) {
      sums[i] += posterior;
    }
  }

  @Test
  void visitedLinksAreThoseOfTheTable() {
    Sides sides = Sample.faithful(7, 25).sides();
    Scorer scorer = published(sides);
    Lattice lattice = Lattice.banded(scorer, sides, everything(sides), Cancellation.NONE);
    Posteriors posteriors = new Posteriors(lattice, Cancellation.NONE);
    int[] seen = {0, -1};
    posteriors.links(
        0.01,
        (shape, t, s, posterior) -> {
          assertEquals(posteriors.link(shape, t, s), posterior);
          assertTrue(posterior >= 0.01 && t >= seen[1]);
          seen[0]++;
          seen[1] = t;
        });
    assertTrue(seen[0] >= 12, "links " + seen[0]);
  }

  /** A band around the way through gives what the whole table gives, but for what is unlikely. */
  @Test
  void aBandAroundTheWayLosesNothing() {
    for (int seed = 0; seed < 25; seed++) {
      Sides sides = Sample.faithful(seed, 35).sides();
      Evidence.Texts texts = Evidence.Texts.of(sides);
      Scorer scorer = Evidence.full(texts, Fit.start(1.1, sides));
      Lattice whole = Lattice.banded(scorer, sides, everything(sides), Cancellation.NONE);
      Posteriors inAll = new Posteriors(whole, Cancellation.NONE);
      List<Match> way = Lattice.wide(scorer, sides, 60, Cancellation.NONE).chain();
      for (Band band : List.of(Band.around(way, sides), inAll.band())) {
        Lattice narrow = Lattice.banded(scorer, sides, band, Cancellation.NONE);
        assertEquals(whole.chain(), narrow.chain());
        Posteriors inBand = new Posteriors(narrow, Cancellation.NONE);
        assertSame(inAll.sourceNull(), inBand.sourceNull());
        assertSame(inAll.targetNull(), inBand.targetNull());
        inAll.links(1e-4, (shape, t, s, p) -> assertEquals(p, inBand.link(shape, t, s), 1e-6));
      }
    }
  }

  @Test
  void aBandIsNarrowOnlyWhereTheWayIsPlain() {
    Sample sample = Sample.faithful(3, 60);
    sample.target.subList(25, 35).clear();
    Sides sides = sample.sides();
    Scorer scorer = Evidence.full(Evidence.Texts.of(sides), Fit.start(1.1, sides));
    Lattice whole = Lattice.banded(scorer, sides, everything(sides), Cancellation.NONE);
    Band band = new Posteriors(whole, Cancellation.NONE).band();
    assertTrue(width(band, 10) <= 6, () -> "width " + width(band, 10));
    assertTrue(band.first()[25] <= 25 && band.last()[25] >= 35, () -> "width " + width(band, 25));
  }

  private static int width(Band band, int row) {
    return band.last()[row] - band.first()[row] + 1;
  }

  /** Whatever the rows are, each reaches to where the next one starts, and none falls back. */
  @Test
  void aBandCanBePassedWithoutLinks() {
    Band band = Band.passable(new int[] {0, 2, 1, 7}, new int[] {0, 4, 3, 9});
    assertArrayEquals(new int[] {0, 2, 1, 7}, band.first());
    assertArrayEquals(new int[] {2, 4, 7, 9}, band.last());
  }

  private static void assertSame(double[] expected, double[] actual) {
    for (int i = 0; i < expected.length; i++) {
      assertEquals(expected[i], actual[i], 1e-6);
    }
  }

  private static Scorer published(Sides sides) {
    return new Published(sides.source().lengthBefore, sides.target().lengthBefore);
  }

  private static Band everything(Sides sides) {
    int[] first = new int[sides.target().size() + 1];
    int[] last = new int[first.length];
    Arrays.fill(last, sides.source().size());
    return new Band(first, last);
  }
}
