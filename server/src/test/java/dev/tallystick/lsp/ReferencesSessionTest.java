package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import org.eclipse.lsp4j.Location;
import org.eclipse.lsp4j.ReferenceContext;
import org.eclipse.lsp4j.ReferenceParams;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A sentence in all the languages of its file. */
class ReferencesSessionTest {
  private static final String WINCH_FR = Ferry.line(Ferry.FR, "Le treuil tire");

  @TempDir Path folder;
  private Work work;
  private Buffer english;
  private Buffer german;
  private Buffer french;

  @BeforeEach
  void work() {
    work = Work.withoutFog(folder);
    work.write("fr/ferry.md", Ferry.FR);
  }

  private void open(Talk talk) {
    english = talk.open(work.en(), Ferry.EN);
    german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
    french = talk.open(work.fr(), Ferry.FR);
  }

  private static CompletableFuture<List<? extends Location>> ask(
      Talk talk, Buffer buffer, String words, boolean itself) {
    return talk.server
        .getTextDocumentService()
        .references(
            new ReferenceParams(
                new TextDocumentIdentifier(buffer.uri),
                buffer.position(buffer.text.indexOf(words)),
                new ReferenceContext(itself)));
  }

  private List<String> words(List<? extends Location> locations) {
    List<String> words = new ArrayList<>();
    for (Location location : locations) {
      for (Buffer buffer : List.of(english, german, french)) {
        if (buffer.uri.equals(location.getUri())) {
          words.add(buffer.words(location.getRange()));
        }
      }
    }
    return words;
  }

  private List<String> others(Talk talk, Buffer buffer, String words) {
    return words(Talk.answer(ask(talk, buffer, words, false)));
  }

  private List<String> all(Talk talk, Buffer buffer, String words) {
    return words(Talk.answer(ask(talk, buffer, words, true)));
  }

  @Test
  void fromTheSourceAllTranslationsAreReached() {
    try (Talk talk = Talk.in(folder)) {
      open(talk);

      List<String> translations = List.of(JumpSessionTest.WINCH_DE, WINCH_FR);
      assertEquals(translations, others(talk, english, "410 links"));
      List<String> all = new ArrayList<>(translations);
      all.add(0, JumpSessionTest.WINCH_EN);
      assertEquals(all, all(talk, english, "410 links"));
    }
  }

  @Test
  void fromATranslationTheSourceAndTheOtherTranslationsAreReached() {
    try (Talk talk = Talk.in(folder)) {
      open(talk);

      assertEquals(
          List.of(JumpSessionTest.WINCH_EN, WINCH_FR), others(talk, german, "410 Gliedern"));
      assertEquals(
          List.of(WINCH_FR, JumpSessionTest.WINCH_EN, JumpSessionTest.WINCH_DE),
          all(talk, french, "410 maillons"));
    }
  }

  @Test
  void aLanguageThatLacksTheSentenceIsLeftOut() {
    try (Talk talk = Talk.in(folder)) {
      open(talk);

      assertEquals(List.of(Ferry.FOG_FR), others(talk, english, "thick fog"));
      assertEquals(List.of(Ferry.FOG_EN), others(talk, french, "brouillard"));
    }
  }

  @Test
  void aSentenceThatStandsForTwoLeadsToBothInEveryLanguage() {
    String first = "Der letzte Wärter schließt das Tor ab.";
    String second = Ferry.line(Ferry.DE, "Im Winter ruht");
    String joined = first.replace(".", ", und ") + second.replace("Im", "im");
    try (Talk talk = Talk.in(folder)) {
      open(talk);
      german.whole(Ferry.DE_WITHOUT_FOG.replace(first + "\n" + second, joined));

      assertEquals(
          List.of(
              Ferry.line(Ferry.EN, "The last keeper") + "\n" + Ferry.line(Ferry.EN, "In winter"),
              Ferry.line(Ferry.FR, "Le dernier gardien"),
              Ferry.line(Ferry.FR, "En hiver")),
          others(talk, german, "daumendickes"));
      assertEquals(
          Ferry.line(Ferry.EN, "The last keeper") + "\n" + Ferry.line(Ferry.EN, "In winter"),
          all(talk, english, "In winter").get(0));
    }
  }

  @Test
  void theOtherTranslationsAreWaitedForAndTheirEditsOutdateTheQuestion() {
    try (Talk talk = Talk.in(folder)) {
      open(talk);
      talk.settle();
      talk.machine.hold();
      french.type("gémit", "grince");
      CompletableFuture<List<? extends Location>> asked = ask(talk, german, "410", false);
      talk.barrier();
      assertFalse(asked.isDone());

      french.type("grince", "gémit");
      assertThrows(CompletionException.class, () -> Talk.answer(asked));
    }
  }

  @Test
  void aFileWithoutACounterpartIsMentionedNowhere() {
    Path notes = work.write("notes.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      assertTrue(talk.initialized.getCapabilities().getReferencesProvider().getLeft());
      Buffer buffer = talk.open(notes, Ferry.EN);
      assertTrue(Talk.answer(ask(talk, buffer, "410", true)).isEmpty());
    }
  }
}
