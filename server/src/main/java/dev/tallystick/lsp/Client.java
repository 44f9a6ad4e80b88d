package dev.tallystick.lsp;

import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.eclipse.lsp4j.ClientCapabilities;
import org.eclipse.lsp4j.CodeActionCapabilities;
import org.eclipse.lsp4j.CodeActionResolveSupportCapabilities;
import org.eclipse.lsp4j.CodeLensWorkspaceCapabilities;
import org.eclipse.lsp4j.DefinitionCapabilities;
import org.eclipse.lsp4j.DiagnosticCapabilities;
import org.eclipse.lsp4j.DiagnosticWorkspaceCapabilities;
import org.eclipse.lsp4j.DidChangeConfigurationCapabilities;
import org.eclipse.lsp4j.DidChangeWatchedFilesCapabilities;
import org.eclipse.lsp4j.DocumentSymbolCapabilities;
import org.eclipse.lsp4j.GeneralClientCapabilities;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.InlayHintWorkspaceCapabilities;
import org.eclipse.lsp4j.PublishDiagnosticsCapabilities;
import org.eclipse.lsp4j.TextDocumentClientCapabilities;
import org.eclipse.lsp4j.WindowClientCapabilities;
import org.eclipse.lsp4j.WorkspaceClientCapabilities;
import org.eclipse.lsp4j.WorkspaceEditCapabilities;
import org.eclipse.lsp4j.WorkspaceFolder;

/** What a client can do, as far as it matters here. What it does not declare it cannot do. */
final class Client {
  private final InitializeParams params;
  private final List<String> encodings;
  private final Encoding encoding;

  private Client(InitializeParams params) {
    this.params = params;
    this.encodings =
        can(ClientCapabilities::getGeneral)
            .map(GeneralClientCapabilities::getPositionEncodings)
            .orElse(List.of());
    this.encoding = Encoding.of(encodings);
  }

  static Client of(InitializeParams params) {
    return new Client(params);
  }

  /** In what it counts columns. */
  Encoding encoding() {
    return encoding;
  }

  /** Whether it wants to be told in what columns are counted. */
  boolean namesEncoding() {
    return !encodings.isEmpty();
  }

  /** Whether it asks for findings itself; then they are never sent unasked. */
  boolean pulls() {
    return text(TextDocumentClientCapabilities::getDiagnostic).isPresent();
  }

  /** Whether it takes the findings of other files along with those that it asks for. */
  boolean pullsRelated() {
    return yes(
        text(TextDocumentClientCapabilities::getDiagnostic)
            .map(DiagnosticCapabilities::getRelatedDocumentSupport));
  }

  /** Whether it can be told to ask for findings again. */
  boolean refreshesFindings() {
    return yes(
        workspace(WorkspaceClientCapabilities::getDiagnostics)
            .map(DiagnosticWorkspaceCapabilities::getRefreshSupport));
  }

  /** Whether it can be told to ask for lenses again. */
  boolean refreshesLenses() {
    return yes(
        workspace(WorkspaceClientCapabilities::getCodeLens)
            .map(CodeLensWorkspaceCapabilities::getRefreshSupport));
  }

  /** Whether it can be told to ask for inlay hints again. */
  boolean refreshesHints() {
    return yes(
        workspace(WorkspaceClientCapabilities::getInlayHint)
            .map(InlayHintWorkspaceCapabilities::getRefreshSupport));
  }

  /** Whether it shows how far long work has come. */
  boolean showsProgress() {
    return yes(
        can(ClientCapabilities::getWindow).map(WindowClientCapabilities::getWorkDoneProgress));
  }

  /** Whether it shows related places of a finding. */
  boolean related() {
    return yes(
            text(TextDocumentClientCapabilities::getPublishDiagnostics)
                .map(PublishDiagnosticsCapabilities::getRelatedInformation))
        || yes(
            text(TextDocumentClientCapabilities::getDiagnostic)
                .map(DiagnosticCapabilities::getRelatedInformation));
  }

