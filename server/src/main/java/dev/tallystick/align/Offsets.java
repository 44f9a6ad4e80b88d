package dev.tallystick.align;

import java.util.Arrays;
import java.util.List;

/** How often each offset between the times of two texts occurs, at one scale. */
final class Offsets {
  /** Offsets are looked for so far from the middle (seconds). */
  static final double FARTHEST = 600;

  private static final double WIDTH = 0.125;

  /** So many places beside each other are counted as one: an eighth of a second each. */
  private static final int[] WINDOWS = {2, 8};

  private static final int PLACES = (int) (2 * FARTHEST / WIDTH);

  private final double scale;
  private final double lowest;
  private final double[] counts = new double[PLACES];
  private final int[] counted = new int[PLACES];

  /**
   * An offset that stands out.
   *
   * @param share of the target units
   * @param worth how much likelier it is than chance (nats)
   */
  record Peak(double scale, double offset, double share, double worth) {
    double at(double time) {
      return scale * time + offset;
    }
  }

  /**
   * How likely an offset is before anything is counted: half of all translations are timed as their
   * sources are (common practice, no source), the rest lie around a middle as Cauchy's distribution
   * has it, at each scale alike.
   *
   * @param middle middle of the distribution (seconds)
   * @param spread half of the offsets lie no farther from it (seconds)
   */
  record Prior(double middle, double spread) {
    private static final double PLAIN = 0.5;

    /** Natural log of the probability of an eighth of a second. */
    double log(double scale, double offset) {
      double z = (offset - middle) / spread;
      double other = (1 - PLAIN) / ClockSearch.SCALES.size();
      double around = other * WIDTH / (Math.PI * spread * (1 + z * z));
      boolean plain = scale == 1 && Math.abs(offset) <= WIDTH;
      return Math.log(plain ? PLAIN + around : around);
    }
  }

  Offsets(double scale, double middle) {
    this.scale = scale;
    this.lowest = middle - FARTHEST;
    Arrays.fill(counted, -1);
  }

  /** Counts an offset (seconds) with a weight; of one target unit only once at each place. */
  void add(int target, double offset, double weight) {
    int place = (int) Math.floor((offset - lowest) / WIDTH);
    if (place >= 0 && place < PLACES && counted[place] != target) {
      counted[place] = target;
      counts[place] += weight;
    }
  }

  /**
   * Adds what stands out.
   *
   * @param all weight of all target units
   * @param step how far the begins of the source lie apart (seconds)
   * @param least what is worth less does not stand out (nats)
   */
  void peaks(double all, double step, Prior prior, double least, List<Peak> into) {
    for (int window : WINDOWS) {
      double chance = Math.min(0.5, window * WIDTH / step);
      double sum = 0;
      for (int place = 0; place < PLACES; place++) {
        sum += counts[place] - (place >= window ? counts[place - window] : 0);
        double share = Math.min(1, sum / all);
        double offset = lowest + (place + 1 - window / 2.0) * WIDTH;
        if (share > chance) {
          double worth = all * divergence(share, chance) + prior.log(scale, offset);
          if (worth >= least) {
            into.add(new Peak(scale, offset, share, worth));
          }
        }
      }
    }
  }

  /** Kullback and Leibler's divergence of two coins. */
  private static double divergence(double q, double p) {
    double other = q < 1 ? (1 - q) * Math.log((1 - q) / (1 - p)) : 0;
    return q * Math.log(q / p) + other;
  }
}
