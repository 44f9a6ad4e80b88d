package dev.tallystick.bench;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;

/** How long something took, time after time. */
final class Times {
  private final List<Long> nanos = new ArrayList<>();

  void add(long tookNanos) {
    nanos.add(tookNanos);
  }

  int count() {
    return nanos.size();
  }

  /** The cells of a table: how often, median, 99th percentile, maximum, in milliseconds. */
  String cells() {
    return nanos.size() + " | " + millis(0.5) + " | " + millis(0.99) + " | " + millis(1);
  }

  /** The least value that a share of all does not exceed. */
  private String millis(double share) {
    List<Long> sorted = new ArrayList<>(nanos);
    Collections.sort(sorted);
    int index = Math.max(0, (int) Math.ceil(share * sorted.size()) - 1);
    return String.format(Locale.ROOT, "%.1f", sorted.get(index) / 1e6);
  }
}
