package dev.tallystick.engine;

import dev.tallystick.pairing.Language;
import dev.tallystick.pairing.Rules;
import java.util.Optional;

/**
 * What the user has set in the editor.
 *
 * @param restMillis how long no edit must come before the translator is taken to pause
 * @param sourceLanguage the language of the sources, if it is set
 * @param folders whether all pairs of the workspace's folders are watched, not the open ones only
 */
public record Settings(long restMillis, Optional<Language> sourceLanguage, boolean folders) {
  /** What counts where nothing is set. */
  public static final Settings DEFAULT = new Settings(1500, Optional.empty(), false);

  Rules rules() {
    return Rules.assuming(sourceLanguage);
  }
}
