package dev.tallystick.align;

import java.util.Arrays;

/**
 * One row of a table: what the links from its cells are worth, and the worth of all chains to each
 * cell and on from it, relative to the row's own best cell. {@code step} and {@code scale} lead
 * from the row before (for what leads on, from the row behind) to that: a row does not know where
 * in the text it stands, and comes out the same wherever that is.
 */
final class Cells {
  /** For each cell the worth of each shape's link; {@link #UNKNOWN} if nobody has looked. */
  int[] links = {};

  /** Whether all of them are known. */
  boolean complete;

  /** Chains from the start of the texts to each cell. */
  final Half before = new Half();

  /** Chains from each cell to the end of the texts. */
  final Half behind = new Half();

  /** Posteriors of what starts here. */
  final Shares shares = new Shares();

  static final int UNKNOWN = Integer.MIN_VALUE;

  /** One direction. */
  static final class Half {
    int[] best = {};

    /** The sum over all chains, relative to the best to the same cell. */
    double[] sum = {};

    int step;
    double scale = 1;
    boolean filled;

    /**
     * Takes what was computed, and makes it relative to the best cell.
     *
     * @return whether it is something else than before
     */
    boolean take(int[] newBest, double[] newSum, int width) {
      int at = 0;
      for (int cell = 1; cell < width; cell++) {
        if (newBest[cell] > newBest[at]) {
          at = cell;
        }
      }
      boolean nowhere = newBest[at] == Fixed.NOWHERE;
      int newStep = nowhere ? 0 : newBest[at];
      double newScale = nowhere ? 1 : newSum[at];
      for (int cell = 0; cell < width; cell++) {
        int worth = newBest[cell] - newStep;
        boolean dead = newBest[cell] == Fixed.NOWHERE || worth <= Fixed.DEAD;
        newBest[cell] = dead ? Fixed.NOWHERE : worth;
        newSum[cell] = dead ? 0 : newSum[cell] / newScale;
      }
      boolean same =
          filled
              && step == newStep
              && scale == newScale
              && Arrays.equals(best, 0, best.length, newBest, 0, width)
              && Arrays.equals(sum, 0, sum.length, newSum, 0, width);
      if (!same) {
        best = Arrays.copyOf(newBest, width);
        sum = Arrays.copyOf(newSum, width);
        step = newStep;
        scale = newScale;
        filled = true;
      }
      return !same;
    }
  }

  /** The row has other columns now: what is known of their links is kept. */
  void reshape(int oldLow, int newLow, int width, int[] right, Columns moved) {
    int shapes = right.length;
    int[] kept = new int[width * shapes];
    int cells = links.length / shapes;
    for (int cell = 0; cell < width; cell++) {
      int column = newLow + cell;
      int old = moved.before(column) - oldLow;
      for (int shape = 0; shape < shapes; shape++) {
        boolean known = old >= 0 && old < cells && moved.keeps(column, right[shape]);
        kept[cell * shapes + shape] = known ? links[old * shapes + shape] : UNKNOWN;
      }
    }
    links = kept;
    complete = false;
    before.filled = false;
    behind.filled = false;
  }

  /** Nothing is known any more of the links that lead farther down than so many rows. */
  void forgetLinks(int[] down, int most) {
    for (int at = 0; at < links.length; at++) {
      links[at] = down[at % down.length] > most ? UNKNOWN : links[at];
    }
    complete = false;
  }

  /**
   * Where columns were before source units were replaced.
   *
   * @param at the first unit replaced
   * @param added how many came
   * @param shift how many more than went
   */
  record Columns(int at, int added, int shift) {
    static final Columns SAME = new Columns(Integer.MAX_VALUE, 0, 0);

    int before(int column) {
      return column < at ? column : column - shift;
    }

    /** Whether a link from a column holds no new unit, nor lies where one is gone. */
    boolean keeps(int column, int units) {
      return at == Integer.MAX_VALUE || column + units <= at || column >= at + added;
    }
  }

  /** What the chains through a row add up to, and the posteriors of the moves that start in it. */
  static final class Shares {
    /** The sum over the links that cover the unit behind the row, and so many units further. */
    final double[] covering = new double[Shape.MOST];

    /** The same of a block that nothing stands for. */
    double addedBlock;

    /** All chains. */
    double all = 1;

    /** Posterior of the link of the best chain from here, if there is one. */
    double link;

    /** Posterior that the unit behind the row stands for nothing, by itself. */
    double added;

    /** For each column the posterior that its unit is left out here. */
    double[] omitted = {};
  }
}
