package dev.tallystick.project;

import dev.tallystick.check.Levels;
import dev.tallystick.pairing.Glob;
import dev.tallystick.pairing.Language;
import dev.tallystick.pairing.PairRule;
import dev.tallystick.pairing.Rules;
import dev.tallystick.prose.FrontMatterKeys;
import java.util.List;
import java.util.Optional;

/**
 * The facts of a project.
 *
 * @param sourceLanguage the language of its sources, if it is set
 * @param pairs the files that belong together, whatever their names tell
 * @param levels how loudly each kind of finding is said
 * @param ignored the files that do not count
 * @param segmentation the file with rules for sentence borders, if one is named
 * @param frontMatter the keys of front matter whose values are prose
 */
public record Project(
    Optional<Language> sourceLanguage,
    List<PairRule> pairs,
    Levels levels,
    List<Glob> ignored,
    Optional<String> segmentation,
    FrontMatterKeys frontMatter) {
  /** Nothing is set. */
  public static final Project NONE =
      new Project(
          Optional.empty(),
          List.of(),
          Levels.USUAL,
          List.of(),
          Optional.empty(),
          FrontMatterKeys.USUAL);

  /** Takes copies. */
  public Project {
    pairs = List.copyOf(pairs);
    ignored = List.copyOf(ignored);
  }

  /**
   * The rules by which its files are paired: the project's facts beat what the user has set.
   *
   * @param set by the user
   */
  public Rules rules(Rules set) {
    return new Rules(
        sourceLanguage.or(set::sourceLanguage),
        set.targetLanguage(),
        pairs,
        ignored,
        sourceLanguage.isEmpty() && set.assumed());
  }
}
