package dev.tallystick.align;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Evidence from words that stand in both texts: numbers, names, terms, placeholders. For a link it
 * is ln(floor + (1 - floor) R) summed over the words of one side, R being how much likelier the
 * sentences of the other side make the word than its general frequency does. A word of the other
 * side makes itself likely with its trust, and any word like the general text with the rest: IBM
 * Model 1 with identity as its only entry.
 *
 * <p>Nearly all words of a link stand on one side only, and those all have the same R. So for each
 * made unit the places of its shared words near the band are looked up once ({@link Near}).
 */
final class SharedWords implements LinkWords {
  /** Words count less than their likelihood ratio says, since they are not independent. */
  private static final double WEIGHT = 0.5;

  static final double FLOOR = 0.1;

  /** A word that makes up more than one in so many says nothing about place. */
  static final double RARE = 60;

  /** Words trusted less are no anchors. */
  private static final double TRUSTED = 0.5;

  /** Places are looked up so far beyond what was asked for, so that it is seldom asked again. */
  private static final int AHEAD = 12;

  private final Side given;

  /** The words of the given side. */
  private final Vocabulary vocabulary;

  /**
   * Words before each given unit; the same less the trust in those shared; before each made unit.
   */
  private final int[] givenBefore;

  private final double[] generalBefore;
  private final int[] madeBefore;

  /** For each made unit the numbers of its rare shared words. */
  private final int[][] made;

  /** How often each word of the vocabulary stands in the made text. */
  private final int[] counts;

  /** How rare each shared word is in the made text: all words for one of this. */
  private final double[] rarity;

  /** For each shared word the given units that have it, ascending, and the trust it has there. */
  private final int[][] places;

  private final double[][] trusts;

  /** For each given unit and number of units from there on: what a word not shared is worth. */
  private final double[] plain;

  private final Near[] near;

  /** Evidence for the words of {@code madeSide}, given those of {@code givenSide}. */
  SharedWords(Side givenSide, Side madeSide) {
    this.given = givenSide;
    this.vocabulary = Vocabulary.of(givenSide, Unit.Word::key);
    this.madeBefore = new int[madeSide.size() + 1];
    this.made = new int[madeSide.size()][];
    this.counts = new int[vocabulary.size()];
    this.rarity = new double[vocabulary.size()];
    countMade(madeSide);
    this.places = new int[vocabulary.size()][];
    this.trusts = new double[vocabulary.size()][];
    this.givenBefore = new int[givenSide.size() + 1];
    this.generalBefore = new double[givenSide.size() + 1];
    placeGiven();
    this.plain = plain();
    this.near = new Near[made.length];
  }

  /** How rare the words are that stand in both texts. */
  Rarity rarity() {
    return new Rarity(vocabulary, rarity);
  }

  /** The words that stand once in either text, in the order of the made one. */
  List<Anchors.Anchor> anchors() {
    List<Anchors.Anchor> anchors = new ArrayList<>();
    for (int j = 0; j < made.length; j++) {
      for (int number : made[j]) {
        boolean once = counts[number] == 1 && places[number].length == 1;
        if (once && trusts[number][0] >= TRUSTED) {
          anchors.add(new Anchors.Anchor(places[number][0], j));
        }
      }
    }
    return anchors;
  }

  private void countMade(Side madeSide) {
    for (int j = 0; j < made.length; j++) {
      Unit.Word[] words = madeSide.units[j].words();
      madeBefore[j + 1] = madeBefore[j] + words.length;
      int[] shared = new int[words.length];
      int n = 0;
      for (Unit.Word word : words) {
        int number = vocabulary.number(word.key());
        if (number >= 0) {
          shared[n++] = number;
          counts[number]++;
        }
      }
      made[j] = Arrays.copyOf(shared, n);
    }
    double words = madeBefore[made.length] + 0.5 * vocabulary.size();
    for (int number = 0; number < counts.length; number++) {
      rarity[number] = counts[number] == 0 ? 0 : words / (counts[number] + 0.5);
    }
    for (int j = 0; j < made.length; j++) {
      made[j] = rareOnce(made[j]);
    }
  }

  private int[] rareOnce(int[] words) {
    Arrays.sort(words);
    int n = 0;
    for (int i = 0; i < words.length; i++) {
      boolean repeated = n > 0 && words[n - 1] == words[i];
      if (!repeated && rarity[words[i]] >= RARE) {
        words[n++] = words[i];
      }
    }
    return Arrays.copyOf(words, n);
  }

  private void placeGiven() {
    int[] filled = new int[vocabulary.size()];
    for (int i = 0; i < given.size(); i++) {
      Unit.Word[] words = given.units[i].words();
      double general = words.length;
      for (Unit.Word word : words) {
        int number = vocabulary.number(word.key());
        if (rarity[number] > 0) {
          general -= word.trust();
        }
        if (rarity[number] >= RARE) {
          place(number, filled[number]++, i, word.trust());
        }
      }
      givenBefore[i + 1] = givenBefore[i] + words.length;
      generalBefore[i + 1] = generalBefore[i] + general;
    }
    for (int number = 0; number < filled.length; number++) {
      if (places[number] != null) {
        places[number] = Arrays.copyOf(places[number], filled[number]);
      }
    }
  }

