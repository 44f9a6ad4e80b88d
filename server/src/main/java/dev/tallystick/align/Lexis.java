package dev.tallystick.align;

import java.util.Arrays;

/**
 * Evidence from the words of a link, by what the links of the pair itself have taught. How likely
 * the words of one side make a word of the other is summed over its words; a word counts as {@code
 * ln(floor + (1 - floor) R)}, R being how much likelier the link makes it than its share in the
 * text does.
 *
 * <p>What a link taught is left out wherever one of its sentences is judged: else a word pair seen
 * in one wrong link only would make that very link look certain.
 */
final class Lexis implements LinkWords {
  private static final double FLOOR = 0.1;
  private static final double FORWARD = 0.45;
  private static final double BACKWARD = 0.15;

  /** A pair of words that is worth less than this in both directions is let go. */
  private static final double LEAST = 0.02;

  private static final int KEPT = 8;
  private static final double HUGE = 1e250;
  private static final double TINY = 1e-250;

  private final Stems source;
  private final Stems target;
  private final Band band;
  private final WordPairs pairs;
  private final Lessons lessons;
  private final Translations forward;
  private final Translations backward;

  private final Entries entries;
  private final double[][] sourceScale;
  private final double[] sourcePlain;
  private final double[][] targetScale;
  private final double[] dense;
  private final double[] made;
  private final double[] inSource;
  private final double[] inTarget;
  private final Row[] rows = new Row[KEPT];

  private Lexis(Stems source, Stems target, WordPairs pairs, Lessons lessons, Band band) {
    this.source = source;
    this.target = target;
    this.band = band;
    this.pairs = pairs;
    this.lessons = lessons;
    this.forward = new Translations(pairs, source, target, true);
    this.backward = new Translations(pairs, target, source, false);
    forward.learn(lessons);
    backward.learn(lessons);
    this.entries = entries();
    this.sourceScale = new double[source.of.length][];
    this.sourcePlain = new double[source.of.length];
    this.targetScale = new double[target.of.length][];
    this.dense = new double[source.size()];
    this.made = new double[source.size()];
    this.inSource = new double[source.size()];
    this.inTarget = new double[target.size()];
  }

  /**
   * Learns from the links that a look has found probable.
   *
   * @param band where links will be judged
   */
  static Lexis learnt(Posteriors posteriors, Stems source, Stems target, Band band) {
    WordPairs pairs = new WordPairs(source, target);
    Lessons lessons = new Lessons(posteriors, source, target, pairs);
    return new Lexis(source, target, pairs, lessons, band);
  }

  /**
   * What each target word has to do with source words: for the word {@code f} the entries from
   * {@code first[f]} on.
   *
   * @param source the source word of each
   * @param forward how much that makes the target word, by its general share
   * @param backward the same the other way
   */
  private record Entries(int[] first, int[] source, float[] forward, float[] backward) {
    static Entries room(int words, int entries) {
      return new Entries(
          new int[words + 1], new int[entries], new float[entries], new float[entries]);
    }
  }

  private Entries entries() {
    int[] counts = new int[target.size() + 1];
    int all = 0;
    for (int pair = 0; pair < pairs.size(); pair++) {
      if (matters(pair)) {
        counts[pairs.target(pair) + 1]++;
        all++;
      }
    }
    Entries room = Entries.room(target.size(), all);
    for (int f = 0; f < target.size(); f++) {
      room.first[f + 1] = room.first[f] + counts[f + 1];
    }
    int[] next = Arrays.copyOf(room.first, target.size());
    for (int pair = 0; pair < pairs.size(); pair++) {
      if (matters(pair)) {
        int at = next[pairs.target(pair)]++;
        room.source[at] = pairs.source(pair);
        room.forward[at] = (float) forward.gain(pair);
        room.backward[at] = (float) backward.gain(pair);
      }
    }
    return room;
  }

  private boolean matters(int pair) {
    return forward.gain(pair) >= LEAST * forward.total(pairs.source(pair))
        || backward.gain(pair) >= LEAST * backward.total(pairs.target(pair));
  }

  @Override
  public double worth(int s, int sEnd, int t, int tEnd) {
    return FORWARD * forward(s, sEnd, t, tEnd) + BACKWARD * backward(s, sEnd, t, tEnd);
  }

