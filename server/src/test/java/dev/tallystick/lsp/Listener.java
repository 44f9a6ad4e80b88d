package dev.tallystick.lsp;

import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CopyOnWriteArrayList;

/** What a scripted client is told so that it asks again, and of how far pairs have come. */
abstract class Listener implements Remote {
  /** How far pairs have come. */
  final List<PairProgress> progress = new CopyOnWriteArrayList<>();

  /** What it is to ask for again. */
  final List<String> refreshed = new CopyOnWriteArrayList<>();

  /** The answer to that. */
  volatile CompletableFuture<Void> refreshing = CompletableFuture.completedFuture(null);

  @Override
  public void stands(PairProgress now) {
    progress.add(now);
  }

  @Override
  public CompletableFuture<Void> refreshDiagnostics() {
    refreshed.add("findings");
    return refreshing;
  }

  @Override
  public CompletableFuture<Void> refreshCodeLenses() {
    refreshed.add("lenses");
    return refreshing;
  }

  @Override
  public CompletableFuture<Void> refreshInlayHints() {
    refreshed.add("hints");
    return refreshing;
  }
}
