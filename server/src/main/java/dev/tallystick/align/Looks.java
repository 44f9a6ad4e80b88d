package dev.tallystick.align;

import dev.tallystick.run.Cancellation;
import java.util.List;

/** The first looks at a pair, of which nothing is known yet of what stands where. */
final class Looks {
  /** How far below its row's best a cell may lie in the first look, and in the last (nats). */
  private static final double NEAR = 60;

  private static final double FAR = 960;

  /** The most that rows times reach may come to. */
  private static final double EFFORT = 6e6;

  /** So large a share of the target left out, or of the source, and the first look goes on. */
  private static final double SUSPICIOUS = 0.02;

  private Looks() {}

  /** The band along words that stand once in either text, or around the way a scorer finds. */
  static Band first(Scorer scorer, SharedWords shared, Sides sides, Cancellation cancellation) {
    return Anchors.band(shared.anchors(), sides)
        .orElseGet(() -> around(scorer, sides, cancellation));
  }

  /**
   * The band around the way through both texts. Where the way found leaves out much, it may have
   * been lost at a gap, and is looked for again from farther off.
   */
  private static Band around(Scorer scorer, Sides sides, Cancellation cancellation) {
    List<Match> chain = List.of();
    for (double reach = NEAR; reach <= far(sides); reach *= 2) {
      chain = Lattice.wide(scorer, sides, reach, cancellation).chain();
      if (leftOut(chain, sides.target().size()) <= SUSPICIOUS * sides.target().size()) {
        break;
      }
    }
    return Band.around(chain, sides);
  }

  /**
   * The band around a way that a look from farther off does not change. The published model has one
   * ratio for all languages; where that is far from the pair's, ways that come to nothing are the
   * cheaper ones at first, and a near look loses the best without leaving anything out.
   */
  static Band steady(Scorer scorer, Sides sides, Cancellation cancellation) {
    List<Match> near = Lattice.wide(scorer, sides, NEAR, cancellation).chain();
    List<Match> farther = Lattice.wide(scorer, sides, 2 * NEAR, cancellation).chain();
    boolean steady = near.equals(farther);
    return Band.around(
        steady ? near : Lattice.wide(scorer, sides, far(sides), cancellation).chain(), sides);
  }

  /** The larger a text, the less can be spent on looking far. */
  private static double far(Sides sides) {
    return Math.max(NEAR, Math.min(FAR, EFFORT / (1 + sides.target().size())));
  }

  /** Units without a counterpart, but for the source behind the end of the translation. */
  private static int leftOut(List<Match> chain, int targets) {
    int count = 0;
    for (Match match : chain) {
      count += match.twoSided() || match.targetFrom() == targets ? 0 : 1;
    }
    return count;
  }
}
