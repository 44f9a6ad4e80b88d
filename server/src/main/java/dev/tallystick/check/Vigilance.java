package dev.tallystick.check;

import java.util.Locale;
import java.util.Optional;

/**
 * How sure a finding must be to be told: the taste of whoever reads them. What each finds and what
 * of it is right was measured on published translations with planted faults; the figures are in the
 * README.
 */
public enum Vigilance {
  /** Few alarms, and nearly all of them right. */
  QUIET(0.9, 6),
  /** What counts where nothing is set. */
  BALANCED(0.5, 5),
  /** Doubtful ones too, for a last look before delivery. */
  THOROUGH(0.2, 4);

  private final double least;
  private final double shortfall;

  Vigilance(double least, double shortfall) {
    this.least = least;
    this.shortfall = shortfall;
  }

  /** The least posterior, from 0 to 1, that a sentence has no counterpart. */
  double least() {
    return least;
  }

  /** So many robust deviations below the usual length a translation is too short. */
  double shortfall() {
    return shortfall;
  }

  /** The name in settings. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /** The one with this name. */
  public static Optional<Vigilance> of(String word) {
    for (Vigilance vigilance : values()) {
      if (vigilance.word().equals(word)) {
        return Optional.of(vigilance);
      }
    }
    return Optional.empty();
  }
}
