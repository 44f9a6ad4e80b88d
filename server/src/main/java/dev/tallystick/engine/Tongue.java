package dev.tallystick.engine;

import dev.tallystick.pairing.Language;
import dev.tallystick.prose.Format;
import dev.tallystick.text.Text;

/**
 * What is known of the language of a text before it is read.
 *
 * @param stated what its name, the project or the user say; {@link Language#UNKNOWN} if they say
 *     nothing
 * @param assumed what it is in if the text does not say either
 */
public record Tongue(Language stated, Language assumed) {
  /** Of a text for which nothing is assumed. */
  public static Tongue of(Language stated) {
    return new Tongue(stated, Language.UNKNOWN);
  }

  /** The language of a text: what is stated, else what the text says, else what is assumed. */
  Language in(Text text, Format format) {
    return stated.equals(Language.UNKNOWN)
        ? format.language(text).flatMap(Language::of).orElse(assumed)
        : stated;
  }
}