  @Override
  public double alike(int s, int t) {
    return forward(s, s + 1, t, t + 1);
  }

  private double forward(int s, int sEnd, int t, int tEnd) {
    double scale = (1 - FLOOR) / (1 + count(source, s, sEnd));
    double log = 0;
    double product = 1;
    for (int j = t; j < tEnd; j++) {
      Row row = row(j, s, sEnd);
      for (int b = 0; b < target.of[j].length; b++) {
        double sum = 1;
        for (int i = s; i < sEnd; i++) {
          sum += row.forward[i - row.first][b];
        }
        product *= FLOOR + scale * sum;
        if (product > HUGE || product < TINY) {
          log += Math.log(product);
          product = 1;
        }
      }
    }
    return log + Math.log(product);
  }

  private double backward(int s, int sEnd, int t, int tEnd) {
    double scale = (1 - FLOOR) / (1 + count(target, t, tEnd));
    double log = 0;
    double product = 1;
    for (int i = s; i < sEnd; i++) {
      for (int a = 0; a < source.of[i].length; a++) {
        double sum = 1;
        for (int j = t; j < tEnd; j++) {
          Row row = row(j, s, sEnd);
          sum += row.backward[i - row.first][a];
        }
        product *= FLOOR + scale * sum;
        if (product > HUGE || product < TINY) {
          log += Math.log(product);
          product = 1;
        }
      }
    }
    return log + Math.log(product);
  }

  private static int count(Stems stems, int from, int to) {
    int count = 0;
    for (int i = from; i < to; i++) {
      count += stems.of[i].length;
    }
    return count;
  }

  /** What one target unit and some source units make of each other's words. */
  private static final class Row {
    final int target;
    final int first;
    final float[][] forward;
    final float[][] backward;

    Row(int target, int first, int end) {
      this.target = target;
      this.first = first;
      this.forward = new float[end - first][];
      this.backward = new float[end - first][];
    }
  }

  private Row row(int j, int s, int sEnd) {
    Row row = rows[j % KEPT];
    if (row == null || row.target != j || s < row.first || sEnd > row.first + row.forward.length) {
      int first = s;
      int end = sEnd;
      for (int t = Math.max(0, j - Shape.MOST + 1); t <= j; t++) {
        first = Math.min(first, band.first()[t]);
        end = Math.max(end, band.last()[t] + Shape.MOST);
      }
      row = new Row(j, first, Math.min(end, source.of.length));
      fill(row);
      rows[j % KEPT] = row;
    }
    return row;
  }

  private void fill(Row row) {
    int j = row.target;
    int[] said = target.of[j];
    double[] scale = targetScale(j);
    double plain = 0;
    for (int b = 0; b < said.length; b++) {
      plain += backward.plain(said[b]) * scale[b];
      inTarget[said[b]] += scale[b];
    }
    for (int i = 0; i < row.forward.length; i++) {
      row.forward[i] = new float[said.length];
      sourceScale(row.first + i);
    }
    for (int b = 0; b < said.length; b++) {
      spread(j, said[b], scale[b]);
      for (int i = 0; i < row.forward.length; i++) {
        row.forward[i][b] = (float) (sourcePlain[row.first + i] + sum(row.first + i));
      }
      clear(j, said[b]);
    }
    for (int i = 0; i < row.backward.length; i++) {
      int[] words = source.of[row.first + i];
      row.backward[i] = new float[words.length];
      for (int a = 0; a < words.length; a++) {
        row.backward[i][a] = (float) (plain + made[words[a]]);
      }
      leaveOut(row, i, (float) plain);
    }
    for (int f : said) {
      forget(j, f);
      inTarget[f] = 0;
    }
  }

  /** Lays out what makes a target word, and adds what it makes, less the lessons of its unit. */
  private void spread(int j, int f, double scale) {
    for (int at = entries.first[f]; at < entries.first[f + 1]; at++) {
      int e = entries.source[at];
      dense[e] = entries.forward[at];
      made[e] += entries.backward[at] * scale;
    }
    for (int x : lessons.ofTarget[j]) {
      Lessons.Lesson lesson = lessons.all.get(x);
      int width = lesson.source().length;
      for (int b = 0; b < lesson.target().length; b++) {
        if (lesson.target()[b] == f) {
          for (int a = 0; a < width; a++) {
            int e = lesson.source()[a];
            dense[e] -= lesson.forward()[b * width + a] / forward.general(f);
            made[e] -= lesson.backward()[b * width + a] / backward.general(e) * scale;
          }
        }
      }
    }
  }

