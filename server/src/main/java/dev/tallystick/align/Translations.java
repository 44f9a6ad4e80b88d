package dev.tallystick.align;

import java.util.Arrays;

/**
 * What words of one side, the given one, become on the other, the made one: expected counts by IBM
 * Model 1 (Brown et al. 1993), started and smoothed by the likeness of words (after Simard, Foster
 * and Isabelle 1992).
 */
final class Translations {
  /** So many words of prior belief stand beside what is counted for each given word. */
  static final double PRIOR = 2;

  private static final int STEPS = 4;

  /** How much of the prior goes to words alike: with digits, the same word, alike enough, else. */
  private static final double NUMBER = 0.9;

  private static final double SAME = 0.5;
  private static final double ALIKE = 0.3;
  private static final double HARDLY = 0.05;
  private static final double ENOUGH = 0.25;

  /** Null once nothing more is asked about pairs; so are the counts. */
  private WordPairs pairs;

  private final boolean forward;
  private final double[] general;

  /** For each given word the part of its prior that goes to words alike. */
  private final double[] faithful;

  /** For the first pairs the share of the made word in that. */
  private double[] alike;

  private double[] counts;

  /** For each given word the sum of its counts. */
  private double[] totals;

  Translations(WordPairs pairs, Stems given, Stems made, boolean forward) {
    this.pairs = pairs;
    this.forward = forward;
    this.general = made.general;
    this.faithful = new double[given.size() + 1]; // the last for words not known
    this.alike = new double[pairs.alike()];
    this.totals = new double[given.size() + 1];
    double[] sums = new double[given.size()];
    boolean[] same = new boolean[given.size()];
    for (int pair = 0; pair < alike.length; pair++) {
      sums[given(pair)] += pairs.likeness(pair);
      same[given(pair)] |= pairs.likeness(pair) == 1;
    }
    for (int pair = 0; pair < alike.length; pair++) {
      alike[pair] = pairs.likeness(pair) / sums[given(pair)];
    }
    for (int word = 0; word < sums.length; word++) {
      if (sums[word] > 0) {
        faithful[word] =
            given.words[word].number()
                ? NUMBER
                : same[word] ? SAME : sums[word] < ENOUGH ? HARDLY : ALIKE;
      }
    }
  }

  private int given(int pair) {
    return forward ? pairs.source(pair) : pairs.target(pair);
  }

  private int made(int pair) {
    return forward ? pairs.target(pair) : pairs.source(pair);
  }

  /** Learns from links, and leaves in each what it taught. */
  void learn(Lessons lessons) {
    counts = new double[pairs.size()];
    totals = new double[totals.length];
    double[] likely = new double[pairs.size()];
    for (int step = 0; step < STEPS; step++) {
      for (int pair = 0; pair < likely.length; pair++) {
        int word = given(pair);
        double general = (1 - faithful[word]) * this.general[made(pair)];
        likely[pair] = (counts[pair] + PRIOR * (likeness(pair) + general)) / (totals[word] + PRIOR);
      }
      Arrays.fill(counts, 0);
      Arrays.fill(totals, 0);
      for (Lessons.Lesson lesson : lessons.all) {
        share(lesson, likely);
      }
    }
  }

  private double likeness(int pair) {
    return pair < alike.length ? faithful[given(pair)] * alike[pair] : 0;
  }

  /** Parts each made word of a link among the given words that may have made it, or none. */
  private void share(Lessons.Lesson lesson, double[] likely) {
    int e = lesson.source().length;
    int[] given = forward ? lesson.source() : lesson.target();
    int[] made = forward ? lesson.target() : lesson.source();
    float[] taught = forward ? lesson.forward() : lesson.backward();
    int stepGiven = forward ? 1 : e;
    int stepMade = forward ? e : 1;
    for (int m = 0; m < made.length; m++) {
      double sum = general[made[m]];
      for (int g = 0; g < given.length; g++) {
        sum += likely[lesson.pairs()[m * stepMade + g * stepGiven]];
      }
      double scale = lesson.weight() / sum;
      for (int g = 0; g < given.length; g++) {
        int at = m * stepMade + g * stepGiven;
        double part = scale * likely[lesson.pairs()[at]];
        taught[at] = (float) part;
        counts[lesson.pairs()[at]] += part;
        totals[given[g]] += part;
      }
    }
  }

  /**
   * How much a pair was counted, its prior included, for each of what its made word is in general.
   */
  double gain(int pair) {
    return (counts[pair] + PRIOR * likeness(pair)) / general[made(pair)];
  }

  /** Nothing more will be asked about pairs. */
  void forget() {
    pairs = null;
    counts = null;
    alike = null;
  }

  /** How often a made word stands in general, as a share. */
  double general(int made) {
    return general[made];
  }

  /** What a given word makes any word likely by, for each of that word's general share. */
  double plain(int given) {
    return PRIOR * (1 - faithful[given]);
  }

  /** All counts of a given word, its prior included. */
  double total(int given) {
    return totals[given] + PRIOR;
  }
}
