package dev.tallystick.check;

import java.util.Locale;

/** One of the two texts of a pair. */
public enum OnSide {
  /** The text that is translated. */
  SOURCE,
  /** The translation. */
  TARGET;

  /** The name in output. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /** The other one. */
  public OnSide other() {
    return this == SOURCE ? TARGET : SOURCE;
  }
}
