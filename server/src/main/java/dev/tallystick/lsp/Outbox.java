package dev.tallystick.lsp;

import dev.tallystick.run.Threads;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.RejectedExecutionException;
import java.util.concurrent.TimeUnit;
import org.eclipse.lsp4j.jsonrpc.JsonRpcException;
import org.eclipse.lsp4j.jsonrpc.MessageConsumer;
import org.eclipse.lsp4j.jsonrpc.messages.Message;

/**
 * Writes messages on a thread of its own, in order. A client that does not read blocks that thread,
 * and neither the loop nor the reader.
 */
final class Outbox implements MessageConsumer {
  private static final int LAST_WORDS_MILLIS = 1000;

  private final ExecutorService writer =
      Executors.newSingleThreadExecutor(Threads.daemons("tallystick-writer"));
  private final MessageConsumer stream;

  Outbox(MessageConsumer stream) {
    this.stream = stream;
  }

  @Override
  public void consume(Message message) {
    try {
      writer.execute(() -> write(message));
    } catch (RejectedExecutionException e) {
      // The session is over.
    }
  }

  private void write(Message message) {
    try {
      stream.consume(message);
    } catch (JsonRpcException e) {
      // The client is gone. The reader finds out too, and ends the session.
    }
  }

  /** Writes what is left, if the client reads it within a second. */
  void close() {
    writer.shutdown();
    try {
      writer.awaitTermination(LAST_WORDS_MILLIS, TimeUnit.MILLISECONDS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}
