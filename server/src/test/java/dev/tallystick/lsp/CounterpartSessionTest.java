package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import com.google.gson.Gson;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.TextDocumentPositionParams;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The request for the counterpart of a place. */
class CounterpartSessionTest {
  @TempDir Path folder;
  private Work work;

  @BeforeEach
  void work() {
    work = Work.withoutFog(folder);
  }

  private static CompletableFuture<List<Placed>> ask(Talk talk, String uri, Position position) {
    return talk.server.counterpart(
        new TextDocumentPositionParams(new TextDocumentIdentifier(uri), position));
  }

  private static List<Placed> at(Talk talk, Buffer buffer, String words) {
    return Talk.answer(ask(talk, buffer.uri, buffer.position(buffer.text.indexOf(words))));
  }

  private static List<String> words(String text, List<Range> ranges) {
    return ranges.stream().map(range -> Buffer.words(text, range)).toList();
  }

  @Test
  void theAnswerHasTheFieldsThatAreWrittenDown() {
    Range range = new Range(new Position(1, 0), new Position(1, 4));
    String place = "{\"start\":{\"line\":1,\"character\":0},\"end\":{\"line\":1,\"character\":4}}";
    assertEquals(
        "{\"uri\":\"file:///a.md\",\"language\":\"en\",\"state\":\"matched\",\"spans\":["
            + place
            + "],\"counterpart\":["
            + place
            + "]}",
        new Gson()
            .toJson(new Placed("file:///a.md", "en", "matched", List.of(range), List.of(range))));
  }

  @Test
  void aMatchIsToldFromBothSides() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      Buffer english = talk.open(work.en(), Ferry.EN);
      Placed there = at(talk, german, "410 Gliedern").get(0);
      assertEquals(english.uri, there.uri());
      assertEquals("en", there.language());
      assertEquals("matched", there.state());
      assertEquals(List.of(JumpSessionTest.WINCH_DE), words(german.text, there.spans()));
      assertEquals(List.of(JumpSessionTest.WINCH_EN), words(english.text, there.counterpart()));

