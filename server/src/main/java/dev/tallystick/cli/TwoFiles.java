package dev.tallystick.cli;

import dev.tallystick.engine.Disk;
import dev.tallystick.engine.Intake;
import dev.tallystick.engine.Reading;
import dev.tallystick.engine.Unreadable;
import dev.tallystick.pairing.Language;
import dev.tallystick.pairing.Pair;
import dev.tallystick.pairing.Pairing;
import dev.tallystick.pairing.Rules;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Decoded;
import java.nio.file.Path;
import java.util.concurrent.CompletableFuture;

/**
 * A source and a translation named on the command line, read.
 *
 * @param pair the two and their languages
 * @param source the source
 * @param target the translation
 * @param complete whether all of both was text
 */
record TwoFiles(Pair pair, Reading source, Reading target, boolean complete) {
  /**
   * Reads both, side by side, and says on the error console where they are malformed.
   *
   * @throws Refused if one cannot be read
   */
  static TwoFiles read(Console console, Path source, Path target, Rules rules) {
    Pair pair = Pairing.named(source.toString(), target.toString(), rules);
    Decoded sourceText = load(source);
    Decoded targetText = load(target);
    boolean malformed = Malformed.tell(console, source, sourceText);
    malformed |= Malformed.tell(console, target, targetText);
    CompletableFuture<Reading> reading =
        CompletableFuture.supplyAsync(() -> reading(source, sourceText, pair.sourceLanguage()));
    Reading translation = reading(target, targetText, pair.targetLanguage());
    return new TwoFiles(pair, reading.join(), translation, !malformed);
  }

  private static Decoded load(Path file) {
    try {
      return Intake.load(Disk.REAL, file);
    } catch (Unreadable e) {
      throw new Refused(e.getMessage());
    }
  }

  private static Reading reading(Path file, Decoded decoded, Language language) {
    return Reading.of(decoded.text(), Intake.format(file), language.tag(), Cancellation.NONE);
  }
}
