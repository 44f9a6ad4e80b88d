package dev.tallystick.lsp;

import com.google.gson.JsonDeserializer;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import dev.tallystick.engine.Machine;
import dev.tallystick.run.Fault;
import dev.tallystick.run.Threads;
import java.io.InputStream;
import java.io.OutputStream;
import java.lang.reflect.InvocationTargetException;
import java.util.Map;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.eclipse.lsp4j.WorkspaceFolder;
import org.eclipse.lsp4j.jsonrpc.Launcher;
import org.eclipse.lsp4j.jsonrpc.MessageConsumer;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.json.JsonRpcMethod;
import org.eclipse.lsp4j.jsonrpc.json.StreamMessageConsumer;
import org.eclipse.lsp4j.jsonrpc.messages.RequestMessage;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseError;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseMessage;
import org.eclipse.lsp4j.jsonrpc.services.ServiceEndpoints;
import org.eclipse.lsp4j.launch.LSPLauncher;

/** A client's connection, from the first message to the last. */
public final class Session {
  /**
   * The library's own log, which may quote messages and so text of files. Held, else it is lost.
   */
  private static final Logger LIBRARY = Logger.getLogger("org.eclipse.lsp4j");

  private static final Map<String, JsonRpcMethod> METHODS =
      ServiceEndpoints.getSupportedMethods(Server.class);

  /** Neovim 0.7.2 sends an empty list in the place of a folder: a name that no folder has. */
  private static final JsonDeserializer<WorkspaceFolder> FOLDERS =
      (json, type, context) ->
          json instanceof JsonObject folder && folder.get("uri") instanceof JsonPrimitive uri
              ? new WorkspaceFolder(uri.getAsString(), "")
              : new WorkspaceFolder("", "");

  private final CompletableFuture<Integer> ended = new CompletableFuture<>();
  private Outbox outbox;

  private Session() {}

  /**
   * Serves a client until it ends the session, or is gone.
   *
   * @param version of this program
   * @return 0 if the client asked to shut down before, else 1
   */
  public static CompletableFuture<Integer> start(
      InputStream in, OutputStream out, Machine machine, String version) {
    LIBRARY.setLevel(Level.OFF);
    return new Session().serve(in, out, machine, version);
  }

  private CompletableFuture<Integer> serve(
      InputStream in, OutputStream out, Machine machine, String version) {
    ExecutorService readers = Executors.newCachedThreadPool(Threads.daemons("tallystick-reader"));
    Server server = new Server(machine, version, ended);
    Launcher<Remote> launcher =
        new LSPLauncher.Builder<Remote>()
            .setLocalService(server)
            .setRemoteInterface(Remote.class)
            .setInput(in)
            .setOutput(out)
            .setExecutorService(readers)
            .configureGson(gson -> gson.registerTypeAdapter(WorkspaceFolder.class, FOLDERS))
            .wrapMessages(this::wrapped)
            .setExceptionHandler(Session::error)
            .create();
    server.connect(launcher.getRemoteProxy());
    Future<Void> reading = launcher.startListening();
    readers.execute(() -> awaitEnd(reading, server));
    return ended.whenComplete(
        (code, fault) -> {
          server.close();
          outbox.close();
          readers.shutdown();
        });
  }

  /** What a client is told of a request that failed: what we said, or that it is our own fault. */
  private static ResponseError error(Throwable failure) {
    Throwable cause = failure;
    while (cause.getCause() != null
        && (cause instanceof CompletionException || cause instanceof InvocationTargetException)) {
      cause = cause.getCause();
    }
    if (cause instanceof ResponseErrorException said) {
      return said.getResponseError();
    }
    String message = "A fault of Tallystick itself: " + Fault.where(cause);
    return new ResponseError(ResponseErrorCode.InternalError, message, null);
  }

  private MessageConsumer wrapped(MessageConsumer consumer) {
    if (consumer instanceof StreamMessageConsumer) {
      outbox = new Outbox(consumer);
      return outbox;
    }
    return message -> {
      if (message instanceof RequestMessage request && lacksParameters(request)) {
        outbox.consume(refusal(request));
      } else {
        consumer.consume(message);
      }
    };
  }

  private static boolean lacksParameters(RequestMessage request) {
    JsonRpcMethod method = METHODS.get(request.getMethod());
    return method != null && method.getParameterTypes().length > 0 && request.getParams() == null;
  }

  private static ResponseMessage refusal(RequestMessage request) {
    String message = "The request " + request.getMethod() + " needs parameters.";
    ResponseMessage refusal = new ResponseMessage();
    refusal.setRawId(request.getRawId());
    refusal.setError(new ResponseError(ResponseErrorCode.InvalidParams, message, null));
    return refusal;
  }

  private void awaitEnd(Future<Void> reading, Server server) {
    try {
      reading.get();
    } catch (InterruptedException | ExecutionException e) {
      // Whatever ended it, it is over.
    }
    server.exit();
  }
}
