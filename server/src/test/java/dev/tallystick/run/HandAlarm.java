package dev.tallystick.run;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** An alarm that a test moves by hand. It rings on the test's thread. */
public final class HandAlarm implements Alarm {
  private final List<Ring> rings = new ArrayList<>();
  private long now = 1_000_000;

  private record Ring(long at, Runnable ring) {}

  @Override
  public synchronized long millis() {
    return now;
  }

  @Override
  public synchronized void at(long millis, Runnable ring) {
    rings.add(new Ring(millis, ring));
  }

  /** Lets time pass, and rings what is due. */
  public void pass(long millis) {
    for (Ring ring : due(millis)) {
      ring.ring().run();
    }
  }

  private synchronized List<Ring> due(long millis) {
    now += millis;
    List<Ring> due = new ArrayList<>(rings.stream().filter(ring -> ring.at() <= now).toList());
    due.sort(Comparator.comparingLong(Ring::at));
    rings.removeAll(due);
    return due;
  }
}
