package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.engine.Disk;
import dev.tallystick.engine.Event;
import dev.tallystick.engine.Examiner;
import dev.tallystick.engine.Folder;
import dev.tallystick.engine.Unreadable;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Consumer;
import org.eclipse.lsp4j.DidChangeWatchedFilesParams;
import org.eclipse.lsp4j.DidChangeWorkspaceFoldersParams;
import org.eclipse.lsp4j.FileChangeType;
import org.eclipse.lsp4j.FileEvent;
import org.eclipse.lsp4j.WorkspaceFolder;
import org.eclipse.lsp4j.WorkspaceFoldersChangeEvent;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Files that other programs add, move and replace, and how much work that makes. */
class DiskMovesSessionTest {
  @TempDir Path folder;

  /** A disk that counts what it is asked. */
  private static final class Counting implements Disk {
    private final AtomicInteger listings = new AtomicInteger();
    private final AtomicInteger reads = new AtomicInteger();
    private final AtomicInteger runs = new AtomicInteger();

    /** Counts from now on what a session does. */
    static Counting of(Talk talk) {
      Counting counting = new Counting();
      talk.machine.disk = counting;
      talk.machine.examiner =
          (source, target, draft, known, cancellation) -> {
            counting.runs.incrementAndGet();
            return Examiner.ADAPTIVE.examine(source, target, draft, known, cancellation);
          };
      return counting;
    }

    @Override
    public byte[] read(Path file) throws Unreadable {
      reads.incrementAndGet();
      return Disk.REAL.read(file);
    }

    @Override
    public List<Path> files(Path folder) throws Unreadable {
      listings.incrementAndGet();
      return Disk.REAL.files(folder);
    }

    @Override
    public List<Path> files(Folder folder, Consumer<String> unread) throws Unreadable {
      listings.incrementAndGet();
      return Disk.REAL.files(folder, unread);
    }

    @Override
    public String toString() {
      return listings + " listings, " + reads + " reads, " + runs + " runs";
    }
  }

  private static FileEvent event(FileChangeType type, Path file) {
    return new FileEvent(file.toUri().toString(), type);
  }

  /** The editor tells of several events at once. */
  private static void tell(Talk talk, FileEvent... events) {
    talk.server
        .getWorkspaceService()
        .didChangeWatchedFiles(new DidChangeWatchedFilesParams(List.of(events)));
  }

  @Test
  void aLanguageThatComesOrGoesLeavesTheOthersAlone() {
    Work work = Work.withoutFog(folder);
    work.write("nl/ferry.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.en(), Ferry.EN);
      talk.settle();
      Counting counting = Counting.of(talk);
      work.write("fr/ferry.md", Ferry.FR_WITHOUT_FOG);
      work.write("zh-Hant/ferry.md", "# 渡船\n");
      tell(
          talk,
          event(FileChangeType.Created, work.fr()),
          event(FileChangeType.Created, work.file("zh-Hant/ferry.md")));
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.fr()));
      assertEquals(2, talk.shown(work.en()).size());
      assertEquals("1 listings, 2 reads, 2 runs", counting.toString());

