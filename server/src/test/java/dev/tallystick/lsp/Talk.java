package dev.tallystick.lsp;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import org.eclipse.lsp4j.ClientCapabilities;
import org.eclipse.lsp4j.ConfigurationParams;
import org.eclipse.lsp4j.DefinitionCapabilities;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.DidChangeWatchedFilesCapabilities;
import org.eclipse.lsp4j.DidChangeWatchedFilesParams;
import org.eclipse.lsp4j.DidSaveTextDocumentParams;
import org.eclipse.lsp4j.DocumentSymbolCapabilities;
import org.eclipse.lsp4j.ExecuteCommandParams;
import org.eclipse.lsp4j.FileChangeType;
import org.eclipse.lsp4j.FileEvent;
import org.eclipse.lsp4j.HoverParams;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.InitializeResult;
import org.eclipse.lsp4j.InitializedParams;
import org.eclipse.lsp4j.MessageActionItem;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.ProgressParams;
import org.eclipse.lsp4j.PublishDiagnosticsCapabilities;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.RegistrationParams;
import org.eclipse.lsp4j.ShowMessageRequestParams;
import org.eclipse.lsp4j.TextDocumentClientCapabilities;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.WorkDoneProgressCreateParams;
import org.eclipse.lsp4j.WorkspaceClientCapabilities;
import org.eclipse.lsp4j.WorkspaceFolder;
import org.eclipse.lsp4j.jsonrpc.Launcher;
import org.eclipse.lsp4j.launch.LSPLauncher;
import org.eclipse.lsp4j.services.LanguageServer;

/** A scripted client on the other end of a real connection. It keeps all that it is told. */
final class Talk implements Remote, AutoCloseable {
  private static final long FAR_TOO_LONG = 60;

  final Surround machine = new Surround();
  final List<PublishDiagnosticsParams> published = new CopyOnWriteArrayList<>();
  final List<String> said = new CopyOnWriteArrayList<>();
  final List<String> logged = new CopyOnWriteArrayList<>();
  final List<Object> passes = new CopyOnWriteArrayList<>();
  final List<RegistrationParams> registered = new CopyOnWriteArrayList<>();
  final CompletableFuture<Integer> ended;
  final Peer server;

  /** What is set under {@code tallystick}. */
  volatile Object settings;

  /** The answer to the question what is set; empty for one that comes at once. */
  volatile Optional<CompletableFuture<List<Object>>> answer = Optional.empty();

  /** How far pairs have come, as it was told. */
  final List<PairProgress> progress = new CopyOnWriteArrayList<>();

  /** What the client was told to ask for again. */
  final List<String> refreshed = new CopyOnWriteArrayList<>();

  /** The answer to that. */
  volatile CompletableFuture<Void> refreshing = CompletableFuture.completedFuture(null);

  InitializeResult initialized;
  private final Pipe toServer = new Pipe();
  private final Pipe toClient = new Pipe();
  private final ExecutorService threads = Executors.newCachedThreadPool();

  /** The server, with what it can be asked beyond the protocol. */
  interface Peer extends LanguageServer, OwnRequests {}

  private Talk() {
    ended = Session.start(toServer.in, toClient.out, machine.machine(), "0.0-test");
    Launcher<Peer> launcher =
        new LSPLauncher.Builder<Peer>()
            .setLocalService(this)
            .setRemoteInterface(Peer.class)
            .setInput(toClient.in)
            .setOutput(toServer.out)
            .setExecutorService(threads)
            .configureGson(RelatedReports::teach)
            .create();
    server = launcher.getRemoteProxy();
    launcher.startListening();
  }

  /** Connected, and nothing more. */
  static Talk silent() {
    return new Talk();
  }

  /** A session in a folder, with a client that can do all that matters. */
  static Talk in(Path folder) {
    return in(folder, params -> {});
  }

  /** The same, with a client that is a little different. */
  static Talk in(Path folder, Consumer<InitializeParams> different) {
    Talk talk = new Talk();
    InitializeParams params = params();
    params.setWorkspaceFolders(List.of(new WorkspaceFolder(folder.toUri().toString(), "work")));
    different.accept(params);
    talk.begin(params);
    return talk;
  }

