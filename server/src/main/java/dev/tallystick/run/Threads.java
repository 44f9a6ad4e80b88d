package dev.tallystick.run;

import java.util.concurrent.ThreadFactory;
import java.util.concurrent.atomic.AtomicInteger;

/** Makes threads with names that a thread dump explains. */
public final class Threads {
  private Threads() {}

  /** Threads that do not keep the program alive, numbered from 1. */
  public static ThreadFactory daemons(String name) {
    AtomicInteger number = new AtomicInteger();
    return task -> {
      Thread thread = new Thread(task, name + "-" + number.incrementAndGet());
      thread.setDaemon(true);
      return thread;
    };
  }
}
