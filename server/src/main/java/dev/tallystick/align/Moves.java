package dev.tallystick.align;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;

/**
 * Finds sentences that were moved: a source unit and a target unit that probably have no
 * counterpart in their places but suit each other well. The most suitable pair is taken first, and
 * no unit twice. Sentences that have changed places right beside each other are matched as one;
 * there one is found where each suits the place of the other far better than its own.
 */
final class Moves {
  /** Units less probably without a counterpart are not looked at. */
  private static final double LEAST_NULL = 0.35;

  /** How far apart they may stand, in units. */
  private static final int FARTHEST = 60;

  /** Suiting each other less than this is chance (nats). */
  private static final double LEAST_WORTH = 4;

  /** Each of two sentences in one match must suit the place of the other so well (nats). */
  private static final double LEAST_SWAPPED = 6;

  /** So much better must both suit those places than their own, taken together (nats). */
  private static final double LEAST_GAIN = 12;

  private record Candidate(Move move, double worth) {}

  private Moves() {}

  /** The moved units, in the order of the source. */
  static List<Move> find(
      Evidence evidence, double[] sourceNull, double[] targetNull, List<Match> chain) {
    List<Candidate> candidates = candidates(evidence, sourceNull, targetNull, chain);
    candidates.sort(
        Comparator.comparingDouble(Candidate::worth)
            .reversed()
            .thenComparing(candidate -> candidate.move().source())
            .thenComparing(candidate -> candidate.move().target()));
    boolean[] sourceTaken = new boolean[sourceNull.length];
    boolean[] targetTaken = new boolean[targetNull.length];
    List<Move> moves = new ArrayList<>();
    for (Candidate candidate : candidates) {
      Move move = candidate.move();
      if (!sourceTaken[move.source()] && !targetTaken[move.target()]) {
        sourceTaken[move.source()] = true;
        targetTaken[move.target()] = true;
        moves.add(move);
      }
    }
    for (Match match : chain) {
      Move swap = match.confidence() >= 0.5 ? swap(evidence, match) : null;
      if (swap != null && !sourceTaken[swap.source()] && !targetTaken[swap.target()]) {
        sourceTaken[swap.source()] = true;
        targetTaken[swap.target()] = true;
        moves.add(swap);
      }
    }
    moves.sort(Comparator.comparingInt(Move::source));
    return Collections.unmodifiableList(moves);
  }

  /**
   * The first of two target units in a match that have changed places, with its counterpart; null
   * if none have.
   */
  private static Move swap(Evidence evidence, Match match) {
    Move best = null;
    double most = LEAST_GAIN;
    for (int s = match.sourceFrom(); s < match.sourceTo() - 1; s++) {
      for (int t = match.targetFrom(); t < match.targetTo() - 1; t++) {
        for (int later = s + 1; later < match.sourceTo(); later++) {
          for (int behind = t + 1; behind < match.targetTo(); behind++) {
            double gain = gain(evidence, s, t, later, behind);
            if (gain >= most) {
              most = gain;
              best = new Move(later, t);
            }
          }
        }
      }
    }
    return best;
  }

  private static double gain(Evidence evidence, int s, int t, int later, int behind) {
    double moved = evidence.alike(t, later);
    double passed = evidence.alike(behind, s);
    if (Math.min(moved, passed) < LEAST_SWAPPED) {
      return Double.NEGATIVE_INFINITY;
    }
    return moved + passed - evidence.alike(t, s) - evidence.alike(behind, later);
  }

  private static List<Candidate> candidates(
      Evidence evidence, double[] sourceNull, double[] targetNull, List<Match> chain) {
    List<Candidate> candidates = new ArrayList<>();
    for (Match match : chain) {
      int from = Math.max(0, match.targetFrom() - FARTHEST);
      int to = Math.min(targetNull.length, match.targetFrom() + FARTHEST);
      for (int source = match.sourceFrom(); source < match.sourceTo(); source++) {
        for (int target = from; target < to && sourceNull[source] >= LEAST_NULL; target++) {
          boolean inPlace = match.targetFrom() <= target && target < match.targetTo();
          if (targetNull[target] >= LEAST_NULL && !inPlace) {
            double worth = evidence.alike(target, source);
            if (worth >= LEAST_WORTH) {
              candidates.add(new Candidate(new Move(source, target), worth));
            }
          }
        }
      }
    }
    return candidates;
  }
}
