package dev.tallystick.opendata;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.align.Aligner;
import dev.tallystick.align.Match;
import dev.tallystick.run.Cancellation;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;

/**
 * English against nine languages in six scripts, all by official translators. Where an article
 * begins is known; the aligner is not told, and must begin a match there on both sides.
 */
class DeclarationIT {
  private static final double LEAST_MEAN = 0.97;

  /**
   * A floor below what was measured, 0.92: between scripts hardly more than lengths is to go by.
   */
  private static final double LEAST_MEAN_WITH_GAPS = 0.9;

  /** File of the package and language. */
  private static final List<List<String>> OTHERS =
      List.of(
          List.of("deu_1996", "de"),
          List.of("fra", "fr"),
          List.of("spa", "es"),
          List.of("hun", "hu"),
          List.of("ell_monotonic", "el"),
          List.of("rus", "ru"),
          List.of("heb", "he"),
          List.of("hin", "hi"),
          List.of("jpn", "ja"));

  @Test
  void articlesAreFoundInOtherLanguagesAndScripts() {
    assertTrue(meanF1(Set.of()) >= LEAST_MEAN);
  }

  /** A link with the beginning of an article that the translation lacks counts as wrong. */
  @Test
  void articlesThatTheTranslationLacksMisleadFewOthers() {
    assertTrue(meanF1(Set.of(4, 12, 18, 27)) >= LEAST_MEAN_WITH_GAPS);
  }

  /** The measure itself: right throughout, and wrong throughout. */
  @Test
  void aTextAgreesWithItselfAndNotWithBordersMoved() {
    Declaration english = Declaration.of("eng", "en", Set.of());
    SortedMap<Integer, Integer> moved = new TreeMap<>(english.articles());
    moved.replaceAll((number, first) -> first + 1);
    assertEquals(1, f1(english, english));
    assertEquals(0, f1(english, new Declaration(english.reading(), moved)));
  }

  private static double meanF1(Set<Integer> leftOut) {
    Declaration english = Declaration.of("eng", "en", Set.of());
    double sum = 0;
    List<String> told = new ArrayList<>();
    for (List<String> other : OTHERS) {
      double f1 = f1(english, Declaration.of(other.get(0), other.get(1), leftOut));
      told.add(String.format(Locale.ROOT, "%s %.3f", other.get(1), f1));
      sum += f1;
    }
    double mean = sum / OTHERS.size();
    System.out.printf(
        Locale.ROOT,
        "F1 of the borders of articles, %d left out: %s, mean %.3f%n",
        leftOut.size(),
        String.join(", ", told),
        mean);
    return mean;
  }

  /**
   * The harmonic mean of precision (of the matches that begin with an article on either side, those
   * that begin with the same one on both) and recall (of the articles that both have, those where a
   * match begins so).
   */
  private static double f1(Declaration source, Declaration target) {
    SortedMap<Integer, Integer> gold = new TreeMap<>();
    target.articles().forEach((number, at) -> gold.put(source.articles().get(number), at));
    int right = 0;
    int found = 0;
    for (Match match : matches(source, target)) {
      boolean onEither =
          source.articles().containsValue(match.sourceFrom())
              || target.articles().containsValue(match.targetFrom());
      if (match.twoSided() && onEither) {
        found++;
        right += gold.getOrDefault(match.sourceFrom(), -1) == match.targetFrom() ? 1 : 0;
      }
    }
    return 2.0 * right / (found + gold.size());
  }

  private static List<Match> matches(Declaration source, Declaration target) {
    return Aligner.ADAPTIVE
        .align(source.reading().units(), target.reading().units(), Cancellation.NONE)
        .matches();
  }
}
