package dev.tallystick.opendata;

import com.google.gson.Gson;
import com.google.gson.JsonElement;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;

/**
 * The lengths of the sentences of a text and of a translation.
 *
 * @param source lengths in characters
 * @param target lengths in characters
 * @param changes how many merges, splits and drops made the one the other; empty if unknown
 */
record Lengths(int[] source, int[] target, int[] changes) {
  /** Merges, splits, drops. */
  static final int CHANGES = 3;

  private static final int MERGE = 0;
  private static final int SPLIT = 1;
  private static final int DROP = 2;
  private static final int NONE_OF = 8;

  Lengths(int[] source, int[] target) {
    this(source, target, new int[0]);
  }

  /**
   * A made-up pair with 16 to 34 source sentences; the longest sentence comes to fewer than 234.
   */
  static Lengths drawn(long seed) {
    Random random = new Random(seed);
    int[] source = new int[16 + random.nextInt(19)];
    int[] changes = new int[CHANGES];
    List<Integer> target = new ArrayList<>();
    for (int i = 0; i < source.length; i++) {
      source[i] = 10 + random.nextInt(80);
      int length = translated(source[i], random);
      int change = random.nextInt(CHANGES + NONE_OF);
      if (change == MERGE && !target.isEmpty() && target.get(target.size() - 1) < 110) {
        target.set(target.size() - 1, target.get(target.size() - 1) + 1 + length);
        changes[MERGE]++;
      } else if (change == SPLIT && length > 20) {
        int part = 8 + random.nextInt(length - 16);
        target.addAll(List.of(part, length - part));
        changes[SPLIT]++;
      } else if (change == DROP) {
        changes[DROP]++;
      } else {
        target.add(length);
      }
    }
    return new Lengths(source, target.stream().mapToInt(Integer::intValue).toArray(), changes);
  }

  /** A translation about as long: the spread is that of the model. */
  private static int translated(int length, Random random) {
    double drawn = length + Math.sqrt(6.8 * length) * random.nextGaussian() / 2;
    return Math.min(120, Math.max(4, (int) Math.round(drawn)));
  }

  int longest() {
    return Math.max(Arrays.stream(source).max().orElse(0), Arrays.stream(target).max().orElse(0));
  }

  /** A list of the two. */
  JsonElement json() {
    return new Gson().toJsonTree(List.of(source, target));
  }

  @Override
  public String toString() {
    return json().toString();
  }
}
