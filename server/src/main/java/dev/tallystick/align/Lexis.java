package dev.tallystick.align;

import java.util.Arrays;

/**
 * Evidence from the words of a link, by what the links of the pair itself have taught. How likely
 * the words of one side make a word of the other is summed over its words; a word counts as {@code
 * ln(floor + (1 - floor) R)}, R being how much likelier the link makes it than its share in the
 * text does.
 *
 * <p>What a link taught is left out wherever one of its sentences is judged: else a word pair seen
 * in one wrong link only would make that very link look certain. A sentence is known by its words
 * and length ({@link Lexicon}), so that this holds for texts that were edited since.
 */
final class Lexis implements LinkWords {
  private static final double FLOOR = 0.1;
  private static final double FORWARD = 0.45;
  private static final double BACKWARD = 0.15;

  /** Rows are kept, as most of them outlast an edit. */
  private static final int KEPT = 64;

  private static final double HUGE = 1e250;
  private static final double TINY = 1e-250;

  private final Lexicon lexicon;
  private final Lexicon.Entries entries;
  private final Translations forward;
  private final Translations backward;

  /** The units of either text as the lexicon knows them, once they were asked for. */
  private Said[] source;

  private Said[] target;
  private Unit[] sourceUnits;
  private Unit[] targetUnits;
  private Band band;

  private final double[] dense;
  private final double[] made;
  private final double[] inSource;
  private final double[] inTarget;
  private final Row[] rows = new Row[KEPT];

  /**
   * Judges two texts by what the links of these, or of an earlier state of them, have taught.
   *
   * @param band where links will be judged
   */
  Lexis(Lexicon lexicon, Sides sides, Band band) {
    this.lexicon = lexicon;
    this.entries = lexicon.entries;
    this.forward = lexicon.forward;
    this.backward = lexicon.backward;
    this.sourceUnits = sides.source().units;
    this.targetUnits = sides.target().units;
    this.source = new Said[sourceUnits.length];
    this.target = new Said[targetUnits.length];
    this.band = band;
    this.dense = new double[lexicon.source.size() + 1];
    this.made = new double[lexicon.source.size() + 1];
    this.inSource = new double[lexicon.source.size() + 1];
    this.inTarget = new double[lexicon.target.size() + 1];
  }

  /** The texts are these now. */
  void replace(Change inSource, Change inTarget, Sides sides, Band judgedIn) {
    source = replaced(source, inSource);
    target = replaced(target, inTarget);
    sourceUnits = sides.source().units;
    targetUnits = sides.target().units;
    band = judgedIn;
    Row[] before = rows.clone();
    Arrays.fill(rows, null);
    for (Row row : before) {
      if (row != null && row.outlasts(inSource, inTarget)) {
        rows[row.target % KEPT] = row;
      }
    }
  }

  private static Said[] replaced(Said[] said, Change change) {
    Said[] all = new Said[said.length + change.shift()];
    int behind = change.from() + change.removed();
    System.arraycopy(said, 0, all, 0, change.from());
    System.arraycopy(said, behind, all, change.from() + change.added(), said.length - behind);
    return all;
  }

  /**
   * A unit as the lexicon knows it.
   *
   * @param words the numbers of its words
   * @param taught what was learnt from sentences of the same content
   * @param scale for each word one over all its counts, less the unit's own lessons
   * @param plain what its words make of any word of the other text
   */
  private record Said(int[] words, Lexicon.Taught taught, double[] scale, double plain) {}

  @Override
  public double worth(int s, int sEnd, int t, int tEnd) {
    return FORWARD * forward(s, sEnd, t, tEnd) + BACKWARD * backward(s, sEnd, t, tEnd);
  }

  @Override
  public double alike(int s, int t) {
    return forward(s, s + 1, t, t + 1);
  }

