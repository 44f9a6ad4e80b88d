package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.engine.Disk;
import dev.tallystick.engine.Examiner;
import dev.tallystick.engine.Unreadable;
import java.nio.file.Path;
import java.util.List;
import org.eclipse.lsp4j.FileChangeType;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is too much for the machine, or wrong in Tallystick itself, stays where it is. */
class FaultSessionTest {
  @TempDir Path folder;

  /** This machine's disk, with one file that there is no memory for. */
  private record Narrow(Path huge) implements Disk {
    @Override
    public byte[] read(Path file) throws Unreadable {
      if (file.equals(huge)) {
        throw new OutOfMemoryError("this file");
      }
      return REAL.read(file);
    }

    @Override
    public List<Path> files(Path listed) throws Unreadable {
      return REAL.files(listed);
    }
  }

  @Test
  void aFileThatThereIsNoMemoryForIsToldOnceAndTheRestGoesOn() {
    Work work = Work.withoutFog(folder);
    Path french = work.write("fr/ferry.md", Ferry.FR);
    try (Talk talk = Talk.in(folder)) {
      talk.machine.disk = new Narrow(french);
      talk.open(work.en(), Ferry.EN);
      talk.settle();
      talk.wrote(FileChangeType.Changed, french);

      assertEquals(List.of("omission"), talk.codes(work.de()));
      assertEquals(1, talk.logged.size(), talk.logged::toString);
      assertTrue(talk.logged.get(0).startsWith(french + ": too long for the memory"));

      talk.machine.disk = Disk.REAL;
      talk.wrote(FileChangeType.Changed, french);
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void anErrorInAWorkerIsLoggedAndThePairIsTriedWithTheNextText() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.machine.examiner =
          (source, target, draft, known, cancellation) -> {
            throw new LinkageError("text of a file");
          };
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(1, talk.logged.size());
      assertTrue(talk.logged.get(0).contains("java.lang.LinkageError at "));
      assertTrue(!talk.logged.get(0).contains("text of a file"));

      talk.machine.examiner = Examiner.ADAPTIVE;
      german.replace("Winter", "Frost");
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void anErrorInTheLoopIsLoggedAndTheNextEventIsHandled() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.machine.disk =
          new Disk() {
            @Override
            public byte[] read(Path file) {
              throw new LinkageError("text of a file");
            }

            @Override
            public List<Path> files(Path listed) throws Unreadable {
              return REAL.files(listed);
            }
          };
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertTrue(talk.logged.get(0).contains("java.lang.LinkageError at "));

      talk.machine.disk = Disk.REAL;
      german.replace("Winter", "Frost");
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aFolderThatCannotBeListedIsToldInTheLog() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.en(), Ferry.EN);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.de()));
      talk.machine.disk =
          new Disk() {
            @Override
            public byte[] read(Path file) throws Unreadable {
              return REAL.read(file);
            }

            @Override
            public List<Path> files(Path listed) throws Unreadable {
              throw new Unreadable(listed + ": cannot be listed.");
            }
          };
      talk.wrote(FileChangeType.Created, work.write("fr/ferry.md", Ferry.FR));
      assertEquals(1, talk.logged.size(), talk.logged::toString);
      assertTrue(talk.logged.get(0).endsWith(": cannot be listed."), talk.logged::toString);
    }
  }
}
