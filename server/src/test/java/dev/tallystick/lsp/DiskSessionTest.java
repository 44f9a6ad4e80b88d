package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.engine.Event;
import dev.tallystick.engine.Folder;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.DiagnosticSeverity;
import org.eclipse.lsp4j.FileChangeType;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Files that other programs write, and files that are opened and closed. */
class DiskSessionTest {
  @TempDir Path folder;

  @Test
  void aSourceEditedOnDiskIsReadAgain() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));

      work.write("en/ferry.md", Ferry.EN.replace(Ferry.FOG_EN + "\n", ""));
      talk.wrote(FileChangeType.Changed, work.en());

      assertEquals(List.of(), talk.codes(work.en()));
      assertEquals(List.of(), talk.codes(work.de()));
    }
  }

  @Test
  void aFileWrittenWithTheSameTextChangesNothing() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      int published = talk.published.size();

      talk.wrote(FileChangeType.Changed, work.en(), work.de());

      assertEquals(published, talk.published.size());
    }
  }

  @Test
  void anOpenFileWrittenOnDiskKeepsTheTextOfTheEditor() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      work.write("de/ferry.md", Ferry.DE);
      talk.wrote(FileChangeType.Changed, work.de());
      assertEquals(List.of("omission"), talk.codes(work.en()));

      talk.open(work.en(), Ferry.EN);
      german.close();
      assertEquals(List.of(), talk.codes(work.en()));
    }
  }

  @Test
  void aHalfWrittenFileKeepsTheLastFindingsUntilItIsWhole() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      int published = talk.published.size();

      work.write("en/ferry.md", "");
      talk.wrote(FileChangeType.Changed, work.en());
      work.write("en/ferry.md", Ferry.EN.substring(0, Ferry.EN.length() / 3));
      talk.wrote(FileChangeType.Changed, work.en());
      talk.pass(1000);
      assertEquals(published, talk.published.size());

      work.write("en/ferry.md", Ferry.EN.replace(Ferry.FOG_EN + "\n", ""));
      talk.wrote(FileChangeType.Changed, work.en());
      assertEquals(List.of(), talk.codes(work.de()));
    }
  }

  @Test
  void aFileThatStaysCutShortCountsAfterOneRest() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      work.write("en/ferry.md", "# The chain ferry\n");
      talk.wrote(FileChangeType.Changed, work.en());
      talk.pass(1499);
      assertEquals(List.of("omission"), talk.codes(work.en()));

      talk.pass(1);
      assertEquals(List.of(), talk.codes(work.en()));
    }
  }

  @Test
  void aHalfWrittenFileThatGrowsStartsItsRestAnew() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      work.write("en/ferry.md", "# The chain ferry\n");
      talk.wrote(FileChangeType.Changed, work.en());
      talk.pass(1000);
      work.write("en/ferry.md", "# The chain ferry\n\nThe chain\n"); // nobody tells
      talk.pass(500);
      assertEquals(List.of("omission"), talk.codes(work.en()));

      talk.pass(1500);
      assertEquals(List.of(), talk.codes(work.en()));
    }
  }

  @Test
  void bytesThatAreNoTextAreShownWhereTheyStandWhileTheFileIsPaired() throws IOException {
    Work work = new Work(folder);
    String half = Ferry.EN.replace("from dawn", "from d\u00e4wn");
    work.write("en/ferry.md", "");
    Files.write(work.en(), half.getBytes(StandardCharsets.ISO_8859_1));
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      talk.settle();

      Diagnostic shown = FindingsSessionTest.only(talk.shown(work.en()));
      assertEquals("\u00e4", Buffer.words(half, shown.getRange()));
      assertEquals(DiagnosticSeverity.Warning, shown.getSeverity());
      assertEquals("tallystick", shown.getSource());
      assertNull(shown.getCode());
      assertTrue(shown.getMessage().getLeft().contains("no text in the file's encoding: E4"));

      Buffer english = talk.open(work.en(), Ferry.EN);
      talk.settle();
      assertEquals(List.of(), talk.shown(work.en()));
      english.close();
      assertEquals(1, talk.shown(work.en()).size());
      german.close();
      assertEquals(List.of(), talk.shown(work.en()));
    }
  }

  @Test
  void closingTheLastOpenSideEmptiesBoth() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      Buffer english = talk.open(work.en(), Ferry.EN);
      german.close();
      assertEquals(List.of("omission"), talk.codes(work.de()));
      english.close();

      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals(List.of(), talk.codes(work.en()));
      assertFalse(talk.published.get(0).getDiagnostics().isEmpty());
    }
  }

  @Test
  void aPairThatFallsApartIsEmptied() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      work.delete("en/ferry.md");
      talk.wrote(FileChangeType.Deleted, work.en());

      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals(List.of(), talk.codes(work.en()));
      assertEquals(1, talk.all(german.uri).get(1).getVersion());
    }
  }

  @Test
  void aSourceThatAppearsMakesAPair() {
    Work work = new Work(folder);
    work.write("de/ferry.md", Ferry.DE_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of(), talk.codes(work.de()));

      work.write("en/ferry.md", Ferry.EN);
      talk.wrote(FileChangeType.Created, work.en());

      assertEquals(List.of("omission"), talk.codes(work.de()));
    }
  }

  @Test
  void openingAFileFindsThoseThatNobodyToldOf() {
    Work work = new Work(folder);
    work.write("en/bell.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      talk.settle();
      work.write("en/ferry.md", Ferry.EN);
      work.write("de/ferry.md", Ferry.DE_WITHOUT_FOG);
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();

      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void openingAFileThatNoListHoldsMakesNobodyWait() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      talk.machine.holdListing();
      talk.open(work.file("ferry.py"), "print()");
      talk.open(work.file(".notes/ferry.md"), "Nothing.");
      talk.open(work.file("de/.ferry.md"), "Nothing.");

      assertEquals(JumpSessionTest.WINCH_EN, JumpSessionTest.text(german.hover("410 Gliedern")));
    }
  }

  @Test
  void aTranslationThatIsNotOnDiskYetIsPaired() {
    Work work = new Work(folder);
    Path english = work.write("ferry.en.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.file("ferry.de.md"), Ferry.DE_WITHOUT_FOG);
      talk.settle();

      assertEquals(List.of("omission"), talk.codes(english));
    }
  }

  @Test
  void aClientThatCannotWatchIsWatchedFor() {
    Work work = Work.withoutFog(folder);
    try (Talk talk =
        Talk.in(
            folder,
            params -> params.getCapabilities().getWorkspace().setDidChangeWatchedFiles(null))) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of(new Folder(folder, Folder.DEEP)), talk.machine.watched);
      assertTrue(talk.registered.isEmpty());

      work.write("en/ferry.md", Ferry.EN.replace(Ferry.FOG_EN + "\n", ""));
      talk.machine.tell(new Event.FilesChanged(List.of(), true)); // an overflow
      talk.settle();
      assertEquals(List.of(), talk.codes(work.en()));
    }
  }

  @Test
  void aClientThatCanWatchIsAskedTo() {
    Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.settle();

      assertEquals(List.of(), talk.machine.watched);
      String asked = talk.registered.get(0).getRegistrations().get(0).toString();
      assertTrue(asked.contains("workspace/didChangeWatchedFiles"));
      assertTrue(
          asked.contains("**/*.{txt,text,md,markdown,mkd,srt,vtt,adoc,asciidoc,asc}"), asked);
    }
  }
}
