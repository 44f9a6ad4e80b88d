package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.run.Cancellation;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What the times of subtitles tell where lengths and words tell nothing. */
class ClockTest {
  private static final double TELEVISION = 25 * 1001.0 / 24_000;

  /** Units of one length that follow each other as cues do, each a block. */
  private static List<Unit> cues(long seed, int count) {
    Random random = new Random(seed);
    List<Unit> units = new ArrayList<>();
    long at = 1_000;
    for (int i = 0; i < count; i++) {
      long stays = 1_200 + random.nextInt(2_500);
      units.add(Sample.unit(30, true).shown(at, at + stays));
      at += stays + 80 + random.nextInt(random.nextInt(8) == 0 ? 6_000 : 600);
    }
    return units;
  }

  private static List<Unit> timed(List<Unit> units, double scale, double offset, long jitter) {
    Random random = new Random(7);
    UnaryOperator<Unit> move =
        unit ->
            unit.shown(
                Math.round(scale * unit.from() + 1000 * offset + jitter * random.nextGaussian()),
                Math.round(scale * unit.to() + 1000 * offset + jitter * random.nextGaussian()));
    return units.stream().map(move).toList();
  }

  private static List<Unit> untimed(List<Unit> units) {
    return units.stream().map(unit -> unit.shown(0, -1)).toList();
  }

  private static List<Unit> without(List<Unit> units, int... dropped) {
    List<Unit> left = new ArrayList<>(units);
    for (int i = dropped.length - 1; i >= 0; i--) {
      left.remove(dropped[i]);
    }
    return left;
  }

  private static Alignment align(List<Unit> source, List<Unit> target) {
    return Aligner.ADAPTIVE.align(source, target, Cancellation.NONE);
  }

  private static List<Integer> missing(List<Unit> source, List<Unit> target) {
    double[] nulls = align(source, target).sourceNull();
    List<Integer> missing = new ArrayList<>();
    for (int i = 0; i < nulls.length; i++) {
      if (nulls[i] >= 0.5) {
        missing.add(i);
      }
    }
    return missing;
  }

  @ParameterizedTest
  @CsvSource({
    "1, 0, 0",
    "1, 0, 150",
    "1, 40, 40",
    "1, -400, 40",
    "1, 36000, 40",
    "0.96, 20, 40",
    "1.0427, 0, 40",
    "0.999, 3, 40"
  })
  void omissionsAreFoundWhereOnlyTimesTell(double scale, double offset, long jitter) {
    for (int seed = 0; seed < 10; seed++) {
      List<Unit> source = cues(seed, 120);
      List<Unit> left = without(source, 11, 40, 41, 90);
      List<Integer> found = missing(source, timed(left, scale, offset, jitter));
      assertEquals(List.of(11, 40, 41, 90), found, "seed " + seed);
      assertNotEquals(found, missing(untimed(source), untimed(left)));
    }
  }

  @ParameterizedTest
  @CsvSource({"0", "40", "-15"})
  void tenCuesAreEnough(double offset) {
    for (int seed = 0; seed < 50; seed++) {
      List<Unit> source = cues(100 + seed, 10);
      int dropped = 1 + seed % 8;
      List<Unit> target = timed(without(source, dropped), 1, offset, 20);
      assertEquals(List.of(dropped), missing(source, target), "seed " + seed);
    }
  }

  @Test
  void aFaithfulTranslationHasNothingLeftOut() {
    for (int seed = 0; seed < 20; seed++) {
      List<Unit> source = cues(200 + seed, 60);
      for (Match match : align(source, timed(source, 1, 12, 200)).matches()) {
        assertTrue(match.twoSided(), match::toString);
      }
    }
  }

  @Test
  void twoCuesMadeOneAreNoOmission() {
    List<Unit> source = cues(300, 30);
    List<Unit> target = without(source, 13);
    target.set(12, source.get(12).shown(source.get(12).from(), source.get(13).to()));
    Alignment alignment = align(source, target);
    assertEquals(2, alignment.matches().get(12).sources());
    assertTrue(alignment.sourceNull()[12] + alignment.sourceNull()[13] < 0.5);
  }

