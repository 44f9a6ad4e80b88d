package dev.tallystick.align;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The pairs of a source and a target word of which anything may be learnt, by number from 0 on:
 * those that are alike, and those that stand in one link.
 */
final class WordPairs {
  /** What two words that only begin alike are worth, the same word being 1. */
  private static final double SAME_ROOT = 0.3;

  private final int targets;

  /** Source word times number of target words plus target word; by hash, -1 where there is none. */
  private long[] keys = new long[1 << 12];

  private int[] numbers = new int[1 << 12];
  private int size;
  private int[] source = new int[1 << 10];
  private int[] target = new int[1 << 10];

  /** How much alike the words of the first pairs are. */
  private final double[] likeness;

  /** The pairs of words that are alike. */
  WordPairs(Stems source, Stems target) {
    this.targets = target.size();
    Arrays.fill(numbers, -1);
    Map<Long, List<Integer>> roots = new HashMap<>();
    for (int f = 0; f < target.size(); f++) {
      if (target.words[f].root() != 0) {
        roots.computeIfAbsent(target.words[f].root(), k -> new ArrayList<>()).add(f);
      }
    }
    double[] alike = new double[1 << 8];
    for (int e = 0; e < source.size(); e++) {
      Unit.Word word = source.words[e];
      int same = target.number(word.stem());
      if (same >= 0) {
        alike = put(alike, number(e, same), word.likeness());
      }
      for (int f : roots.getOrDefault(word.root(), List.of())) {
        if (f != same) {
          alike = put(alike, number(e, f), SAME_ROOT);
        }
      }
    }
    this.likeness = Arrays.copyOf(alike, size);
  }

  private static double[] put(double[] values, int at, double value) {
    double[] room = at < values.length ? values : Arrays.copyOf(values, 2 * values.length);
    room[at] = value;
    return room;
  }

  /** The number of a pair; a new one if it has none yet. */
  int number(int e, int f) {
    long key = (long) e * targets + f;
    int place = place(key);
    if (numbers[place] < 0) {
      if (2 * size >= keys.length) {
        grow();
        place = place(key);
      }
      if (size == source.length) {
        source = Arrays.copyOf(source, 2 * size);
        target = Arrays.copyOf(target, 2 * size);
      }
      keys[place] = key;
      source[size] = e;
      target[size] = f;
      numbers[place] = size++;
    }
    return numbers[place];
  }

  private int place(long key) {
    int place = (int) (key * 0x9E3779B97F4A7C15L >>> 32) & keys.length - 1;
    while (numbers[place] >= 0 && keys[place] != key) {
      place = place + 1 & keys.length - 1;
    }
    return place;
  }

  private void grow() {
    long[] oldKeys = keys;
    int[] oldNumbers = numbers;
    keys = new long[2 * oldKeys.length];
    numbers = new int[keys.length];
    Arrays.fill(numbers, -1);
    for (int i = 0; i < oldKeys.length; i++) {
      if (oldNumbers[i] >= 0) {
        int place = place(oldKeys[i]);
        keys[place] = oldKeys[i];
        numbers[place] = oldNumbers[i];
      }
    }
  }

  int size() {
    return size;
  }

  int source(int pair) {
    return source[pair];
  }

  int target(int pair) {
    return target[pair];
  }

  /** How much alike its words are, from 0 to 1. */
  double likeness(int pair) {
    return pair < likeness.length ? likeness[pair] : 0;
  }

  /** How many of the first pairs are of words that are alike; no others are. */
  int alike() {
    return likeness.length;
  }
}
