package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class AnchorsTest {
  private static final int SENTENCES = 200;

  private static Sides sides(int sources, int targets) {
    return Sample.sides(Sample.units(new int[sources]), Sample.units(new int[targets]));
  }

  /** An anchor in every fifth sentence of a translation sentence by sentence. */
  private static List<Anchors.Anchor> everyFifth() {
    List<Anchors.Anchor> anchors = new ArrayList<>();
    for (int i = 2; i < SENTENCES; i += 5) {
      anchors.add(new Anchors.Anchor(i, i));
    }
    return anchors;
  }

  @Test
  void theBandFollowsTheAnchors() {
    Band band = Anchors.band(everyFifth(), sides(SENTENCES, SENTENCES)).orElseThrow();
    for (int row = 0; row < SENTENCES - 10; row++) {
      assertTrue(band.first()[row] <= row && row <= band.last()[row], "row " + row);
      assertTrue(band.last()[row] - band.first()[row] < 15, "row " + row);
    }
    assertEquals(SENTENCES, band.last()[SENTENCES], "the end is reached");
  }

  @Test
  void aFalseFriendIsOutvoted() {
    List<Anchors.Anchor> anchors = everyFifth();
    anchors.add(20, new Anchors.Anchor(180, 99));
    Band band = Anchors.band(anchors, sides(SENTENCES, SENTENCES)).orElseThrow();
    assertTrue(band.last()[99] < 115);
  }

  @Test
  void aHoleIsSpannedWhole() {
    List<Anchors.Anchor> anchors = new ArrayList<>();
    for (int i = 0; i < SENTENCES; i += 3) {
      anchors.add(new Anchors.Anchor(i < 100 ? i : i + 40, i));
    }
    Band band = Anchors.band(anchors, sides(SENTENCES + 40, SENTENCES)).orElseThrow();
    assertTrue(band.first()[100] <= 100 && band.last()[100] >= 140);
  }

  @Test
  void tooFewAnchorsAreNone() {
    assertEquals(Optional.empty(), Anchors.band(List.of(), sides(SENTENCES, SENTENCES)));
    List<Anchors.Anchor> two = List.of(new Anchors.Anchor(20, 20), new Anchors.Anchor(180, 20));
    assertEquals(Optional.empty(), Anchors.band(two, sides(SENTENCES, SENTENCES)));
  }

  @Test
  void onlyWordsThatStandOnceInEitherTextAreAnchors() {
    List<Unit> source = new ArrayList<>();
    List<Unit> target = new ArrayList<>();
    for (int i = 0; i < 90; i++) {
      source.add(Sample.unit(50, i == 0, 1000 + i, i % 2 == 0 ? 1 : 3));
      target.add(Sample.unit(55, i == 0, 2000 + i));
    }
    target.set(7, Sample.unit(55, false, 1007));
    target.set(40, Sample.unit(55, false, 1040, 1));
    List<Anchors.Anchor> anchors = new SharedWords(new Side(source), new Side(target)).anchors();
    assertEquals(Arrays.asList(new Anchors.Anchor(7, 7), new Anchors.Anchor(40, 40)), anchors);
  }
}
