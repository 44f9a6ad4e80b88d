package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.FileChangeType;
import org.eclipse.lsp4j.PreviousResultId;
import org.eclipse.lsp4j.WorkspaceDiagnosticParams;
import org.eclipse.lsp4j.WorkspaceDocumentDiagnosticReport;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** News for a client that asks for findings: when it is told to ask again, and of which files. */
class RefreshSessionTest {
  @TempDir Path folder;
  private Work work;

  @BeforeEach
  void work() {
    work = Work.withoutFog(folder);
  }

  private static List<WorkspaceDocumentDiagnosticReport> pullAll(
      Talk talk, List<PreviousResultId> previous) {
    return Talk.answer(
            talk.server.getWorkspaceService().diagnostic(new WorkspaceDiagnosticParams(previous)))
        .getItems();
  }

  private static String uri(WorkspaceDocumentDiagnosticReport report) {
    return report.isLeft() ? report.getLeft().getUri() : report.getRight().getUri();
  }

  private static PreviousResultId name(WorkspaceDocumentDiagnosticReport report) {
    return new PreviousResultId(
        uri(report),
        report.isLeft() ? report.getLeft().getResultId() : report.getRight().getResultId());
  }

  /** Each file's name with the codes it shows, or that they are the same as before. */
  private static Map<String, String> shown(List<WorkspaceDocumentDiagnosticReport> reports) {
    Map<String, String> shown = new TreeMap<>();
    for (WorkspaceDocumentDiagnosticReport report : reports) {
      String uri = uri(report);
      String file = uri.replaceFirst(".*/(\\w+/\\w+\\.md)$", "$1");
      shown.put(
          file,
          report.isLeft()
              ? PullSessionTest.codes(report.getLeft().getItems()).toString()
              : "unchanged");
    }
    return shown;
  }

  private void restsAfterLosingTheFog(Talk talk, Buffer german) {
    german.replace(Ferry.FOG_DE + "\n", "");
    talk.pass(1500);
  }

  @Test
  void findingsThatComeByThemselvesAreAnnounced() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      PullSessionTest.pull(talk, german.uri, null);
      talk.settle();
      talk.refreshed.clear();
      german.replace(Ferry.FOG_DE + "\n", "");
      assertEquals(List.of(), talk.refreshed, "held back while the line is being written");

      talk.pass(1500);
      assertEquals(List.of("findings"), talk.refreshed);
    }
  }

  @Test
  void whatTheClientGetsWithItsOwnQuestionIsNotAnnounced() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pullsRelated)) {
      talk.machine.hold();
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      var asked = PullSessionTest.ask(talk, german.uri, null);
      talk.barrier();
      talk.machine.release();
      Talk.answer(asked);
      talk.settle();

      assertEquals(List.of(), talk.refreshed);
    }
  }

  @Test
  void newsOfTheOtherFileIsAnnouncedToAClientThatDoesNotGetItAlong() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      talk.machine.hold();
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      Buffer english = talk.open(work.en(), Ferry.EN);
      var asked = PullSessionTest.ask(talk, german.uri, null);
      talk.barrier();
      talk.machine.release();
      Talk.answer(asked);
      talk.settle();
      assertEquals(List.of("findings"), talk.refreshed);

      PullSessionTest.pull(talk, english.uri, null);
      german.replace("Die Winde zieht", "Die Winde holt");
      assertEquals(List.of("findings"), talk.refreshed, "nothing of it shows anywhere");
    }
  }

  @Test
  void oneAnnouncementIsUnderWayAtATime() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      CompletableFuture<Void> first = new CompletableFuture<>();
      talk.refreshing = first;
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(1, talk.refreshed.size());
      german.replace("# Die", "\n# Die");
      german.replace("# Die", "\n# Die");
      assertEquals(1, talk.refreshed.size());

      talk.refreshing = CompletableFuture.completedFuture(null);
      first.complete(null);
      talk.settle();
      assertEquals(2, talk.refreshed.size());
    }
  }

  @Test
  void whatWasAskedForMeanwhileIsNoNewsAnyMore() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pullsRelated)) {
      CompletableFuture<Void> first = new CompletableFuture<>();
      talk.refreshing = first;
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      german.replace("# Die", "\n# Die");
      PullSessionTest.pull(talk, german.uri, null);
      first.complete(null);
      talk.settle();

      assertEquals(1, talk.refreshed.size());
    }
  }

  @Test
  void anAnnouncementThatFailsIsNotTheLast() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      talk.refreshing = CompletableFuture.failedFuture(new IllegalStateException("no"));
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      german.replace("# Die", "\n# Die");

      assertEquals(2, talk.refreshed.size());
    }
  }

  @Test
  void whoCannotAskAgainIsNotTold() {
    try (Talk talk =
        Talk.in(
            folder,
            params -> {
              PullSessionTest.pulls(params);
              params.getCapabilities().getWorkspace().setDiagnostics(null);
            })) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      restsAfterLosingTheFog(talk, german);
      assertEquals(List.of(), talk.refreshed);
    }
  }

  @Test
  void allFilesAreReportedTheClosedOnesToo() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      List<WorkspaceDocumentDiagnosticReport> all = pullAll(talk, List.of());

      assertEquals(Map.of("de/ferry.md", "[omission]", "en/ferry.md", "[omission]"), shown(all));
      assertEquals(1, all.get(0).getLeft().getVersion(), "the one that is open");
      assertNull(all.get(1).getLeft().getVersion());
      List<PreviousResultId> names =
          new ArrayList<>(all.stream().map(RefreshSessionTest::name).toList());
      assertEquals(
          Map.of("de/ferry.md", "unchanged", "en/ferry.md", "unchanged"),
          shown(pullAll(talk, names)));
    }
  }

  @Test
  void aFileHasOneNameForItsFindingsHoweverItIsAskedFor() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      String one = PullSessionTest.pull(talk, german.uri, null).getLeft().getResultId();

      assertEquals(
          "unchanged",
          shown(pullAll(talk, List.of(new PreviousResultId(german.uri, one)))).get("de/ferry.md"));
    }
  }

  @Test
  void whatNoLongerShowsAnythingIsReportedEmpty() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      List<PreviousResultId> names =
          pullAll(talk, List.of()).stream().map(RefreshSessionTest::name).toList();
      german.close();

      assertEquals(Map.of("de/ferry.md", "[]", "en/ferry.md", "[]"), shown(pullAll(talk, names)));
      assertEquals(
          Map.of("de/ferry.md", "[]", "en/ferry.md", "[]"),
          shown(pullAll(talk, List.of())),
          "a client may have forgotten the names, but not the findings");
    }
  }

  @Test
  void whatTheClientShowsFromAnEarlierSessionIsTakenBack() {
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      String uri = work.write("nn/gone.md", "").toUri().toString();
      assertEquals(
          Map.of("nn/gone.md", "[]"),
          shown(pullAll(talk, List.of(new PreviousResultId(uri, "earlier-7")))));
    }
  }

  @Test
  void whatAnotherProgramWritesIsAnnounced() {
    work.write("en/ferry.md", Ferry.EN.replace(Ferry.FOG_EN + "\n", ""));
    try (Talk talk = Talk.in(folder, PullSessionTest::pulls)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of(), talk.refreshed);
      work.write("en/ferry.md", Ferry.EN);
      talk.wrote(FileChangeType.Changed, work.en());

      assertEquals(List.of("findings"), talk.refreshed);
      assertEquals("[omission]", shown(pullAll(talk, List.of())).get("en/ferry.md"));
    }
  }
}
