package dev.tallystick.align;

import java.util.Arrays;
import java.util.List;

/**
 * The way through a table, and the band around it. For each row (a node between two target units)
 * the first and the last column of the way; inside a link the two columns of the link. From one
 * node of the way to the next leads one link, or an added unit where the column stays.
 *
 * <p>The band is a function of the way alone: narrow where it is plain sailing, wide where much is
 * left out or tied together near by. All that is stored here are plain arrays, so that an edit
 * moves what lies behind it at little cost.
 */
final class Way {
  /** How far a band reaches around the way where nothing is in doubt: columns, and rows too. */
  private static final int NEAR = 4;

  /** The same where there is trouble, and how much more for each. */
  private static final int FAR = 6;

  private static final int MORE = 2;

  /** How far it reaches at most. */
  static final int FARTHEST = 32;

  /** Troubles count so many rows away. */
  private static final int SIGHT = 16;

  /** How far off in rows a change of the way may change the band. */
  static final int REACH = Math.max(FARTHEST, SIGHT);

  /** A link of more sentences than this is trouble. */
  private static final int PLAIN = 3;

  int targets;
  int sources;
  int[] first;
  int[] last;
  boolean[] node;

  /** Units left out, and doubtful links that end, in each row. */
  int[] trouble;

  /** The band: first and last column that are looked at. */
  int[] low;

  int[] high;

  /** Along a chain that covers all units. */
  Way(List<Match> chain, int sources, int targets) {
    this.targets = targets;
    this.sources = sources;
    this.first = new int[targets + 1];
    this.last = new int[targets + 1];
    this.node = new boolean[targets + 1];
    this.trouble = new int[targets + 1];
    this.low = new int[targets + 1];
    this.high = new int[targets + 1];
    Arrays.fill(high, -1);
    node[0] = true;
    for (Match match : chain) {
      follow(match);
    }
    last[targets] = first[targets];
    trouble[targets] = 0;
  }

  private void follow(Match match) {
    int row = match.targetFrom();
    int end = match.targetTo();
    if (match.targets() == 0) {
      last[row] = match.sourceTo();
      trouble[row]++;
      return;
    }
    for (int inside = row + 1; inside < end; inside++) {
      first[inside] = match.sourceFrom();
      last[inside] = match.sourceTo();
    }
    first[end] = match.sourceTo();
    last[end] = match.sourceTo();
    node[end] = true;
    trouble[end] = isTrouble(match.targets(), match.sources()) ? 1 : 0;
  }

  static boolean isTrouble(int targets, int sources) {
    return sources == 0 || targets + sources > PLAIN;
  }

  /** Columns from this one on are reached by the bands of rows from the answer on only. */
  int firstRowReaching(int column) {
    int from = 0;
    int to = targets + 1;
    while (from < to) {
      int middle = (from + to) >>> 1;
      if (last[Math.min(targets, middle + FARTHEST)] + FARTHEST >= column) {
        to = middle;
      } else {
        from = middle + 1;
      }
    }
    return from;
  }

  /** Columns up to this one are reached by the bands of rows up to the answer only. */
  int lastRowReaching(int column) {
    int from = -1;
    int to = targets;
    while (from < to) {
      int middle = (from + to + 1) >> 1;
      if (first[Math.max(0, middle - FARTHEST)] - FARTHEST <= column) {
        from = middle;
      } else {
        to = middle - 1;
      }
    }
    return from;
  }

  /** How far the band reaches around the way in each row of a stretch. */
  int[] radii(int from, int to) {
    int[] radii = new int[to - from + 1];
    int troubles = 0;
    for (int row = Math.max(0, from - SIGHT); row < Math.min(targets + 1, from + SIGHT); row++) {
      troubles += trouble[row];
    }
    for (int row = from; row <= to; row++) {
      troubles += row + SIGHT <= targets ? trouble[row + SIGHT] : 0;
      radii[row - from] = troubles == 0 ? NEAR : Math.min(FARTHEST, FAR + MORE * troubles);
      troubles -= row - SIGHT >= 0 ? trouble[row - SIGHT] : 0;
    }
    return radii;
  }

  int low(int row, int radius) {
    return Math.max(0, first[Math.max(0, row - radius)] - radius);
  }

  int high(int row, int radius) {
    return Math.min(sources, last[Math.min(targets, row + radius)] + radius);
  }

  /** The nearest node of the way at or above a row. */
  int nodeAbove(int row) {
    int node = Math.max(0, Math.min(row, targets));
    while (!this.node[node]) {
      node--;
    }
    return node;
  }

  /** The next node of the way below a row; the row itself if it is the last. */
  int nodeBelow(int row) {
    int node = Math.min(row + 1, targets);
    while (!this.node[node]) {
      node++;
    }
    return node;
  }

  /**
   * Target units were replaced: the rows between them are new, and where the way leads there is
   * unknown.
   */
  void replaceRows(int at, int removed, int added) {
    if (removed == added) {
      return;
    }
    boolean atEnd = at + removed == targets;
    int from = first[at];
    int to = last[at + removed];
    if (atEnd && removed > 0) { // what was translated there is no gap in the source
      to = Math.min(to, last[at] + 2 * added + FARTHEST);
    }
    first = spliced(first, at + 1, removed, added);
    last = spliced(last, at + 1, removed, added);
    trouble = spliced(trouble, at + 1, removed, added);
    low = spliced(low, at + 1, removed, added);
    high = spliced(high, at + 1, removed, added);
    boolean[] nodes = new boolean[node.length + added - removed];
    System.arraycopy(node, 0, nodes, 0, at + 1);
    System.arraycopy(node, at + 1 + removed, nodes, at + 1 + added, node.length - at - 1 - removed);
    node = nodes;
    targets += added - removed;
    for (int row = at; row <= at + added; row++) {
      first[row] = from;
      last[row] = to;
      trouble[row] = 1;
      node[row] = row == 0;
    }
    for (int row = at + 1; row <= at + added; row++) {
      low[row] = 0;
      high[row] = -1;
    }
    first[0] = 0;
    last[targets] = first[targets];
  }

  /** Source units were replaced: the way keeps its place in what is left, in units. */
  void replaceColumns(int at, int removed, int added) {
    int shift = added - removed;
    if (shift == 0) {
      return;
    }
    for (int row = 0; row <= targets; row++) {
      first[row] = first[row] <= at ? first[row] : Math.max(at, first[row] + shift);
      if (last[row] >= at + removed) {
        last[row] += shift;
      } else if (last[row] > at) {
        last[row] = at + added;
      }
    }
    sources += shift;
    last[targets] = first[targets];
  }

  private static int[] spliced(int[] values, int at, int removed, int added) {
    int[] all = new int[values.length + added - removed];
    System.arraycopy(values, 0, all, 0, at);
    System.arraycopy(values, at + removed, all, at + added, values.length - at - removed);
    return all;
  }
}
