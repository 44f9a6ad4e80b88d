package dev.tallystick.align;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;

/**
 * What the links of a pair have taught about its words. It knows sentences by their words and
 * length, not by their places: so it holds for texts that were edited since.
 */
final class Lexicon {
  /** A pair of words that is worth less than this in both directions is let go. */
  private static final double LEAST = 0.02;

  /** Of sentences that are the same the lessons of so many are kept. */
  private static final int KEPT = 4;

  final Stems source;
  final Stems target;
  final Entries entries;
  final Translations forward;
  final Translations backward;
  private final Map<Long, Taught> ofSource;
  private final Map<Long, Taught> ofTarget;

  private Lexicon(Stems source, Stems target, WordPairs pairs, Lessons lessons) {
    this.source = source;
    this.target = target;
    this.forward = new Translations(pairs, source, target, true);
    this.backward = new Translations(pairs, target, source, false);
    forward.learn(lessons);
    backward.learn(lessons);
    this.entries = entries(pairs);
    Lessons.Lesson[] learnt =
        lessons.all.stream().map(Lessons.Lesson::learnt).toArray(Lessons.Lesson[]::new);
    this.ofSource = byContent(source, learnt, lessons.ofSource);
    this.ofTarget = byContent(target, learnt, lessons.ofTarget);
    forward.forget();
    backward.forget();
  }

  /** Learns from the links that a look has found probable. */
  static Lexicon learnt(Posteriors posteriors, Stems source, Stems target) {
    WordPairs pairs = new WordPairs(source, target);
    return new Lexicon(source, target, pairs, new Lessons(posteriors, source, target, pairs));
  }

  /**
   * What each target word has to do with source words: for the word {@code f} the entries from
   * {@code first[f]} on.
   *
   * @param source the source word of each
   * @param forward how much that makes the target word, by its general share
   * @param backward the same the other way
   */
  record Entries(int[] first, int[] source, float[] forward, float[] backward) {
    static Entries room(int words, int entries) {
      return new Entries(
          new int[words + 1], new int[entries], new float[entries], new float[entries]);
    }
  }

  /**
   * The lessons in which sentences of one content stand.
   *
   * @param share what counts of each: sentences that are the same share what is left out
   */
  record Taught(Lessons.Lesson[] lessons, double share) {
    static final Taught NOTHING = new Taught(new Lessons.Lesson[0], 1);

    boolean has(Lessons.Lesson lesson) {
      for (Lessons.Lesson one : lessons) {
        if (one == lesson) {
          return true;
        }
      }
      return false;
    }
  }

  /** What sentences with a source unit's content have taught. */
  Taught bySource(long content) {
    return ofSource.getOrDefault(content, Taught.NOTHING);
  }

  /** What sentences with a target unit's content have taught. */
  Taught byTarget(long content) {
    return ofTarget.getOrDefault(content, Taught.NOTHING);
  }

  private static Map<Long, Taught> byContent(Stems stems, Lessons.Lesson[] lessons, int[][] of) {
    Map<Long, Taught> taught = new HashMap<>();
    Map<Long, Integer> counts = new HashMap<>();
    for (int unit = 0; unit < of.length; unit++) {
      long content = stems.content[unit];
      int count = counts.merge(content, 1, Integer::sum);
      if (count <= KEPT) {
        Taught before = taught.getOrDefault(content, Taught.NOTHING);
        int known = before.lessons.length;
        Lessons.Lesson[] all = Arrays.copyOf(before.lessons, known + of[unit].length);
        for (int i = 0; i < of[unit].length; i++) {
          all[known + i] = lessons[of[unit][i]];
        }
        taught.put(content, new Taught(all, 1.0 / count));
      }
    }
    return taught;
  }

  private Entries entries(WordPairs pairs) {
    int[] counts = new int[target.size() + 1];
    int all = 0;
    for (int pair = 0; pair < pairs.size(); pair++) {
      if (matters(pairs, pair)) {
        counts[pairs.target(pair) + 1]++;
        all++;
      }
    }
    Entries room = Entries.room(target.size() + 1, all); // one more: the unknown word
    for (int f = 0; f < target.size(); f++) {
      room.first[f + 1] = room.first[f] + counts[f + 1];
    }
    room.first[target.size() + 1] = all;
    int[] next = Arrays.copyOf(room.first, target.size());
    for (int pair = 0; pair < pairs.size(); pair++) {
      if (matters(pairs, pair)) {
        int at = next[pairs.target(pair)]++;
        room.source[at] = pairs.source(pair);
        room.forward[at] = (float) forward.gain(pair);
        room.backward[at] = (float) backward.gain(pair);
      }
    }
    return room;
  }

  private boolean matters(WordPairs pairs, int pair) {
    return forward.gain(pair) >= LEAST * forward.total(pairs.source(pair))
        || backward.gain(pair) >= LEAST * backward.total(pairs.target(pair));
  }
}
