package dev.tallystick.lsp;

import java.util.List;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.DocumentDiagnosticReport;
import org.eclipse.lsp4j.FullDocumentDiagnosticReport;
import org.eclipse.lsp4j.RelatedFullDocumentDiagnosticReport;
import org.eclipse.lsp4j.RelatedUnchangedDocumentDiagnosticReport;
import org.eclipse.lsp4j.WorkspaceDocumentDiagnosticReport;
import org.eclipse.lsp4j.WorkspaceFullDocumentDiagnosticReport;
import org.eclipse.lsp4j.WorkspaceUnchangedDocumentDiagnosticReport;

/**
 * What a file shows, with a name by which a client tells whether it has got it already.
 *
 * @param uri the file
 * @param version the number of the text that this is about; null if the client does not show it
 * @param diagnostics what it shows
 * @param id the name: the same as long as it shows the same
 */
record Posted(String uri, Integer version, List<Diagnostic> diagnostics, String id) {
  /** Names what shows nothing, in any file and any session. */
  private static final String NOTHING = "0";

  /** A file that shows nothing. */
  static Posted nothing(String uri, Integer version) {
    return new Posted(uri, version, List.of(), NOTHING);
  }

  /** For the client that asks about this file. */
  DocumentDiagnosticReport report(String previous) {
    if (id.equals(previous)) {
      return new DocumentDiagnosticReport(new RelatedUnchangedDocumentDiagnosticReport(id));
    }
    RelatedFullDocumentDiagnosticReport full = new RelatedFullDocumentDiagnosticReport(diagnostics);
    full.setResultId(id);
    return new DocumentDiagnosticReport(full);
  }

  /** For the client that asks about another file. */
  FullDocumentDiagnosticReport related() {
    FullDocumentDiagnosticReport full = new FullDocumentDiagnosticReport(diagnostics);
    full.setResultId(id);
    return full;
  }

  /** For the client that asks about all files. */
  WorkspaceDocumentDiagnosticReport amongAll(String previous) {
    if (id.equals(previous)) {
      return new WorkspaceDocumentDiagnosticReport(
          new WorkspaceUnchangedDocumentDiagnosticReport(id, uri, version));
    }
    WorkspaceFullDocumentDiagnosticReport full =
        new WorkspaceFullDocumentDiagnosticReport(diagnostics, uri, version);
    full.setResultId(id);
    return new WorkspaceDocumentDiagnosticReport(full);
  }
}
