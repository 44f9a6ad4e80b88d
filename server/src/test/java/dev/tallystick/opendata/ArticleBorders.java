package dev.tallystick.opendata;

import dev.tallystick.align.Aligner;
import dev.tallystick.align.Match;
import dev.tallystick.run.Cancellation;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;

/** How well the aligner finds where articles begin, of which it is told nothing. */
final class ArticleBorders {
  private ArticleBorders() {}

  /**
   * The harmonic mean of precision (of the matches that begin with an article on either side, those
   * that begin with the same one on both) and recall (of the articles that both have, those where a
   * match begins so).
   */
  static double f1(Declaration source, Declaration target) {
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

  static List<Match> matches(Declaration source, Declaration target) {
    return Aligner.ADAPTIVE
        .align(source.reading().units(), target.reading().units(), Cancellation.NONE)
        .matches();
  }
}
