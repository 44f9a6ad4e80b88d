package dev.tallystick.lsp;

import dev.tallystick.engine.Event;
import dev.tallystick.engine.Known;
import dev.tallystick.engine.Loop;
import dev.tallystick.engine.Question;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.function.Function;
import java.util.function.Supplier;
import org.eclipse.lsp4j.DiagnosticServerCancellationData;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseError;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;

/** Asks the loop what a client wants to know. */
final class Requests {
  /** What a client is told whose text was edited before the answer was there. */
  private static final ResponseError MODIFIED =
      new ResponseError(ResponseErrorCode.ContentModified, "The text has changed since.", null);

  /**
   * The same for one that asks for findings. Some take {@code ContentModified} for an empty list
   * there, and would show for a moment that nothing is wrong.
   */
  private static final ResponseError ASK_AGAIN =
      new ResponseError(
          ResponseErrorCode.ServerCancelled,
          "The text has changed since. Ask again.",
          new DiagnosticServerCancellationData(true));

  private static final Path NO_FILE = Path.of("");

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
    return ask(document, named, reach, convert, MODIFIED);
  }

  /** What a client is told whose text was edited before. */
  static ResponseErrorException modified() {
    return new ResponseErrorException(MODIFIED);
  }

  /** Asks for the findings of a document. */
  <T> CompletableFuture<T> askFindings(
      TextDocumentIdentifier document, Function<Known, T> convert) {
    return ask(document, Optional.ofNullable(document), Question.Reach.PAIRS, convert, ASK_AGAIN);
  }

  /** Asks about no document in particular: answered as soon as all that came before is handled. */
  <T> CompletableFuture<T> ask(Supplier<T> convert) {
    check();
    return post(NO_FILE, Question.Reach.PAIRS, known -> convert.get(), Optional.of(MODIFIED));
  }

  /**
   * Asks about a folder, or about all of them: answered when all pairs in it are examined, by null
   * if the user cancels that.
   */
  <T> CompletableFuture<T> askFolder(Optional<Path> folder, Function<Known, T> convert) {
    check();
    return post(folder.orElse(NO_FILE), Question.Reach.FOLDER, convert, Optional.empty());
  }

  private <T> CompletableFuture<T> ask(
      TextDocumentIdentifier document,
      Optional<?> named,
      Question.Reach reach,
      Function<Known, T> convert,
      ResponseError outdated) {
    check();
    if (document == null || named.isEmpty()) {
      throw Server.refused(ResponseErrorCode.InvalidParams, "A document and a position, please.");
    }
    return Uris.text(document.getUri())
        .map(file -> post(file, reach, convert, Optional.of(outdated)))
        .orElseGet(() -> CompletableFuture.completedFuture(convert.apply(Known.NOTHING)));
  }

  private <T> CompletableFuture<T> post(
      Path path,
      Question.Reach reach,
      Function<Known, T> convert,
      Optional<ResponseError> outdated) {
    CompletableFuture<T> asked = new CompletableFuture<>();
    Question question = new Question(path, reach, new Reply<>(asked, convert, outdated));
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
  private record Reply<T>(
      CompletableFuture<T> asked, Function<Known, T> convert, Optional<ResponseError> tooLate)
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
      tooLate.ifPresentOrElse(
          error -> asked.completeExceptionally(new ResponseErrorException(error)),
          () -> asked.complete(null));
    }
  }
}
