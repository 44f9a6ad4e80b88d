package dev.tallystick.pairing;

import java.util.List;
import java.util.Optional;

/**
 * What the settings, the project or the command line say about files and languages.
 *
 * @param sourceLanguage the language of the sources, if it is set
 * @param targetLanguage the only language into which translations are wanted, if it is set
 * @param pairs the files that are stated to belong together; of two that name the same translation
 *     the first counts
 * @param ignored the files that do not count at all
 */
public record Rules(
    Optional<Language> sourceLanguage,
    Optional<Language> targetLanguage,
    List<PairRule> pairs,
    List<Glob> ignored) {
  /** Nothing is set. */
  public static final Rules NONE = new Rules(Optional.empty(), Optional.empty());

  /** Takes copies. */
  public Rules {
    pairs = List.copyOf(pairs);
    ignored = List.copyOf(ignored);
  }

  /** Of languages only. */
  public Rules(Optional<Language> sourceLanguage, Optional<Language> targetLanguage) {
    this(sourceLanguage, targetLanguage, List.of(), List.of());
  }

  /**
   * These rules under options that beat them.
   *
   * @param options languages from the command line; its source language is that of all sources
   */
  public Rules under(Rules options) {
    Optional<Language> source = options.sourceLanguage;
    return new Rules(
        source.or(() -> sourceLanguage),
        options.targetLanguage.or(() -> targetLanguage),
        source.isEmpty() ? pairs : pairs.stream().map(rule -> in(rule, source)).toList(),
        ignored);
  }

  private static PairRule in(PairRule rule, Optional<Language> source) {
    return new PairRule(rule.source(), rule.target(), source, rule.targetLanguage());
  }

  /** The glob by which a file is ignored, if it is. */
  Optional<Glob> ignoring(String path) {
    return ignored.stream().filter(glob -> glob.matches(path)).findFirst();
  }

  /** Whether translations into {@code language} are wanted. */
  boolean wants(Language language) {
    return targetLanguage.isEmpty() || intoTarget(language);
  }

  /** Whether the settings make {@code language} the one of the translations. */
  boolean intoTarget(Language language) {
    return targetLanguage.filter(target -> target.covers(language)).isPresent();
  }
}
