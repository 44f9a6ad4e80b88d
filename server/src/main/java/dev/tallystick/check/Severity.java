package dev.tallystick.check;

import java.util.Locale;

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
}
