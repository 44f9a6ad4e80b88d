package dev.tallystick.cli;

import dev.tallystick.run.Clock;

/** Says how far a long command has come: after a second, then once a second. */
final class Ticker {
  private static final long INTERVAL = 1000;

  private final Console console;
  private final Clock clock;
  private final int all;
  private long next;
  private int done;

  Ticker(Console console, int all) {
    this(console, all, Clock.SYSTEM);
  }

  Ticker(Console console, int all, Clock clock) {
    this.console = console;
    this.clock = clock;
    this.all = all;
    this.next = clock.millis() + INTERVAL;
  }

  /** One pair is done. */
  void tick() {
    done++;
    if (done < all && clock.millis() >= next) {
      console.err().println("checked " + done + " of " + all + " pairs");
      next = clock.millis() + INTERVAL;
    }
  }
}
