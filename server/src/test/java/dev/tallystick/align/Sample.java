package dev.tallystick.align;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;

/** Made-up units and pairs of texts of which the true matches are known. */
final class Sample {
  static final Unit.Word[] NO_WORDS = {};

  private final Random random;
  final List<Unit> source = new ArrayList<>();
  final List<Unit> target = new ArrayList<>();

  private Sample(long seed) {
    this.random = new Random(seed);
  }

  /** A sentence of running text without words. */
  static Unit unit(int length) {
    return unit(length, false);
  }

  static Unit unit(int length, boolean opens) {
    return new Unit(length, length, length, opens, 0, 1, NO_WORDS, false);
  }

  static Unit unit(int length, boolean opens, long... keys) {
    Unit.Word[] words = new Unit.Word[keys.length];
    for (int i = 0; i < keys.length; i++) {
      words[i] = new Unit.Word(keys[i], 0.5);
    }
    return new Unit(length, length, length, opens, 0, 1, words, false);
  }

  static Unit verbatim(long content) {
    Unit.Word[] words = {new Unit.Word(content, 0.9)};
    return new Unit(30, 30, 0, true, 0, 0, words, true);
  }

  static List<Unit> units(int... lengths) {
    List<Unit> units = new ArrayList<>();
    for (int length : lengths) {
      units.add(unit(length, units.isEmpty()));
    }
    return units;
  }

  static Sides sides(List<Unit> source, List<Unit> target) {
    return new Sides(new Side(source), new Side(target));
  }

  /** Two texts that have nothing to do with each other, with borders and words of all kinds. */
  static Sample unrelated(long seed, int most) {
    Sample sample = new Sample(seed);
    sample.fill(sample.source, sample.random.nextInt(most + 1));
    sample.fill(sample.target, sample.random.nextInt(most + 1));
    return sample;
  }

  private void fill(List<Unit> units, int count) {
    for (int i = 0; i < count; i++) {
      if (random.nextInt(12) == 0) {
        units.add(verbatim(random.nextInt(3)));
      } else {
        Unit.Word[] words = new Unit.Word[random.nextInt(6)];
        for (int k = 0; k < words.length; k++) {
          words[k] = new Unit.Word(random.nextInt(40), 0.1 + 0.8 * random.nextDouble());
        }
        int length = 1 + random.nextInt(200);
        int kind = random.nextInt(Unit.KINDS);
        int close = random.nextInt(Unit.CLOSES);
        boolean opens = i == 0 || random.nextInt(4) == 0;
        units.add(new Unit(length, length, length / 2 + 1, opens, kind, close, words, false));
      }
    }
  }

  /** A faithful translation: lengths go together, and two words of each sentence, as names do. */
  static Sample faithful(long seed, int sentences) {
    Sample sample = new Sample(seed);
    for (int i = 0; i < sentences; i++) {
      int length = 30 + sample.random.nextInt(140);
      boolean opens = i % 5 == 0;
      double ratio = 1.1 * Math.exp(0.12 * sample.random.nextGaussian());
      long own = 1_000 + i;
      sample.source.add(unit(length, opens, sample.words(own, 100)));
      sample.target.add(unit((int) (length * ratio), opens, sample.words(own, 500)));
    }
    return sample;
  }

  private long[] words(long own, int language) {
    long[] words = new long[12];
    for (int k = 0; k < words.length; k++) {
      words[k] = language + random.nextInt(300);
    }
    words[random.nextInt(6)] = own;
    words[6 + random.nextInt(6)] = own + 100_000;
    return words;
  }

  Sides sides() {
    return sides(source, target);
  }
}
