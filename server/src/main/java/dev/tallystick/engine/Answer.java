package dev.tallystick.engine;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * What stands for a sentence, in each pair that its file is in.
 *
 * @param all sorted by the language of the translation; none if the file is in no pair
 * @param preferred the one in the pair edited last, else the first
 */
public record Answer(List<At> all, Optional<At> preferred) {
  /**
   * The counterpart in one pair.
   *
   * @param counterpart what stands there
   * @param uri the file that it stands in, as the editor names it
   */
  public record At(Counterpart counterpart, String uri) {}

  /** Keeps the list unchangeable. */
  public Answer {
    all = List.copyOf(all);
  }

  /** Looks a place of a file up in the pairs that it is in. */
  static Answer of(List<Settled> pairs, Path file, int offset, Uris uris) {
    List<At> all = new ArrayList<>();
    Optional<At> preferred = Optional.empty();
    long latest = -1;
    for (Settled pair : pairs) {
      At at = at(pair.counterpart(file, offset), uris);
      all.add(at);
      if (pair.editedAt() > latest) {
        preferred = Optional.of(at);
        latest = pair.editedAt();
      }
    }
    return new Answer(all, preferred);
  }

  private static At at(Counterpart found, Uris uris) {
    return new At(found, uris.uri(found.files().file(found.side().other())));
  }
}
