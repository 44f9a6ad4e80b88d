package dev.tallystick.pairing;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Predicate;

/**
 * Puts each file into one group at most.
 *
 * <p>A file with several tags can be read as a version of several stems, and the untagged file of
 * one group may carry a tag of another. The groups therefore take their files in turn, the most
 * convincing first, and a file that is taken is gone for the others. More convincing is, in this
 * order: more languages; a language of the settings or English among them; more files; a tag
 * farther to the left; the lesser stem. A group that is left without two languages takes none.
 */
final class Groups {
  private final Rules rules;
  private final Map<String, List<Tagged>> readings = new HashMap<>();
  private final Map<String, Group> byStem = new HashMap<>();
  private final List<Group> formed = new ArrayList<>();
  private final Set<String> taken = new HashSet<>();

  /**
   * Forms the groups.
   *
   * @param paths sorted, without duplicates
   * @param elsewhere those of them that belong elsewhere
   */
  Groups(Collection<String> paths, Predicate<String> elsewhere, Rules rules) {
    this.rules = rules;
    paths.stream().filter(elsewhere).forEach(taken::add);
    Tags tags = new Tags(rules);
    for (String path : paths) {
      List<Tagged> found = tags.of(path);
      readings.put(path, found);
      found.forEach(this::addReading);
    }
    for (String path : paths) {
      Group group = byStem.get(path);
      if (group != null) {
        group.members().add(Tagged.plain(path));
      }
    }
    rank().forEach(this::form);
    formed.sort(Comparator.comparing(Group::stem));
  }

  /** The groups, each with two languages at least; sorted by stem. */
  List<Group> formed() {
    return formed;
  }

  /** Whether the file is in a group, or belongs elsewhere. */
  boolean isTaken(String path) {
    return taken.contains(path);
  }

  /** The readings of a path that have a tag, the likeliest first. */
  List<Tagged> readings(String path) {
    return readings.get(path);
  }

  /** Whether the file had siblings that other groups took. */
  boolean lostSiblings(String path) {
    Group around = byStem.get(path);
    return around != null
        || readings(path).stream().anyMatch(reading -> byStem.get(reading.stem()).isTranslated());
  }

  private void addReading(Tagged reading) {
    List<Tagged> members =
        byStem
            .computeIfAbsent(reading.stem(), stem -> new Group(stem, new ArrayList<>()))
            .members();
    boolean again =
        !members.isEmpty() && members.get(members.size() - 1).path().equals(reading.path());
    if (!again) {
      members.add(reading);
    }
  }

  private List<Group> rank() {
    List<Claim> claims = new ArrayList<>();
    for (Group group : byStem.values()) {
      Group free = free(group);
      if (free.isTranslated()) {
        claims.add(claim(free));
      }
    }
    claims.sort(Claim.ORDER);
    return claims.stream().map(Claim::group).toList();
  }

  private Claim claim(Group group) {
    Collection<Language> languages = group.languages();
    int position =
        group.members().stream().mapToInt(Tagged::position).min().orElse(Integer.MAX_VALUE);
    return new Claim(
        group, languages.size(), languages.stream().anyMatch(this::isExpected), position);
  }

  private boolean isExpected(Language language) {
    String primary = language.primary();
    return primary.equals("en")
        || rules.sourceLanguage().filter(set -> set.primary().equals(primary)).isPresent()
        || rules.targetLanguage().filter(set -> set.primary().equals(primary)).isPresent();
  }

  private void form(Group group) {
    Group rest = free(group);
    if (rest.isTranslated()) {
      formed.add(rest);
      rest.members().forEach(member -> taken.add(member.path()));
    }
  }

  /** What is left of a group, in the order of the paths. */
  private Group free(Group group) {
    List<Tagged> left = new ArrayList<>();
    for (Tagged member : group.members()) {
      if (!taken.contains(member.path())) {
        left.add(member);
      }
    }
    left.sort(Comparator.comparing(Tagged::path));
    return new Group(group.stem(), left);
  }

  /** How convincing a group is. */
  private record Claim(Group group, int languages, boolean expected, int position) {
    static final Comparator<Claim> ORDER =
        Comparator.comparingInt(Claim::languages)
            .thenComparing(Claim::expected)
            .thenComparingInt(claim -> claim.group.members().size())
            .reversed()
            .thenComparingInt(Claim::position)
            .thenComparing(claim -> claim.group.stem());
  }
}
