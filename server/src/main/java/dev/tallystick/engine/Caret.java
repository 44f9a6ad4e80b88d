package dev.tallystick.engine;

import dev.tallystick.run.Alarm;
import java.nio.file.Path;
import java.util.Optional;
import java.util.OptionalLong;

/**
 * Where the translator writes. The protocol tells no caret, so it is where the last edit ended,
 * until the translator edits elsewhere, saves, or rests.
 */
final class Caret {
  private final Alarm alarm;
  private Optional<Edited> last = Optional.empty();
  private long restMillis = Settings.DEFAULT.restMillis();

  /**
   * The end of the last edit.
   *
   * @param file the edited file
   * @param offset where the edit ended, in the text after it
   * @param at when it came, by the alarm
   */
  record Edited(Path file, int offset, long at) {}

  Caret(Alarm alarm) {
    this.alarm = alarm;
  }

  void edited(Path file, int offset) {
    last = Optional.of(new Edited(file, offset, alarm.millis()));
  }

  /** The translator has turned away, or saved: nothing is being written. */
  void lift() {
    last = Optional.empty();
  }

  void closed(Path file) {
    last = last.filter(edited -> !edited.file().equals(file));
  }

  /** Time has passed. */
  void settle() {
    last = last.filter(edited -> alarm.millis() - edited.at() < restMillis);
  }

  /** When it will have rested, by the alarm; empty at rest. */
  OptionalLong due() {
    return last.map(edited -> OptionalLong.of(edited.at() + restMillis))
        .orElse(OptionalLong.empty());
  }

  void rest(long millis) {
    restMillis = millis;
  }

  long restMillis() {
    return restMillis;
  }

  /** The end of the last edit; empty at rest. */
  Optional<Edited> last() {
    return last;
  }
}
