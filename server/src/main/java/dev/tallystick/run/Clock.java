package dev.tallystick.run;

/** Milliseconds that only ever grow; tests move one by hand. */
@FunctionalInterface
public interface Clock {
  /** The clock of this machine. */
  Clock SYSTEM = () -> System.nanoTime() / 1_000_000;

  /** Milliseconds since some fixed moment. */
  long millis();
}
