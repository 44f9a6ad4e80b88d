package dev.tallystick.align;

/** The words of one text by the number of their stem, from 0 on. */
final class Stems {
  private static final double SMOOTHING = 0.5;
  private static final int[] NONE = {};

  /** For each unit the numbers of its words, in order; none for a verbatim one. */
  final int[][] of;

  /** For each number one of its words. */
  final Unit.Word[] words;

  /** For each number its share among all words of the text, smoothed. */
  final double[] general;

  private final Vocabulary vocabulary;

  Stems(Side side) {
    this.vocabulary = Vocabulary.of(side, Unit.Word::stem);
    this.of = new int[side.size()][];
    this.words = new Unit.Word[vocabulary.size()];
    int[] counts = new int[words.length];
    int all = 0;
    for (int i = 0; i < of.length; i++) {
      Unit.Word[] said = side.units[i].words();
      int[] numbers = new int[said.length];
      for (int k = 0; k < said.length; k++) {
        numbers[k] = vocabulary.number(said[k].stem());
        words[numbers[k]] = said[k];
        counts[numbers[k]]++;
      }
      of[i] = side.units[i].verbatim() ? NONE : numbers;
      all += said.length;
    }
    this.general = new double[words.length];
    for (int number = 0; number < words.length; number++) {
      general[number] = (counts[number] + SMOOTHING) / (all + SMOOTHING * words.length);
    }
  }

  int size() {
    return words.length;
  }

  /** The number of a stem, or less than 0 if the text does not have it. */
  int number(long stem) {
    return vocabulary.number(stem);
  }

  /** The words of some units one after another. */
  int[] of(int from, int to) {
    if (to - from == 1) {
      return of[from];
    }
    int length = 0;
    for (int i = from; i < to; i++) {
      length += of[i].length;
    }
    int[] all = new int[length];
    int at = 0;
    for (int i = from; i < to; i++) {
      System.arraycopy(of[i], 0, all, at, of[i].length);
      at += of[i].length;
    }
    return all;
  }
}
