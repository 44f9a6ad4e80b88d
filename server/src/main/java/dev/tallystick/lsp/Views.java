package dev.tallystick.lsp;

import dev.tallystick.engine.Count;
import dev.tallystick.engine.FilePair;
import dev.tallystick.engine.Standing;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** The ways to show in a text how far it has come. */
final class Views {
  private final View lenses;
  private final View hints;
  private final Map<FilePair, List<Count>> counts = new TreeMap<>();

  Views(Client client, Remote remote) {
    this.lenses = new View(client.refreshesLenses(), remote::refreshCodeLenses);
    this.hints = new View(client.refreshesHints(), remote::refreshInlayHints);
  }

  /** Above the lines. */
  View lenses() {
    return lenses;
  }

  /** Behind the lines. */
  View hints() {
    return hints;
  }

  /** A pair has come so far. Called by the loop's thread. */
  void stands(Standing standing) {
    List<Count> now =
        standing.figures().map(one -> List.of(one.onSource(), one.onTarget())).orElse(List.of());
    List<Count> before =
        now.isEmpty() ? counts.remove(standing.files()) : counts.put(standing.files(), now);
    if (!now.equals(before)) {
      lenses.changed();
      hints.changed();
    }
  }

  /** Tells the client what is to be told. */
  void check() {
    lenses.check();
    hints.check();
  }
}