  private double forward(int s, int sEnd, int t, int tEnd) {
    double scale = (1 - FLOOR) / (1 + sourceWords(s, sEnd));
    double log = 0;
    double product = 1;
    for (int j = t; j < tEnd; j++) {
      Row row = row(j, s, sEnd);
      for (int b = 0; b < target(j).words.length; b++) {
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
    double scale = (1 - FLOOR) / (1 + targetWords(t, tEnd));
    double log = 0;
    double product = 1;
    for (int i = s; i < sEnd; i++) {
      for (int a = 0; a < source(i).words.length; a++) {
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

  private int sourceWords(int from, int to) {
    int count = 0;
    for (int i = from; i < to; i++) {
      count += source(i).words.length;
    }
    return count;
  }

  private int targetWords(int from, int to) {
    int count = 0;
    for (int j = from; j < to; j++) {
      count += target(j).words.length;
    }
    return count;
  }

  /** What one target unit and some source units make of each other's words. */
  private static final class Row {
    int target;
    int first;
    final float[][] forward;
    final float[][] backward;

    Row(int target, int first, int end) {
      this.target = target;
      this.first = first;
      this.forward = new float[end - first][];
      this.backward = new float[end - first][];
    }

    /** Moves the row along with its units; whether these are all as they were. */
    boolean outlasts(Change inSource, Change inTarget) {
      boolean same =
          inTarget.keeps(target, target + 1) && inSource.keeps(first, first + forward.length);
      target = inTarget.moved(target);
      first = inSource.moved(first);
      return same;
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
      row = new Row(j, first, Math.min(end, source.length));
      fill(row);
      rows[j % KEPT] = row;
    }
    return row;
  }

  private void fill(Row row) {
    Said target = target(row.target);
    int[] said = target.words;
    double[] scale = target.scale;
    double plain = target.plain;
    for (int b = 0; b < said.length; b++) {
      inTarget[said[b]] += scale[b];
    }
    for (int i = 0; i < row.forward.length; i++) {
      row.forward[i] = new float[said.length];
    }
    for (int b = 0; b < said.length; b++) {
      spread(target.taught, said[b], scale[b]);
      for (int i = 0; i < row.forward.length; i++) {
        Said source = source(row.first + i);
        row.forward[i][b] = (float) (source.plain + sum(source));
      }
      clear(target.taught, said[b]);
    }
    for (int i = 0; i < row.backward.length; i++) {
      int[] words = source(row.first + i).words;
      row.backward[i] = new float[words.length];
      for (int a = 0; a < words.length; a++) {
        row.backward[i][a] = (float) (plain + made[words[a]]);
      }
      leaveOut(row, i, (float) plain);
    }
    for (int f : said) {
      forget(target.taught, f);
      inTarget[f] = 0;
    }
  }

  /** Lays out what makes a target word, and adds what it makes, less the lessons of its unit. */
  private void spread(Lexicon.Taught taught, int f, double scale) {
    for (int at = entries.first()[f]; at < entries.first()[f + 1]; at++) {
      int e = entries.source()[at];
      dense[e] = entries.forward()[at];
      made[e] += entries.backward()[at] * scale;
    }
    for (Lessons.Lesson lesson : taught.lessons()) {
      int width = lesson.source().length;
      for (int b = 0; b < lesson.target().length; b++) {
        if (lesson.target()[b] == f) {
          for (int a = 0; a < width; a++) {
            int e = lesson.source()[a];
            double share = taught.share();
            dense[e] -= share * lesson.forward()[b * width + a] / forward.general(f);
            made[e] -= share * lesson.backward()[b * width + a] / backward.general(e) * scale;
          }
        }
      }
    }
  }

  private double sum(Said source) {
    double sum = 0;
    for (int a = 0; a < source.words.length; a++) {
      sum += Math.max(0, dense[source.words[a]]) * source.scale[a];
    }
    return sum;
  }

  private void clear(Lexicon.Taught taught, int f) {
    for (int at = entries.first()[f]; at < entries.first()[f + 1]; at++) {
      dense[entries.source()[at]] = 0;
    }
    for (Lessons.Lesson lesson : taught.lessons()) {
      for (int e : lesson.source()) {
        dense[e] = 0;
      }
    }
  }

  private void forget(Lexicon.Taught taught, int f) {
    for (int at = entries.first()[f]; at < entries.first()[f + 1]; at++) {
      made[entries.source()[at]] = 0;
    }
    for (Lessons.Lesson lesson : taught.lessons()) {
      for (int e : lesson.source()) {
        made[e] = 0;
      }
    }
  }

  /** Takes away what the other lessons of a source unit taught of its words and the row's. */
  private void leaveOut(Row row, int at, float plain) {
    Said source = source(row.first + at);
    int[] words = source.words;
    for (int a = 0; a < words.length; a++) {
      inSource[words[a]] += source.scale[a];
    }
    for (Lessons.Lesson lesson : source.taught.lessons()) {
      if (!target(row.target).taught.has(lesson)) {
        leaveOut(row, at, lesson, source.taught.share());
      }
    }
    for (int a = 0; a < words.length; a++) {
      inSource[words[a]] = 0;
      row.backward[at][a] = Math.max(plain, row.backward[at][a]);
    }
    for (int b = 0; b < row.forward[at].length; b++) {
      row.forward[at][b] = (float) Math.max(source.plain, row.forward[at][b]);
    }
  }

  private void leaveOut(Row row, int at, Lessons.Lesson lesson, double share) {
    int[] said = target(row.target).words;
    int[] words = source(row.first + at).words;
    int width = lesson.source().length;
    for (int b = 0; b < lesson.target().length; b++) {
      int f = lesson.target()[b];
      if (inTarget[f] > 0) {
        double mass = 0;
        for (int a = 0; a < width; a++) {
          mass += share * lesson.forward()[b * width + a] * inSource[lesson.source()[a]];
        }
        for (int k = 0; k < said.length; k++) {
          row.forward[at][k] -= said[k] == f ? (float) (mass / forward.general(f)) : 0;
        }
        for (int a = 0; a < width; a++) {
          int e = lesson.source()[a];
          if (inSource[e] > 0) {
            float less =
                (float)
                    (share * lesson.backward()[b * width + a] / backward.general(e) * inTarget[f]);
            for (int k = 0; k < words.length; k++) {
              row.backward[at][k] -= words[k] == e ? less : 0;
            }
          }
        }
      }
    }
  }

  private Said source(int i) {
    if (source[i] == null) {
      int[] words = lexicon.source.numbers(sourceUnits[i]);
      Lexicon.Taught taught = lexicon.bySource(Stems.content(sourceUnits[i]));
      source[i] = said(words, taught, forward, true);
    }
    return source[i];
  }

  private Said target(int j) {
    if (target[j] == null) {
      int[] words = lexicon.target.numbers(targetUnits[j]);
      Lexicon.Taught taught = lexicon.byTarget(Stems.content(targetUnits[j]));
      target[j] = said(words, taught, backward, false);
    }
    return target[j];
  }

  private static Said said(int[] words, Lexicon.Taught taught, Translations by, boolean ofSource) {
    double[] scale = new double[words.length];
    double plain = 0;
    for (int a = 0; a < words.length; a++) {
      double own = 0;
      for (Lessons.Lesson lesson : taught.lessons()) {
        own += ofSource ? lesson.ofSource(words[a]) : lesson.ofTarget(words[a]);
      }
      double total = by.total(words[a]) - taught.share() * own;
      scale[a] = 1 / Math.max(Translations.PRIOR, total);
      plain += by.plain(words[a]) * scale[a];
    }
    return new Said(words, taught, scale, plain);
  }
}
