package dev.tallystick.pairing;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.NavigableSet;
import java.util.Optional;
import java.util.TreeSet;

/**
 * Finds the files that are translations of one another: those that the project states, and among
 * the rest those that the language tags in their paths tell. What the project ignores is neither.
 *
 * <p>A tag is the last part of a file's name before the extension ({@code guide.de.md}, {@code
 * guide_pt_BR.txt}) or the name of a folder at any depth ({@code docs/de/guide.md}). It counts only
 * if CLDR knows the language and another version of the file exists: the same path without the tag,
 * or with the tag of another language.
 *
 * <p>A file that could belong to several groups joins one only, and the choice does not depend on
 * the order of the paths: the group with more languages; then the one with English or a language of
 * the settings; then the one with more files; then the one whose tag stands farther to the left;
 * then the one whose stem sorts first. So a file is the target of one pair at most, and never the
 * source of one and the target of another.
 *
 * <p>Where a group has several files in the source's language, each translation goes with the one
 * that carries its tag at the same place, else with the first by path. A translation without a tag
 * beside a tagged source is paired only if the settings name its language or it is the only one.
 */
public final class Pairing {
  private final Rules rules;
  private final List<Pair> pairs = new ArrayList<>();
  private final List<Alone> alone = new ArrayList<>();
  private final List<Ambiguity> ambiguities = new ArrayList<>();

  private Pairing(Rules rules) {
    this.rules = rules;
  }

  /**
   * Sorts the files into pairs, lone files and open questions.
   *
   * @param paths relative paths with {@code /}, in any order; no file is opened
   * @param rules what the settings, the project or the command line say
   */
  public static Pairs pairs(Collection<String> paths, Rules rules) {
    Pairing pairing = new Pairing(rules);
    pairing.addAll(new TreeSet<>(paths));
    return new Pairs(pairing.pairs, pairing.alone, pairing.ambiguities);
  }

  private void addAll(NavigableSet<String> paths) {
    paths.removeIf(this::isIgnored);
    StatedPairs stated = new StatedPairs(paths, rules);
    pairs.addAll(stated.pairs());
    alone.addAll(stated.alone());
    Groups groups = new Groups(paths, stated::has, rules);
    Sides sides = new Sides(groups.formed(), rules);
    for (Group group : groups.formed()) {
      sides
          .source(group)
          .ifPresentOrElse(
              source -> addGroup(group, source), () -> addAmbiguity(group, sides.choices(group)));
    }
    for (String path : paths) {
      if (!groups.isTaken(path)) {
        Optional<String> named = stated.whyUnmatched(path);
        alone.add(new Alone(path, named.orElseGet(() -> whyAlone(path, groups))));
      }
    }
  }

  private boolean isIgnored(String path) {
    Optional<Glob> glob = rules.ignoring(path);
    glob.ifPresent(by -> alone.add(new Alone(path, Reasons.ignored(by))));
    return glob.isPresent();
  }

  private void addAmbiguity(Group group, Collection<Language> choices) {
    List<String> files = group.members().stream().map(Tagged::path).toList();
    ambiguities.add(new Ambiguity(files, List.copyOf(choices)));
  }

  private void addGroup(Group group, Language source) {
    GroupPairs found = new GroupPairs(group, source, rules);
    pairs.addAll(found.pairs());
    alone.addAll(found.alone());
  }

  private static String whyAlone(String path, Groups groups) {
    if (groups.lostSiblings(path)) {
      return Reasons.siblingsTaken();
    }
    List<Tagged> readings = groups.readings(path);
    return readings.isEmpty() ? Reasons.noTag(path) : Reasons.noSibling(readings.get(0));
  }

  /**
   * A source and a translation that somebody has named as such, whatever they are called. Their
   * languages are those of the rules, else those that their paths name.
   */
  public static Pair named(String source, String target, Rules rules) {
    return new Pair(
        source,
        target,
        rules.sourceLanguage().orElseGet(() -> Tags.only(source)),
        rules.targetLanguage().orElseGet(() -> Tags.only(target)),
        Why.ARGUMENT);
  }
}
