package dev.tallystick.bench;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.TimeUnit;
import org.eclipse.lsp4j.ClientCapabilities;
import org.eclipse.lsp4j.DefinitionParams;
import org.eclipse.lsp4j.DidChangeConfigurationParams;
import org.eclipse.lsp4j.DidChangeTextDocumentParams;
import org.eclipse.lsp4j.DidOpenTextDocumentParams;
import org.eclipse.lsp4j.ExecuteCommandParams;
import org.eclipse.lsp4j.HoverParams;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.InitializedParams;
import org.eclipse.lsp4j.MessageActionItem;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.ShowMessageRequestParams;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.TextDocumentItem;
import org.eclipse.lsp4j.VersionedTextDocumentIdentifier;
import org.eclipse.lsp4j.WorkspaceFolder;
import org.eclipse.lsp4j.jsonrpc.Launcher;
import org.eclipse.lsp4j.launch.LSPLauncher;
import org.eclipse.lsp4j.services.LanguageClient;
import org.eclipse.lsp4j.services.LanguageServer;

/** A client that runs a server as a process of its own and takes the time. */
final class Peer implements LanguageClient, AutoCloseable {
  private static final int SECONDS_AT_MOST = 120;

  private final Map<String, CompletableFuture<Long>> awaited = new ConcurrentHashMap<>();
  private final Process process;
  private final LanguageServer server;
  private int version = 1;

  /** Starts a server by its main class. */
  Peer(Path folder, List<String> main) throws IOException {
    List<String> command = new ArrayList<>();
    command.add(ProcessHandle.current().info().command().orElse("java"));
    command.addAll(List.of("-XX:+UseSerialGC", "-cp", System.getProperty("java.class.path")));
    command.addAll(main);
    process = new ProcessBuilder(command).redirectError(ProcessBuilder.Redirect.INHERIT).start();
    Launcher<LanguageServer> launcher =
        LSPLauncher.createClientLauncher(
            this, process.getInputStream(), process.getOutputStream());
    launcher.startListening();
    server = launcher.getRemoteProxy();
    InitializeParams params = new InitializeParams();
    params.setCapabilities(new ClientCapabilities());
    params.setWorkspaceFolders(List.of(new WorkspaceFolder(folder.toUri().toString(), "bench")));
    answer(server.initialize(params));
    server.initialized(new InitializedParams());
    server
        .getWorkspaceService()
        .didChangeConfiguration(new DidChangeConfigurationParams(Map.of()));
  }

  /** Opens a file and waits for its findings. */
  void open(Path file, String text) {
    TextDocumentItem item =
        new TextDocumentItem(file.toUri().toString(), "plaintext", version, text);
    CompletableFuture<Long> published = expect(item.getUri());
    server.getTextDocumentService().didOpen(new DidOpenTextDocumentParams(item));
    answer(published);
  }

  /** Types a letter at a place and waits for the findings of that very version. */
  long edit(Path file, Position at) {
    String uri = file.toUri().toString();
    version++;
    CompletableFuture<Long> published = expect(uri);
    long start = System.nanoTime();
    server
        .getTextDocumentService()
        .didChange(
            new DidChangeTextDocumentParams(
                new VersionedTextDocumentIdentifier(uri, version),
                List.of(new TextDocumentContentChangeEvent(new Range(at, at), "e"))));
    return answer(published) - start;
  }

  private CompletableFuture<Long> expect(String uri) {
    return awaited.computeIfAbsent(uri + " " + version, key -> new CompletableFuture<>());
  }

  long definition(Path file, Position at) {
    long start = System.nanoTime();
    answer(
        server
            .getTextDocumentService()
            .definition(new DefinitionParams(identifier(file), at)));
    return System.nanoTime() - start;
  }

  long hover(Path file, Position at) {
    long start = System.nanoTime();
    answer(server.getTextDocumentService().hover(new HoverParams(identifier(file), at)));
    return System.nanoTime() - start;
  }

  /** All pairs of the folder; done when all are examined. */
  CompletableFuture<Object> checkFolder() {
    return server
        .getWorkspaceService()
        .executeCommand(new ExecuteCommandParams("tallystick.checkFolder", List.of()));
  }

  private static TextDocumentIdentifier identifier(Path file) {
    return new TextDocumentIdentifier(file.toUri().toString());
  }

  private static <T> T answer(CompletableFuture<T> asked) {
    return asked.orTimeout(SECONDS_AT_MOST, TimeUnit.SECONDS).join();
  }

  @Override
  public void publishDiagnostics(PublishDiagnosticsParams params) {
    CompletableFuture<Long> one = awaited.remove(params.getUri() + " " + params.getVersion());
    if (one != null) {
      one.complete(System.nanoTime());
    }
  }

  @Override
  public void showMessage(MessageParams params) {
    // Nobody reads it.
  }

  @Override
  public void logMessage(MessageParams params) {
    // Nobody reads it.
  }

  @Override
  public void telemetryEvent(Object event) {
    throw new AssertionError("nothing leaves the machine");
  }

  @Override
  public CompletableFuture<MessageActionItem> showMessageRequest(ShowMessageRequestParams params) {
    return CompletableFuture.completedFuture(null);
  }

  @Override
  public void close() {
    answer(server.shutdown());
    server.exit();
  }
}
