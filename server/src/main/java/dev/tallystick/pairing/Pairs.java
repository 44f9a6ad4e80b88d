package dev.tallystick.pairing;

import java.util.List;

/**
 * What belongs together among some files. Every file is in exactly one of the three lists; there it
 * is the target of one pair at most, and has the same language in all its pairs. Only where the
 * project states it, a file is the source of one pair and the target of another.
 *
 * @param pairs sorted by source, then target
 * @param alone files without a counterpart, sorted by path
 * @param ambiguities files whose source cannot be told, sorted by their first path
 */
public record Pairs(List<Pair> pairs, List<Alone> alone, List<Ambiguity> ambiguities) {
  /** Takes copies. */
  public Pairs {
    pairs = List.copyOf(pairs);
    alone = List.copyOf(alone);
    ambiguities = List.copyOf(ambiguities);
  }
}
