package dev.tallystick.align;

import java.util.Arrays;

/** The words of a text, numbered from 0. */
final class Vocabulary {
  private final long[] keys;

  private Vocabulary(long[] ascending) {
    this.keys = ascending;
  }

  static Vocabulary of(Side side) {
    int words = 0;
    for (Unit unit : side.units) {
      words += unit.words().length;
    }
    long[] keys = new long[words];
    int at = 0;
    for (Unit unit : side.units) {
      for (Unit.Word word : unit.words()) {
        keys[at++] = word.key();
      }
    }
    Arrays.sort(keys);
    int distinct = 0;
    for (int i = 0; i < keys.length; i++) {
      if (i == 0 || keys[i] != keys[i - 1]) {
        keys[distinct++] = keys[i];
      }
    }
    return new Vocabulary(Arrays.copyOf(keys, distinct));
  }

  int size() {
    return keys.length;
  }

  /** The number of a word, or less than 0 if the text does not have it. */
  int number(Unit.Word word) {
    return Arrays.binarySearch(keys, word.key());
  }
}
