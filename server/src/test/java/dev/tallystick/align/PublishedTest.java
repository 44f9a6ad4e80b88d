package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The model of Gale and Church, Computational Linguistics 19(1), 1993. The values were recomputed
 * with mpmath from the paper's formulas; the shares of the link types (its Table 5) and the mean
 * length under the root (the form of its listing) are from memory.
 */
class PublishedTest {
  private static final double SHARE_1_1 = 0.89;
  private static final double SHARE_NULL = 0.0099;
  private static final double SHARE_2_1 = 0.089;
  private static final double SHARE_2_2 = 0.011;

  @ParameterizedTest(name = "{0}. {1} {2}:{3}")
  @CsvSource({
    "1, 1-1, 0, 0, 0.000000, 1.000000e+00, 0.116534",
    "2, 1-1, 100, 100, 0.000000, 1.000000e+00, 0.116534",
    "3, 1-1, 100, 110, 0.374241, 7.082253e-01, 0.461527",
    "4, 1-1, 100, 90, -0.393445, 6.939910e-01, 0.481830",
    "5, 1-1, 100, 150, 1.714986, 8.634782e-02, 2.565906",
    "6, 1-1, 50, 80, 1.426954, 1.535930e-01, 1.989983",
    "7, 1-1, 20, 35, 1.096909, 2.726813e-01, 1.415985",
    "8, 1-1, 200, 100, -3.131121, 1.741401e-03, 6.469599",
    "9, 1-0, 40, 0, -3.429972, 6.036442e-04, 12.027746",
    "10, 1-0, 0, 40, 3.429972, 6.036442e-04, 12.027746",
    "11, 1-0, 5, 0, -1.212678, 2.252529e-01, 6.105752",
    "12, 1-0, 0, 117, 5.866154, 4.460191e-09, 23.843295",
    "13, 2-1, 115, 120, 0.176887, 8.595969e-01, 2.570411",
    "14, 2-1, 120, 130, 0.342997, 7.316006e-01, 2.731639",
    "15, 2-2, 170, 175, 0.145989, 8.839298e-01, 4.633238"
  })
  void costsAreThoseOfThePaper(
      int row, String type, double l1, double l2, double delta, double p, double cost) {
    double computed = Published.delta(l1, l2, 1, 6.8);
    assertEquals(delta, computed, 6e-7);
    assertEquals(p, Math.exp(Published.logProbability(computed)), 1e-6 * p);
    assertEquals(cost, Published.cost(l1, l2, share(type)), 6e-7);
  }

  /** The parameters measured on paragraphs of the paper's two pairs, and one for Chinese. */
  @ParameterizedTest
  @CsvSource({
    "1.1, 7.3, 100, 130, 0.708719, 4.784987e-01",
    "1.06, 5.6, 100, 130, 0.961234, 3.364345e-01",
    "0.506, 6.8, 100, 80, 0.992457, 3.209748e-01"
  })
  void otherParametersGiveTheirValues(
      double ratio, double spread, double l1, double l2, double delta, double p) {
    double computed = Published.delta(l1, l2, ratio, spread);
    assertEquals(delta, computed, 6e-7);
    assertEquals(p, Math.exp(Published.logProbability(computed)), 1e-6 * p);
  }

  /**
   * The form printed in the paper's section 4, with the source's length alone under the root, has
   * the same tail. Rows as above, then the pairs with parameters of their own.
   */
  @ParameterizedTest(name = "{0}:{1}")
  @CsvSource({
    "100, 100, 1, 6.8, 0.000000, 1.000000e+00",
    "100, 110, 1, 6.8, 0.383482, 7.013620e-01",
    "100, 90, 1, 6.8, -0.383482, 7.013620e-01",
    "100, 150, 1, 6.8, 1.917412, 5.518555e-02",
    "50, 80, 1, 6.8, 1.626978, 1.037417e-01",
    "20, 35, 1, 6.8, 1.286239, 1.983595e-01",
    "200, 100, 1, 6.8, -2.711631, 6.695314e-03",
    "40, 0, 1, 6.8, -2.425356, 1.529337e-02",
    "5, 0, 1, 6.8, -0.857493, 3.911725e-01",
    "115, 120, 1, 6.8, 0.178800, 8.580950e-01",
    "120, 130, 1, 6.8, 0.350070, 7.262861e-01",
    "170, 175, 1, 6.8, 0.147059, 8.830856e-01",
    "100, 130, 1.1, 7.3, 0.740233, 4.591585e-01",
    "100, 130, 1.06, 5.6, 1.014185, 3.104944e-01",
    "100, 80, 0.506, 6.8, 1.127439, 2.595571e-01"
  })
  void thePrintedFormHasTheSameTail(
      double l1, double l2, double ratio, double spread, double delta, double p) {
    double printed = (l2 - l1 * ratio) / Math.sqrt(l1 * spread);
    assertEquals(delta, printed, 6e-7);
    assertEquals(p, Math.exp(Published.logProbability(printed)), 1e-6 * p);
  }

