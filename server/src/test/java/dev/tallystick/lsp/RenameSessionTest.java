package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.eclipse.lsp4j.FileOperationFilter;
import org.eclipse.lsp4j.FileRename;
import org.eclipse.lsp4j.RenameFilesParams;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Files that get another name, as the client tells it. */
class RenameSessionTest {
  @TempDir Path folder;

  private static void rename(Talk talk, Path from, Path to) throws Exception {
    Files.createDirectories(to.getParent());
    Files.move(from, to);
    talk.server
        .getWorkspaceService()
        .didRenameFiles(
            new RenameFilesParams(
                List.of(new FileRename(from.toUri().toString(), to.toUri().toString()))));
    talk.settle();
  }

  @Test
  void aRenamedSourceIsPairedAnewAndItsOldNameShowsNothing() throws Exception {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));

      Path away = work.file("drafts/boat.md");
      rename(talk, work.en(), away);
      assertEquals(List.of(), talk.codes(work.en()));
      assertEquals(List.of(), talk.codes(work.de()));

      rename(talk, away, work.en());
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aPairMadeByHandAndItsMarkFollowTheirFiles() throws Exception {
    Work work = new Work(folder);
    Path english = work.write("theirs/from-the-client.md", Ferry.EN);
    Path german =
        work.write("mine.md", Ferry.DE.substring(0, Ferry.DE.indexOf("Am Ende des Tages")));
    try (Talk talk = Talk.in(folder)) {
      talk.open(english, Ferry.EN);
      talk.command(
          "tallystick.pair",
          Map.of("source", english.toUri().toString(), "target", german.toUri().toString()));
      talk.settle();
      talk.command("tallystick.finished", german.toUri().toString());
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(english));

      Path renamed = work.file("mine/translated.md");
      rename(talk, german, renamed);
      assertEquals(List.of("omission"), talk.codes(english));
      assertEquals(1, talk.shown(renamed).size());
      assertEquals(List.of(), talk.shown(german));
    }
  }

  @Test
  void aRenamedFolderTakesItsFilesAlong() throws Exception {
    Work work = new Work(folder);
    Path english = work.write("theirs/from-the-client.md", Ferry.EN);
    Path german = work.write("mine/translated.md", Ferry.DE_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder)) {
      talk.open(english, Ferry.EN);
      talk.command(
          "tallystick.pair",
          Map.of("source", english.toUri().toString(), "target", german.toUri().toString()));
      talk.settle(); // the pair is made of files that are still there
      rename(talk, folder.resolve("mine"), folder.resolve("delivered"));
      assertEquals(List.of("omission"), talk.codes(english));
      assertEquals(1, talk.shown(work.file("delivered/translated.md")).size());
    }
  }

  @Test
  void theClientIsAskedToTellOfFilesAndFolders() {
    try (Talk talk = Talk.in(folder)) {
      List<FileOperationFilter> filters =
          talk.initialized
              .getCapabilities()
              .getWorkspace()
              .getFileOperations()
              .getDidRename()
              .getFilters();
      assertEquals(
          List.of("file", "folder"),
          filters.stream().map(filter -> filter.getPattern().getMatches()).toList());
      assertTrue(filters.get(0).getPattern().getGlob().contains("md"));
    }
  }
}
