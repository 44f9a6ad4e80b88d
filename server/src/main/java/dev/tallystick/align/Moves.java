package dev.tallystick.align;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;

/**
 * Finds sentences that were moved: a source unit and a target unit that probably have no
 * counterpart in their places but suit each other well. The most suitable pair is taken first, and
 * no unit twice.
 */
final class Moves {
  /** Units less probably without a counterpart are not looked at. */
  private static final double LEAST_NULL = 0.2;

  /** How far apart they may stand, in units. */
  private static final int FARTHEST = 60;

  /** Suiting each other less than this is chance (nats). */
  private static final double LEAST_WORTH = 1.5;

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
    moves.sort(Comparator.comparingInt(Move::source));
    return Collections.unmodifiableList(moves);
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
