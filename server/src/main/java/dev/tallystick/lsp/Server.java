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
import org.eclipse.lsp4j.TextDocumentPositionParams;
import org.eclipse.lsp4j.WorkDoneProgressCancelParams;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseError;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.eclipse.lsp4j.services.LanguageServer;
import org.eclipse.lsp4j.services.TextDocumentService;
import org.eclipse.lsp4j.services.WorkspaceService;

/**
 * The life of a session. Called by the thread that reads messages, which does nothing here but put
 * events into the loop's queue.
 */
final class Server implements LanguageServer, OwnRequests {
  private final Machine machine;
  private final String version;
  private final CompletableFuture<Integer> ended;
  private final Requests requests = new Requests();
  private final Board board = new Board();
  private final Documents documents = new Documents(requests, board);
  private final Surroundings surroundings =
      new Surroundings(requests, board, new Commands(requests));
  private Remote remote;
  private Loop loop;
  private Client client;
  private PassReport report;
  private volatile boolean shutDown;

  Server(Machine machine, String version, CompletableFuture<Integer> ended) {
    this.machine = machine;
    this.version = version;
    this.ended = ended;
  }

  void connect(Remote to) {
    remote = to;
  }

  @Override
  public CompletableFuture<InitializeResult> initialize(InitializeParams params) {
    if (loop != null) {
      throw refused(ResponseErrorCode.InvalidRequest, "The session has begun already.");
    }
    client = Client.of(params);
    Conversion conversion = new Conversion(client);
    Views views = new Views(client, remote);
    report = new PassReport(remote);
    Editor editor = new Editor(remote, conversion, board, views, report);
    loop = new Loop(machine.watchedByEditor(client.watches()), editor);
    requests.begin(loop);
    documents.begin(loop, conversion, views);
    surroundings.begin(loop, client, views, remote, machine.alarm());
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
    requests.end();
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
  public void cancelProgress(WorkDoneProgressCancelParams params) {
    if (loop != null && report.is(params.getToken())) {
      loop.post(new Event.FoldersDeclined());
    }
  }

  @Override
  public void setTrace(SetTraceParams params) {
    // Nothing is traced.
  }

  @Override
  public CompletableFuture<List<Placed>> counterpart(TextDocumentPositionParams params) {
    return documents.counterpart(params);
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
