package dev.tallystick.lsp;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.eclipse.lsp4j.ClientCapabilities;
import org.eclipse.lsp4j.DefinitionCapabilities;
import org.eclipse.lsp4j.DidChangeConfigurationCapabilities;
import org.eclipse.lsp4j.DidChangeWatchedFilesCapabilities;
import org.eclipse.lsp4j.DocumentSymbolCapabilities;
import org.eclipse.lsp4j.GeneralClientCapabilities;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.PublishDiagnosticsCapabilities;
import org.eclipse.lsp4j.TextDocumentClientCapabilities;
import org.eclipse.lsp4j.WindowClientCapabilities;
import org.eclipse.lsp4j.WorkspaceClientCapabilities;
import org.eclipse.lsp4j.WorkspaceFolder;

/**
 * What a client can do, as far as it matters here.
 *
 * @param encoding in what it counts columns
 * @param namesEncoding whether it wants to be told which
 * @param related whether it shows related places of a finding
 * @param links whether it takes a jump with the ranges on both sides
 * @param outlines whether it takes the headings of a text as a tree
 * @param watches whether it can be asked to watch files
 * @param tellsSettings whether it can be asked for settings
 * @param registersSettings whether it can be asked to tell when they change
 * @param showsProgress whether it shows how far long work has come
 * @param folders the folders of the workspace
 */
record Client(
    Encoding encoding,
    boolean namesEncoding,
    boolean related,
    boolean links,
    boolean outlines,
    boolean watches,
    boolean tellsSettings,
    boolean registersSettings,
    boolean showsProgress,
    List<Path> folders) {
  static Client of(InitializeParams params) {
    Optional<ClientCapabilities> can = Optional.ofNullable(params.getCapabilities());
    Optional<WorkspaceClientCapabilities> workspace = can.map(ClientCapabilities::getWorkspace);
    Optional<TextDocumentClientCapabilities> text = can.map(ClientCapabilities::getTextDocument);
    List<String> encodings =
        can.map(ClientCapabilities::getGeneral)
            .map(GeneralClientCapabilities::getPositionEncodings)
            .orElse(List.of());
    return new Client(
        Encoding.of(encodings),
        !encodings.isEmpty(),
        yes(
            text.map(TextDocumentClientCapabilities::getPublishDiagnostics)
                .map(PublishDiagnosticsCapabilities::getRelatedInformation)),
        yes(
            text.map(TextDocumentClientCapabilities::getDefinition)
                .map(DefinitionCapabilities::getLinkSupport)),
        yes(
            text.map(TextDocumentClientCapabilities::getDocumentSymbol)
                .map(DocumentSymbolCapabilities::getHierarchicalDocumentSymbolSupport)),
        yes(
            workspace
                .map(WorkspaceClientCapabilities::getDidChangeWatchedFiles)
                .map(DidChangeWatchedFilesCapabilities::getDynamicRegistration)),
        yes(workspace.map(WorkspaceClientCapabilities::getConfiguration)),
        yes(
            workspace
                .map(WorkspaceClientCapabilities::getDidChangeConfiguration)
                .map(DidChangeConfigurationCapabilities::getDynamicRegistration)),
        yes(
            can.map(ClientCapabilities::getWindow)
                .map(WindowClientCapabilities::getWorkDoneProgress)),
        folders(params));
  }

  private static boolean yes(Optional<Boolean> said) {
    return said.orElse(false);
  }

  /** The folders, or the one root of clients that know no folders. */
  @SuppressWarnings("deprecation") // older clients send a root only
  private static List<Path> folders(InitializeParams params) {
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
