package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.engine.Disk;
import dev.tallystick.engine.Examiner;
import dev.tallystick.engine.Unreadable;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.CountDownLatch;
import java.util.stream.IntStream;
import org.eclipse.lsp4j.DidChangeConfigurationParams;
import org.eclipse.lsp4j.ExecuteCommandParams;
import org.eclipse.lsp4j.FileChangeType;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.WindowClientCapabilities;
import org.eclipse.lsp4j.WorkDoneProgressBegin;
import org.eclipse.lsp4j.WorkDoneProgressCancelParams;
import org.eclipse.lsp4j.WorkDoneProgressCreateParams;
import org.eclipse.lsp4j.WorkDoneProgressEnd;
import org.eclipse.lsp4j.WorkDoneProgressReport;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Looking at a whole folder: by a setting, by a command, and how far it has come. */
class ScopeSessionTest {
  private static final int MANY = 12;

  @TempDir Path folder;

  private Work manyPairs() {
    Work work = new Work(folder);
    for (int i = 0; i < MANY; i++) {
      work.write("en/ferry" + i + ".md", Ferry.EN);
      work.write("de/ferry" + i + ".md", Ferry.DE_WITHOUT_FOG);
    }
    return work;
  }

  private static void showsProgress(InitializeParams params) {
    WindowClientCapabilities window = new WindowClientCapabilities();
    window.setWorkDoneProgress(true);
    params.getCapabilities().setWindow(window);
  }

  private static void scope(Talk talk, String scope) {
    talk.server
        .getWorkspaceService()
        .didChangeConfiguration(new DidChangeConfigurationParams(Map.of("scope", scope)));
  }

  private static long withFindings(Talk talk, Work work, String language) {
    return IntStream.range(0, MANY)
        .filter(i -> !talk.shown(work.file(language + "/ferry" + i + ".md")).isEmpty())
        .count();
  }

  @Test
  void aSettingWatchesAllPairsOfTheFolder() {
    Work work = manyPairs();
    try (Talk talk = Talk.in(folder)) {
      scope(talk, "folder");
      talk.settle();
      assertEquals(MANY, withFindings(talk, work, "en"));
      assertEquals(MANY, withFindings(talk, work, "de"));

      work.write("de/ferry3.md", Ferry.DE);
      talk.wrote(FileChangeType.Changed, work.file("de/ferry3.md"));
      assertEquals(MANY - 1, withFindings(talk, work, "en"));

      scope(talk, "open");
      talk.settle();
      assertEquals(0, withFindings(talk, work, "en"));
      assertEquals(0, withFindings(talk, work, "de"));
    }
  }

  @Test
  void aCommandChecksTheWholeFolderAndTellsWhatItFound() {
    Work work = manyPairs();
    try (Talk talk = Talk.in(folder)) {
      Object answer = talk.command("tallystick.checkFolder");
      talk.settle();
      assertEquals(found(MANY, MANY), answer);
      assertEquals(List.of("12 pairs checked: 12 findings."), talk.said);
      assertEquals(MANY, withFindings(talk, work, "de"));
    }
  }

  @Test
  void aCommandChecksTheFolderThatItNames() {
    Work.withoutFog(folder.resolve("other"));
    try (Talk talk = Talk.in(folder)) {
      talk.command("tallystick.checkFolder", folder.resolve("none").toUri().toString());
      talk.settle();
      assertTrue(talk.said.get(0).startsWith("No pairs of files here"), talk.said.get(0));
      talk.command("tallystick.checkFolder", folder.toUri().toString());
      talk.settle();
      assertEquals("1 pair checked: 1 finding.", talk.said.get(1));
    }
  }

  @Test
  void aCommandChecksTheFoldersInsideTheOneThatItNames() {
    Work.withoutFog(folder.resolve("job"));
    try (Talk talk = Talk.in(folder.resolve("job"))) {
      talk.command("tallystick.checkFolder", folder.toUri().toString());
      assertEquals(List.of("1 pair checked: 1 finding."), talk.said);
    }
  }

  @Test
  void theClientIsShownHowFarItHasCome() {
    manyPairs();
    try (Talk talk = Talk.in(folder, ScopeSessionTest::showsProgress)) {
      talk.command("tallystick.checkFolder");
      talk.settle();
      assertInstanceOf(WorkDoneProgressCreateParams.class, talk.passes.get(0));
      assertInstanceOf(WorkDoneProgressBegin.class, talk.passes.get(1));
      List<String> messages =
          talk.passes.stream()
              .filter(WorkDoneProgressReport.class::isInstance)
              .map(report -> ((WorkDoneProgressReport) report).getMessage())
              .toList();
      assertFalse(messages.isEmpty());
      assertEquals("12 of 12 pairs", messages.get(messages.size() - 1));
      assertInstanceOf(WorkDoneProgressEnd.class, talk.passes.get(talk.passes.size() - 1));
    }
  }

  @Test
  void aFewPairsAreNotWorthShowing() {
    Work work = Work.withoutFog(folder);
    work.write("fr/ferry.md", Ferry.FR);
    try (Talk talk = Talk.in(folder, ScopeSessionTest::showsProgress)) {
      talk.open(work.en(), Ferry.EN);
      talk.command("tallystick.checkFolder");
      talk.settle();
      assertEquals(List.of(), talk.passes);
    }
  }

