package dev.tallystick.run;

import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;

/** A clock that also rings. Tests move one by hand, so that no test ever waits for time to pass. */
public interface Alarm extends Clock {
  /**
   * Runs something short once the clock shows {@code millis} or more, on a thread of the alarm's
   * choice. It cannot be taken back: whoever is woken looks whether there still is a reason.
   */
  void at(long millis, Runnable ring);

  /** An alarm of this machine, with a thread of its own that does not keep the program alive. */
  static Alarm ofMachine() {
    ScheduledExecutorService timer =
        Executors.newSingleThreadScheduledExecutor(Threads.daemons("tallystick-alarm"));
    return new Alarm() {
      @Override
      public long millis() {
        return Clock.SYSTEM.millis();
      }

      @Override
      public void at(long millis, Runnable ring) {
        timer.schedule(ring, Math.max(0, millis - millis()), TimeUnit.MILLISECONDS);
      }
    };
  }
}
