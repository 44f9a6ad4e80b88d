package dev.tallystick.text;

import java.util.List;
import java.util.Random;

/** Texts of everything that makes positions hard: line ends of all kinds, pairs, lone halves. */
final class RandomTexts {
  private static final List<String> PIECES =
      List.of(
          "a",
          "Wort",
          " ",
          "\n",
          "\r\n",
          "\r",
          "\n\r",
          "\uD83D\uDE00",
          "\uD83D",
          "\uDE00",
          "\u00E9",
          "\u6F22",
          "\u2028",
          "\uFEFF",
          "\t");

  private final Random random;

  RandomTexts(long seed) {
    this.random = new Random(seed);
  }

  String next() {
    return next(random.nextInt(25));
  }

  String next(int pieces) {
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < pieces; i++) {
      text.append(PIECES.get(random.nextInt(PIECES.size())));
    }
    return text.toString();
  }

  int below(int bound) {
    return random.nextInt(bound);
  }
}
