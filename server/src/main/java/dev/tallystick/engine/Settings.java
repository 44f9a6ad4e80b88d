package dev.tallystick.engine;

import dev.tallystick.check.Vigilance;
import dev.tallystick.pairing.Language;
import dev.tallystick.pairing.Rules;
import java.util.Optional;

/**
 * What the user has set in the editor.
 *
 * @param restMillis how long no edit must come before the translator is taken to pause
 * @param sourceLanguage the language of the sources, if it is set
 * @param folders whether all pairs of the workspace's folders are watched, not the open ones only
 * @param vigilance how sure a finding must be to be told
 */
public record Settings(
    long restMillis, Optional<Language> sourceLanguage, boolean folders, Vigilance vigilance) {
  /** What counts where nothing is set. */
  public static final Settings DEFAULT =
      new Settings(1500, Optional.empty(), false, Vigilance.BALANCED);

  Rules rules() {
    return Rules.assuming(sourceLanguage);
  }
}
