package dev.tallystick.bench;

import java.util.List;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.DefinitionParams;
import org.eclipse.lsp4j.DidChangeConfigurationParams;
import org.eclipse.lsp4j.DidChangeTextDocumentParams;
import org.eclipse.lsp4j.DidChangeWatchedFilesParams;
import org.eclipse.lsp4j.DidCloseTextDocumentParams;
import org.eclipse.lsp4j.DidOpenTextDocumentParams;
import org.eclipse.lsp4j.DidSaveTextDocumentParams;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.HoverParams;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.InitializeResult;
import org.eclipse.lsp4j.Location;
import org.eclipse.lsp4j.LocationLink;
import org.eclipse.lsp4j.MarkupContent;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.ServerCapabilities;
import org.eclipse.lsp4j.jsonrpc.Launcher;
import org.eclipse.lsp4j.jsonrpc.messages.Either;
import org.eclipse.lsp4j.launch.LSPLauncher;
import org.eclipse.lsp4j.services.LanguageClient;
import org.eclipse.lsp4j.services.LanguageServer;
import org.eclipse.lsp4j.services.TextDocumentService;
import org.eclipse.lsp4j.services.WorkspaceService;

/**
 * Answers at once and knows nothing: what the protocol, the library and the machine cost by
 * themselves. A process of its own, as the real server is.
 */
public final class EchoServer implements LanguageServer, TextDocumentService, WorkspaceService {
  private LanguageClient client;

  private EchoServer() {}

  /** Serves over standard input and output. */
  public static void main(String[] arguments) throws Exception {
    EchoServer server = new EchoServer();
    Launcher<LanguageClient> launcher =
        LSPLauncher.createServerLauncher(server, System.in, System.out);
    server.client = launcher.getRemoteProxy();
    launcher.startListening().get();
  }

  @Override
  public CompletableFuture<InitializeResult> initialize(InitializeParams params) {
    return CompletableFuture.completedFuture(new InitializeResult(new ServerCapabilities()));
  }

  @Override
  public CompletableFuture<Object> shutdown() {
    return CompletableFuture.completedFuture(null);
  }

  @Override
  public void exit() {
    System.exit(0);
  }

  @Override
  public TextDocumentService getTextDocumentService() {
    return this;
  }

  @Override
  public WorkspaceService getWorkspaceService() {
    return this;
  }

  @Override
  public void didOpen(DidOpenTextDocumentParams params) {
    publish(params.getTextDocument().getUri(), params.getTextDocument().getVersion());
  }

  @Override
  public void didChange(DidChangeTextDocumentParams params) {
    publish(params.getTextDocument().getUri(), params.getTextDocument().getVersion());
  }

  private void publish(String uri, int version) {
    client.publishDiagnostics(new PublishDiagnosticsParams(uri, List.of(), version));
  }

  @Override
  public CompletableFuture<Hover> hover(HoverParams params) {
    return CompletableFuture.completedFuture(new Hover(new MarkupContent("plaintext", "Echo.")));
  }

  @Override
  public CompletableFuture<Either<List<? extends Location>, List<? extends LocationLink>>>
      definition(DefinitionParams params) {
    return CompletableFuture.completedFuture(Either.forRight(List.of()));
  }

  @Override
  public void didClose(DidCloseTextDocumentParams params) {
    // Nothing is kept.
  }

  @Override
  public void didSave(DidSaveTextDocumentParams params) {
    // Nothing is kept.
  }

  @Override
  public void didChangeConfiguration(DidChangeConfigurationParams params) {
    // Nothing can be set.
  }

  @Override
  public void didChangeWatchedFiles(DidChangeWatchedFilesParams params) {
    // Nothing is read.
  }
}
