package dev.tallystick.align;

import java.util.List;

/**
 * Which cells of a lattice are looked at: for each row (a node between two target units, from 0)
 * the first and the last column (a node between two source units).
 *
 * @param first first column of each row
 * @param last last column of each row
 */
record Band(int[] first, int[] last) {
  /** How far around a chain to look where it is plain sailing: columns, and rows too. */
  private static final int NEAR = 3;

  /** The same around places where something is left out or much is tied together. */
  private static final int FAR = 12;

  /** A match of more sentences than this counts as such a place. */
  private static final int PLAIN = 3;

  /** These rows, wide enough that one can get through by leaving out unit after unit. */
  static Band passable(int[] first, int[] last) {
    for (int row = 1; row < first.length; row++) {
      last[row - 1] = Math.max(last[row - 1], first[row]);
      last[row] = Math.max(last[row], last[row - 1]);
    }
    return new Band(first, last);
  }

  /** The band around a chain of matches: a pure function of the chain. */
  static Band around(List<Match> chain, Sides sides) {
    int targets = sides.target().size();
    int sources = sides.source().size();
    int[] low = new int[targets + 1];
    int[] high = new int[targets + 1];
    int[] trouble = new int[targets + 2];
    for (Match match : chain) {
      for (int row = match.targetFrom() + 1; row <= match.targetTo(); row++) {
        low[row] = row < match.targetTo() ? match.sourceFrom() : match.sourceTo();
      }
      int reached = match.targets() == 0 ? match.targetFrom() : match.targetFrom() + 1;
      for (int row = reached; row <= match.targetTo(); row++) {
        high[row] = match.sourceTo();
      }
      if (!match.twoSided() || match.sources() + match.targets() > PLAIN) {
        trouble[Math.max(0, match.targetFrom() - FAR)]++;
        trouble[Math.min(targets, match.targetTo() + FAR) + 1]--;
      }
    }
    int[] first = new int[targets + 1];
    int[] last = new int[targets + 1];
    int troubles = 0;
    for (int row = 0; row <= targets; row++) {
      troubles += trouble[row];
      int radius = troubles > 0 ? FAR : NEAR;
      first[row] = Math.max(0, low[Math.max(0, row - radius)] - radius);
      last[row] = Math.min(sources, high[Math.min(targets, row + radius)] + radius);
    }
    return new Band(first, last);
  }
}
