package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class SharedWordsTest {
  private static final long NAME = 7;

  @Test
  void aNameOnBothSidesSpeaksForALink() {
    SharedWords words = named(3, 3);
    assertTrue(words.logRatio(3, 4, 3, 4) > 1);
    assertTrue(words.logRatio(3, 4, 3, 4) > words.logRatio(2, 3, 3, 4) + 1);
    assertTrue(words.logRatio(3, 4, 3, 4) > words.logRatio(3, 4, 2, 3) + 1);
  }

  @Test
  void aNameOnOneSideOnlySpeaksForNothing() {
    SharedWords words = named(3, 3);
    assertTrue(words.logRatio(3, 4, 8, 9) <= 0);
    assertTrue(words.logRatio(8, 9, 3, 4) <= 0);
    assertTrue(words.logRatio(5, 6, 5, 6) <= 0);
  }

  @Test
  void aNameCountsWhereverItStandsInALink() {
    SharedWords words = named(3, 4);
    assertTrue(words.logRatio(2, 5, 2, 6) > words.logRatio(0, 3, 2, 6));
  }

  @Test
  void aWordThatStandsEverywhereSaysNothing() {
    List<Unit> given = texts(40, 100);
    List<Unit> made = texts(40, 500);
    for (int i = 0; i < 20; i++) {
      given.set(i, Sample.unit(60, false, 100 + i, NAME));
      made.set(i, Sample.unit(60, false, 500 + i, NAME));
    }
    SharedWords words = new SharedWords(new Side(given), new Side(made));
    assertTrue(words.logRatio(3, 4, 3, 4) <= 0);
  }

  @Test
  void textsWithoutWordsSayNothing() {
    SharedWords words =
        new SharedWords(new Side(Sample.units(60, 70)), new Side(Sample.units(65, 75)));
    assertEquals(0, words.logRatio(0, 1, 0, 1), 1e-12);
    assertEquals(0, words.logRatio(0, 2, 0, 2), 1e-12);
  }

  /** What is looked up near the band does not depend on what was asked before. */
  @Test
  void theOrderOfQuestionsDoesNotMatter() {
    Random random = new Random(51);
    Sample sample = Sample.faithful(51, 300);
    SharedWords asked = new SharedWords(new Side(sample.source), new Side(sample.target));
    for (int i = 0; i < 2_000; i++) {
      int s = random.nextInt(290);
      int t = random.nextInt(290);
      int sEnd = s + 1 + random.nextInt(6);
      int tEnd = t + 1 + random.nextInt(6);
      double once = asked.logRatio(s, sEnd, t, tEnd);
      if (i % 100 == 0) {
        SharedWords fresh = new SharedWords(new Side(sample.source), new Side(sample.target));
        assertEquals(fresh.logRatio(s, sEnd, t, tEnd), once, 1e-12);
      }
    }
  }

  private static SharedWords named(int given, int made) {
    List<Unit> one = texts(40, 100);
    List<Unit> other = texts(40, 500);
    one.set(given, Sample.unit(60, false, 100, 101, 102, 103, NAME));
    other.set(made, Sample.unit(60, false, 500, 501, 502, 503, NAME));
    return new SharedWords(new Side(one), new Side(other));
  }

  private static List<Unit> texts(int sentences, long language) {
    List<Unit> units = new ArrayList<>();
    for (int i = 0; i < sentences; i++) {
      units.add(Sample.unit(60, false, language, language + 1, language + 2, language + i));
    }
    return units;
  }
}
