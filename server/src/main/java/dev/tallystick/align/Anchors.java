package dev.tallystick.align;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Optional;

/**
 * A short cut to the way through both texts: words that stand once in either text mostly stand for
 * each other. The longest chain of such places in the order of both texts, less those that no
 * neighbour agrees with, makes a narrow band, if there are enough of them.
 */
final class Anchors {
  /** Columns at either side of the line between two anchors. */
  private static final int MARGIN = 2;

  /** Two anchors agree if their distances differ by no more than this, and a share of them. */
  private static final int SLACK = 3;

  private static final double STRETCH = 0.25;

  /** The most columns in a row, on average: with more, a first look is as quick and safer. */
  private static final int WIDEST = 30;

  /** Anchors so far apart leave the band one column wider. */
  private static final int FARTHER = 8;

  /** Columns behind the last anchor. */
  private static final int TAIL = 60;

  /** A word's place in both texts. */
  record Anchor(int source, int target) {}

  private Anchors() {}

  /** The band along the anchors, or empty if they are too few. */
  static Optional<Band> band(List<Anchor> candidates, Sides sides) {
    int targets = sides.target().size();
    int sources = sides.source().size();
    List<Anchor> anchors = agreeing(inOrder(candidates));
    Band band = along(anchors, targets, sources);
    long cells = 0;
    for (int row = 0; row <= targets; row++) {
      cells += band.last()[row] - band.first()[row] + 1;
    }
    return anchors.isEmpty() || cells > (long) WIDEST * (targets + 1)
        ? Optional.empty()
        : Optional.of(band);
  }

  /** The longest chain that rises in both texts; candidates come in the order of the target. */
  private static List<Anchor> inOrder(List<Anchor> candidates) {
    int[] tails = new int[candidates.size()];
    int[] before = new int[candidates.size()];
    int length = 0;
    for (int i = 0; i < candidates.size(); i++) {
      int low = 0;
      int high = length;
      while (low < high) {
        int middle = (low + high) >>> 1;
        if (candidates.get(tails[middle]).source() <= candidates.get(i).source()) {
          low = middle + 1;
        } else {
          high = middle;
        }
      }
      before[i] = low > 0 ? tails[low - 1] : -1;
      tails[low] = i;
      length = Math.max(length, low + 1);
    }
    List<Anchor> chain = new ArrayList<>();
    for (int i = length > 0 ? tails[length - 1] : -1; i >= 0; i = before[i]) {
      chain.add(candidates.get(i));
    }
    Collections.reverse(chain);
    return chain;
  }

  private static List<Anchor> agreeing(List<Anchor> chain) {
    List<Anchor> kept = new ArrayList<>();
    for (int i = 0; i < chain.size(); i++) {
      boolean before = i > 0 && agree(chain.get(i - 1), chain.get(i));
      boolean behind = i + 1 < chain.size() && agree(chain.get(i), chain.get(i + 1));
      if (before || behind) {
        kept.add(chain.get(i));
      }
    }
    return kept;
  }

  private static boolean agree(Anchor one, Anchor next) {
    int rows = next.target() - one.target();
    int columns = next.source() - one.source();
    return Math.abs(rows - columns) <= SLACK + STRETCH * Math.min(rows, columns);
  }

  /**
   * From anchor to anchor along the straight line, as far to either side as they disagree, and a
   * little more the farther they are apart.
   */
  private static Band along(List<Anchor> anchors, int targets, int sources) {
    int[] first = new int[targets + 1];
    int[] last = new int[targets + 1];
    Arrays.fill(first, sources);
    Anchor from = new Anchor(0, 0);
    for (Anchor to : anchors) {
      stretch(first, last, from, to, sources);
      from = to;
    }
    int rows = targets - from.target();
    int end = Math.min(sources, from.source() + 2 * rows + TAIL);
    stretch(first, last, from, new Anchor(end, targets), sources);
    return new Band(first, last);
  }

  private static void stretch(int[] first, int[] last, Anchor from, Anchor to, int sources) {
    int rows = to.target() - from.target();
    int columns = to.source() - from.source();
    int aside = MARGIN + Math.abs(rows - columns) + Math.min(rows, columns) / FARTHER;
    int end = Math.min(first.length - 1, to.target() + 1);
    for (int row = from.target(); row <= end; row++) {
      int middle =
          from.source() + (int) ((long) columns * (row - from.target()) / Math.max(1, rows));
      first[row] = Math.min(first[row], Math.max(0, middle - aside));
      last[row] = Math.max(last[row], Math.min(sources, middle + 1 + aside));
    }
  }
}
