package dev.tallystick.prose;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Whether lines were broken by an editor at a fixed width, so that a paragraph runs over several of
 * them, or each line stands for itself.
 *
 * @param width columns at which lines were broken; 0 if they were not
 * @param pairs how many lines have another one below that could go on with them
 */
record Wrapping(int width, int pairs) {
  private static final int NARROWEST = 40;
  private static final int WIDEST = 120;

  /** Judges lines from their widths, their last and their first characters. */
  static Wrapping of(String file, List<Line> all) {
    List<Line> lines = withoutSignatures(file, all);
    int[] widths = new int[lines.size()];
    int pairs = 0;
    for (int i = 0; i + 1 < lines.size(); i++) {
      if (isPair(lines, i)) {
        widths[pairs++] = lines.get(i).width();
      }
    }
    if (pairs == 0) {
      return new Wrapping(0, 0);
    }
    Arrays.sort(widths, 0, pairs);
    // The longest lines may be ones that no editor could break, or that are being typed right now.
    for (int share : new int[] {20, 4}) {
      Wrapping guess = new Wrapping(widths[pairs - 1 - pairs / share], pairs);
      if (guess.holds(file, lines)) {
        return guess;
      }
    }
    return new Wrapping(0, pairs);
  }

  boolean isWrapped() {
    return width > 0;
  }

  /** Whether a line is so long that the first word of the next would have passed the width. */
  boolean isFull(String file, Line line, Line next) {
    return needed(file, line, next) > width - width / 10;
  }

  /** Whether a line ended long before it had to. */
  boolean isShort(String file, Line line, Line next) {
    return needed(file, line, next) < width - width / 5;
  }

  /** Whether lines keep to themselves although the rest is wrapped: verse, an address. */
  boolean isRagged(String file, List<Line> lines) {
    int full = 0;
    int all = 0;
    for (int i = 0; i + 1 < lines.size(); i++) {
      if (isPair(lines, i)) {
        all++;
        full += isFull(file, lines.get(i), lines.get(i + 1)) ? 1 : 0;
      }
    }
    return all >= 3 && full * 2 < all;
  }

  private boolean holds(String file, List<Line> lines) {
    if (width < NARROWEST || width > WIDEST) {
      return false;
    }
    int open = 0;
    int full = 0;
    int goesOn = 0;
    int prose = 0;
    int tooLong = 0;
    for (int i = 0; i < lines.size(); i++) {
      Line line = lines.get(i);
      prose += line.isProse() ? 1 : 0;
      tooLong += line.width() > width + width / 10 ? 1 : 0;
      if (isPair(lines, i)) {
        open += line.stops(file) ? 0 : 1;
        full += isFull(file, line, lines.get(i + 1)) ? 1 : 0;
        goesOn += Character.isUpperCase(file.codePointAt(lines.get(i + 1).start())) ? 0 : 1;
      }
    }
    // One line more than the share may stand out, so that a short text survives its own editing.
    int early = Math.max(pairs / 5, pairs < 3 ? 0 : 1);
    return open * 2 > pairs
        && pairs - full <= early
        && goesOn * 4 >= pairs
        && tooLong <= prose / 10 + 1;
  }

  /** A name and an address below a letter tell nothing. */
  private static List<Line> withoutSignatures(String file, List<Line> lines) {
    List<Line> letter = new ArrayList<>(lines.size());
    boolean signature = false;
    for (Line line : lines) {
      signature = line.opensSignature(file) || signature && !line.isBlank();
      if (!signature) {
        letter.add(line);
      }
    }
    return letter;
  }

  private static boolean isPair(List<Line> lines, int i) {
    return i + 1 < lines.size()
        && lines.get(i).isProse()
        && lines.get(i + 1).isProse()
        && lines.get(i).isBeside(lines.get(i + 1))
        && !lines.get(i + 1).isItem();
  }

  private static int needed(String file, Line line, Line next) {
    return line.width() + 1 + next.firstWordWidth(file);
  }
}
