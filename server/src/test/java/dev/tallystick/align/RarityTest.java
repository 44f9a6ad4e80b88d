package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** What words say of two units, known by themselves and by their places. */
class RarityTest {
  @Test
  void itSaysOfUnitsWhatTheSharedWordsOfTheTextsSay() {
    for (int seed = 0; seed < 60; seed++) {
      Sample sample = Sample.unrelated(8_000 + seed, 60);
      SharedWords shared = new SharedWords(new Side(sample.source), new Side(sample.target));
      Rarity rarity = shared.rarity();
      for (int s = 0; s < sample.source.size(); s++) {
        for (int t = 0; t < sample.target.size(); t++) {
          double expected = shared.alike(s, t);
          double found = rarity.alike(sample.source.get(s), sample.target.get(t));
          assertEquals(expected, found, 1e-9, "pair " + seed + ", " + s + ", " + t);
        }
      }
    }
  }
}
