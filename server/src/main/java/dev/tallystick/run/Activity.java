package dev.tallystick.run;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CompletableFuture;

/**
 * Counts what is under way: events that wait or are being handled, and workers that run. Whoever
 * wants to know when everything asked for so far is done waits for {@link #idle()}.
 */
public final class Activity {
  private final List<CompletableFuture<Void>> waiting = new ArrayList<>();
  private int underWay;

  /** Something more is under way. Called before it is handed on, so that no moment looks idle. */
  public synchronized void begin() {
    underWay++;
  }

  /** Something is done, and all that follows from it has begun. */
  public void end() {
    for (CompletableFuture<Void> idle : ended()) {
      idle.complete(null);
    }
  }

  /** Completes as soon as nothing is under way: at once if nothing is. */
  public synchronized CompletableFuture<Void> idle() {
    CompletableFuture<Void> idle = new CompletableFuture<>();
    if (underWay == 0) {
      idle.complete(null);
    } else {
      waiting.add(idle);
    }
    return idle;
  }

  private synchronized List<CompletableFuture<Void>> ended() {
    underWay--;
    if (underWay > 0) {
      return List.of();
    }
    List<CompletableFuture<Void>> told = List.copyOf(waiting);
    waiting.clear();
    return told;
  }
}
