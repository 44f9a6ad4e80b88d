package dev.tallystick.engine;

import dev.tallystick.run.Alarm;

/**
 * Rings at the next moment that anyone waits for; whoever waits for a later one asks again then.
 */
final class Bell {
  private final Alarm alarm;
  private final Runnable ring;
  private long next = Long.MAX_VALUE;

  Bell(Alarm alarm, Runnable ring) {
    this.alarm = alarm;
    this.ring = ring;
  }

  /** Someone waits for a moment, in milliseconds by the alarm. */
  void at(long millis) {
    if (millis < next) {
      next = millis;
      alarm.at(millis, ring);
    }
  }

  /** It has rung. */
  void rung() {
    if (alarm.millis() >= next) {
      next = Long.MAX_VALUE;
    }
  }
}
