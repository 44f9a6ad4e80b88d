package dev.tallystick.check;

import java.util.Locale;
import java.util.Optional;

/** How loudly a finding is said, from quiet to loud. */
public enum Severity {
  /** Barely. */
  HINT,
  /** A suspicion. */
  INFORMATION,
  /** Something to look at before delivery. */
  WARNING;

  /** The name in output and settings. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /** The severity with this name. */
  public static Optional<Severity> of(String word) {
    for (Severity severity : values()) {
      if (severity.word().equals(word)) {
        return Optional.of(severity);
      }
    }
    return Optional.empty();
  }
}
