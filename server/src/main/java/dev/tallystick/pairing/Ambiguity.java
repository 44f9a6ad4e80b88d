package dev.tallystick.pairing;

import java.util.List;

/**
 * Files that belong together, but nothing tells which is the source: the translator has to choose
 * its language.
 *
 * @param files their paths, sorted
 * @param choices the languages that may be the source, sorted by tag
 */
public record Ambiguity(List<String> files, List<Language> choices) {
  /** Takes copies. */
  public Ambiguity {
    files = List.copyOf(files);
    choices = List.copyOf(choices);
  }
}
