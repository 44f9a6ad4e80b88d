package dev.tallystick.engine;

import dev.tallystick.pairing.Pair;
import dev.tallystick.pairing.Pairing;
import dev.tallystick.pairing.Rules;
import java.nio.file.Path;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * The pairs that the user has made by a command. They count before those that names tell: a
 * translation has one source.
 */
final class MadePairs {
  private final Map<Path, FilePair> byTarget = new TreeMap<>();

  void add(Event.Paired made) {
    Rules rules = new Rules(made.sourceLanguage(), made.targetLanguage());
    Pair named = Pairing.named(Listing.name(made.source()), Listing.name(made.target()), rules);
    put(new FilePair(made.source(), made.target(), named.sourceLanguage(), named.targetLanguage()));
  }

  private void put(FilePair pair) {
    byTarget.values().removeIf(before -> turned(before, pair));
    byTarget.put(pair.target(), pair);
  }

  private static boolean turned(FilePair one, FilePair other) {
    return one.source().equals(other.target()) && one.target().equals(other.source());
  }

  Collection<FilePair> all() {
    return byTarget.values();
  }

  /** Whether a pair that names tell does not count. */
  boolean overrule(FilePair told) {
    return byTarget.containsKey(told.target())
        || byTarget.values().stream().anyMatch(made -> turned(made, told));
  }

  /** Buffers without a file that are not open are gone for good. */
  void retainBuffers(Collection<Path> open) {
    byTarget.values().removeIf(pair -> gone(pair.source(), open) || gone(pair.target(), open));
  }

  private static boolean gone(Path file, Collection<Path> open) {
    return !file.isAbsolute() && !open.contains(file);
  }

  /** Files have other names. */
  void rename(Renaming renaming) {
    List<FilePair> before = List.copyOf(byTarget.values());
    byTarget.clear();
    for (FilePair pair : before) {
      put(
          new FilePair(
              renaming.of(pair.source()),
              renaming.of(pair.target()),
              pair.sourceLanguage(),
              pair.targetLanguage()));
    }
  }
}