      work.delete("de/ferry.md");
      talk.wrote(FileChangeType.Deleted, work.de());
      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals(1, talk.shown(work.en()).size());
      assertEquals(2, counting.runs.get());
    }
  }

  @Test
  void aTranslationThatIsRenamedTakesItsFindingsAlong() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.en(), Ferry.EN);
      talk.settle();
      work.delete("de/ferry.md");
      Path renamed = work.write("de-AT/ferry.md", Ferry.DE_WITHOUT_FOG);
      tell(talk, event(FileChangeType.Deleted, work.de()), event(FileChangeType.Created, renamed));
      talk.settle();

      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals(List.of("omission"), talk.codes(renamed));
      String message = talk.shown(work.en()).get(0).getMessage().getLeft();
      assertTrue(message.contains("into German (Austria)"), message);
    }
  }

  @Test
  void aSourceThatIsMovedAwayAndBackIsPairedAgain() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      work.delete("en/ferry.md");
      Path moved = work.write("en/boats/ferry.md", Ferry.EN);
      talk.wrote(FileChangeType.Deleted, work.en());
      talk.wrote(FileChangeType.Created, moved);
      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals(List.of(), talk.codes(moved));

      work.delete("en/boats/ferry.md");
      work.write("en/ferry.md", Ferry.EN);
      talk.wrote(FileChangeType.Created, work.en());
      talk.wrote(FileChangeType.Deleted, moved);
      assertEquals(List.of("omission"), talk.codes(work.de()));
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aSourceThatIsReplacedAsAWholeIsComparedAnewOnce() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      Counting counting = Counting.of(talk);
      work.write("en/ferry.md", Ferry.FR_WITHOUT_FOG);
      // Many programs write another file and rename it.
      tell(
          talk,
          event(FileChangeType.Deleted, work.en()),
          event(FileChangeType.Created, work.en()),
          event(FileChangeType.Changed, work.en()));
      talk.settle();

      assertEquals(List.of(), talk.codes(work.en()));
      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals("1 listings, 1 reads, 1 runs", counting.toString());
    }
  }

  @Test
  void aCheckoutOfAThousandFilesMakesOneListingAndTheRunsOfWhatIsOpen() {
    Work work = Work.withoutFog(folder);
    List<FileEvent> events = new ArrayList<>();
    for (int i = 0; i < 500; i++) {
      Path source = work.write("en/part" + i + ".md", "The bell rings.\n");
      Path target = work.write("de/part" + i + ".md", "Die Glocke läutet.\n");
      FileChangeType type = i % 2 == 0 ? FileChangeType.Changed : FileChangeType.Created;
      events.add(event(type, source));
      events.add(event(type, target));
    }
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      Counting counting = Counting.of(talk);
      work.write("en/ferry.md", Ferry.EN.replace(Ferry.FOG_EN + "\n", ""));
      events.add(event(FileChangeType.Changed, work.en()));
      tell(talk, events.toArray(FileEvent[]::new));
      talk.settle();

      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals("1 listings, 1 reads, 1 runs", counting.toString());
    }
  }

  @Test
  void aThousandMessagesDuringAListingMakeOneMore() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      Counting counting = Counting.of(talk);
      talk.machine.holdListing();
      for (int i = 0; i < 1000; i++) {
        tell(talk, event(FileChangeType.Created, work.file("en/part" + i + ".md")));
      }
      talk.barrier();
      talk.machine.release();
      talk.settle();

      assertEquals("2 listings, 0 reads, 0 runs", counting.toString());
    }
  }

  @Test
  void aFileWithoutAWorkspaceMeetsItsTranslationAsSoonAsThatIsThere() {
    Work work = new Work(folder);
    Path english = work.write("ferry.en.md", Ferry.EN);
    try (Talk talk = Talk.in(folder, params -> params.setWorkspaceFolders(null))) {
      talk.open(english, Ferry.EN);
      talk.settle();
      Path german = work.write("ferry.de.md", Ferry.DE_WITHOUT_FOG);
      talk.machine.tell(new Event.FilesChanged(List.of(german), true));
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(english));

      work.delete("ferry.de.md");
      talk.machine.tell(new Event.FilesChanged(List.of(german), true));
      talk.settle();
      assertEquals(List.of(), talk.codes(english));
    }
  }

  @Test
  void aFolderThatJoinsTheWorkspaceReachesDeeperThanThatOfTheFile() {
    Work work = new Work(folder);
    Path german = work.write("de/boats/river/ferry.md", Ferry.DE_WITHOUT_FOG);
    Path english = work.write("en/boats/river/ferry.md", Ferry.EN);
    try (Talk talk = Talk.in(folder, params -> params.setWorkspaceFolders(null))) {
      talk.open(german, Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of(), talk.codes(english));

      WorkspaceFolder joined = new WorkspaceFolder(folder.toUri().toString(), "work");
      folders(talk, List.of(joined), List.of());
      assertEquals(List.of("omission"), talk.codes(english));
      assertEquals(List.of(), talk.machine.watched);

      folders(talk, List.of(), List.of(joined));
      assertEquals(List.of(), talk.codes(english));
      assertEquals(
          List.of(german.getParent()), talk.machine.watched.stream().map(Folder::path).toList());
    }
  }

  @Test
  void twoFoldersOfTheWorkspaceAreNotMixed() {
    Work one = Work.withoutFog(folder.resolve("one"));
    Work two = new Work(folder.resolve("two"));
    two.write("fr/ferry.md", Ferry.FR_WITHOUT_FOG);
    try (Talk talk = Talk.in(one.folder())) {
      folders(
          talk, List.of(new WorkspaceFolder(two.folder().toUri().toString(), "two")), List.of());
      talk.open(one.en(), Ferry.EN);
      talk.open(two.fr(), Ferry.FR_WITHOUT_FOG);
      talk.settle();

      assertEquals(List.of(), talk.codes(two.fr()));
      assertEquals(List.of("omission"), talk.codes(one.de()));
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
}
