package dev.tallystick.lsp;

import java.util.concurrent.CompletableFuture;
import java.util.function.Supplier;

/**
 * One way to show figures in the text: whether the user wants it, and whether there are others than
 * the client was told. It asks by itself only for a file that was edited, not for its counterpart.
 */
final class View {
  private final Refresh refresh;
  private boolean wanted;
  private boolean news;

  /**
   * Not wanted at first.
   *
   * @param refreshes whether the client can be told to ask again
   * @param request tells it
   */
  View(boolean refreshes, Supplier<CompletableFuture<Void>> request) {
    this.refresh = new Refresh(() -> refreshes && takeNews(), request);
  }

  private synchronized boolean takeNews() {
    boolean any = news;
    news = false;
    return any;
  }

  synchronized boolean wanted() {
    return wanted;
  }

  /** The user wants it from now on, or does not. */
  void want(boolean now) {
    synchronized (this) {
      news |= now != wanted;
      wanted = now;
    }
    check();
  }

  /** There are other figures now. */
  synchronized void changed() {
    news |= wanted;
  }

  /** Tells the client what is to be told. */
  void check() {
    refresh.check();
  }
}
