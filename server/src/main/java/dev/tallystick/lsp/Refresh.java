package dev.tallystick.lsp;

import java.util.concurrent.CompletableFuture;
import java.util.function.BooleanSupplier;
import java.util.function.Supplier;

/**
 * Tells the client to ask again for what it has asked before. One such request is under way at a
 * time: what comes up meanwhile is told by the next one, if it is still news then.
 */
final class Refresh {
  private final BooleanSupplier due;
  private final Supplier<CompletableFuture<Void>> request;
  private boolean underWay;

  /**
   * A kind of request.
   *
   * @param due whether there is news, which counts as told from then on
   */
  Refresh(BooleanSupplier due, Supplier<CompletableFuture<Void>> request) {
    this.due = due;
    this.request = request;
  }

  /** Tells what is to be told. */
  void check() {
    if (begins()) {
      request.get().whenComplete((nothing, fault) -> done());
    }
  }

  private synchronized boolean begins() {
    boolean now = !underWay && due.getAsBoolean();
    underWay |= now;
    return now;
  }

  private void done() {
    synchronized (this) {
      underWay = false;
    }
    check();
  }
}