  private void place(int number, int at, int unit, double trust) {
    if (at == 0) {
      places[number] = new int[2];
      trusts[number] = new double[2];
    } else if (at == places[number].length) {
      places[number] = Arrays.copyOf(places[number], 2 * at);
      trusts[number] = Arrays.copyOf(trusts[number], 2 * at);
    }
    places[number][at] = unit;
    trusts[number][at] = trust;
  }

  private double[] plain() {
    double[] worth = new double[given.size() * Shape.MOST];
    for (int from = 0; from < given.size(); from++) {
      for (int n = 1; n <= Shape.MOST && from + n <= given.size(); n++) {
        double general = 1 + generalBefore[from + n] - generalBefore[from];
        int words = 1 + givenBefore[from + n] - givenBefore[from];
        worth[from * Shape.MOST + n - 1] = Math.log(FLOOR + (1 - FLOOR) * general / words);
      }
    }
    return worth;
  }

  @Override
  public double worth(int s, int sEnd, int t, int tEnd) {
    return WEIGHT * logRatio(s, sEnd, t, tEnd);
  }

  @Override
  public double alike(int s, int t) {
    return logRatio(s, s + 1, t, t + 1);
  }

  /** Natural log of the likelihood ratio of the words of made units, given those of given units. */
  double logRatio(int givenFrom, int givenTo, int madeFrom, int madeTo) {
    double plainWord = plain[givenFrom * Shape.MOST + givenTo - givenFrom - 1];
    double sum = plainWord * (madeBefore[madeTo] - madeBefore[madeFrom]);
    for (int j = madeFrom; j < madeTo; j++) {
      if (made[j].length > 0) {
        sum += near(j, givenFrom, givenTo).beyondPlain(givenFrom, givenTo);
      }
    }
    return sum;
  }

  /** How much more each unit of its weight makes a shared word worth than one not shared. */
  private double step(int givenFrom, int givenTo) {
    double general = 1 + generalBefore[givenTo] - generalBefore[givenFrom];
    int words = 1 + givenBefore[givenTo] - givenBefore[givenFrom];
    return (1 - FLOOR) / (FLOOR * words + (1 - FLOOR) * general);
  }

  private Near near(int j, int from, int to) {
    Near found = near[j];
    if (found == null || from < found.from || to > found.to) {
      int first = Math.max(0, from - AHEAD);
      int last = Math.min(given.size(), to + AHEAD);
      if (found != null) {
        first = Math.min(first, found.from);
        last = Math.max(last, found.to);
      }
      found = new Near(made[j], first, last);
      near[j] = found;
    }
    return found;
  }

  private static int firstFrom(int[] ascending, int least) {
    int at = Arrays.binarySearch(ascending, least);
    while (at > 0 && ascending[at - 1] == least) {
      at--; // a word may stand twice in one unit
    }
    return at >= 0 ? at : -at - 1;
  }

  /** Where the shared words of one made unit stand in a stretch of given units. */
  private final class Near {
    final int from;
    final int to;

    /** For each given unit the last entry of a word that it has, or -1. */
    private final int[] lastOf;

    /** For each entry the one before it in the same given unit, or -1. */
    private int[] before = new int[4];

    private int[] word = new int[4];
    private double[] weight = new double[4];
    private int count;

    Near(int[] words, int from, int to) {
      this.from = from;
      this.to = to;
      this.lastOf = new int[to - from];
      Arrays.fill(lastOf, -1);
      for (int number : words) {
        int[] at = places[number];
        for (int k = firstFrom(at, from); k < at.length && at[k] < to; k++) {
          add(number, at[k] - from, rarity[number] * trusts[number][k]);
        }
      }
    }

    private void add(int number, int unit, double weighs) {
      int last = lastOf[unit];
      if (last >= 0 && word[last] == number) {
        weight[last] += weighs; // a word may stand twice in one unit
        return;
      }
      if (count == word.length) {
        before = Arrays.copyOf(before, 2 * count);
        word = Arrays.copyOf(word, 2 * count);
        weight = Arrays.copyOf(weight, 2 * count);
      }
      before[count] = last;
      word[count] = number;
      weight[count] = weighs;
      lastOf[unit] = count++;
    }

    /** What the shared words say beyond what they would say if they were not shared. */
    double beyondPlain(int givenFrom, int givenTo) {
      double step = step(givenFrom, givenTo);
      double sum = 0;
      for (int unit = givenFrom; unit < givenTo; unit++) {
        for (int entry = lastOf[unit - from]; entry >= 0; entry = before[entry]) {
          int number = word[entry];
          if (weight(number, givenFrom, unit) == 0) {
            double own = weight[entry] + weight(number, unit + 1, givenTo);
            sum += Math.log(1 + own * step);
          }
        }
      }
      return sum;
    }

    private double weight(int number, int givenFrom, int givenTo) {
      double sum = 0;
      for (int unit = givenFrom; unit < givenTo; unit++) {
        for (int entry = lastOf[unit - from]; entry >= 0; entry = before[entry]) {
          sum += word[entry] == number ? weight[entry] : 0;
        }
      }
      return sum;
    }
  }
}