  /** Each keystroke in the source concerns all of its translations. */
  @Test
  void typingInASourceOfManyLanguagesIsNotWorthShowing() {
    Work work = new Work(folder);
    Path source = work.write("ferry.md", Ferry.EN);
    for (String tag : List.of("de", "es", "fr", "it", "nl", "pl")) {
      work.write("ferry." + tag + ".md", Ferry.DE);
    }
    try (Talk talk = Talk.in(folder, ScopeSessionTest::showsProgress)) {
      Buffer english = talk.open(source, Ferry.EN);
      talk.settle();
      english.replace("Two keepers", "Three keepers");
      assertEquals(List.of(), talk.passes);
    }
  }

  @Test
  void aClientThatShowsNoProgressIsNotAskedTo() {
    manyPairs();
    try (Talk talk = Talk.in(folder)) {
      talk.command("tallystick.checkFolder");
      talk.settle();
      assertEquals(List.of(), talk.passes);
    }
  }

  @Test
  void theUserCanCancelIt() {
    Work work = manyPairs();
    Path notes = work.write("notes.md", "Nothing.");
    try (Talk talk = Talk.in(folder, ScopeSessionTest::showsProgress)) {
      Buffer other = talk.open(notes, "Nothing.");
      talk.open(work.file("de/ferry7.md"), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      talk.machine.hold();
      CompletableFuture<Object> answer =
          talk.server
              .getWorkspaceService()
              .executeCommand(new ExecuteCommandParams("tallystick.checkFolder", List.of()));
      assertNull(Talk.answer(other.ask("Nothing"))); // its turn comes after
      var create = (WorkDoneProgressCreateParams) talk.passes.get(0);
      talk.server.cancelProgress(new WorkDoneProgressCancelParams(create.getToken()));
      talk.machine.release();
      talk.settle();

      assertNull(Talk.answer(answer));
      assertEquals(List.of(), talk.said, "of a part nothing is told as if it were the whole");
      assertEquals(1, withFindings(talk, work, "en"), "the open pair is still watched");
      assertInstanceOf(WorkDoneProgressEnd.class, talk.passes.get(talk.passes.size() - 1));
    }
  }

  /** Pairs that nobody looks at have the workers that are left. */
  @Test
  void anOpenPairDoesNotWaitForTheFolder() {
    Work work = manyPairs();
    CountDownLatch others = new CountDownLatch(1);
    try (Talk talk = Talk.in(folder)) {
      talk.machine.examiner =
          (source, target, draft, known, cancellation) -> {
            if (!target.text().string().contains("Frost")) {
              await(others);
            }
            return Examiner.ADAPTIVE.examine(source, target, draft, known, cancellation);
          };
      scope(talk, "folder");
      Path open = work.file("de/ferry7.md");
      Buffer german = talk.open(open, Ferry.DE_WITHOUT_FOG.replace("Winter", "Frost"));
      assertNotNull(german.hover("Frost"));
      assertEquals(List.of("omission"), talk.codes(work.file("en/ferry7.md")));
      others.countDown();
      talk.settle();
      assertEquals(MANY, withFindings(talk, work, "en"));
    }
  }

  /** The French is not open, but it is asked for too. */
  @Test
  void theOtherLanguagesOfAnOpenFileDoNotWaitForTheFolder() {
    Work work = manyPairs();
    for (int i = 0; i < MANY; i++) {
      work.write("fr/ferry" + i + ".md", i == 7 ? Ferry.FR : "Rien.");
    }
    CountDownLatch others = new CountDownLatch(1);
    try (Talk talk = Talk.in(folder)) {
      talk.machine.examiner =
          (source, target, draft, known, cancellation) -> {
            if (target.text().string().equals(Ferry.DE_WITHOUT_FOG)) {
              await(others);
            }
            return Examiner.ADAPTIVE.examine(source, target, draft, known, cancellation);
          };
      scope(talk, "folder");
      Buffer german = talk.open(work.file("de/ferry7.md"), Ferry.DE);
      assertEquals(2, german.references("Winter").size());
      others.countDown();
      talk.settle();
    }
  }

  /** What is not open is read when its turn comes, so that nobody waits for the disk. */
  @Test
  void filesAreReadOneByOneAsWorkersBecomeFree() {
    manyPairs();
    List<Path> read = new CopyOnWriteArrayList<>();
    CountDownLatch gate = new CountDownLatch(1);
    try (Talk talk = Talk.in(folder)) {
      talk.settle();
      talk.machine.disk = reading(read);
      talk.machine.examiner =
          (source, target, draft, known, cancellation) -> {
            await(gate);
            return Examiner.ADAPTIVE.examine(source, target, draft, known, cancellation);
          };
      scope(talk, "folder");
      Buffer notes = talk.open(folder.resolve("notes.md"), "Nothing.");
      assertNull(notes.hover("Nothing"));
      assertEquals(2 * Surround.WORKERS, read.size());

      gate.countDown();
      talk.settle();
      assertEquals(2 * MANY, read.size());
    }
  }

  private static Disk reading(List<Path> read) {
    return new Disk() {
      @Override
      public byte[] read(Path file) throws Unreadable {
        read.add(file);
        return Disk.REAL.read(file);
      }

      @Override
      public List<Path> files(Path folder) throws Unreadable {
        return Disk.REAL.files(folder);
      }
    };
  }

  /**
   * The answer to the command, as the client's reader of JSON makes it: all numbers are doubles.
   */
  private static Map<String, Object> found(double pairs, double omissions) {
    return Map.of("pairs", pairs, "findings", Map.of("omission", omissions));
  }

  private static void await(CountDownLatch latch) {
    try {
      latch.await();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}
