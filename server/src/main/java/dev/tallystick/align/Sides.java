package dev.tallystick.align;

/**
 * The two texts of a pair.
 *
 * @param source the text that is translated: the columns of a lattice
 * @param target the translation: its rows
 */
record Sides(Side source, Side target) {
  /** Whether both say when their units are on the screen. */
  boolean timed() {
    return source.timeline != null && target.timeline != null;
  }

  /** The same, but nothing says when they are on the screen. */
  Sides untimed() {
    return new Sides(source.untimed(), target.untimed());
  }
}
