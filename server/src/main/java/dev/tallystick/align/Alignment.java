package dev.tallystick.align;

import java.util.List;

/**
 * The result for a pair.
 *
 * @param matches the best chain, in order; it covers every unit of both sides once
 * @param sourceNull for each source unit the posterior probability, from 0 to 1, that nothing in
 *     the target stands for it
 * @param targetNull for each target unit the posterior probability that nothing in the source does
 * @param moves units that stand at another place than in the source
 * @param lengths how long a translation is in this pair
 */
public record Alignment(
    List<Match> matches,
    double[] sourceNull,
    double[] targetNull,
    List<Move> moves,
    LengthModel lengths) {
  /** Keeps the lists unchangeable. */
  public Alignment {
    matches = List.copyOf(matches);
    moves = List.copyOf(moves);
  }
}
