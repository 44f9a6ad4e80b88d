package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;

import dev.tallystick.engine.Folder;
import java.nio.file.Path;
import java.util.List;
import org.eclipse.lsp4j.DidChangeWorkspaceFoldersParams;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.WorkspaceFolder;
import org.eclipse.lsp4j.WorkspaceFoldersChangeEvent;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Which folders count, and what files are called. */
class FoldersSessionTest {
  @TempDir Path folder;

  @Test
  void aClientThatKnowsNoFoldersNamesItsRoot() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder, this::rootUriOnly)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
    try (Talk talk = Talk.in(folder, this::rootPathOnly)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @SuppressWarnings("deprecation")
  private void rootUriOnly(InitializeParams params) {
    params.setWorkspaceFolders(null);
    params.setRootUri(folder.toUri().toString());
  }

  @SuppressWarnings("deprecation")
  private void rootPathOnly(InitializeParams params) {
    params.setWorkspaceFolders(null);
    params.setRootPath(folder.toString());
  }

  @Test
  void withoutAFolderThatOfTheOpenedFileCounts() {
    Work work = new Work(folder);
    Path english = work.write("ferry.en.md", Ferry.EN);
    Path german = work.write("ferry.de.md", Ferry.DE_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder, params -> params.setWorkspaceFolders(null))) {
      Buffer buffer = talk.open(german, Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(english));
      assertEquals(List.of(folder), talk.machine.watched.stream().map(Folder::path).toList());

      buffer.close();
      assertEquals(List.of(), talk.codes(english));
      assertEquals(List.of(), talk.machine.watched);
    }
  }

  @Test
  void aFileOutsideTheFoldersIsPairedInItsOwn() {
    Work work = new Work(folder.resolve("outside"));
    Path english = work.write("ferry.en.md", Ferry.EN);
    Path german = work.write("ferry.de.md", Ferry.DE_WITHOUT_FOG);
    Work inside = Work.withoutFog(folder.resolve("inside"));
    try (Talk talk = Talk.in(inside.folder())) {
      talk.open(german, Ferry.DE_WITHOUT_FOG);
      talk.settle();

      assertEquals(List.of("omission"), talk.codes(english));
    }
  }

  @Test
  void aFolderThatIsRemovedTakesItsPairsAlong() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      WorkspaceFolder gone = new WorkspaceFolder(folder.toUri().toString(), "work");
      folders(talk, List.of(), List.of(gone));
      assertEquals(List.of(), talk.codes(work.de()));

      folders(talk, List.of(gone), List.of());
      assertEquals(List.of("omission"), talk.codes(work.de()));
    }
  }

  private static void folders(
      Talk talk, List<WorkspaceFolder> added, List<WorkspaceFolder> removed) {
    talk.server
        .getWorkspaceService()
        .didChangeWorkspaceFolders(
            new DidChangeWorkspaceFoldersParams(new WorkspaceFoldersChangeEvent(added, removed)));
    talk.settle();
  }

  @Test
  void findingsGoOutUnderTheNameThatTheClientUses() {
    Work work = new Work(folder);
    work.write("süd ufer/en/ferry.md", Ferry.EN);
    Path german = work.write("süd ufer/de/ferry.md", Ferry.DE_WITHOUT_FOG);
    String plain = "file://" + german.toString().replace('\\', '/');
    String escaped = plain.replace("ü", "%C3%BC").replace(" ", "%20").replace(".", "%2e");
    try (Talk talk = Talk.in(folder)) {
      for (String uri : List.of(plain, escaped)) {
        Buffer buffer = talk.open(uri, Ferry.DE_WITHOUT_FOG);
        talk.settle();
        List<PublishDiagnosticsParams> all = talk.all(uri);
        assertEquals(1, all.get(all.size() - 1).getDiagnostics().size());
        buffer.close();
        assertEquals(List.of(), talk.shown(uri));
      }
    }
  }

  @Test
  void whatIsOpenedDuringTheFirstListingWaitsForNoSecondOne() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.silent()) {
      talk.machine.holdListing();
      InitializeParams params = Talk.params();
      params.setWorkspaceFolders(List.of(new WorkspaceFolder(folder.toUri().toString(), "work")));
      talk.begin(params);
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.open(work.en(), Ferry.EN);
      var asked = german.ask("Winter");
      talk.barrier();
      talk.machine.release();
      assertNotNull(Talk.answer(asked));
      talk.settle();
      assertEquals(1, talk.machine.listings.get());
    }
  }
}
