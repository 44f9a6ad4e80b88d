package dev.tallystick.engine;

import dev.tallystick.check.Code;
import dev.tallystick.check.Finding;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * What a look at a folder found.
 *
 * @param pairs how many pairs could be examined
 * @param findings how many findings of each code there are in them
 */
public record Summary(int pairs, SortedMap<Code, Integer> findings) {
  static Summary of(List<Settled> pairs) {
    SortedMap<Code, Integer> findings = new TreeMap<>();
    for (Settled pair : pairs) {
      for (Finding finding : pair.result().findings()) {
        findings.merge(finding.code(), 1, Integer::sum);
      }
    }
    return new Summary(pairs.size(), findings);
  }

  /** How many findings there are. */
  public int total() {
    return findings.values().stream().mapToInt(Integer::intValue).sum();
  }
}