  /** What a client that can do all that matters says of itself. */
  static InitializeParams params() {
    PublishDiagnosticsCapabilities diagnostics = new PublishDiagnosticsCapabilities();
    diagnostics.setRelatedInformation(true);
    DefinitionCapabilities definition = new DefinitionCapabilities();
    definition.setLinkSupport(true);
    TextDocumentClientCapabilities text = new TextDocumentClientCapabilities();
    text.setPublishDiagnostics(diagnostics);
    text.setDefinition(definition);
    DocumentSymbolCapabilities symbols = new DocumentSymbolCapabilities();
    symbols.setHierarchicalDocumentSymbolSupport(true);
    text.setDocumentSymbol(symbols);
    WorkspaceClientCapabilities workspace = new WorkspaceClientCapabilities();
    workspace.setDidChangeWatchedFiles(new DidChangeWatchedFilesCapabilities(true));
    InitializeParams params = new InitializeParams();
    params.setCapabilities(new ClientCapabilities(workspace, text, null));
    return params;
  }

  void begin(InitializeParams params) {
    initialized = answer(server.initialize(params));
    server.initialized(new InitializedParams());
  }

  /** Opens a file in the editor. */
  Buffer open(Path file, String text) {
    return open(file.toUri().toString(), text);
  }

  Buffer open(String uri, String text) {
    return new Buffer(this, uri, text);
  }

  /** Waits until all that was sent is done, and all that came of it is here. */
  void settle() {
    for (int i = 0; i < 2; i++) { // the server may have asked something meanwhile
      barrier();
      answer(machine.activity.idle());
    }
    barrier();
  }

  /** Waits until the server has read all that was sent, and all that it wrote is here. */
  void barrier() {
    answer(
        server
            .getTextDocumentService()
            .hover(new HoverParams(new TextDocumentIdentifier("nothing"), new Position(0, 0))));
  }

  static <T> T answer(CompletableFuture<T> asked) {
    return asked.orTimeout(FAR_TOO_LONG, TimeUnit.SECONDS).join();
  }

  /** The user gives a command. */
  Object command(String name, Object... arguments) {
    return answer(
        server
            .getWorkspaceService()
            .executeCommand(new ExecuteCommandParams(name, List.of(arguments))));
  }

  /** Lets time pass. */
  void pass(long millis) {
    settle();
    machine.alarm.pass(millis);
    settle();
  }

  /** The editor tells that files were written. */
  void wrote(FileChangeType type, Path... files) {
    List<FileEvent> events = new ArrayList<>();
    for (Path file : files) {
      events.add(new FileEvent(file.toUri().toString(), type));
    }
    server.getWorkspaceService().didChangeWatchedFiles(new DidChangeWatchedFilesParams(events));
    settle();
  }

  void save(String uri) {
    server
        .getTextDocumentService()
        .didSave(new DidSaveTextDocumentParams(new TextDocumentIdentifier(uri)));
    settle();
  }

  /** All that was published for a file. */
  List<PublishDiagnosticsParams> all(String uri) {
    return published.stream().filter(params -> params.getUri().equals(uri)).toList();
  }

  /** What a file shows now. */
  List<Diagnostic> shown(Path file) {
    return shown(file.toUri().toString());
  }

  List<Diagnostic> shown(String uri) {
    List<PublishDiagnosticsParams> all = all(uri);
    return all.isEmpty() ? List.of() : all.get(all.size() - 1).getDiagnostics();
  }

  /** The codes that a file shows now. */
  List<String> codes(Path file) {
    return shown(file).stream().map(diagnostic -> diagnostic.getCode().getLeft()).toList();
  }

  @Override
  public void publishDiagnostics(PublishDiagnosticsParams params) {
    published.add(params);
  }

  @Override
  public void stands(PairProgress now) {
    progress.add(now);
  }

  @Override
  public void showMessage(MessageParams params) {
    said.add(params.getMessage());
  }

  @Override
  public void logMessage(MessageParams params) {
    logged.add(params.getMessage());
  }

  @Override
  public CompletableFuture<Void> registerCapability(RegistrationParams params) {
    registered.add(params);
    return CompletableFuture.completedFuture(null);
  }

  @Override
  public CompletableFuture<Void> createProgress(WorkDoneProgressCreateParams params) {
    passes.add(params);
    return CompletableFuture.completedFuture(null);
  }

  @Override
  public void notifyProgress(ProgressParams params) {
    passes.add(params.getValue().getLeft());
  }

  @Override
  public CompletableFuture<List<Object>> configuration(ConfigurationParams params) {
    List<Object> values = new ArrayList<>();
    params.getItems().forEach(item -> values.add(settings));
    return answer.orElseGet(() -> CompletableFuture.completedFuture(values));
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

  @Override
  public CompletableFuture<MessageActionItem> showMessageRequest(ShowMessageRequestParams params) {
    throw new AssertionError("nobody asks this client");
  }

  @Override
  public void telemetryEvent(Object event) {
    throw new AssertionError("nothing leaves the machine");
  }

  @Override
  public void close() {
    machine.release();
    server.exit();
    answer(ended.handle((code, fault) -> code));
    threads.shutdownNow();
  }
}