  /** Whether it takes a jump with the ranges on both sides. */
  boolean links() {
    return yes(
        text(TextDocumentClientCapabilities::getDefinition)
            .map(DefinitionCapabilities::getLinkSupport));
  }

  /** Whether it takes the headings of a text as a tree. */
  boolean outlines() {
    return yes(
        text(TextDocumentClientCapabilities::getDocumentSymbol)
            .map(DocumentSymbolCapabilities::getHierarchicalDocumentSymbolSupport));
  }

  /** Whether it takes code actions that are more than a command. */
  boolean takesActions() {
    return actions().map(CodeActionCapabilities::getCodeActionLiteralSupport).isPresent();
  }

  /** Whether it asks for the edit of a code action only when the user has chosen it. */
  boolean resolvesEdits() {
    return yes(actions().map(CodeActionCapabilities::getDataSupport))
        && actions()
            .map(CodeActionCapabilities::getResolveSupport)
            .map(CodeActionResolveSupportCapabilities::getProperties)
            .filter(properties -> properties.contains("edit"))
            .isPresent();
  }

  private Optional<CodeActionCapabilities> actions() {
    return text(TextDocumentClientCapabilities::getCodeAction);
  }

  /** Whether it takes edits that say of which version of a text they are. */
  boolean takesVersions() {
    return yes(
        workspace(WorkspaceClientCapabilities::getWorkspaceEdit)
            .map(WorkspaceEditCapabilities::getDocumentChanges));
  }

  /** Whether it can be asked to watch files. */
  boolean watches() {
    return yes(
        workspace(WorkspaceClientCapabilities::getDidChangeWatchedFiles)
            .map(DidChangeWatchedFilesCapabilities::getDynamicRegistration));
  }

  /** Whether it wants to be told how far each pair has come. */
  boolean wantsProgress() {
    return options() instanceof JsonObject options
        && options.get("progress") instanceof JsonPrimitive said
        && said.isBoolean()
        && said.getAsBoolean();
  }

  /** What it said about us at the start: settings, as far as it sends them there. */
  Object options() {
    return params.getInitializationOptions();
  }

  /** Whether it can be asked for settings. */
  boolean tellsSettings() {
    return yes(workspace(WorkspaceClientCapabilities::getConfiguration));
  }

  /** Whether it can be asked to tell when settings change. */
  boolean registersSettings() {
    return yes(
        workspace(WorkspaceClientCapabilities::getDidChangeConfiguration)
            .map(DidChangeConfigurationCapabilities::getDynamicRegistration));
  }

  private <T> Optional<T> can(Function<ClientCapabilities, T> part) {
    return Optional.ofNullable(params.getCapabilities()).map(part);
  }

  private <T> Optional<T> text(Function<TextDocumentClientCapabilities, T> part) {
    return can(ClientCapabilities::getTextDocument).map(part);
  }

  private <T> Optional<T> workspace(Function<WorkspaceClientCapabilities, T> part) {
    return can(ClientCapabilities::getWorkspace).map(part);
  }

  private static boolean yes(Optional<Boolean> said) {
    return said.orElse(false);
  }

  /** The folders, or the one root of clients that know no folders. */
  @SuppressWarnings("deprecation") // older clients send a root only
  List<Path> folders() {
    List<WorkspaceFolder> named = params.getWorkspaceFolders();
    if (named != null && !named.isEmpty()) {
      return paths(named);
    }
    if (params.getRootUri() != null) {
      return Uris.file(params.getRootUri()).map(List::of).orElse(List.of());
    }
    if (params.getRootPath() != null && !params.getRootPath().isEmpty()) {
      return Uris.file("file://" + params.getRootPath().replace("%", "%25"))
          .map(List::of)
          .orElse(List.of());
    }
    return List.of();
  }

  /** The folders on this machine. */
  static List<Path> paths(List<WorkspaceFolder> folders) {
    List<Path> paths = new ArrayList<>();
    for (WorkspaceFolder folder : folders) {
      Uris.file(folder.getUri()).ifPresent(paths::add);
    }
    return paths;
  }
}
