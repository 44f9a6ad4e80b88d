package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotSame;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;

import dev.tallystick.engine.Examiner;
import dev.tallystick.engine.Reading;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** How much work an edit makes. */
class WorkSessionTest {
  @TempDir Path folder;

  /** The texts of one examination. */
  private record Seen(Reading source, Reading target) {}

  private static List<Seen> watch(Talk talk) {
    List<Seen> seen = new CopyOnWriteArrayList<>();
    talk.machine.examiner =
        (source, target, draft, known, cancellation) -> {
          seen.add(new Seen(source, target));
          return Examiner.ADAPTIVE.examine(source, target, draft, known, cancellation);
        };
    return seen;
  }

  @Test
  void anEditOfOneSideReadsThatSideOnly() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      List<Seen> seen = watch(talk);
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      german.replace("Winter", "Frost");

      assertEquals(2, seen.size());
      assertSame(seen.get(0).source(), seen.get(1).source());
      assertNotSame(seen.get(0).target(), seen.get(1).target());
    }
  }

  @Test
  void aSourceIsReadOnceForAllItsTranslations() {
    Work work = Work.withoutFog(folder);
    work.write("fr/ferry.md", Ferry.FR);
    try (Talk talk = Talk.in(folder)) {
      List<Seen> seen = watch(talk);
      talk.open(work.en(), Ferry.EN);
      talk.settle();

      assertEquals(2, seen.size());
      assertSame(seen.get(0).source(), seen.get(1).source());
    }
  }

  @Test
  void aTextThatHasMovedOnIsNotExamined() {
    Work work = Work.withoutFog(folder);
    Path alone = work.write("notes.md", "Nothing.");
    try (Talk talk = Talk.in(folder)) {
      List<Seen> seen = watch(talk);
      talk.machine.hold();
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      german.type("Winter", "Frost");
      german.type("Trommel", "Walze");
      Buffer notes = talk.open(alone, "Nothing."); // its turn comes after
      assertNull(Talk.answer(notes.ask("Nothing")));
      talk.machine.release();
      talk.settle();

      assertEquals(1, seen.size());
      assertEquals(german.text, seen.get(0).target().text().string());
    }
  }

  @Test
  void openingAFileWithTheTextOfTheDiskMakesNoWork() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      List<Seen> seen = watch(talk);
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      Buffer english = talk.open(work.en(), Ferry.EN);
      talk.settle();
      english.close();

      assertEquals(1, seen.size());
    }
  }

  @Test
  void aPairThatNobodyLooksAtAnyMoreIsNotExamined() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      List<Seen> seen = watch(talk);
      talk.machine.hold();
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      german.closeNow();
      assertNull(Talk.answer(german.ask("Winter"))); // its turn comes after
      talk.machine.release();
      talk.settle();

      assertEquals(List.of(), seen);
      assertEquals(List.of(), talk.codes(work.en()));
    }
  }
}
