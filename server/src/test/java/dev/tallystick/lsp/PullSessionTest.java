package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.DiagnosticCapabilities;
import org.eclipse.lsp4j.DiagnosticWorkspaceCapabilities;
import org.eclipse.lsp4j.DocumentDiagnosticParams;
import org.eclipse.lsp4j.DocumentDiagnosticReport;
import org.eclipse.lsp4j.FullDocumentDiagnosticReport;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.RelatedFullDocumentDiagnosticReport;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseError;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Findings of a file for a client that asks for them. */
class PullSessionTest {
  @TempDir Path folder;
  private Work work;

  @BeforeEach
  void work() {
    work = Work.withoutFog(folder);
  }

  /** A client that asks for findings, and can be told to ask again. */
  static void pulls(InitializeParams params) {
    params.getCapabilities().getTextDocument().setDiagnostic(new DiagnosticCapabilities());
    params
        .getCapabilities()
        .getWorkspace()
        .setDiagnostics(new DiagnosticWorkspaceCapabilities(true));
  }

  static void pullsRelated(InitializeParams params) {
    pulls(params);
    params.getCapabilities().getTextDocument().getDiagnostic().setRelatedDocumentSupport(true);
  }

  static CompletableFuture<DocumentDiagnosticReport> ask(Talk talk, String uri, String previous) {
    return talk.server.getTextDocumentService().diagnostic(params(uri, previous));
  }

  private static DocumentDiagnosticParams params(String uri, String previous) {
    DocumentDiagnosticParams params = new DocumentDiagnosticParams(new TextDocumentIdentifier(uri));
    params.setPreviousResultId(previous);
    return params;
  }

  static DocumentDiagnosticReport pull(Talk talk, String uri, String previous) {
    return Talk.answer(ask(talk, uri, previous));
  }

  private static RelatedFullDocumentDiagnosticReport full(Talk talk, String uri) {
    return pull(talk, uri, null).getLeft();
  }

  static List<String> codes(List<Diagnostic> diagnostics) {
    return diagnostics.stream().map(diagnostic -> diagnostic.getCode().getLeft()).toList();
  }

  @Test
  void whoAsksForFindingsIsSentNone() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      var provider = talk.initialized.getCapabilities().getDiagnosticProvider();
      assertTrue(provider.isInterFileDependencies());
      assertTrue(provider.isWorkspaceDiagnostics());
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      RelatedFullDocumentDiagnosticReport report = full(talk, german.uri);

