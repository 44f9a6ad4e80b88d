package dev.tallystick.lsp;

import java.util.List;
import org.eclipse.lsp4j.CodeActionKind;
import org.eclipse.lsp4j.CodeActionOptions;
import org.eclipse.lsp4j.CodeLensOptions;
import org.eclipse.lsp4j.DiagnosticRegistrationOptions;
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
    can.setWorkspace(new WorkspaceServerCapabilities(folders()));
    return can;
  }

  private static TextDocumentSyncOptions sync() {
    TextDocumentSyncOptions sync = new TextDocumentSyncOptions();
    sync.setOpenClose(true);
    sync.setChange(TextDocumentSyncKind.Incremental);
    sync.setSave(new SaveOptions(false));
    return sync;
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
