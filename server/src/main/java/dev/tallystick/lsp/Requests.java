package dev.tallystick.lsp;

import dev.tallystick.engine.Event;
import dev.tallystick.engine.Known;
import dev.tallystick.engine.Loop;
import dev.tallystick.engine.Question;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.function.Function;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;

/** Asks the loop what a client wants to know. */
final class Requests {
  private Loop loop;
  private boolean over;

  /** The session has begun. */
  void begin(Loop with) {
    loop = with;
  }

  /** Nothing is answered any more. */
  void end() {
    over = true;
  }

  /**
   * Looks whether anything can be asked.
   *
   * @throws org.eclipse.lsp4j.jsonrpc.ResponseErrorException if the session has not begun, or ends
   */
  void check() {
    if (loop == null) {
      throw Server.refused(ResponseErrorCode.ServerNotInitialized, "The session has not begun.");
    }
    if (over) {
      throw Server.refused(ResponseErrorCode.InvalidRequest, "The session is shut down.");
    }
  }

  /**
   * Asks about a document. The future is handed out as it is, so that the client's cancelling
   * reaches it.
   *
   * @param named what else a request of this kind has to name; empty if it does not
   */
  <T> CompletableFuture<T> ask(
      TextDocumentIdentifier document,
      Optional<?> named,
      Question.Reach reach,
      Function<Known, T> convert) {
    check();
    if (document == null || named.isEmpty()) {
      throw Server.refused(ResponseErrorCode.InvalidParams, "A document and a position, please.");
    }
    return Uris.text(document.getUri())
        .map(file -> ask(file, reach, convert))
        .orElseGet(() -> CompletableFuture.completedFuture(convert.apply(Known.NOTHING)));
  }

  /** Asks about a file or a folder. */
  <T> CompletableFuture<T> ask(Path path, Question.Reach reach, Function<Known, T> convert) {
    CompletableFuture<T> asked = new CompletableFuture<>();
    Question question = new Question(path, reach, new Reply<>(asked, convert));
    asked.whenComplete(
        (answer, fault) -> {
          if (asked.isCancelled()) {
            loop.post(new Event.Withdrawn(question));
          }
        });
    loop.post(new Event.Asked(question));
    return asked;
  }

  /** Completes what the client waits for. */
  private record Reply<T>(CompletableFuture<T> asked, Function<Known, T> convert)
      implements Question.Reply {
    @Override
    public void answer(Known known) {
      try {
        asked.complete(convert.apply(known));
      } catch (RuntimeException e) {
        asked.completeExceptionally(e); // a fault of our own is told by the session
      }
    }

    @Override
    public void outdated() {
      asked.completeExceptionally(
          Server.refused(ResponseErrorCode.ContentModified, "The text has changed since."));
    }
  }
}
