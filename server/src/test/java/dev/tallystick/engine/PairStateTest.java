package dev.tallystick.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.pairing.Language;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** What becomes of results when texts move on. */
class PairStateTest {
  private static final FilePair FILES =
      new FilePair(Path.of("a.md"), Path.of("a.de.md"), new Language("en"), new Language("de"));

  private final PairState pair = new PairState(FILES);
  private final Sheet source = sheet("The bell rings.", "en");

  private static Sheet sheet(String text, String language) {
    Tongue tongue = Tongue.of(new Language(language));
    return new Sheet(new Text(text), Format.MARKDOWN, tongue, TextRules.USUAL);
  }

  private Task take(Sheet target) {
    return pair.take(Optional.of(source), Optional.of(target), true, false).orElseThrow();
  }

  private static Optional<PairResult> result(Task task) {
    return Optional.of(
        Examiner.ADAPTIVE.examine(
            task.source().reading(),
            task.target().reading(),
            task.draft(),
            task.known(),
            Cancellation.NONE));
  }

  @Test
  void aResultWhoseTextsHaveMovedOnIsDropped() {
    Task old = take(sheet("Die Glocke", "de"));
    Optional<PairResult> tooLate = result(old);
    Task now = take(sheet("Die Glocke läutet.", "de"));
    assertTrue(old.cancelled());
    pair.finish(old, tooLate);
    assertFalse(pair.settled());
    assertEquals(Optional.empty(), pair.known());

    Optional<PairResult> result = result(now);
    pair.finish(now, result);
    assertTrue(pair.settled());
    assertSame(now.target().text(), pair.known().orElseThrow().reading(FILES.target()).text());
  }

  @Test
  void theSameTextsMakeNoNewWork() {
    Sheet target = sheet("Die Glocke läutet.", "de");
    take(target);
    assertEquals(
        Optional.empty(), pair.take(Optional.of(source), Optional.of(target), true, false));
  }

  @Test
  void withoutOneTextNothingMoreIsToCome() {
    Task task = take(sheet("Die Glocke läutet.", "de"));
    assertEquals(Optional.empty(), pair.take(Optional.of(source), Optional.empty(), true, false));
    assertTrue(pair.settled());
    assertTrue(task.cancelled());
  }

  @Test
  void anOutdatedSheetIsNotReadAnyMore() {
    Sheet target = sheet("Die Glocke läutet.", "de");
    Task task = take(target);
    target.outdate();
    assertTrue(task.cancelled());
    assertThrows(Cancellation.Cancelled.class, target::reading);
  }

  @Test
  void whatWasJudgedByEarlierTextsIsLearntFromAtRest() {
    Task first = take(sheet("Die Glocke läutet.", "de"));
    pair.finish(first, result(first));
    assertEquals(Optional.empty(), pair.rest());

    Sheet edited = sheet("Die Glocke läutet jetzt.", "de");
    Task typed = pair.take(Optional.of(source), Optional.of(edited), true, true).orElseThrow();
    assertTrue(typed.known().isPresent());
    assertEquals(Optional.empty(), pair.rest());
    pair.finish(typed, result(typed));
    assertTrue(pair.settled());

    Task learning = pair.rest().orElseThrow();
    assertEquals(Optional.empty(), learning.known());
    assertEquals(Optional.empty(), pair.rest());
    assertTrue(pair.settled());
    pair.finish(learning, result(learning));
    assertEquals(Optional.empty(), pair.rest());
    assertFalse(pair.known().orElseThrow().result().provisional());
  }
}
