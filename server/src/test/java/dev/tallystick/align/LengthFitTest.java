package dev.tallystick.align;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LengthFitTest {
  /** Pairs drawn from the model itself: a normal divided by the root of a chi-square. */
  @ParameterizedTest
  @CsvSource({
    "1.1, 6.8, 1, 4",
    "0.4, 1.2, 1.1, 8",
    "1.5, 0.4, 1.7, 4",
    "1, 3, 1.4, 30",
    "2.2, 9, 1, 2"
  })
  void ratioAndSpreadComeBackFromPairsDrawnFromThem(
      double ratio, double spread, double power, int freedom) {
    Random random = new Random(41);
    LengthModel true_ = new LengthModel(ratio, spread, power, freedom);
    LengthFit fit = new LengthFit(4_000, 1);
    for (int i = 0; i < 4_000; i++) {
      double l1 = 20 + random.nextInt(180);
      fit.add(l1, true_.expected(l1) + true_.deviation(l1) * student(random, freedom), 1);
    }
    LengthModel fitted = fit.fit();
    assertEquals(ratio, fitted.ratio(), 0.05 * ratio);
    for (double l1 : new double[] {40, 100, 180}) {
      double off = fitted.deviation(l1) / true_.deviation(l1);
      assertTrue(off > 0.75 && off < 1.33, () -> fitted + " at " + l1 + ": " + off);
    }
  }

  private static double student(Random random, int freedom) {
    double square = 0;
    for (int i = 0; i < freedom; i++) {
      double normal = random.nextGaussian();
      square += normal * normal;
    }
    return random.nextGaussian() / Math.sqrt(square / freedom);
  }

  @Test
  void withoutPairsTheStartIsKept() {
    LengthModel model = new LengthFit(10, 0.7).fit();
    assertEquals(0.7, model.ratio());
    assertEquals(1, model.power());
    assertTrue(model.deviation(100) > 5 && model.deviation(100) < 40);
  }

  @Test
  void weightsCount() {
    LengthFit fit = new LengthFit(200, 1);
    for (int i = 0; i < 100; i++) {
      fit.add(100, 120, 1);
      fit.add(100, 40, 0.001);
    }
    assertEquals(1.2, fit.fit().ratio(), 0.01);
  }

  @Test
  void aFewPairsFarOffHardlyWidenTheSpread() {
    double calm = deviation(0);
    double disturbed = deviation(5);
    assertTrue(disturbed < 2 * calm, calm + " became " + disturbed);
  }

  private static double deviation(int wrong) {
    Random random = new Random(42);
    LengthFit fit = new LengthFit(300, 1);
    for (int i = 0; i < 200; i++) {
      fit.add(100, 110 + 8 * random.nextGaussian(), 1);
    }
    for (int i = 0; i < wrong; i++) {
      fit.add(100, i % 2 == 0 ? 300 : 10, 1);
    }
    return fit.fit().deviation(100);
  }

  @Test
  void pairsBeyondTheNumberForeseenAreLeftOut() {
    LengthFit fit = new LengthFit(2, 1);
    fit.add(100, 120, 1);
    fit.add(100, 120, 1);
    fit.add(100, 9_000, 1);
    assertEquals(1.2, fit.fit().ratio(), 1e-9);
  }

  @Test
  void theTableAgreesWithTheDensity() {
    LengthModel model = new LengthModel(1.1, 5, 1.2, 4);
    LengthTable table = new LengthTable(model);
    for (int l1 : new int[] {1, 7, 60, 400, 5_000}) {
      for (int l2 : new int[] {0, 3, 66, 90, 5_500, 100_000}) {
        double sd = Math.sqrt(5 * Math.pow(l1, 1.2));
        double z = (l2 - 1.1 * l1) / sd;
        // Density of Student's t with 4 degrees of freedom: 3/8 (1 + z^2/4)^(-5/2).
        double expected = Math.log(3.0 / 8 / sd) - 2.5 * Math.log1p(z * z / 4);
        assertEquals(expected, table.logDensity(l1, l2), 2e-3, l1 + ":" + l2);
      }
    }
  }
}
