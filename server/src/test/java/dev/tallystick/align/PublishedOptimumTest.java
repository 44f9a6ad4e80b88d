package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.run.Cancellation;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The published model's best alignment is the best of all, found here over the whole table as in
 * the paper; also where the translation is far from as long as its source, as Chinese and Japanese
 * are, so that the best way looks poor at first.
 */
class PublishedOptimumTest {
  private static final int SENTENCES = 70;

  @ParameterizedTest
  @ValueSource(doubles = {0.3, 0.4, 0.5, 1, 2, 3})
  void noOtherAlignmentIsCheaper(double ratio) {
    for (int seed = 0; seed < 5; seed++) {
      List<Unit> source = new ArrayList<>();
      List<Unit> target = new ArrayList<>();
      Random random = new Random(seed);
      for (int i = 0; i < SENTENCES; i++) {
        int length = 15 + random.nextInt(250);
        source.add(Sample.unit(length));
        int translated = (int) Math.max(1, length * ratio * (0.8 + 0.4 * random.nextDouble()));
        target.add(Sample.unit(translated));
      }
      Published model = new Published(sums(source), sums(target));
      double found = 0;
      for (Match match : Aligner.PUBLISHED.align(source, target, Cancellation.NONE).matches()) {
        found += worth(model, match);
      }
      assertEquals(best(model, SENTENCES, SENTENCES), found, 1e-6, "seed " + seed);
    }
  }

  private static int[] sums(List<Unit> units) {
    return new Side(units).lengthBefore;
  }

  private static double worth(Published model, Match match) {
    if (!match.twoSided()) {
      return match.targets() == 0
          ? model.omission(match.sourceFrom())
          : model.addition(match.targetFrom());
    }
    double[] links = new double[model.shapes().size()];
    model.links(match.targetFrom(), match.sourceFrom(), links, 0);
    for (int shape = 0; shape < links.length; shape++) {
      Shape taken = model.shapes().get(shape);
      if (taken.sources() == match.sources() && taken.targets() == match.targets()) {
        return links[shape];
      }
    }
    throw new AssertionError("not a link of the model: " + match);
  }

  /** The worth of the best alignment, by dynamic programming over every cell. */
  private static double best(Published model, int sources, int targets) {
    double[][] best = new double[targets + 1][sources + 1];
    Arrays.stream(best).forEach(row -> Arrays.fill(row, Double.NEGATIVE_INFINITY));
    best[0][0] = 0;
    double[] links = new double[model.shapes().size()];
    for (int t = 0; t <= targets; t++) {
      for (int s = 0; s <= sources; s++) {
        if (s < sources) {
          best[t][s + 1] = Math.max(best[t][s + 1], best[t][s] + model.omission(s));
        }
        if (t < targets) {
          best[t + 1][s] = Math.max(best[t + 1][s], best[t][s] + model.addition(t));
        }
        model.links(t, s, links, 0);
        for (int shape = 0; shape < links.length; shape++) {
          int toT = t + model.shapes().get(shape).targets();
          int toS = s + model.shapes().get(shape).sources();
          if (toT <= targets && toS <= sources) {
            best[toT][toS] = Math.max(best[toT][toS], best[t][s] + links[shape]);
          }
        }
      }
    }
    return best[targets][sources];
  }
}
