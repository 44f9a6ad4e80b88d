package dev.tallystick.bench;

import java.util.Random;

/**
 * A made-up source and a faithful translation of any length, always the same for a seed. The words
 * are nonsense; lengths, numbers, names, merges and splits are as in a technical text.
 */
final class InventedPair {
  private static final String[] SYLLABLES = {
    "ka", "lo", "mi", "ner", "tas", "vu", "sel", "dor", "in", "bra", "qua", "tel", "os", "ry"
  };
  private static final int PARAGRAPH = 6;
  private static final int NAMES = 400;

  private final Random random;
  private final StringBuilder source = new StringBuilder();
  private final StringBuilder target = new StringBuilder();

  InventedPair(int sentences, long seed) {
    this.random = new Random(seed);
    for (int i = 0; i < sentences; i++) {
      boolean opens = i % PARAGRAPH == 0;
      String mark = random.nextInt(3) == 0 ? " " + mark() : "";
      int words = 4 + random.nextInt(24);
      append(source, words, mark, opens, ".");
      int translated = Math.max(3, (int) Math.round(words * (0.9 + 0.35 * random.nextDouble())));
      boolean merges = random.nextInt(20) == 0;
      append(target, translated, mark, opens, merges ? "," : ".");
    }
  }

  String source() {
    return source.toString();
  }

  String target() {
    return target.toString();
  }

  private String mark() {
    return random.nextBoolean() ? "N" + random.nextInt(NAMES) : String.valueOf(random.nextInt(999));
  }

  private void append(StringBuilder text, int words, String mark, boolean opens, String stop) {
    if (text.length() > 0) {
      text.append(opens ? "\n\n" : " ");
    }
    text.append("The");
    for (int i = 0; i < words; i++) {
      text.append(' ');
      for (int syllables = 1 + random.nextInt(3); syllables > 0; syllables--) {
        text.append(SYLLABLES[random.nextInt(SYLLABLES.length)]);
      }
    }
    text.append(mark).append(stop);
  }
}
