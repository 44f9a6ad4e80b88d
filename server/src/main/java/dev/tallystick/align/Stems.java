package dev.tallystick.align;

/** The words of one text by the number of their stem, from 0 on. */
final class Stems {
  private static final double SMOOTHING = 0.5;
  private static final int[] NONE = {};

  /** For each unit the numbers of its words, in order; none for a verbatim one. */
  final int[][] of;

  /** For each number one of its words. */
  final Unit.Word[] words;

  /** For each number its share among all words of the text, smoothed; last that of any other. */
  final double[] general;

  /** For each unit what tells it from others ({@link #content(Unit)}). */
  final long[] content;

  private final Vocabulary vocabulary;

  Stems(Side side) {
    this.vocabulary = Vocabulary.of(side, Unit.Word::stem);
    this.of = new int[side.size()][];
    this.content = new long[side.size()];
    this.words = new Unit.Word[vocabulary.size()];
    int[] counts = new int[words.length];
    int all = 0;
    for (int i = 0; i < of.length; i++) {
      Unit.Word[] said = side.units[i].words();
      content[i] = content(side.units[i]);
      int[] numbers = new int[said.length];
      for (int k = 0; k < said.length; k++) {
        numbers[k] = vocabulary.number(said[k].stem());
        words[numbers[k]] = said[k];
        counts[numbers[k]]++;
      }
      of[i] = side.units[i].verbatim() ? NONE : numbers;
      all += said.length;
    }
    this.general = new double[words.length + 1];
    for (int number = 0; number <= words.length; number++) {
      int count = number < words.length ? counts[number] : 0;
      general[number] = (count + SMOOTHING) / (all + SMOOTHING * words.length);
    }
  }

  /** Equal for units with the same words and of the same length. */
  static long content(Unit unit) {
    long content = unit.length() * 2L + (unit.verbatim() ? 1 : 0);
    for (Unit.Word word : unit.words()) {
      content = (content ^ word.stem()) * 0x9E3779B97F4A7C15L;
      content ^= content >>> 32;
    }
    return content;
  }

  /**
   * The numbers of a unit's words, {@link #size()} for any that is not known; as in {@link #of}.
   */
  int[] numbers(Unit unit) {
    if (unit.verbatim()) {
      return NONE;
    }
    Unit.Word[] said = unit.words();
    int[] numbers = new int[said.length];
    for (int k = 0; k < said.length; k++) {
      int number = vocabulary.number(said[k].stem());
      numbers[k] = number < 0 ? size() : number;
    }
    return numbers;
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
