package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.run.Cancellation;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Whatever is edited in whatever order: what is kept up with the edits equals, to the last bit,
 * what is judged afresh by the same calibration.
 */
class LiveLawTest {
  @ParameterizedTest
  @CsvSource({"1,40,300", "2,40,300", "3,90,100", "4,12,500", "5,25,400", "6,200,30"})
  void keptUpWithEditsIsTheSameAsJudgedAfresh(long seed, int sentences, int edits) {
    Random random = new Random(seed);
    Sample sample = Sample.faithful(seed, sentences);
    Edited source = new Edited(sample.source, random);
    Edited target = new Edited(sample.target, random);
    Calibration calibration = Calibration.learnt(sample.sides(), Cancellation.NONE).calibration();
    Live live = new Live(calibration);
    for (int edit = 0; edit < edits; edit++) {
      (random.nextInt(4) == 0 ? source : target).edit();
      Alignment kept = live.judge(source.now(), target.now(), Cancellation.NONE);
      Live afresh = new Live(calibration);
      Alignment fresh = afresh.judge(source.now(), target.now(), Cancellation.NONE);
      String told = "seed " + seed + ", edit " + edit + ": " + source.last + ", " + target.last;
      assertEquals(fresh.matches(), kept.matches(), told);
      assertArrayEquals(fresh.sourceNull(), kept.sourceNull(), 0, told);
      assertArrayEquals(fresh.targetNull(), kept.targetNull(), 0, told);
      assertEquals(fresh.moves(), kept.moves(), told);
    }
  }

  /** A text and what somebody makes of it. */
  private static final class Edited {
    private final Random random;
    private final Deque<List<Unit>> before = new ArrayDeque<>();
    private List<Unit> units;
    private List<Unit> cut = List.of();
    private String last = "";

    Edited(List<Unit> units, Random random) {
      this.units = List.copyOf(units);
      this.random = random;
    }

    List<Unit> now() {
      return units;
    }

    void edit() {
      List<Unit> all = new ArrayList<>(units);
      int size = all.size();
      int at = size == 0 ? 0 : random.nextInt(size);
      int kind = random.nextInt(12);
      last = kind + " at " + at;
      if (kind == 11 && !before.isEmpty()) {
        units = before.pop();
        return;
      }
      before.push(units);
      if (kind < 4 && size > 0) {
        all.set(at, typed(all.get(at)));
      } else if (kind == 4) {
        all.add(at, typed(size == 0 ? Sample.unit(60, true) : all.get(at)));
      } else if (kind == 5 && size > 0) {
        all.remove(at);
      } else if (kind == 6 && size > 0) {
        all.set(at, flipped(all.get(at)));
      } else if (kind == 7 && size > 0) {
        List<Unit> pasted = List.copyOf(all.subList(at, end(at, size, 8)));
        all.addAll(random.nextInt(size + 1), pasted);
      } else if (kind == 8 && size > 0) {
        move(all, at);
      } else if (kind == 9) {
        tail(all, at);
      } else if (kind == 10 && size > 0) {
        all.subList(at, end(at, size, 6)).clear();
      }
      units = List.copyOf(all);
    }

    private int end(int at, int size, int most) {
      return Math.min(size, at + 1 + random.nextInt(most));
    }

    private void move(List<Unit> all, int at) {
      List<Unit> part = all.subList(at, end(at, all.size(), 6));
      List<Unit> moved = List.copyOf(part);
      part.clear();
      all.addAll(random.nextInt(all.size() + 1), moved);
    }

    /** Cuts the end off, or lets it grow again. */
    private void tail(List<Unit> all, int at) {
      if (cut.isEmpty()) {
        int from = Math.max(at, all.size() * 2 / 3);
        cut = List.copyOf(all.subList(from, all.size()));
        all.subList(from, all.size()).clear();
      } else {
        int grown = 1 + random.nextInt(cut.size());
        all.addAll(cut.subList(0, grown));
        cut = List.copyOf(cut.subList(grown, cut.size()));
      }
    }

    private Unit typed(Unit unit) {
      int length = Math.max(1, unit.length() + random.nextInt(21) - 10);
      Unit.Word[] words = unit.words().clone();
      if (words.length > 0 && !unit.verbatim() && random.nextBoolean()) {
        words[random.nextInt(words.length)] = new Unit.Word(random.nextInt(900), 0.5);
      }
      return new Unit(
          length,
          length,
          unit.letters(),
          unit.opens(),
          unit.kind(),
          random.nextInt(3),
          words,
          unit.verbatim());
    }

    private Unit flipped(Unit unit) {
      return random.nextInt(4) == 0
          ? Sample.verbatim(random.nextInt(3))
          : new Unit(
              unit.length(),
              unit.codePoints(),
              unit.letters(),
              !unit.opens(),
              unit.kind(),
              unit.close(),
              unit.words(),
              unit.verbatim());
    }
  }
}
