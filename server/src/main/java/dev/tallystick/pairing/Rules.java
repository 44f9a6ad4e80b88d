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
 * @param assumed whether the language of the sources is only what they are in where they do not say
 *     it themselves
 */
public record Rules(
    Optional<Language> sourceLanguage,
    Optional<Language> targetLanguage,
    List<PairRule> pairs,
    List<Glob> ignored,
    boolean assumed) {
  /** Nothing is set. */
  public static final Rules NONE = new Rules(Optional.empty(), Optional.empty());

  /** Takes copies. */
  public Rules {
    pairs = List.copyOf(pairs);
    ignored = List.copyOf(ignored);
  }

  /** All that is set is stated. */
  public Rules(
      Optional<Language> sourceLanguage,
      Optional<Language> targetLanguage,
      List<PairRule> pairs,
      List<Glob> ignored) {
    this(sourceLanguage, targetLanguage, pairs, ignored, false);
  }

  /** Of languages only. */
  public Rules(Optional<Language> sourceLanguage, Optional<Language> targetLanguage) {
    this(sourceLanguage, targetLanguage, List.of(), List.of());
  }

  /** Sources that do not say their language are in this one, if it is given. */
  public static Rules assuming(Optional<Language> sourceLanguage) {
    return new Rules(sourceLanguage, Optional.empty(), List.of(), List.of(), true);
  }

  /** The language of the sources, if it is not for themselves to say. */
  Optional<Language> statedSource() {
    return assumed ? Optional.empty() : sourceLanguage;
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
        ignored,
        source.isEmpty() ? assumed : options.assumed);
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