      assertEquals("full", report.getKind());
      assertEquals(List.of("omission"), codes(report.getItems()));
      assertEquals(
          "Marken", german.words(report.getItems().get(0).getRange()), "the word before the gap");
      talk.pass(2000);
      assertEquals(List.of(), talk.published);
    }
  }

  @Test
  void whoDoesNotAskIsSentThem() {
    try (Talk talk = Talk.in(folder)) {
      assertNull(talk.initialized.getCapabilities().getDiagnosticProvider());
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();

      assertEquals(List.of("omission"), talk.codes(work.de()));
      assertEquals(List.of(), talk.refreshed);
    }
  }

  @Test
  void whatTheClientHasGotIsNotSentAgain() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      String first = full(talk, german.uri).getResultId();
      assertEquals("unchanged", pull(talk, german.uri, first).getRight().getKind());

      german.replace("von früh bis spät", "vom Morgen bis zum Abend");
      DocumentDiagnosticReport below = pull(talk, german.uri, first);
      assertEquals(first, below.getRight().getResultId(), "an edit that moves no finding");

      german.replace("# Die Kettenfähre", "\n# Die Kettenfähre");
      RelatedFullDocumentDiagnosticReport moved = pull(talk, german.uri, first).getLeft();
      assertEquals(List.of("omission"), codes(moved.getItems()));
      assertNotEquals(first, moved.getResultId());
    }
  }

  @Test
  void anEmptyListHasOneNameForEver() {
    Path notes = work.write("notes.md", Ferry.EN);
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      Buffer alone = talk.open(notes, Ferry.EN);
      RelatedFullDocumentDiagnosticReport report = full(talk, alone.uri);
      assertEquals(List.of(), report.getItems());
      assertTrue(pull(talk, alone.uri, report.getResultId()).isRight());

      Buffer german = talk.open(work.de(), Ferry.DE);
      assertTrue(pull(talk, german.uri, report.getResultId()).isRight());
      assertTrue(pull(talk, "untitled:one", report.getResultId()).isRight());
    }
  }

  @Test
  void theReportIsAboutTheTextAfterTheEdit() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      talk.machine.hold();
      german.type("Karren kosten", "\nKarren kosten");
      var asked = ask(talk, german.uri, null);
      talk.barrier();
      assertFalse(asked.isDone());

      talk.machine.release();
      Diagnostic omission = Talk.answer(asked).getLeft().getItems().get(0);
      assertEquals("Marken", german.words(omission.getRange()));
    }
  }

  @Test
  void whoIsOvertakenByAnEditIsToldToAskAgain() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      talk.machine.hold();
      german.type("Karren", "Wagen");
      var asked = ask(talk, german.uri, null);
      german.type("Wagen", "Fuhrwerke");
      CompletionException failure =
          assertThrows(CompletionException.class, () -> Talk.answer(asked));

      ResponseError error = ((ResponseErrorException) failure.getCause()).getResponseError();
      assertEquals(ResponseErrorCode.ServerCancelled.getValue(), error.getCode());
      assertTrue(((JsonObject) error.getData()).get("retriggerRequest").getAsBoolean());
    }
  }

  @Test
  void theOtherFileComesAlongIfTheClientTakesIt() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pullsRelated)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      RelatedFullDocumentDiagnosticReport report = full(talk, german.uri);
      String english = work.en().toUri().toString();
      assertEquals(Set.of(english), report.getRelatedDocuments().keySet());
      FullDocumentDiagnosticReport other = report.getRelatedDocuments().get(english).getLeft();
      assertEquals(List.of("omission"), codes(other.getItems()));

      var unchanged = pull(talk, german.uri, report.getResultId()).getRight();
      assertEquals(other, unchanged.getRelatedDocuments().get(english).getLeft());
      Buffer source = talk.open(work.en(), Ferry.EN);
      assertEquals(other.getResultId(), full(talk, source.uri).getResultId());
    }
  }

  @Test
  void otherFilesStayAwayIfItDoesNot() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      assertNull(full(talk, german.uri).getRelatedDocuments());
    }
  }

  @Test
  void aFileThatWasJustClosedIsReportedOn() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      Buffer english = talk.open(work.en(), Ferry.EN);
      talk.settle();
      english.closeNow();
      assertEquals(List.of("omission"), codes(full(talk, english.uri).getItems()));

      german.closeNow();
      assertEquals(List.of(), full(talk, english.uri).getItems());
      assertEquals(List.of(), full(talk, german.uri).getItems());
    }
  }

  @Test
  void aReportOnAClosedFileWaitsForItsText() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      talk.open(work.en(), Ferry.EN);
      Buffer german = talk.open(work.de(), Ferry.DE);
      assertEquals(List.of(), full(talk, german.uri).getItems());
      talk.machine.hold();
      german.closeNow();
      var asked = ask(talk, german.uri, null);
      talk.barrier();
      assertFalse(asked.isDone());

      talk.machine.release();
      assertEquals(List.of("omission"), codes(Talk.answer(asked).getLeft().getItems()));
    }
  }

  @Test
  void relatedPlacesAreToldToWhoDeclaresThemForPulledFindings() {
    try (Talk talk =
        Talk.in(
            folder,
            params -> {
              pulls(params);
              params.getCapabilities().getTextDocument().setPublishDiagnostics(null);
              params
                  .getCapabilities()
                  .getTextDocument()
                  .getDiagnostic()
                  .setRelatedInformation(true);
            })) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      assertNotNull(full(talk, german.uri).getItems().get(0).getRelatedInformation());
    }
  }

  @Test
  void columnsAreCountedAsTheClientDoes() {
    try (Talk talk =
        Talk.in(
            folder,
            params -> {
              pulls(params);
              LifecycleSessionTest.offer(params, "utf-8");
            })) {
      String text = Ferry.DE_WITHOUT_FOG.replace("Karren kosten 2", "🛒 Karren kosten 2");
      Buffer german = talk.open(work.de(), text);
      var range = full(talk, german.uri).getItems().get(0).getRange();

      int column = "🛒 Karren kosten 2 ".getBytes(StandardCharsets.UTF_8).length;
      assertEquals(column, range.getStart().getCharacter());
      assertEquals(column + "Marken".length(), range.getEnd().getCharacter());
    }
  }
}
