package dev.tallystick.align;

import java.util.Arrays;

/** When the units of a text are on the screen, in seconds; not a number where nothing says so. */
final class Timeline {
  /** Of the prose, this share has to have times. */
  private static final double ENOUGH = 0.5;

  /** Of the steps from unit to unit, this share must not lead back. */
  private static final double ORDERLY = 0.9;

  /** Units that mostly follow each other faster cannot be read (seconds). */
  private static final double FASTEST = 0.05;

  private final double[] from;
  private final double[] to;
  private final double step;
  private final double stay;

  private Timeline(Unit[] units, double[] begins, double[] stays) {
    this.from = new double[units.length];
    this.to = new double[units.length];
    for (int i = 0; i < units.length; i++) {
      from[i] = units[i].timed() ? units[i].from() / 1000.0 : Double.NaN;
      to[i] = units[i].timed() ? units[i].to() / 1000.0 : Double.NaN;
    }
    this.step = median(steps(begins));
    this.stay = Math.max(FASTEST, median(stays));
  }

  /** The times of a text; null if it has too few, or if they make no sense. */
  static Timeline of(Unit[] units) {
    int prose = 0;
    int timed = 0;
    for (Unit unit : units) {
      prose += unit.verbatim() ? 0 : 1;
      timed += unit.timed() ? 1 : 0;
    }
    if (timed < 2 || timed < ENOUGH * prose) {
      return null;
    }
    double[] begins = new double[timed];
    double[] stays = new double[timed];
    int at = 0;
    for (Unit unit : units) {
      if (unit.timed()) {
        begins[at] = unit.from() / 1000.0;
        stays[at++] = (unit.to() - unit.from()) / 1000.0;
      }
    }
    Timeline timeline = new Timeline(units, begins, stays);
    return orderly(begins) && timeline.step >= FASTEST ? timeline : null;
  }

  private static boolean orderly(double[] begins) {
    int on = 0;
    for (int i = 1; i < begins.length; i++) {
      on += begins[i] >= begins[i - 1] ? 1 : 0;
    }
    return on >= ORDERLY * (begins.length - 1);
  }

  /** From each begin to the next that is another: sentences of one cue begin together. */
  private static double[] steps(double[] begins) {
    double[] steps = new double[begins.length];
    int count = 0;
    for (int i = 1; i < begins.length; i++) {
      if (begins[i] != begins[i - 1]) {
        steps[count++] = Math.abs(begins[i] - begins[i - 1]);
      }
    }
    return Arrays.copyOf(steps, count);
  }

  /** The middle one; 0 if there is none. */
  static double median(double[] values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    return sorted.length == 0 ? 0 : sorted[sorted.length / 2];
  }

  int size() {
    return from.length;
  }

  /** When a unit comes on the screen. */
  double from(int unit) {
    return from[unit];
  }

  /** When a unit goes from the screen. */
  double to(int unit) {
    return to[unit];
  }

  /** The begins of all units that have one, in the order of the text. */
  double[] begins() {
    return Arrays.stream(from).filter(begin -> !Double.isNaN(begin)).toArray();
  }

  /** Half of the units begin no later after the one before. */
  double step() {
    return step;
  }

  /** Half of the units stay no longer. */
  double stay() {
    return stay;
  }
}
