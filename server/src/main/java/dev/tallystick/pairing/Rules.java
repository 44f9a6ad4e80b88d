package dev.tallystick.pairing;

import java.util.Optional;

/**
 * What the settings or the command line say about languages.
 *
 * @param sourceLanguage the language of the sources, if it is set
 * @param targetLanguage the only language into which translations are wanted, if it is set
 */
public record Rules(Optional<Language> sourceLanguage, Optional<Language> targetLanguage) {
  /** Nothing is set. */
  public static final Rules NONE = new Rules(Optional.empty(), Optional.empty());

  /** Whether translations into {@code language} are wanted. */
  boolean wants(Language language) {
    return targetLanguage.isEmpty() || intoTarget(language);
  }

  /** Whether the settings make {@code language} the one of the translations. */
  boolean intoTarget(Language language) {
    return targetLanguage.filter(target -> target.covers(language)).isPresent();
  }
}
