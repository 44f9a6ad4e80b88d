package dev.tallystick.engine;

import dev.tallystick.check.Code;
import dev.tallystick.check.OnSide;
import dev.tallystick.check.Progress;
import java.util.Map;
import java.util.Optional;

/**
 * How far a pair has come.
 *
 * @param files the pair
 * @param source the source, as the editor names it
 * @param target its translation, as the editor names it
 * @param figures what is to tell; empty of a pair that is one no longer, or that nothing is known
 *     of any more
 */
public record Standing(FilePair files, String source, String target, Optional<Figures> figures) {
  /**
   * Figures of a pair.
   *
   * @param progress how far the translation has come, in words
   * @param findings how many findings of each kind are shown; none that has none
   * @param onSource the sentences of the source
   * @param onTarget the sentences of the translation
   */
  public record Figures(
      Progress progress, Map<Code, Integer> findings, Count onSource, Count onTarget) {}

  /** How a pair stands whose texts are known. */
  static Standing of(Settled pair, Map<Code, Integer> findings, Uris uris) {
    PairResult result = pair.result();
    States states = States.of(result);
    Figures figures =
        new Figures(
            result.progress(),
            findings,
            states.count(OnSide.SOURCE, pair.spoken().targetLanguage().name()),
            states.count(OnSide.TARGET, pair.spoken().sourceLanguage().name()));
    return of(pair.spoken(), Optional.of(figures), uris);
  }

  /** Nothing is known of a pair any more. */
  static Standing gone(FilePair files, Uris uris) {
    return of(files, Optional.empty(), uris);
  }

  private static Standing of(FilePair files, Optional<Figures> figures, Uris uris) {
    return new Standing(files, uris.uri(files.source()), uris.uri(files.target()), figures);
  }
}
