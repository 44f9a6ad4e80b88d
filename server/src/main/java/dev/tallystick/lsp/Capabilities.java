package dev.tallystick.lsp;

import dev.tallystick.prose.Format;
import java.util.List;
import org.eclipse.lsp4j.CodeActionKind;
import org.eclipse.lsp4j.CodeActionOptions;
import org.eclipse.lsp4j.CodeLensOptions;
import org.eclipse.lsp4j.DiagnosticRegistrationOptions;
import org.eclipse.lsp4j.ExecuteCommandOptions;
import org.eclipse.lsp4j.FileOperationFilter;
import org.eclipse.lsp4j.FileOperationOptions;
import org.eclipse.lsp4j.FileOperationPattern;
import org.eclipse.lsp4j.FileOperationPatternKind;
import org.eclipse.lsp4j.FileOperationsServerCapabilities;
import org.eclipse.lsp4j.SaveOptions;
import org.eclipse.lsp4j.ServerCapabilities;
import org.eclipse.lsp4j.TextDocumentSyncKind;
import org.eclipse.lsp4j.TextDocumentSyncOptions;
import org.eclipse.lsp4j.WorkspaceFoldersOptions;
import org.eclipse.lsp4j.WorkspaceServerCapabilities;

/** What this server can do. */
final class Capabilities {
  private Capabilities() {}

  static ServerCapabilities of(Client client) {
    ServerCapabilities can = new ServerCapabilities();
    if (client.namesEncoding()) {
      can.setPositionEncoding(client.encoding().kind());
    }
    can.setTextDocumentSync(sync());
    can.setDefinitionProvider(true);
    can.setReferencesProvider(true);
    can.setDocumentSymbolProvider(true);
    can.setHoverProvider(true);
    can.setSelectionRangeProvider(true);
    can.setDocumentHighlightProvider(true);
    can.setCodeLensProvider(new CodeLensOptions(false));
    can.setInlayHintProvider(true);
    if (client.takesActions()) {
      can.setCodeActionProvider(actions(client.resolvesEdits()));
    }
    if (client.pulls()) {
      can.setDiagnosticProvider(findings());
    }
    can.setExecuteCommandProvider(new ExecuteCommandOptions(Commands.NAMES));
    WorkspaceServerCapabilities workspace = new WorkspaceServerCapabilities(folders());
    workspace.setFileOperations(fileOperations());
    can.setWorkspace(workspace);
    return can;
  }

  private static TextDocumentSyncOptions sync() {
    TextDocumentSyncOptions sync = new TextDocumentSyncOptions();
    sync.setOpenClose(true);
    sync.setChange(TextDocumentSyncKind.Incremental);
    sync.setSave(new SaveOptions(false));
    return sync;
  }

  /** Which renamed files and folders the editor is to tell of. */
  private static FileOperationsServerCapabilities fileOperations() {
    FileOperationPattern files = new FileOperationPattern("**/*.{" + Format.everyExtension() + "}");
    files.setMatches(FileOperationPatternKind.File);
    FileOperationPattern folders = new FileOperationPattern("**");
    folders.setMatches(FileOperationPatternKind.Folder);
    FileOperationsServerCapabilities operations = new FileOperationsServerCapabilities();
    operations.setDidRename(
        new FileOperationOptions(
            List.of(
                new FileOperationFilter(files, "file"), new FileOperationFilter(folders, "file"))));
    return operations;
  }

  private static CodeActionOptions actions(boolean resolved) {
    CodeActionOptions actions = new CodeActionOptions(List.of(CodeActionKind.QuickFix));
    actions.setResolveProvider(resolved);
    return actions;
  }

  /** An edit of one file changes the findings of the other. */
  private static DiagnosticRegistrationOptions findings() {
    DiagnosticRegistrationOptions findings = new DiagnosticRegistrationOptions(true, true);
    findings.setIdentifier("tallystick");
    return findings;
  }

  private static WorkspaceFoldersOptions folders() {
    WorkspaceFoldersOptions folders = new WorkspaceFoldersOptions();
    folders.setSupported(true);
    folders.setChangeNotifications(true);
    return folders;
  }
}
