package dev.tallystick.lsp;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.UUID;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.DocumentDiagnosticReport;
import org.eclipse.lsp4j.FullDocumentDiagnosticReport;
import org.eclipse.lsp4j.PreviousResultId;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.UnchangedDocumentDiagnosticReport;
import org.eclipse.lsp4j.WorkspaceDiagnosticReport;
import org.eclipse.lsp4j.WorkspaceDocumentDiagnosticReport;
import org.eclipse.lsp4j.jsonrpc.messages.Either;

/**
 * What every file shows that anything was ever published for, and what of it is news to a client
 * that asks. One that shows nothing any more stays on the board: somebody may still show more.
 *
 * <p>The loop's thread posts and reports; the client's answer to a refresh asks for news.
 */
final class Board {
  private final String session = UUID.randomUUID().toString();
  private final Map<String, Posted> posted = new TreeMap<>();
  private final Set<String> news = new HashSet<>();
  private long changes;

  /** From now on a file shows this. */
  synchronized void post(PublishDiagnosticsParams published) {
    String file = file(published.getUri());
    String uri = published.getUri();
    Integer version = published.getVersion();
    List<Diagnostic> diagnostics = published.getDiagnostics();
    Posted before = posted(uri);
    if (before.diagnostics().equals(diagnostics)) {
      posted.put(file, new Posted(uri, version, diagnostics, before.id()));
      return;
    }
    news.add(file);
    posted.put(
        file,
        diagnostics.isEmpty()
            ? Posted.nothing(uri, version)
            : new Posted(uri, version, diagnostics, session + "-" + ++changes));
  }

  /** What a file shows. */
  synchronized Posted posted(String uri) {
    return posted.getOrDefault(file(uri), Posted.nothing(uri, null));
  }

  /** Whether a file shows what no client has asked for; from now on that is no news. */
  synchronized boolean takeNews() {
    boolean any = !news.isEmpty();
    news.clear();
    return any;
  }

  /**
   * A file, and others along with it.
   *
   * @param previous the name of what the client shows in it; null if it shows nothing
   */
  synchronized DocumentDiagnosticReport report(String uri, String previous, List<String> related) {
    DocumentDiagnosticReport report = posted(uri).report(previous);
    news.remove(file(uri));
    if (!related.isEmpty()) {
      Map<String, Either<FullDocumentDiagnosticReport, UnchangedDocumentDiagnosticReport>> others =
          new LinkedHashMap<>();
      for (String other : related) {
        others.put(other, Either.forLeft(posted(other).related()));
        news.remove(file(other));
      }
      if (report.isLeft()) {
        report.getLeft().setRelatedDocuments(others);
      } else {
        report.getRight().setRelatedDocuments(others);
      }
    }
    return report;
  }

  /**
   * All files. Of those that it shows in its editor a client takes no notice here: what is news of
   * them still is.
   *
   * @param previous the names of what the client shows
   */
  synchronized WorkspaceDiagnosticReport report(List<PreviousResultId> previous) {
    Map<String, Posted> all = new TreeMap<>(posted);
    Map<String, String> names = new HashMap<>();
    for (PreviousResultId one : previous == null ? List.<PreviousResultId>of() : previous) {
      names.put(file(one.getUri()), one.getValue());
      all.putIfAbsent(file(one.getUri()), Posted.nothing(one.getUri(), null));
    }
    List<WorkspaceDocumentDiagnosticReport> reports = new ArrayList<>();
    all.forEach((file, shown) -> reports.add(shown.amongAll(names.get(file))));
    news.removeIf(file -> all.get(file).version() == null);
    return new WorkspaceDiagnosticReport(reports);
  }

  /** Clients spell one name in several ways. */
  private static String file(String uri) {
    return Uris.file(uri).map(Path::toString).orElse(uri);
  }
}