  /**
   * Lengths outside which p is below 5, 1 and 0.1 per cent: the first is, the one inside not; -1
   * where even an empty target is more probable.
   */
  @ParameterizedTest
  @CsvSource({
    "20, 2, 51, 0.05", "20, -1, 64, 0.01", "20, -1, 81, 0.001",
    "50, 19, 94, 0.05", "50, 12, 111, 0.01", "50, 5, 132, 0.001",
    "100, 55, 159, 0.05", "100, 43, 180, 0.01", "100, 30, 207, 0.001",
    "150, 93, 220, 0.05", "150, 78, 245, 0.01", "150, 61, 276, 0.001",
    "200, 133, 280, 0.05", "200, 115, 307, 0.01", "200, 95, 342, 0.001",
    "300, 217, 396, 0.05", "300, 194, 429, 0.01", "300, 168, 469, 0.001"
  })
  void improbableLengthsStartWhereComputed(int l1, int low, int high, double p) {
    assertTrue(low < 0 || probability(l1, low) < p);
    assertTrue(probability(l1, low + 1) >= p);
    assertTrue(probability(l1, high) < p);
    assertTrue(probability(l1, high - 1) >= p);
  }

  private static double probability(int l1, int l2) {
    return Math.exp(Published.logProbability(Published.delta(l1, l2, 1, 6.8)));
  }

  @ParameterizedTest
  @CsvSource({"1-1, 0.116534", "1-0, 4.615221", "2-1, 2.419119", "2-2, 4.509860"})
  void linksOfEqualLengthCostTheirShareOnly(String type, double cost) {
    assertEquals(cost, Published.cost(80, 80, share(type)), 6e-7);
  }

  /** The integer penalties of the paper's listing (from memory) follow from its shares. */
  @ParameterizedTest
  @CsvSource({"2-1, 230, 230.26", "2-2, 440, 439.33", "1-0, 450, 449.87"})
  void penaltiesRelativeToOneToOneAreThoseOfTheListing(String type, int penalty, double exact) {
    assertEquals(exact, penalty(share(type)), 0.005);
    assertEquals(penalty, penalty(share(type)), 1);
  }

  /** The listing leaves the share of two mirrored types unsplit: halved, these would follow. */
  @ParameterizedTest
  @CsvSource({"2-1, 299.57", "1-0, 519.18"})
  void splitSharesWouldGiveOtherPenalties(String type, double penalty) {
    assertEquals(penalty, penalty(share(type) / 2), 0.005);
  }

  private static double penalty(double share) {
    return 100 * (Published.cost(0, 0, share) - Published.cost(0, 0, SHARE_1_1));
  }

  /** Table 5 counts 1167, 13, 117 and 15 matches of 1312 (from memory); it prints these shares. */
  @Test
  void sharesAreTheCountsOfTable5Rounded() {
    assertEquals(SHARE_1_1, 1167 / 1312.0, 0.001);
    assertEquals(SHARE_NULL, 13 / 1312.0, 0.0001);
    assertEquals(SHARE_2_1, 117 / 1312.0, 0.001);
    assertEquals(SHARE_2_2, 15 / 1312.0, 0.001);
    assertEquals(0.9999, SHARE_1_1 + SHARE_NULL + SHARE_2_1 + SHARE_2_2, 1e-9);
  }

  @Test
  void theModelItselfHasTheseShares() {
    int[] sums = {0, 80, 160};
    Published model = new Published(sums, sums);
    double[] worth = new double[4];
    model.links(0, 0, worth, 0);
    assertEquals(List.of("1-1", "2-1", "1-2", "2-2"), names(model.shapes()));
    assertEquals(-0.116534, worth[0], 6e-7);
    assertEquals(-4.509860, worth[3], 6e-7);
    assertEquals(worth[1], worth[2], 1e-12);
    assertEquals(-Published.cost(160, 80, SHARE_2_1), worth[1], 1e-12);
    assertEquals(-Published.cost(80, 0, SHARE_NULL), model.omission(1), 1e-12);
    assertEquals(-Published.cost(0, 80, SHARE_NULL), model.addition(0), 1e-12);
  }

