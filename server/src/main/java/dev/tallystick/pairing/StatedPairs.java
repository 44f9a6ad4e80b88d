package dev.tallystick.pairing;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.NavigableSet;
import java.util.Optional;
import java.util.Set;

/**
 * The pairs that a project states. They are looked for rule by rule: a file is the translation in
 * one pair at most, and the first rule that finds a source for it counts. It may be the source of
 * another pair, as where a translation is translated on, but not of its own source, by whatever
 * detour. Where several files could be a source, the one in the exact language given counts, else
 * the first by path.
 *
 * <p>The language of a side is told by its tag, else by the rule, else by the file's name alone,
 * else by the settings. A file has the same language in all its pairs: that of the first.
 */
final class StatedPairs {
  private final NavigableSet<String> paths;
  private final Rules rules;
  private final Map<String, Pair> byTarget = new HashMap<>();
  private final Map<String, Language> languages = new HashMap<>();
  private final Map<String, String> unmatched = new HashMap<>();
  private final Set<String> sources = new HashSet<>();

  /**
   * Looks for them.
   *
   * @param paths the files that count
   */
  StatedPairs(NavigableSet<String> paths, Rules rules) {
    this.paths = paths;
    this.rules = rules;
    rules.pairs().forEach(this::add);
  }

  /** The pairs that are wanted. */
  List<Pair> pairs() {
    return byTarget.values().stream().filter(pair -> rules.wants(pair.targetLanguage())).toList();
  }

  /** Whether a file is in one of them, wanted or not. */
  boolean has(String path) {
    return sources.contains(path) || byTarget.containsKey(path);
  }

  /** Those of its files that no wanted pair is left for. */
  List<Alone> alone() {
    Set<String> used = new HashSet<>();
    List<Alone> alone = new ArrayList<>();
    for (Pair pair : pairs()) {
      used.add(pair.source());
      used.add(pair.target());
    }
    for (Pair pair : byTarget.values()) {
      rules.targetLanguage().ifPresent(wanted -> addUnused(pair, wanted, used, alone));
    }
    return alone;
  }

  private static void addUnused(Pair pair, Language wanted, Set<String> used, List<Alone> alone) {
    if (used.add(pair.target())) {
      alone.add(new Alone(pair.target(), Reasons.unwanted(pair.targetLanguage(), wanted)));
    }
    if (used.add(pair.source())) {
      alone.add(new Alone(pair.source(), Reasons.noTranslation(wanted)));
    }
  }

  /** Why a file that a rule names is in no pair by it; empty for one that no rule names. */
  Optional<String> whyUnmatched(String path) {
    return Optional.ofNullable(unmatched.get(path));
  }

  /** One way in which a file is named by one side of a rule. */
  private record Side(String path, PathPattern.Values values, Optional<Language> tagged) {
    /** What source and translation must have in common. */
    String key() {
      return String.valueOf(values.path());
    }

    boolean isIn(Optional<Language> language) {
      return language.isPresent() && tagged.equals(language);
    }
  }

  private void add(PairRule rule) {
    Optional<Language> given = rule.sourceLanguage().or(rules::sourceLanguage);
    Tags tags = new Tags(new Rules(given, rule.targetLanguage().or(rules::targetLanguage)));
    List<Side> from = sides(rule.source(), given, tags);
    Map<String, Side> byKey = new HashMap<>();
    for (Side source : from) {
      byKey.merge(source.key(), source, (a, b) -> b.isIn(given) && !a.isIn(given) ? b : a);
    }
    Set<String> found = new HashSet<>();
    for (Side target : sides(rule.target(), rule.targetLanguage(), tags)) {
      Side source = byKey.get(target.key());
      if (source == null) {
        unmatched.putIfAbsent(target.path(), missing(rule.source(), target));
      } else if (suit(source, target)) {
        pair(rule, source, target);
        found.add(source.key());
      }
    }
    for (Side source : from) {
      String reason =
          found.contains(source.key())
              ? Reasons.secondSource(byKey.get(source.key()).path())
              : missing(rule.target(), source);
      unmatched.putIfAbsent(source.path(), reason);
    }
  }

  private List<Side> sides(PathPattern pattern, Optional<Language> wanted, Tags tags) {
    List<Side> sides = new ArrayList<>();
    if (pattern.isLiteral()) {
      if (paths.contains(pattern.toString())) {
        sides.add(new Side(pattern.toString(), PathPattern.Values.NONE, Optional.empty()));
      }
      return sides;
    }
    boolean tagged = pattern.has(PathPattern.TAG);
    for (String path : paths) {
      for (PathPattern.Values values : pattern.read(path)) {
        Optional<Language> language = tagged ? tags.language(values.tag()) : Optional.empty();
        boolean other =
            language.isPresent() && wanted.isPresent() && !wanted.get().covers(language.get());
        if (language.isPresent() == tagged && !other) {
          sides.add(new Side(path, values, language));
        }
      }
    }
    return sides;
  }

  /** Whether the one may be a translation of the other, which it is of nothing else. */
  private boolean suit(Side source, Side target) {
    boolean sameTag = target.tagged().isPresent() && target.tagged().equals(source.tagged());
    return !sameTag
        && !byTarget.containsKey(target.path())
        && !comesFrom(source.path(), target.path());
  }

  /** Whether a file is another one, or a translation of it by whatever detour. */
  private boolean comesFrom(String path, String origin) {
    String at = path;
    while (!at.equals(origin) && byTarget.containsKey(at)) {
      at = byTarget.get(at).source();
    }
    return at.equals(origin);
  }

  private void pair(PairRule rule, Side source, Side target) {
    Language from = language(source, rule.sourceLanguage(), rules.statedSource());
    Language into = language(target, rule.targetLanguage(), rules.targetLanguage());
    byTarget.put(target.path(), new Pair(source.path(), target.path(), from, into, Why.PROJECT));
    sources.add(source.path());
  }

  private Language language(Side side, Optional<Language> given, Optional<Language> set) {
    return languages.computeIfAbsent(
        side.path(),
        path -> {
          Language named = side.tagged().or(() -> given).orElseGet(() -> Tags.only(path));
          return named.equals(Language.UNKNOWN) ? set.orElse(named) : named;
        });
  }

  private static String missing(PathPattern other, Side side) {
    return Reasons.noStatedFile(other.with(new PathPattern.Values(side.values().path(), null)));
  }
}
