package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.engine.Disk;
import dev.tallystick.engine.Examiner;
import dev.tallystick.engine.Folder;
import dev.tallystick.engine.Unreadable;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Consumer;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.DiagnosticSeverity;
import org.eclipse.lsp4j.DidChangeConfigurationParams;
import org.eclipse.lsp4j.DidChangeWorkspaceFoldersParams;
import org.eclipse.lsp4j.FileChangeType;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.eclipse.lsp4j.WorkspaceFolder;
import org.eclipse.lsp4j.WorkspaceFoldersChangeEvent;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What a tallystick.json does in an editor, and what is shown in it. */
class ProjectSessionTest {
  private static final String NAME = "tallystick.json";
  private static final String STATED =
      "{ \"pairs\": [{ \"source\": \"ferry.md\", \"target\": \"Fähre.md\","
          + " \"targetLanguage\": \"de\" }] }";

  @TempDir Path folder;

  /** A ferry and its translation without the sentence on fog, under names that tell nothing. */
  private Work stated() {
    Work work = new Work(folder);
    work.write("ferry.md", Ferry.EN);
    work.write("Fähre.md", Ferry.DE_WITHOUT_FOG);
    return work;
  }

  @Test
  void aStatedPairIsFollowed() {
    Work work = stated();
    work.write(NAME, STATED);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.file("Fähre.md"), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.file("ferry.md")));
      assertTrue(
          talk.shown(work.file("ferry.md")).get(0).getMessage().getLeft().contains("into German"));

      german.replace("Karren kosten 2 Marken.", "Karren kosten 2 Marken.\n" + Ferry.FOG_DE);
      assertEquals(List.of(), talk.codes(work.file("ferry.md")));
    }
  }

  @Test
  void theTextOfTheEditorCountsBeforeItIsSavedAndTheDiskOnceItIsClosed() {
    Work work = stated();
    work.write(NAME, "{}");
    Path english = work.file("ferry.md");
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.file("Fähre.md"), Ferry.DE_WITHOUT_FOG);
      Buffer project = talk.open(work.file(NAME), "{}");
      talk.settle();
      assertEquals(List.of(), talk.codes(english));

      project.replace("{}", STATED);
      assertEquals(List.of("omission"), talk.codes(english));
      project.replace("ferry.md", "fery.md");
      assertEquals(List.of(), talk.codes(english));
      project.replace("fery.md", "ferry.md");
      assertEquals(List.of("omission"), talk.codes(english));

      project.close();
      assertEquals(List.of(), talk.codes(english));
    }
  }

  @Test
  void aFileThatIsNotOnDiskYetCountsAsTheEditorShowsIt() {
    Work work = stated();
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.file("Fähre.md"), Ferry.DE_WITHOUT_FOG);
      Buffer project = talk.open(work.file(NAME), STATED);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.file("ferry.md")));

      project.close();
      assertEquals(List.of(), talk.codes(work.file("ferry.md")));
    }
  }

  @Test
  void itIsFollowedOnTheDiskFromItsCreationToItsDeletion() {
    Work work = stated();
    Path english = work.file("ferry.md");
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.file("Fähre.md"), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of(), talk.codes(english));

      work.write(NAME, STATED);
      talk.wrote(FileChangeType.Created, work.file(NAME));
      assertEquals(List.of("omission"), talk.codes(english));

      work.write(NAME, STATED.replace("\"de\"", "\"nl\""));
      talk.wrote(FileChangeType.Changed, work.file(NAME));
      String message = talk.shown(english).get(0).getMessage().getLeft();
      assertTrue(message.contains("into Dutch"), message);

      work.delete(NAME);
      talk.wrote(FileChangeType.Deleted, work.file(NAME));
      assertEquals(List.of(), talk.codes(english));
    }
  }

  @Test
  void halfOfItLeavesWhatItSaidUntilItHasBeenStableForOneRest() {
    Work work = stated();
    work.write(NAME, STATED);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.file("Fähre.md"), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      work.write(NAME, "{ \"pairs\"");
      talk.wrote(FileChangeType.Changed, work.file(NAME));
      assertEquals(List.of("omission"), talk.codes(work.file("ferry.md")));
      assertEquals(List.of(), talk.shown(work.file(NAME)));

      talk.pass(1500);
      assertEquals(List.of(), talk.codes(work.file("ferry.md")));
      assertEquals(1, talk.shown(work.file(NAME)).size());
    }
  }

  @Test
  void whatIsWrongIsShownAtItsPlaceThoughTheFileIsNotOpen() {
    Work work = Work.withoutFog(folder);
    String json = "{\n  \"🔔\": 1, \"checks\": { \"length\": \"loud\" }\n}\n";
    work.write(NAME, json);
    try (Talk talk = Talk.in(folder)) {
      talk.settle();
      List<Diagnostic> shown = talk.shown(work.file(NAME));
      assertEquals(2, shown.size());
      assertEquals("\"🔔\"", Buffer.words(json, shown.get(0).getRange()));
      assertEquals("\"loud\"", Buffer.words(json, shown.get(1).getRange()));
      assertEquals(DiagnosticSeverity.Warning, shown.get(0).getSeverity());
      assertEquals("tallystick", shown.get(0).getSource());
      assertNull(shown.get(0).getCode());

      work.write(NAME, json.replace("loud", "hint"));
      talk.wrote(FileChangeType.Changed, work.file(NAME));
      assertEquals(1, talk.shown(work.file(NAME)).size());
      work.delete(NAME);
      talk.wrote(FileChangeType.Deleted, work.file(NAME));
      assertEquals(List.of(), talk.shown(work.file(NAME)));
    }
  }

  @Test
  void whatIsWrongFollowsEachEditWithItsVersion() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer project = talk.open(work.file(NAME), "{ \"ignore\": [\"/old\"] }");
      talk.settle();
      assertEquals("\"/old\"", project.words(talk.shown(project.uri).get(0).getRange()));
      project.replace("/old", "old");
      assertEquals(List.of(), talk.shown(project.uri));
      assertEquals(2, talk.all(project.uri).get(1).getVersion());

      project.replace("\"old\"", "\"old");
      assertEquals("\"old] }", project.words(talk.shown(project.uri).get(0).getRange()));
      project.close();
      assertEquals(List.of(), talk.shown(project.uri));
    }
  }

  @Test
  void aFolderThatGoesTakesWhatIsWrongInItAlong() {
    Work work = Work.withoutFog(folder);
    work.write(NAME, "[]");
    try (Talk talk = Talk.in(folder)) {
      talk.settle();
      assertEquals(1, talk.shown(work.file(NAME)).size());
      WorkspaceFolder gone = new WorkspaceFolder(folder.toUri().toString(), "work");
      folders(talk, List.of(), List.of(gone));
      assertEquals(List.of(), talk.shown(work.file(NAME)));

      folders(talk, List.of(gone), List.of());
      assertEquals(1, talk.shown(work.file(NAME)).size());
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
  void bytesThatAreNoTextAreShownToo() throws IOException {
    Work work = Work.withoutFog(folder);
    byte[] latin = "{ \"ignore\": [\"für\"] }".getBytes(StandardCharsets.ISO_8859_1);
    Files.write(work.file(NAME), latin);
    try (Talk talk = Talk.in(folder)) {
      talk.settle();
      Diagnostic shown = FindingsSessionTest.only(talk.shown(work.file(NAME)));
      assertEquals(new Range(new Position(0, 15), new Position(0, 16)), shown.getRange());
      assertTrue(shown.getMessage().getLeft().contains("no text in the file's encoding: FC"));
    }
  }

  @Test
  void aFileThatCannotBeReadIsToldAtItsStart() throws IOException {
    Work work = Work.withoutFog(folder);
    Files.write(work.file(NAME), new byte[] {'{', 0, '}', 0});
    try (Talk talk = Talk.in(folder)) {
      talk.settle();
      Diagnostic shown = FindingsSessionTest.only(talk.shown(work.file(NAME)));
      assertEquals(new Range(new Position(0, 0), new Position(0, 0)), shown.getRange());
      assertTrue(shown.getMessage().getLeft().contains("this is no text file"));

      work.write(NAME, "{}");
      talk.wrote(FileChangeType.Changed, work.file(NAME));
      assertEquals(List.of(), talk.shown(work.file(NAME)));
    }
  }

  @Test
  void levelsChangeWhatIsShownWithoutAnotherRun() {
    Work work = Work.withoutFog(folder);
    String copied = Ferry.line(Ferry.EN, "In winter the ferry");
    String german = Ferry.DE_WITHOUT_FOG.replace(Ferry.line(Ferry.DE, "Im Winter ruht"), copied);
    work.write("de/ferry.md", german);
    try (Talk talk = Talk.in(folder)) {
      AtomicInteger runs = new AtomicInteger();
      talk.machine.examiner =
          (source, target, draft, known, cancellation) -> {
            runs.incrementAndGet();
            return Examiner.ADAPTIVE.examine(source, target, draft, known, cancellation);
          };
      talk.open(work.de(), german);
      Buffer project = talk.open(work.file(NAME), "{ \"checks\": {} }");
      talk.settle();
      assertEquals(List.of("omission", "untranslated"), talk.codes(work.de()));

      project.replace("{}", "{ \"omission\": \"off\", \"untranslated\": \"hint\" }");
      assertEquals(List.of(), talk.shown(work.en()));
      Diagnostic left = FindingsSessionTest.only(talk.shown(work.de()));
      assertEquals("untranslated", left.getCode().getLeft());
      assertEquals(DiagnosticSeverity.Hint, left.getSeverity());

      project.replace("\"off\"", "\"information\"");
      assertEquals(List.of("omission"), talk.codes(work.en()));
      assertEquals(DiagnosticSeverity.Information, talk.shown(work.en()).get(0).getSeverity());
      assertEquals(1, runs.get());
    }
  }

  @Test
  void aCodeThatIsOffStaysOffWhileTheTranslatorWrites() {
    Work work = Work.withoutFog(folder);
    work.write(NAME, "{ \"checks\": { \"omission\": \"off\" } }");
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      german.replace("Winter", "Frost");
      talk.pass(1500);
      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals(List.of(), talk.all(work.en().toUri().toString()));
    }
  }

  @Test
  void ignoredFilesAreInNoPair() {
    Work work = Work.withoutFog(folder);
    work.write(NAME, "{ \"ignore\": [\"de\"] }");
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of(), talk.codes(work.de()));
      assertNull(german.hover("Winter"));
    }
  }

  @Test
  void theProjectsSourceLanguageBeatsThatOfTheEditor() {
    Work work = Work.withoutFog(folder);
    work.write(NAME, "{ \"sourceLanguage\": \"en\" }");
    try (Talk talk = Talk.in(folder)) {
      talk.server
          .getWorkspaceService()
          .didChangeConfiguration(new DidChangeConfigurationParams(Map.of("sourceLanguage", "de")));
      Buffer project = talk.open(work.file(NAME), "{ \"sourceLanguage\": \"en\" }");
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));

      project.replace("\"sourceLanguage\": \"en\"", "");
      assertEquals(List.of("addition"), talk.codes(work.en()));
    }
  }

  @Test
  void theQuestionForTheSourceIsAnsweredByTheProject() {
    Work work = new Work(folder);
    Path german = work.write("ferry.de.md", Ferry.DE);
    work.write("ferry.fr.md", Ferry.FR_WITHOUT_FOG);
    work.write(NAME, "{ \"sourceLanguage\": \"de\" }");
    try (Talk talk = Talk.in(folder)) {
      talk.open(german, Ferry.DE);
      talk.pass(1500);
      assertEquals(List.of(), talk.said);
      assertEquals(List.of("omission"), talk.codes(german));
    }
  }

  @Test
  void itCountsAtTheRootOnly() {
    Work work = Work.withoutFog(folder);
    work.write("de/" + NAME, "{ \"ignore\": [\"**\"], \"colour\": 1 }");
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.de()));
      assertEquals(List.of(), talk.shown(work.file("de/" + NAME)));
    }
  }

  @Test
  void eachFolderOfTheWorkspaceHasItsOwn() {
    Work one = Work.withoutFog(folder.resolve("one"));
    Work two = Work.withoutFog(folder.resolve("one/two"));
    two.write(NAME, "{ \"checks\": { \"omission\": \"hint\" } }");
    try (Talk talk =
        Talk.in(
            one.folder(),
            params ->
                params.setWorkspaceFolders(
                    List.of(
                        new WorkspaceFolder(one.folder().toUri().toString(), "one"),
                        new WorkspaceFolder(two.folder().toUri().toString(), "two"))))) {
      talk.open(one.de(), Ferry.DE_WITHOUT_FOG);
      talk.open(two.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(DiagnosticSeverity.Warning, talk.shown(one.en()).get(0).getSeverity());
      assertEquals(DiagnosticSeverity.Hint, talk.shown(two.en()).get(0).getSeverity());
    }
  }

  @Test
  void withoutAFolderThatBesideTheOpenedFileCounts() {
    Work work = stated();
    work.write(NAME, STATED.replace("{ \"pairs\"", "{ \"colour\": 1, \"pairs\""));
    try (Talk talk = Talk.in(folder, params -> params.setWorkspaceFolders(null))) {
      Buffer german = talk.open(work.file("Fähre.md"), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.file("ferry.md")));
      assertEquals(1, talk.shown(work.file(NAME)).size());

      german.close();
      assertEquals(List.of(), talk.codes(work.file("ferry.md")));
      assertEquals(List.of(), talk.shown(work.file(NAME)));
    }
  }

  @Test
  void aTextThatIsLostLeavesWhatItSaidLast() {
    Work work = stated();
    work.write(NAME, STATED);
    try (Talk talk = Talk.in(folder)) {
      Buffer project = talk.open(work.file(NAME), STATED);
      Buffer german = talk.open(work.file("Fähre.md"), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      project.change(
          new TextDocumentContentChangeEvent(
              new Range(new Position(9, 0), new Position(3, 0)), ""));
      german.replace("Winter", "Frost");
      assertEquals(List.of("omission"), talk.codes(work.file("ferry.md")));
      assertEquals(1, talk.said.size());
    }
  }

  @Test
  void aClientThatCanWatchIsAskedToWatchIt() {
    Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.settle();
      String asked = talk.registered.get(0).getRegistrations().get(0).toString();
      assertTrue(asked.contains("**/tallystick.json"), asked);
    }
  }

  @Test
  void openingOneThatNobodyToldOfFindsItOnceItIsClosed() {
    Work work = stated();
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.file("Fähre.md"), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      work.write(NAME, STATED);
      Buffer project = talk.open(work.file(NAME), STATED);
      talk.settle();
      project.close();
      assertEquals(List.of("omission"), talk.codes(work.file("ferry.md")));
    }
  }

  /** A folder in which something cannot be looked into, as the disk tells it. */
  private record Closed(String trouble) implements Disk {
    @Override
    public byte[] read(Path file) throws Unreadable {
      return Disk.REAL.read(file);
    }

    @Override
    public List<Path> files(Path folder) throws Unreadable {
      return Disk.REAL.files(folder);
    }

    @Override
    public List<Path> files(Folder folder, Consumer<String> unread) throws Unreadable {
      unread.accept(trouble);
      return Disk.REAL.files(folder, unread);
    }
  }

  @Test
  void aFolderInsideThatCannotBeLookedIntoIsLoggedOnceAndTheRestIsChecked() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.silent()) {
      talk.machine.disk = new Closed("secret: cannot be looked into.");
      var params = Talk.params();
      params.setWorkspaceFolders(List.of(new WorkspaceFolder(folder.toUri().toString(), "work")));
      talk.begin(params);
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));
      assertEquals(List.of("secret: cannot be looked into."), talk.logged);

      talk.wrote(FileChangeType.Created, work.file("new.md"));
      assertEquals(1, talk.logged.size());
      talk.machine.disk = new Closed("other: cannot be looked into.");
      talk.wrote(FileChangeType.Created, work.file("newer.md"));
      assertEquals("other: cannot be looked into.", talk.logged.get(1));
    }
  }
}
