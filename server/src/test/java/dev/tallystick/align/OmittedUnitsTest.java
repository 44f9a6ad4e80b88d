package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.run.Cancellation;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A dropped sentence: what the published model never finds, and the other one is there for. */
class OmittedUnitsTest {
  /** Lengths of the sentence beside the dropped one. */
  private static final int[] BESIDE = {60, 117, 200};

  @Test
  void thePublishedModelTakesAnyDroppedSentenceForAMerge() {
    for (int beside : BESIDE) {
      for (int dropped = 5; dropped <= 300; dropped += 5) {
        assertMerged(Sample.units(beside, dropped), Sample.units(beside));
        assertMerged(Sample.units(dropped, beside), Sample.units(beside));
      }
    }
  }

  private static void assertMerged(List<Unit> source, List<Unit> target) {
    Alignment alignment = Aligner.PUBLISHED.align(source, target, Cancellation.NONE);
    assertEquals(1, alignment.matches().size());
    assertEquals(2, alignment.matches().get(0).sources());
  }

  @ParameterizedTest
  @ValueSource(ints = {60, 117, 200})
  void theAdaptiveModelFindsIt(int beside) {
    for (int dropped = 60; dropped <= 300; dropped += 20) {
      Sample sample = Sample.faithful(beside + dropped, 30);
      sample.source.set(14, Sample.unit(beside, false, 1, 2, 3, 9_001, 9_003));
      sample.target.set(14, Sample.unit(beside + 6, false, 501, 502, 503, 9_001, 9_003));
      sample.source.add(14, Sample.unit(dropped, false, 4, 5, 6, 7, 8));
      assertFound(sample, 14);
    }
  }

  private static void assertFound(Sample sample, int at) {
    Alignment alignment = adaptive(sample);
    Match match = alignment.matches().get(at);
    assertEquals(new Match(at, at + 1, at, at, match.confidence()), match);
    assertTrue(alignment.sourceNull()[at] > 0.5, match::toString);
    assertEquals(alignment.sourceNull()[at], match.confidence());
    assertEquals(31, alignment.matches().size());
  }

  @Test
  void theAdaptiveModelFindsAnAddedSentence() {
    Sample sample = Sample.faithful(21, 30);
    sample.target.add(17, Sample.unit(120, false, 504, 505, 506));
    Alignment alignment = adaptive(sample);
    Match match = alignment.matches().get(17);
    assertEquals(new Match(17, 17, 17, 18, match.confidence()), match);
    assertTrue(alignment.targetNull()[17] > 0.5);
  }

  /** Today: of longer blocks, many are taken for a part of a link of 5-1 or 6-1. */
  @Test
  void aDroppedBlockIsLeftOutWhole() {
    Sample sample = Sample.faithful(22, 60);
    opens(sample.source, 13);
    opens(sample.target, 13);
    sample.target.subList(10, 13).clear();
    Alignment alignment = adaptive(sample);
    for (int i = 10; i < 13; i++) {
      assertEquals(0, alignment.matches().get(i).targets());
      assertTrue(alignment.sourceNull()[i] > 0.5);
    }
  }

  private static void opens(List<Unit> units, int at) {
    Unit unit = units.get(at);
    units.set(
        at,
        new Unit(
            unit.length(),
            unit.codePoints(),
            unit.letters(),
            true,
            unit.kind(),
            unit.close(),
            unit.words(),
            false));
  }

  @Test
  void aTextBrokenOffLeavesTheRestOfTheSourceOut() {
    Sample sample = Sample.faithful(23, 40);
    sample.target.subList(22, 40).clear();
    Alignment alignment = adaptive(sample);
    for (int i = 0; i < 40; i++) {
      assertEquals(i >= 22, alignment.sourceNull()[i] > 0.5, "unit " + i);
    }
  }

  /** Today: from some 40 dropped sentences on the first look goes astray in merges. */
  @Test
  void aHoleOfManySentencesDoesNotLoseTheWay() {
    Sample sample = Sample.faithful(24, 400);
    sample.target.subList(100, 120).clear();
    int right = 0;
    for (Match match : adaptive(sample).matches()) {
      int gone = match.sourceFrom() < 100 ? 0 : 20;
      right += match.twoSided() && match.targetFrom() == match.sourceFrom() - gone ? 1 : 0;
    }
    assertTrue(right > 370, "right " + right);
  }

  @Test
  void aFaithfulTranslationHasNothingLeftOut() {
    for (int seed = 30; seed < 40; seed++) {
      Alignment alignment = adaptive(Sample.faithful(seed, 60));
      for (Match match : alignment.matches()) {
        assertTrue(match.twoSided(), match::toString);
      }
    }
  }

  @Test
  void verbatimBlocksAreLandmarks() {
    List<Unit> source = new ArrayList<>(Sample.units(60, 80));
    source.add(Sample.verbatim(5));
    source.addAll(Sample.units(90, 70));
    List<Unit> target = new ArrayList<>(Sample.units(66));
    target.add(Sample.verbatim(5));
    target.addAll(Sample.units(95, 75));
    Alignment alignment = Aligner.ADAPTIVE.align(source, target, Cancellation.NONE);
    boolean held = false;
    for (Match match : alignment.matches()) {
      held |= match.sourceFrom() == 2 && match.sourceTo() == 3 && match.targetFrom() == 1;
      assertFalse(match.sourceFrom() < 2 && match.targetTo() > 2, match::toString);
    }
    assertTrue(held);
  }

  private static Alignment adaptive(Sample sample) {
    return Aligner.ADAPTIVE.align(sample.source, sample.target, Cancellation.NONE);
  }
}
