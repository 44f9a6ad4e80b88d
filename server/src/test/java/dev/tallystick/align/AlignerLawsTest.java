package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.run.Cancellation;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What holds for both models and any two texts. */
class AlignerLawsTest {
  @ParameterizedTest
  @EnumSource
  void theChainCoversEveryUnitOnceInOrder(Aligner aligner) {
    for (int seed = 0; seed < 80; seed++) {
      Sample sample = Sample.unrelated(3_000 + seed, seed < 40 ? 8 : 60);
      Alignment alignment = align(aligner, sample.source, sample.target);
      assertCovers(alignment, sample.source.size(), sample.target.size());
      assertProbabilities(alignment);
    }
  }

  private static void assertCovers(Alignment alignment, int sources, int targets) {
    int s = 0;
    int t = 0;
    for (Match match : alignment.matches()) {
      assertEquals(s, match.sourceFrom());
      assertEquals(t, match.targetFrom());
      assertTrue(match.sources() + match.targets() > 0);
      assertTrue(match.twoSided() || match.sources() + match.targets() == 1);
      s = match.sourceTo();
      t = match.targetTo();
    }
    assertEquals(sources, s);
    assertEquals(targets, t);
    assertEquals(sources, alignment.sourceNull().length);
    assertEquals(targets, alignment.targetNull().length);
  }

  private static void assertProbabilities(Alignment alignment) {
    alignment.matches().forEach(match -> assertProbability(match.confidence()));
    Arrays.stream(alignment.sourceNull()).forEach(AlignerLawsTest::assertProbability);
    Arrays.stream(alignment.targetNull()).forEach(AlignerLawsTest::assertProbability);
  }

  private static void assertProbability(double p) {
    assertTrue(p >= 0 && p <= 1, () -> "probability " + p);
  }

  @ParameterizedTest
  @EnumSource
  void theSameTextsGiveTheSameResult(Aligner aligner) {
    for (int seed = 0; seed < 10; seed++) {
      Sample sample = Sample.unrelated(4_000 + seed, 60);
      Alignment once = align(aligner, sample.source, sample.target);
      Alignment again = align(aligner, List.copyOf(sample.source), List.copyOf(sample.target));
      assertEquals(once.matches(), again.matches());
      assertArrayEquals(once.sourceNull(), again.sourceNull());
      assertArrayEquals(once.targetNull(), again.targetNull());
      assertEquals(once.lengths(), again.lengths());
    }
  }

  @ParameterizedTest
  @EnumSource
  void emptySidesLeaveEverythingWithoutCounterpart(Aligner aligner) {
    List<Unit> some = Sample.units(40, 90, 60);
    Alignment untranslated = align(aligner, some, List.of());
    assertEquals(3, untranslated.matches().size());
    assertCovers(untranslated, 3, 0);
    assertArrayEquals(new double[] {1, 1, 1}, untranslated.sourceNull(), 1e-9);
    Alignment invented = align(aligner, List.of(), some);
    assertCovers(invented, 0, 3);
    assertArrayEquals(new double[] {1, 1, 1}, invented.targetNull(), 1e-9);
    assertEquals(List.of(), align(aligner, List.of(), List.of()).matches());
  }

  @ParameterizedTest
  @EnumSource
  void identicalTextsMatchOneToOne(Aligner aligner) {
    Sample sample = Sample.faithful(11, 50);
    Alignment alignment = align(aligner, sample.source, List.copyOf(sample.source));
    for (int i = 0; i < 50; i++) {
      Match match = alignment.matches().get(i);
      assertEquals(new Match(i, i + 1, i, i + 1, match.confidence()), match);
      assertTrue(match.confidence() > 0.9, match::toString);
    }
  }

  @ParameterizedTest
  @EnumSource
  void veryUnequalSizesComeToAnEnd(Aligner aligner) {
    List<Unit> one = Sample.units(80);
    List<Unit> many = Sample.faithful(12, 3_000).source;
    assertCovers(align(aligner, one, many), 1, 3_000);
    assertCovers(align(aligner, many, one), 3_000, 1);
  }

  @ParameterizedTest
  @EnumSource
  void extremeLengthsComeToAnEnd(Aligner aligner) {
    List<Unit> source = Sample.units(1, 2_000_000, 0, 5, 1);
    List<Unit> target = Sample.units(0, 0, 3, 500_000);
    Alignment alignment = align(aligner, source, target);
    assertCovers(alignment, 5, 4);
    assertProbabilities(alignment);
  }

  /** However late it comes, cancelling is heard; and nothing but cancelling stops the work. */
  @ParameterizedTest
  @EnumSource
  void cancellingStopsTheWorkAtEveryCheck(Aligner aligner) {
    Sample sample = Sample.faithful(13, 12);
    AtomicInteger checks = new AtomicInteger();
    aligner.align(sample.source, sample.target, () -> checks.incrementAndGet() < 0);
    assertTrue(checks.get() >= 3 * 12, () -> "checks " + checks);
    for (int after = 0; after < checks.get(); after++) {
      AtomicInteger left = new AtomicInteger(after);
      assertThrows(
          Cancellation.Cancelled.class,
          () -> aligner.align(sample.source, sample.target, () -> left.getAndDecrement() == 0));
    }
  }

  private static Alignment align(Aligner aligner, List<Unit> source, List<Unit> target) {
    return aligner.align(source, target, Cancellation.NONE);
  }
}
