package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.eclipse.lsp4j.DefinitionParams;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.Location;
import org.eclipse.lsp4j.LocationLink;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** From a sentence to its counterpart, and what is shown of it. */
class JumpSessionTest {
  static final String WINCH_EN = Ferry.line(Ferry.EN, "The winch pulls");
  static final String WINCH_DE = Ferry.line(Ferry.DE, "Die Winde zieht");

  @TempDir Path folder;
  private Work work;

  @BeforeEach
  void work() {
    work = Work.withoutFog(folder);
  }

  @Test
  void aJumpGoesToTheCounterpartAndBack() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      LocationLink there = german.jump("410 Gliedern");
      assertEquals(work.en().toUri().toString(), there.getTargetUri());
      assertEquals(WINCH_EN, Buffer.words(Ferry.EN, there.getTargetRange()));
      assertEquals(there.getTargetRange(), there.getTargetSelectionRange());
      assertEquals(WINCH_DE, german.words(there.getOriginSelectionRange()));

      Buffer english = talk.open(work.en(), Ferry.EN);
      LocationLink back = english.jump(there.getTargetRange().getStart());
      assertEquals(german.uri, back.getTargetUri());
      assertEquals(WINCH_DE, german.words(back.getTargetRange()));
    }
  }

  @Test
  void aJumpFromAnOmittedSentenceGoesBehindTheOneBefore() {
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      LocationLink there = english.jump("thick fog");

      int end = Ferry.DE_WITHOUT_FOG.indexOf("2 Marken.") + "2 Marken.".length();
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      assertEquals(german.position(end), there.getTargetRange().getStart());
      assertEquals(german.position(end), there.getTargetRange().getEnd());
      assertEquals(Ferry.FOG_EN, english.words(there.getOriginSelectionRange()));
    }
  }

  @Test
  void everyPositionOfAPairedFileJumpsSomewhere() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), "\n" + Ferry.DE_WITHOUT_FOG + "\n\n");
      for (int offset = 0; offset <= german.text.length(); offset += 7) {
        assertEquals(1, german.links(german.position(offset)).size());
      }
      assertEquals(1, german.links(new Position(9999, 9999)).size());
    }
  }

  @Test
  void betweenParagraphsTheSentenceBeforeCounts() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      int blankLine = german.text.indexOf("\n\nDie Fahrgäste") + 1;
      LocationLink there = german.jump(german.position(blankLine));

      assertEquals(
          Ferry.line(Ferry.EN, "The keeper at the gate"),
          Buffer.words(Ferry.EN, there.getTargetRange()));
    }
  }

  @Test
  void aCodeBlockJumpsToItsTwin() {
    String code = "\n```\nwinch --slow 3\n```\n";
    work.write("en/ferry.md", Ferry.EN + code);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG + code);
      LocationLink there = german.jump("winch --slow");

      assertTrue(Buffer.words(Ferry.EN + code, there.getTargetRange()).contains("--slow 3"));
    }
  }

  @Test
  void sentencesThatShareACounterpartAreOneMatch() {
    String first = "Der letzte Wärter schließt das Tor ab.";
    String joined =
        first.replace(".", ", und ")
            + "im Winter ruht die Fähre, sobald daumendickes Eis die langsamere Hälfte des Flusses bedeckt.";
    String text =
        Ferry.DE.replace(first + "\n", "").replace(Ferry.line(Ferry.DE, "Im Winter ruht"), joined);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), text);
      Buffer english = talk.open(work.en(), Ferry.EN);

      String one = Ferry.line(Ferry.EN, "The last keeper");
      String two = Ferry.line(Ferry.EN, "In winter the");
      LocationLink there = german.jump("daumendickes");
      assertEquals(one + "\n" + two, english.words(there.getTargetRange()));
      assertEquals(List.of(one, two), english.highlighted("last keeper"));
      assertEquals(List.of(joined), german.highlighted("daumendickes"));
      assertEquals(one + " " + two, text(german.hover("daumendickes")));
      LocationLink back = english.jump("thicker than");
      assertEquals(one + "\n" + two, english.words(back.getOriginSelectionRange()));
      assertEquals(two, english.words(english.hover("thicker than").getRange()));
    }
  }

  @Test
  void aMovedSentenceLeadsToItsCounterpartBothWays() {
    String english = Ferry.line(Ferry.EN, "Report every jam");
    String german = Ferry.line(Ferry.DE, "Melden Sie");
    String text = Ferry.DE.replace(german + "\n", "").replace("An Bord", german + "\nAn Bord");
    try (Talk talk = Talk.in(folder)) {
      Buffer translation = talk.open(work.de(), text);
      Buffer source = talk.open(work.en(), Ferry.EN);
      talk.settle();
      assertEquals(List.of("order"), talk.codes(work.de()));

      LocationLink there = translation.jump("Odile Marchbanks");
      assertEquals(english, source.words(there.getTargetRange()));
      assertEquals(german, translation.words(there.getOriginSelectionRange()));
      assertEquals(english, text(translation.hover("Odile Marchbanks")));
      LocationLink back = source.jump("Odile Marchbanks");
      assertEquals(german, translation.words(back.getTargetRange()));
      assertEquals(german, text(source.hover("Odile Marchbanks")));
    }
  }

  @Test
  void aHoverShowsTheCounterpartAsPlainText() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      Hover hover = german.hover("410 Gliedern");

      assertEquals("plaintext", hover.getContents().getRight().getKind());
      assertEquals(WINCH_EN, text(hover));
      assertEquals(WINCH_DE, german.words(hover.getRange()));
    }
  }

  @Test
  void aHoverWithoutCounterpartShowsWhatIsWrong() {
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), Ferry.EN);

      assertTrue(text(english.hover("thick fog")).startsWith("Not translated into German"));
    }
  }

  @Test
  void severalLanguagesAreHeadedByTheirNames() {
    work.write("fr/ferry.md", Ferry.FR);
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), Ferry.EN);

      assertEquals(
          "German:\n" + WINCH_DE + "\n\nFrench:\n" + Ferry.line(Ferry.FR, "Le treuil tire"),
          text(english.hover("410 links")));
    }
  }

  @Test
  void ofSeveralLanguagesAJumpPrefersTheOneEditedLast() {
    work.write("fr/ferry.md", Ferry.FR);
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      assertEquals(work.de().toUri().toString(), english.jump("410").getTargetUri());

      Buffer french = talk.open(work.fr(), Ferry.FR);
      french.replace("gémit", "grince");
      assertEquals(french.uri, english.jump("410").getTargetUri());

      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      german.replace("ächzt", "stöhnt");
      assertEquals(german.uri, english.jump("410").getTargetUri());
    }
  }

  @Test
  void aClientWithoutLinksGetsALocation() {
    try (Talk talk =
        Talk.in(folder, params -> params.getCapabilities().getTextDocument().setDefinition(null))) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      List<? extends Location> locations =
          Talk.answer(
                  talk.server
                      .getTextDocumentService()
                      .definition(
                          new DefinitionParams(
                              new TextDocumentIdentifier(german.uri), new Position(3, 3))))
              .getLeft();

      assertEquals(1, locations.size());
      assertEquals(work.en().toUri().toString(), locations.get(0).getUri());
      assertEquals(
          "Two keepers work on board.", Buffer.words(Ferry.EN, locations.get(0).getRange()));
    }
  }

  @Test
  void aPositionInsideASurrogatePairMeansThePair() {
    String text = Ferry.DE_WITHOUT_FOG.replace("An Bord", "🛶 An Bord");
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), text);
      Position inside = german.position(text.indexOf("🛶") + 1);
      Range origin = german.jump(inside).getOriginSelectionRange();

      assertTrue(german.words(origin).contains("An Bord arbeiten"));
    }
  }

  @Test
  void inAFileWithCarriageReturnsJumpsLandOnTheSameWords() {
    work.write("en/ferry.md", Ferry.EN.replace("\n", "\r\n"));
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG.replace("\n", "\r\n"));
      LocationLink there = german.jump("410 Gliedern");

      assertEquals(WINCH_EN, Buffer.words(Ferry.EN, there.getTargetRange()));
      assertEquals(WINCH_DE, german.words(there.getOriginSelectionRange()));
    }
  }

  @Test
  void aFileWithoutACounterpartJumpsNowhere() {
    Path notes = work.write("notes.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      Buffer buffer = talk.open(notes, Ferry.EN);

      assertNull(buffer.jump("410"));
      assertNull(buffer.hover("410"));
      assertTrue(buffer.highlighted("410").isEmpty());
    }
  }

  static String text(Hover hover) {
    return hover.getContents().getRight().getValue();
  }
}
