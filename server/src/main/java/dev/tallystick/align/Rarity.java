package dev.tallystick.align;

import java.util.Arrays;

/**
 * How rare the words are that stood in both texts of a pair, and what that tells of two units
 * beside each other, wherever they stand; as {@link SharedWords} has it of single units.
 *
 * @param vocabulary the words of the source
 * @param all for each of them all words of the translation for one of this; 0 if it has none
 */
record Rarity(Vocabulary vocabulary, double[] all) {
  private static final double FLOOR = SharedWords.FLOOR;

  private double of(Unit.Word word) {
    int number = vocabulary.number(word.key());
    return number < 0 ? 0 : all[number];
  }

  /** How much likelier the words of a source unit make those of a target unit (nats). */
  double alike(Unit source, Unit target) {
    double general = 1 + source.words().length;
    for (Unit.Word word : source.words()) {
      general -= of(word) > 0 ? word.trust() : 0;
    }
    int words = 1 + source.words().length;
    double step = (1 - FLOOR) / (FLOOR * words + (1 - FLOOR) * general);
    double sum = target.words().length * Math.log(FLOOR + (1 - FLOOR) * general / words);
    long[] keys = Arrays.stream(target.words()).mapToLong(Unit.Word::key).sorted().toArray();
    for (int i = 0; i < keys.length; i++) {
      if (i == 0 || keys[i] != keys[i - 1]) {
        sum += Math.log(1 + weight(keys[i], source) * step);
      }
    }
    return sum;
  }

  /** What the words of a unit that are this one weigh. */
  private double weight(long key, Unit source) {
    double weight = 0;
    for (Unit.Word word : source.words()) {
      double rarity = word.key() == key ? of(word) : 0;
      weight += rarity >= SharedWords.RARE ? rarity * word.trust() : 0;
    }
    return weight;
  }
}
