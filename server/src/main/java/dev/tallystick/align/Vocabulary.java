package dev.tallystick.align;

import java.util.Arrays;
import java.util.function.ToLongFunction;

/** The words of a text, numbered from 0 in the order in which they first stand there. */
final class Vocabulary {
  /** Keys are hashed well already, so a word lies at its key's last bits or soon behind. */
  private final long[] keys;

  /** For each place the number of its word; -1 where there is none. */
  private final int[] numbers;

  private int size;

  private Vocabulary(int words) {
    int places = Integer.highestOneBit(words + 1) * 4;
    this.keys = new long[places];
    this.numbers = new int[places];
    Arrays.fill(numbers, -1);
  }

  /** The words of a text, told apart by {@code key}. */
  static Vocabulary of(Side side, ToLongFunction<Unit.Word> key) {
    int words = 0;
    for (Unit unit : side.units) {
      words += unit.words().length;
    }
    Vocabulary vocabulary = new Vocabulary(words);
    for (Unit unit : side.units) {
      for (Unit.Word word : unit.words()) {
        vocabulary.add(key.applyAsLong(word));
      }
    }
    return vocabulary;
  }

  private void add(long key) {
    int place = place(key);
    if (numbers[place] < 0) {
      keys[place] = key;
      numbers[place] = size++;
    }
  }

  private int place(long key) {
    int place = (int) key & keys.length - 1;
    while (numbers[place] >= 0 && keys[place] != key) {
      place = place + 1 & keys.length - 1;
    }
    return place;
  }

  int size() {
    return size;
  }

  /** The number of a word, or less than 0 if the text does not have it. */
  int number(long key) {
    return numbers[place(key)];
  }
}
