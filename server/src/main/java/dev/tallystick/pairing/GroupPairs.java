package dev.tallystick.pairing;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Pairs the files of one group once the language of its source is known. */
final class GroupPairs {
  private final Rules rules;
  private final List<Tagged> sources;
  private final Map<String, Tagged> sourceByLayout = new HashMap<>();
  private final boolean oneLanguage;
  private final Language plainTarget;
  private final List<Pair> pairs = new ArrayList<>();
  private final List<Alone> alone = new ArrayList<>();

  /**
   * Pairs them.
   *
   * @param language the language of the source; {@link Language#UNKNOWN} if it is the file without
   *     a tag
   */
  GroupPairs(Group group, Language language, Rules rules) {
    this.rules = rules;
    sources = group.in(language);
    sources.forEach(source -> sourceByLayout.putIfAbsent(source.layout(), source));
    Set<Language> languages = group.languages();
    oneLanguage = languages.size() == 1;
    // A file without a tag is in the wanted language if no file with a tag is.
    plainTarget =
        languages.stream().anyMatch(rules::intoTarget)
            ? Language.UNKNOWN
            : rules.targetLanguage().orElse(Language.UNKNOWN);
    addTargets(group.notIn(language));
  }

  /** The pairs. */
  List<Pair> pairs() {
    return pairs;
  }

  /** The files of the group that are in none of the pairs. */
  List<Alone> alone() {
    return alone;
  }

  private void addTargets(List<Tagged> targets) {
    Set<Tagged> used = new HashSet<>();
    for (Tagged target : targets) {
      Tagged source = sourceByLayout.getOrDefault(target.layout(), sources.get(0));
      Optional<String> objection = objection(source, target);
      if (objection.isPresent()) {
        alone.add(new Alone(target.path(), objection.get()));
      } else {
        pairs.add(pair(source, target));
        used.add(source);
      }
    }
    Optional<Tagged> first = sources.stream().filter(used::contains).findFirst();
    for (Tagged source : sources) {
      if (!used.contains(source)) {
        alone.add(new Alone(source.path(), whyUnused(source, first)));
      }
    }
  }

  private Optional<String> objection(Tagged source, Tagged target) {
    Language language = languageOf(target);
    if (language.equals(Language.UNKNOWN)) {
      return oneLanguage && rules.targetLanguage().isEmpty()
          ? Optional.empty()
          : Optional.of(Reasons.unknownLanguage(source.path()));
    }
    return rules.wants(language)
        ? Optional.empty()
        : rules.targetLanguage().map(wanted -> Reasons.unwanted(language, wanted));
  }

  private Pair pair(Tagged source, Tagged target) {
    return new Pair(
        source.path(),
        target.path(),
        source.isPlain() ? rules.statedSource().orElse(Language.UNKNOWN) : source.language(),
        languageOf(target),
        target.isPlain() ? source.why() : target.why());
  }

  private Language languageOf(Tagged target) {
    return target.isPlain() ? plainTarget : target.language();
  }

  /** No source at all is used only where the settings want another target. */
  private String whyUnused(Tagged source, Optional<Tagged> used) {
    return used.map(other -> Reasons.secondSource(source.language(), other.path()))
        .orElseGet(() -> Reasons.noTranslation(rules.targetLanguage().orElseThrow()));
  }
}
