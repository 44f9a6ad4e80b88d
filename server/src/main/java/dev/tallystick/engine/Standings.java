package dev.tallystick.engine;

import dev.tallystick.check.Code;
import dev.tallystick.check.Finding;
import java.util.Collection;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** What has been told of how far each pair has come, so that only what is new is told. */
final class Standings {
  private final Map<FilePair, Told> told = new TreeMap<>();
  private final Audience audience;
  private final Uris uris;

  /** What was told, and what it was drawn from. */
  private record Told(Standing standing, PairResult result, List<Finding> shown) {}

  Standings(Audience audience, Uris uris) {
    this.audience = audience;
    this.uris = uris;
  }

  /** Tells of others that they are gone. */
  void retain(Collection<FilePair> wanted) {
    for (FilePair files : List.copyOf(told.keySet())) {
      if (!wanted.contains(files)) {
        gone(files);
      }
    }
  }

  /** Tells what is new of these pairs. */
  void tell(Collection<PairState> pairs) {
    for (PairState pair : pairs) {
      Optional<Settled> known = pair.known();
      known.ifPresent(settled -> tell(settled, pair.shown().findings()));
      if (pair.settled() && known.isEmpty()) {
        gone(pair.files());
      }
    }
  }

  private void gone(FilePair files) {
    if (told.remove(files) != null) {
      audience.stands(Standing.gone(files, uris));
    }
  }

  private void tell(Settled pair, List<Finding> shown) {
    Told before = told.get(pair.files());
    if (before != null && before.result() == pair.result() && before.shown().equals(shown)) {
      return;
    }
    Standing now = Standing.of(pair, counts(shown), uris);
    told.put(pair.files(), new Told(now, pair.result(), shown));
    if (before == null || !before.standing().equals(now)) {
      audience.stands(now);
    }
  }

  private static Map<Code, Integer> counts(List<Finding> findings) {
    Map<Code, Integer> counts = new EnumMap<>(Code.class);
    findings.forEach(finding -> counts.merge(finding.code(), 1, Integer::sum));
    return counts;
  }
}
