package dev.tallystick.align;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** The links that words are learnt from. */
final class Lessons {
  /** Links less probable than this teach nothing. */
  private static final double LEAST = 0.05;

  private static final int[] NONE = {};

  /**
   * One link.
   *
   * @param weight its posterior
   * @param pairs the number of each pair of a target and a source word, by target word first
   * @param forward what it taught of each pair from source to target, backward the other way
   */
  record Lesson(
      int[] source, int[] target, double weight, int[] pairs, float[] forward, float[] backward) {

    /** All that it taught of a source word. */
    double ofSource(int word) {
      double sum = 0;
      for (int a = 0; a < source.length; a++) {
        if (source[a] == word) {
          for (int at = a; at < forward.length; at += source.length) {
            sum += forward[at];
          }
        }
      }
      return sum;
    }

    /** All that it taught of a target word. */
    double ofTarget(int word) {
      double sum = 0;
      for (int b = 0; b < target.length; b++) {
        if (target[b] == word) {
          for (int at = b * source.length; at < (b + 1) * source.length; at++) {
            sum += backward[at];
          }
        }
      }
      return sum;
    }
  }

  final List<Lesson> all = new ArrayList<>();

  /** For each unit the lessons in which it stands. */
  final int[][] ofSource;

  final int[][] ofTarget;

  Lessons(Posteriors posteriors, Stems source, Stems target, WordPairs pairs) {
    this.ofSource = new int[source.of.length][];
    this.ofTarget = new int[target.of.length][];
    Arrays.fill(ofSource, NONE);
    Arrays.fill(ofTarget, NONE);
    posteriors.links(
        LEAST,
        (shape, t, s, posterior) -> {
          Shape taken = Shape.ADAPTIVE.get(shape);
          int[] e = source.of(s, s + taken.sources());
          int[] f = target.of(t, t + taken.targets());
          if (e.length > 0 && f.length > 0) {
            add(ofSource, s, s + taken.sources());
            add(ofTarget, t, t + taken.targets());
            all.add(lesson(e, f, posterior, pairs));
          }
        });
  }

  private void add(int[][] of, int from, int to) {
    for (int i = from; i < to; i++) {
      of[i] = Arrays.copyOf(of[i], of[i].length + 1);
      of[i][of[i].length - 1] = all.size();
    }
  }

  private static Lesson lesson(int[] e, int[] f, double weight, WordPairs pairs) {
    int[] numbers = new int[e.length * f.length];
    for (int b = 0; b < f.length; b++) {
      for (int a = 0; a < e.length; a++) {
        numbers[b * e.length + a] = pairs.number(e[a], f[b]);
      }
    }
    float[] forward = new float[numbers.length];
    float[] backward = new float[numbers.length];
    return new Lesson(e, f, weight, numbers, forward, backward);
  }
}
