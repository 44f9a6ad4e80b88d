package dev.tallystick.opendata;

import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.align.Match;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.junit.jupiter.api.Test;

/**
 * Common practice, no source: from English into German and into French about nine matches in ten
 * are one to one, into Hindi about two in three, with up to six sentences for one. The declaration
 * of human rights bears out the first; for Hindi it does not show the figure, only that there are
 * fewer, for its translation keeps to the articles and their numbered sentences. A pair that is
 * made as practice has it is in {@code EnglishHindiPairsTest}.
 */
class MatchSharesIT {
  private static final Declaration ENGLISH = Declaration.of("eng", "en", Set.of());

  /** Measured: 0.99 and 0.99. */
  @Test
  void nineInTenAreOneToOneIntoGermanAndFrench() {
    for (Translation translation :
        List.of(new Translation("deu_1996", "de"), new Translation("fra", "fr"))) {
      assertTrue(oneToOne(translation) >= 0.85, translation::toString);
    }
  }

  /** Measured: 0.88, and three sentences for one. */
  @Test
  void fewerAreIntoHindiAndOneSentenceIsOftenParted() {
    Translation hindi = new Translation("hin", "hi");
    double share = oneToOne(hindi);
    assertTrue(share > 0.6 && share < 0.95, () -> "one to one: " + share);
    List<Match> matches = ArticleBorders.matches(ENGLISH, hindi.without(Set.of()));
    assertTrue(matches.stream().filter(m -> m.sources() == 1 && m.targets() > 1).count() >= 4);
    assertTrue(matches.stream().anyMatch(m -> m.sources() == 1 && m.targets() >= 3));
  }

  private static double oneToOne(Translation translation) {
    List<Match> matches = ArticleBorders.matches(ENGLISH, translation.without(Set.of()));
    long one = matches.stream().filter(m -> m.sources() == 1 && m.targets() == 1).count();
    double share = (double) one / matches.size();
    System.out.printf(Locale.ROOT, "One to one, en-%s: %.2f%n", translation.language(), share);
    return share;
  }
}