  @Test
  void scaleAndOffsetComeOutAsTheyWere() {
    List<Unit> source = cues(400, 300);
    List<Unit> target = timed(without(source, 5, 200), TELEVISION, -7.25, 60);
    Clock clock = ClockSearch.byTimes(Sample.sides(source, target));
    assertNotNull(clock);
    ClockFit fit = new ClockFit(Sample.sides(source, target));
    for (int i = 6; i < 200; i++) {
      fit.add(i, i + 1, i - 1, i, 1);
    }
    Clock fitted = fit.fit(clock);
    assertEquals(TELEVISION, fitted.scale(), 2e-4);
    assertEquals(-7.25, fitted.offset(), 0.1);
    assertEquals(0.15, fitted.begins().spread(), 0.01);
    assertTrue(fitted.begins().stray() < 0.05, fitted::toString);
  }

  /** Cues as regular as this fit at every third second: only what is known otherwise decides. */
  @Test
  void whereEveryOffsetFitsTheLinksDecide() {
    List<Unit> source = new ArrayList<>();
    for (int i = 0; i < 40; i++) {
      long[] words = {1_000 + i, 2_000 + i, 3_000 + i};
      source.add(Sample.unit(30, true, words).shown(3_000L * i, 3_000L * i + 2_500));
    }
    List<Unit> target = timed(without(source, 20), 1, 6, 0);
    assertEquals(List.of(20), missing(source, target));
  }

  @Test
  void timesThatDoNotFitChangeNothing() {
    for (int seed = 0; seed < 20; seed++) {
      Sample sample = Sample.faithful(500 + seed, 60);
      sample.target.subList(20, 22).clear();
      List<Unit> source = onTimes(sample.source, cues(seed, 60));
      List<Unit> elsewhere = onTimes(sample.target, cues(1_000 + seed, 60));
      assertUnchanged(sample, source, elsewhere);
      List<Unit> back = new ArrayList<>(source.subList(0, sample.target.size()));
      Collections.reverse(back);
      assertUnchanged(sample, source, onTimes(sample.target, back));
      assertUnchanged(sample, source, sample.target);
      assertUnchanged(sample, sample.source, elsewhere);
    }
  }

  @Test
  void hostileTimesChangeNothing() {
    Sample sample = Sample.faithful(600, 60);
    sample.target.remove(30);
    List<Unit> source = onTimes(sample.source, cues(600, 60));
    long far = 99 * 3_600_000L + 59 * 60_000 + 59_999;
    assertUnchanged(sample, source, every(sample.target, 0, 0));
    assertUnchanged(sample, source, every(sample.target, far, far));
    assertUnchanged(sample, source, every(sample.target, 5_000, 1_000));
    assertUnchanged(sample, source, every(sample.target, -5_000, far));
    assertUnchanged(sample, source, every(sample.target, Long.MIN_VALUE / 2, Long.MAX_VALUE / 2));
    assertUnchanged(sample, every(sample.source, 0, far), every(sample.target, 0, far));
  }

  @Test
  void aFewHostileTimesDoNotSpoilTheRest() {
    List<Unit> source = cues(700, 60);
    List<Unit> target = without(source, 30);
    long far = 99 * 3_600_000L + 59 * 60_000 + 59_999;
    target.set(10, target.get(10).shown(far, far));
    target.set(20, target.get(20).shown(-9_000, far));
    target.set(45, target.get(45).shown(9_000, 0));
    target.set(50, target.get(50).shown(target.get(49).from(), target.get(51).to()));
    assertEquals(List.of(30), missing(source, target));
  }

  @Test
  void ordinaryTextsHaveNoTimeline() {
    assertNull(new Side(Sample.units(30, 40, 50)).timeline);
    assertNull(Fit.start(1, Sample.sides(Sample.units(3, 4), Sample.units(3, 4))).clock());
  }

  private static List<Unit> onTimes(List<Unit> units, List<Unit> times) {
    List<Unit> timed = new ArrayList<>();
    for (int i = 0; i < units.size(); i++) {
      timed.add(units.get(i).shown(times.get(i).from(), times.get(i).to()));
    }
    return timed;
  }

  private static List<Unit> every(List<Unit> units, long from, long to) {
    return units.stream().map(unit -> unit.shown(from, to)).toList();
  }

  private static void assertUnchanged(Sample sample, List<Unit> source, List<Unit> target) {
    assertEquals(align(sample.source, sample.target).matches(), align(source, target).matches());
  }
}
