package dev.tallystick.engine;

import dev.tallystick.check.OnSide;
import java.nio.file.Path;

/**
 * A pair of which all is known that there is to know of its current texts.
 *
 * @param files the pair
 * @param result what was found in its texts
 * @param editedAt the turn of the last edit of the translation; 0 if there was none
 */
public record Settled(FilePair files, PairResult result, long editedAt) {
  /** The pair in the languages that its texts were read in. */
  public FilePair spoken() {
    return files.as(result);
  }

  /** What stands for the sentence at a place of a file, a UTF-16 offset. */
  Counterpart counterpart(Path file, int offset) {
    return Counterpart.at(spoken(), result, files.side(file), offset);
  }

  /** The sentences of a file. */
  Count count(Path file) {
    OnSide side = files.side(file);
    return States.of(result).count(side, result.language(side.other()).name());
  }

  /** The sentences in the sections of a file. */
  Tally tally(Path file) {
    return Tally.of(spoken(), result, files.side(file));
  }

  /** One of the two texts, read. */
  Reading reading(Path file) {
    return result.reading(files.side(file));
  }
}
