package dev.tallystick.lsp;

import dev.tallystick.engine.Event;
import dev.tallystick.engine.Loop;
import dev.tallystick.engine.Machine;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.InitializeResult;
import org.eclipse.lsp4j.InitializedParams;
import org.eclipse.lsp4j.ServerInfo;
import org.eclipse.lsp4j.SetTraceParams;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseError;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.eclipse.lsp4j.services.LanguageClient;
import org.eclipse.lsp4j.services.LanguageServer;
import org.eclipse.lsp4j.services.TextDocumentService;
import org.eclipse.lsp4j.services.WorkspaceService;

/**
 * The life of a session. Called by the thread that reads messages, which does nothing here but put
 * events into the loop's queue.
 */
final class Server implements LanguageServer {
  private final Machine machine;
  private final String version;
  private final CompletableFuture<Integer> ended;
  private final Documents documents = new Documents();
  private final Surroundings surroundings = new Surroundings();
  private LanguageClient remote;
  private Loop loop;
  private Client client;
  private volatile boolean shutDown;

  Server(Machine machine, String version, CompletableFuture<Integer> ended) {
    this.machine = machine;
    this.version = version;
    this.ended = ended;
  }

  void connect(LanguageClient to) {
    remote = to;
  }

  @Override
  public CompletableFuture<InitializeResult> initialize(InitializeParams params) {
    if (loop != null) {
      throw refused(ResponseErrorCode.InvalidRequest, "The session has begun already.");
    }
    client = Client.of(params);
    Conversion conversion = new Conversion(client);
    loop = new Loop(machine.watchedByEditor(client.watches()), new Editor(remote, conversion));
    documents.begin(loop, conversion);
    surroundings.begin(loop, client, remote, machine.alarm());
    loop.post(new Event.FoldersChanged(client.folders(), List.of()));
    loop.start();
    InitializeResult result = new InitializeResult(Capabilities.of(client));
    result.setServerInfo(new ServerInfo("Tallystick", version));
    return CompletableFuture.completedFuture(result);
  }

  @Override
  public void initialized(InitializedParams params) {
    if (loop != null) {
      surroundings.ready();
    }
  }

  @Override
  public CompletableFuture<Object> shutdown() {
    if (loop == null) {
      throw refused(ResponseErrorCode.ServerNotInitialized, "The session has not begun.");
    }
    if (shutDown) {
      throw refused(ResponseErrorCode.InvalidRequest, "The session is shut down.");
    }
    shutDown = true;
    documents.end();
    return CompletableFuture.completedFuture(null);
  }

  @Override
  public void exit() {
    ended.complete(shutDown ? 0 : 1);
  }

  /** Stops the work. */
  void close() {
    if (loop != null) {
      loop.close();
    }
  }

  @Override
  public void setTrace(SetTraceParams params) {
    // Nothing is traced.
  }

  @Override
  public TextDocumentService getTextDocumentService() {
    return documents;
  }

  @Override
  public WorkspaceService getWorkspaceService() {
    return surroundings;
  }

  static ResponseErrorException refused(ResponseErrorCode code, String message) {
    return new ResponseErrorException(new ResponseError(code, message, null));
  }
}