  private double sum(int i) {
    int[] words = source.of[i];
    double[] scale = sourceScale[i];
    double sum = 0;
    for (int a = 0; a < words.length; a++) {
      sum += Math.max(0, dense[words[a]]) * scale[a];
    }
    return sum;
  }

  private void clear(int j, int f) {
    for (int at = entries.first[f]; at < entries.first[f + 1]; at++) {
      dense[entries.source[at]] = 0;
    }
    for (int x : lessons.ofTarget[j]) {
      for (int e : lessons.all.get(x).source()) {
        dense[e] = 0;
      }
    }
  }

  private void forget(int j, int f) {
    for (int at = entries.first[f]; at < entries.first[f + 1]; at++) {
      made[entries.source[at]] = 0;
    }
    for (int x : lessons.ofTarget[j]) {
      for (int e : lessons.all.get(x).source()) {
        made[e] = 0;
      }
    }
  }

  /** Takes away what the other lessons of a source unit taught of its words and the row's. */
  private void leaveOut(Row row, int at, float plain) {
    int i = row.first + at;
    int[] words = source.of[i];
    double[] scale = sourceScale[i];
    for (int a = 0; a < words.length; a++) {
      inSource[words[a]] += scale[a];
    }
    for (int x : lessons.ofSource[i]) {
      if (!isIn(lessons.ofTarget[row.target], x)) {
        leaveOut(row, at, lessons.all.get(x));
      }
    }
    for (int a = 0; a < words.length; a++) {
      inSource[words[a]] = 0;
      row.backward[at][a] = Math.max(plain, row.backward[at][a]);
    }
    for (int b = 0; b < row.forward[at].length; b++) {
      row.forward[at][b] = (float) Math.max(sourcePlain[i], row.forward[at][b]);
    }
  }

  private void leaveOut(Row row, int at, Lessons.Lesson lesson) {
    int[] said = target.of[row.target];
    int[] words = source.of[row.first + at];
    int width = lesson.source().length;
    for (int b = 0; b < lesson.target().length; b++) {
      int f = lesson.target()[b];
      if (inTarget[f] > 0) {
        double mass = 0;
        for (int a = 0; a < width; a++) {
          mass += lesson.forward()[b * width + a] * inSource[lesson.source()[a]];
        }
        for (int k = 0; k < said.length; k++) {
          row.forward[at][k] -= said[k] == f ? (float) (mass / forward.general(f)) : 0;
        }
        for (int a = 0; a < width; a++) {
          int e = lesson.source()[a];
          if (inSource[e] > 0) {
            float less =
                (float) (lesson.backward()[b * width + a] / backward.general(e) * inTarget[f]);
            for (int k = 0; k < words.length; k++) {
              row.backward[at][k] -= words[k] == e ? less : 0;
            }
          }
        }
      }
    }
  }

  private static boolean isIn(int[] list, int value) {
    for (int one : list) {
      if (one == value) {
        return true;
      }
    }
    return false;
  }

  /** For each word of a source unit one over all its counts, less its own lessons. */
  private double[] sourceScale(int i) {
    if (sourceScale[i] == null) {
      int[] words = source.of[i];
      double[] scale = new double[words.length];
      for (int a = 0; a < words.length; a++) {
        double own = 0;
        for (int x : lessons.ofSource[i]) {
          own += lessons.all.get(x).ofSource(words[a]);
        }
        scale[a] = 1 / Math.max(Translations.PRIOR, forward.total(words[a]) - own);
        sourcePlain[i] += forward.plain(words[a]) * scale[a];
      }
      sourceScale[i] = scale;
    }
    return sourceScale[i];
  }

  private double[] targetScale(int j) {
    if (targetScale[j] == null) {
      int[] words = target.of[j];
      double[] scale = new double[words.length];
      for (int b = 0; b < words.length; b++) {
        double own = 0;
        for (int x : lessons.ofTarget[j]) {
          own += lessons.all.get(x).ofTarget(words[b]);
        }
        scale[b] = 1 / Math.max(Translations.PRIOR, backward.total(words[b]) - own);
      }
      targetScale[j] = scale;
    }
    return targetScale[j];
  }
}