  @Test
  void noLinkLeadsBeyondTheEndOfAText() {
    Published model = new Published(new int[] {0, 80}, new int[] {0, 80, 160});
    double[] worth = new double[6];
    model.links(0, 0, worth, 1);
    assertEquals(0, worth[0]);
    assertTrue(Double.isFinite(worth[1]));
    assertEquals(Double.NEGATIVE_INFINITY, worth[2]);
    assertTrue(Double.isFinite(worth[3]));
    assertEquals(Double.NEGATIVE_INFINITY, worth[4]);
    assertEquals(0, worth[5]);
  }

  private static List<String> names(List<Shape> shapes) {
    return shapes.stream().map(shape -> shape.sources() + "-" + shape.targets()).toList();
  }

  @Test
  void anEmptySideIsTheRootOfTwiceTheLengthAway() {
    for (int l : new int[] {1, 5, 40, 117, 900}) {
      double far = Math.sqrt(2 * l / 6.8);
      assertEquals(-far, Published.delta(l, 0, 1, 6.8), 1e-12);
      assertEquals(far, Published.delta(0, l, 1, 6.8), 1e-12);
    }
  }

  @Test
  void swappingTheSidesNegatesDelta() {
    for (int l1 = 0; l1 < 300; l1 += 7) {
      for (int l2 = 0; l2 < 300; l2 += 11) {
        double delta = Published.delta(l1, l2, 1, 6.8);
        assertEquals(-delta, Published.delta(l2, l1, 1, 6.8), 1e-12);
        assertEquals(Published.cost(l1, l2, 1), Published.cost(l2, l1, 1), 1e-12);
      }
    }
    assertNotEquals(
        Published.delta(100, 150, 1.1, 6.8), -Published.delta(150, 100, 1.1, 6.8), 1e-6);
  }

  @Test
  void noDifferenceIsCertain() {
    assertEquals(0, Published.logProbability(0), 1e-15);
    assertEquals(Published.logProbability(2.5), Published.logProbability(-2.5));
  }

  /**
   * The naive form 2 (1 - Phi) is 0 from 8.3 deviations on, the error function in doubles from
   * 38.5. Values by mpmath.
   */
  @ParameterizedTest
  @CsvSource({
    "8.3, -36.8010702432",
    "20, -203.224008191",
    "29.9, -450.629765278",
    "30.1, -456.636417236",
    "38, -725.864068838",
    "40, -803.915294833"
  })
  void farTailsKeepTheirDigits(double delta, double log) {
    assertEquals(log, Published.logProbability(delta), 1e-6);
  }

  @Test
  void fartherDifferencesAreAlwaysLessProbable() {
    double last = 0;
    for (double delta = 0.5; delta <= 100; delta += 0.5) {
      double log = Published.logProbability(delta);
      assertTrue(Double.isFinite(log) && log < last, "delta " + delta);
      last = log;
    }
    assertTrue(Double.isFinite(Published.cost(0, 1_000_000, SHARE_NULL)));
  }

  /** Why the model finds no omission: at each of these lengths the merge is cheaper. */
  @Test
  void aDroppedSentenceIsAlwaysTakenForAMerge() {
    for (int n : new int[] {60, 117, 200}) {
      for (int dropped = 5; dropped <= 300; dropped += 5) {
        double merge = Published.cost(n + dropped, n, SHARE_2_1);
        double omission = Published.cost(n, n, SHARE_1_1) + Published.cost(dropped, 0, SHARE_NULL);
        assertTrue(merge < omission, "N " + n + ", L " + dropped);
      }
    }
    double merge = Published.cost(234, 117, SHARE_2_1);
    double omission = Published.cost(117, 117, SHARE_1_1) + Published.cost(117, 0, SHARE_NULL);
    assertEquals(9.67, merge, 0.005);
    assertEquals(23.96, omission, 0.005);
  }

  /** Were a dropped sentence charged its share only, it would be found from these lengths on. */
  @ParameterizedTest
  @CsvSource({"60, 39", "117, 52", "200, 66"})
  void withoutTheLengthTermLongOmissionsWouldBeFound(int n, int from) {
    double omission = Published.cost(n, n, SHARE_1_1) + Published.cost(0, 0, SHARE_NULL);
    assertTrue(Published.cost(n + from - 1, n, SHARE_2_1) < omission);
    for (int dropped = from; dropped <= 300; dropped++) {
      assertTrue(Published.cost(n + dropped, n, SHARE_2_1) > omission, "L " + dropped);
    }
  }

  private static double share(String type) {
    double[] shares = {SHARE_1_1, SHARE_NULL, SHARE_2_1, SHARE_2_2};
    return shares[Arrays.asList("1-1", "1-0", "2-1", "2-2").indexOf(type)];
  }
}