      Placed back = at(talk, english, "410 links").get(0);
      assertEquals("de", back.language());
      assertEquals(there.counterpart(), back.spans());
      assertEquals(there.spans(), back.counterpart());
    }
  }

  @Test
  void aMissingSentenceHasTheNearestPlace() {
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      Placed placed = at(talk, english, "thick fog").get(0);

      int end = Ferry.DE_WITHOUT_FOG.indexOf("2 Marken.") + "2 Marken.".length();
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      Position gap = german.position(end);
      assertEquals("missing", placed.state());
      assertEquals(List.of(Ferry.FOG_EN), words(english.text, placed.spans()));
      assertEquals(List.of(new Range(gap, gap)), placed.counterpart());
    }
  }

  @Test
  void aSentenceTooManyHasOneToo() {
    String cat = "Im Hafen schläft ein roter Kater unter dem großen Kran.";
    String text = Ferry.DE.replace("Vor der", cat + "\nVor der");
    try (Talk talk = Talk.in(folder)) {
      Placed placed = at(talk, talk.open(work.de(), text), "roter Kater").get(0);

      assertEquals("added", placed.state());
      assertEquals(List.of(""), words(Ferry.EN, placed.counterpart()));
      assertEquals(
          JumpSessionTest.WINCH_EN,
          Ferry.EN.lines().toList().get(placed.counterpart().get(0).getStart().getLine()));
    }
  }

  @Test
  void whatIsStillToComeIsPending() {
    String text = Ferry.DE.substring(0, Ferry.DE.indexOf("Der letzte Wärter"));
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), text);
      Buffer english = talk.open(work.en(), Ferry.EN);
      Placed placed = at(talk, english, "A lantern").get(0);

      assertEquals("pending", placed.state());
      assertEquals(List.of(""), words(text, placed.counterpart()));
      assertEquals(text.lines().count() - 1, placed.counterpart().get(0).getStart().getLine());
    }
  }

  @Test
  void anUntouchedCopyIsPendingAtTheEndAndUntranslatedInTheMidst() {
    String lantern = Ferry.line(Ferry.EN, "A lantern");
    String text =
        Ferry.DE
            .replace(Ferry.FOG_DE, Ferry.FOG_EN)
            .replace(Ferry.line(Ferry.DE, "Eine Laterne"), lantern);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), text);
      Buffer english = talk.open(work.en(), Ferry.EN);
      for (Buffer side : List.of(german, english)) {
        Placed fog = at(talk, side, "thick fog").get(0);
        assertEquals("untranslated", fog.state());
        assertEquals(List.of(Ferry.FOG_EN), words(side.text, fog.spans()));
        Placed last = at(talk, side, "A lantern").get(0);
        assertEquals("pending", last.state());
        Buffer other = side == german ? english : german;
        assertEquals(List.of(lantern), words(other.text, last.counterpart()));
      }
    }
  }

  @Test
  void aMovedSentenceLeadsToItsCounterpart() {
    String line = Ferry.line(Ferry.DE, "Melden Sie");
    String text = Ferry.DE.replace(line + "\n", "").replace("An Bord", line + "\nAn Bord");
    try (Talk talk = Talk.in(folder)) {
      Placed placed = at(talk, talk.open(work.de(), text), "Odile").get(0);
      assertEquals("moved", placed.state());
      assertEquals(
          List.of(Ferry.line(Ferry.EN, "Report every jam")), words(Ferry.EN, placed.counterpart()));
    }
  }

  @Test
  void severalLanguagesAreSortedByTheirTags() {
    work.write("fr/ferry.md", Ferry.FR);
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      List<Placed> all = at(talk, english, "thick fog");

      assertEquals(List.of("de", "fr"), all.stream().map(Placed::language).toList());
      assertEquals(List.of("missing", "matched"), all.stream().map(Placed::state).toList());
      assertEquals(List.of(Ferry.FOG_FR), words(Ferry.FR, all.get(1).counterpart()));
    }
  }

  @Test
  void columnsAreCountedAsTheClientDoesAndNeverInsideACharacter() {
    String title = "# 🛶 Die Kettenfähre 🛶";
    String text = Ferry.DE_WITHOUT_FOG.replace("# Die Kettenfähre", title);
    for (String encoding : List.of("utf-16", "utf-8")) {
      try (Talk talk = Talk.in(folder, params -> LifecycleSessionTest.offer(params, encoding))) {
        Buffer german = talk.open(work.de(), text);
        boolean bytes = encoding.equals("utf-8");
        int end = bytes ? title.getBytes(StandardCharsets.UTF_8).length : title.length();
        List<Range> whole = List.of(new Range(new Position(0, 2), new Position(0, end)));
        for (int column = 2; column <= end; column++) {
          assertEquals(
              whole, Talk.answer(ask(talk, german.uri, new Position(0, column))).get(0).spans());
        }
      }
    }
  }

  @Test
  void aTranslationThatIsStillEmptyIsPending() {
    work.write("de/ferry.md", "");
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), "");
      Placed placed = Talk.answer(ask(talk, german.uri, new Position(0, 0))).get(0);

      assertEquals("pending", placed.state());
      assertEquals(List.of(), placed.spans());
      assertEquals(
          List.of(new Range(new Position(0, 0), new Position(0, 0))), placed.counterpart());
    }
  }

  @Test
  void theAnswerWaitsForTheTextAfterTheEdit() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      talk.machine.hold();
      german.type("# Die Kettenfähre\n", "# Die Kettenfähre\n\n");
      var asked = ask(talk, german.uri, new Position(4, 0));
      talk.barrier();
      assertFalse(asked.isDone());

      talk.machine.release();
      Placed placed = Talk.answer(asked).get(0);
      assertEquals(List.of("Two keepers work on board."), words(Ferry.EN, placed.counterpart()));
    }
  }

  @Test
  void aFileInNoPairHasNone() {
    Path notes = work.write("notes.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      assertEquals(List.of(), at(talk, talk.open(notes, Ferry.EN), "410"));
    }
  }
}
