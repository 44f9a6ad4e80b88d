package dev.tallystick.pairing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/**
 * Tells which language of a group is that of the source. In this order: the setting; the file
 * without a tag; the one language that every group has; English; the only one left.
 */
final class Sides {
  private final Rules rules;
  private final Optional<Language> common;

  /**
   * Looks for the language that the groups share.
   *
   * @param groups all that were formed
   */
  Sides(List<Group> groups, Rules rules) {
    this.rules = rules;
    this.common = common(groups);
  }

  /**
   * The language of the source; {@link Language#UNKNOWN} if the file without a tag is the source;
   * empty if the translator has to choose.
   */
  Optional<Language> source(Group group) {
    Optional<Language> set = bySetting(group);
    if (set.isPresent()) {
      return set;
    }
    if (group.plain().isPresent()) {
      return Optional.of(Language.UNKNOWN);
    }
    SortedSet<Language> choices = choices(group);
    if (common.isPresent()) {
      return common;
    }
    if (choices.size() == 1) {
      return Optional.of(choices.first());
    }
    // "en" sorts before "en-GB".
    return choices.stream().filter(language -> language.primary().equals("en")).findFirst();
  }

  /**
   * The languages that may be the source's: a wanted target is none, unless nothing else is left.
   */
  SortedSet<Language> choices(Group group) {
    SortedSet<Language> languages = group.languages();
    SortedSet<Language> others = new TreeSet<>(languages);
    others.removeIf(rules::intoTarget);
    return others.isEmpty() ? languages : others;
  }

  private Optional<Language> bySetting(Group group) {
    if (rules.sourceLanguage().isEmpty()) {
      return Optional.empty();
    }
    Language set = rules.sourceLanguage().get();
    SortedSet<Language> languages = group.languages();
    if (languages.contains(set)) {
      return Optional.of(set);
    }
    // pt-BR beside an untagged file is its translation, though the source were set to pt-PT.
    boolean plain = group.plain().isPresent();
    List<Language> akin =
        languages.stream()
            .filter(language -> plain ? set.covers(language) : isAkin(set, language))
            .toList();
    Optional<Language> first = akin.stream().findFirst();
    return akin.size() < 2
        ? first
        : akin.stream().filter(set::isWrittenLike).findFirst().or(() -> first);
  }

  private static boolean isAkin(Language a, Language b) {
    return a.primary().equals(b.primary());
  }

  private Optional<Language> common(List<Group> groups) {
    List<SortedSet<Language>> tagged = new ArrayList<>();
    for (Group group : groups) {
      if (group.plain().isEmpty()) {
        tagged.add(choices(group));
      }
    }
    if (tagged.isEmpty()) {
      return Optional.empty();
    }
    SortedSet<Language> shared = new TreeSet<>(tagged.get(0));
    tagged.forEach(shared::retainAll);
    return shared.size() == 1 ? Optional.of(shared.first()) : Optional.empty();
  }
}
