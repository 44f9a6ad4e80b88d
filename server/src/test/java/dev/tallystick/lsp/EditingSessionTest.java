package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.FileChangeType;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What happens while the translator types. */
class EditingSessionTest {
  @TempDir Path folder;
  private Work work;

  @BeforeEach
  void work() {
    work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN);
    work.write("de/ferry.md", Ferry.DE);
  }

  @Test
  void aFindingIsWithdrawnAtOnceWhenItsSentenceIsTranslated() {
    work.write("de/ferry.md", Ferry.DE_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.de()));

      german.replace("2 Marken.\n", "2 Marken.\n" + Ferry.FOG_DE + "\n");

      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals(List.of(), talk.codes(work.en()));
      PublishDiagnosticsParams last = last(talk, german.uri);
      assertEquals(2, last.getVersion());
    }
  }

  @Test
  void aNewFindingOnTheEditedSentenceWaitsForARest() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      german.replace(Ferry.FOG_DE + "\n", "");
      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals(List.of(), talk.codes(work.en()));

      talk.pass(1499);
      assertEquals(List.of(), talk.codes(work.en()));

      talk.pass(1);
      assertEquals(List.of("omission"), talk.codes(work.de()));
      assertEquals(List.of("omission"), talk.codes(work.en()));
      assertEquals(2, last(talk, german.uri).getVersion());
    }
  }

  @Test
  void everyEditStartsTheRestAnew() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      german.replace(Ferry.FOG_DE + "\n", "");
      talk.pass(1000);
      german.replace("2 Marken.", "zwei Marken.");
      talk.pass(1000);
      assertEquals(List.of(), talk.codes(work.en()));

      talk.pass(500);
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aNewFindingOnTheEditedSentenceComesWithASave() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      german.replace(Ferry.FOG_DE + "\n", "");
      assertEquals(List.of(), talk.codes(work.en()));

      talk.save(german.uri);

      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aNewFindingOnTheEditedSentenceComesWithAnEditElsewhere() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      german.replace(Ferry.FOG_DE + "\n", "");
      assertEquals(List.of(), talk.codes(work.en()));

      german.replace("Laterne", "Leuchte");

      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aNewFindingOnAnEditedSourceSentenceWaitsToo() {
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      String added =
          "A stuffed pike above the office door reminds every passenger that the river has its own opinions about them.";
      english.replace(Ferry.FOG_EN, Ferry.FOG_EN + "\n" + added);
      assertEquals(List.of(), talk.codes(work.en()));

      talk.pass(1500);
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aFindingThatIsShownStaysWhileItsSentenceIsEdited() {
    work.write("de/ferry.md", Ferry.DE_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      talk.settle();
      english.replace("rung once a minute", "rung once each minute");

      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aClientThatAlwaysSendsTheWholeTextIsServedTheSame() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      german.whole(Ferry.DE_WITHOUT_FOG);
      assertEquals(List.of(), talk.codes(work.de()));
      german.whole(Ferry.DE_WITHOUT_FOG.replace("Laterne", "Leuchte"));
      assertEquals(List.of("omission"), talk.codes(work.de()));
      german.whole(Ferry.DE);
      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals(4, last(talk, german.uri).getVersion());
    }
  }

  @Test
  void fastEditsEndInAPublishOfTheLast() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      german.type("Winter", "Frost");
      german.type("Laterne", "Leuchte");
      german.type(Ferry.FOG_DE + "\n", "");
      german.type("Trommel", "Walze");
      talk.settle();

      assertEquals(5, last(talk, german.uri).getVersion());
      assertEquals(List.of("omission"), talk.codes(work.de()));
      assertEquals("Marken", german.words(talk.shown(work.de()).get(0).getRange()));
    }
  }

  @Test
  void anEditThatDoesNotFitWithdrawsTheFindingsAndSaysSoOnce() {
    work.write("de/ferry.md", Ferry.DE_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      Range backwards = new Range(new Position(5, 0), new Position(4, 0));
      german.change(new TextDocumentContentChangeEvent(backwards, "x"));
      german.change(new TextDocumentContentChangeEvent(backwards, "x"));
      talk.settle();

      assertEquals(List.of(), talk.codes(work.de()));
      assertEquals(List.of(), talk.codes(work.en()));
      assertEquals(1, talk.said.size());
      assertTrue(talk.said.get(0).contains("ferry.md"));
      assertTrue(talk.said.get(0).contains("close and reopen the file"));

      german.whole(Ferry.DE_WITHOUT_FOG);
      assertEquals(List.of("omission"), talk.codes(work.en()));
      assertEquals(4, last(talk, german.uri).getVersion());
    }
  }

  @Test
  void editsInTextWithEmojiLandWhereTheEditorPutThem() {
    String german = Ferry.DE_WITHOUT_FOG.replace("Karren kosten", "🐴🛶 Karren kosten");
    try (Talk talk = Talk.in(folder)) {
      Buffer buffer = talk.open(work.de(), german);
      buffer.replace("Karren kosten 2 Marken.", "Karren kosten 🪙 2 Münzen 🪙.");
      talk.pass(1500);

      Diagnostic gap = FindingsSessionTest.only(talk.shown(work.de()));
      assertEquals("Münzen", buffer.words(gap.getRange()));
    }
  }

  @Test
  void carriageReturnsShiftNothing() {
    String german = Ferry.DE_WITHOUT_FOG.replace("\n", "\r\n");
    work.write("en/ferry.md", Ferry.EN.replace("\n", "\r\n"));
    try (Talk talk = Talk.in(folder)) {
      Buffer buffer = talk.open(work.de(), german);
      talk.settle();

      assertEquals("Marken", buffer.words(talk.shown(work.de()).get(0).getRange()));
      Range source = talk.shown(work.en()).get(0).getRange();
      assertEquals(Ferry.FOG_EN, Buffer.words(Ferry.EN, source));

      buffer.replace("2 Marken.\r\n", "2 Marken.\r\n" + Ferry.FOG_DE + "\r\n");
      assertEquals(List.of(), talk.codes(work.de()));
    }
  }

  @Test
  void aByteOrderMarkInTheEditorIsNoText() {
    work.write("en/ferry.md", "\uFEFF" + Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      Buffer buffer = talk.open(work.de(), "\uFEFF" + Ferry.DE_WITHOUT_FOG);
      talk.settle();

      assertEquals("Marken", buffer.words(talk.shown(work.de()).get(0).getRange()));
      assertEquals(1, talk.shown(work.en()).size());
    }
  }

  /** Neovim and eglot drop the mark, Emacs sends other line ends than the file has. */
  @Test
  void anEditorThatDropsTheMarkAndChangesTheLineEndsIsServedTheSame() {
    work.write("en/ferry.md", "\uFEFF" + Ferry.EN.replace("\n", "\r\n"));
    work.write("de/ferry.md", "\uFEFF" + Ferry.DE_WITHOUT_FOG.replace("\n", "\r\n"));
    try (Talk talk = Talk.in(folder)) {
      Buffer buffer = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals("Marken", buffer.words(talk.shown(work.de()).get(0).getRange()));
      assertEquals(Ferry.FOG_EN, Buffer.words(Ferry.EN, talk.shown(work.en()).get(0).getRange()));

      talk.wrote(FileChangeType.Changed, work.de());
      assertEquals("Marken", buffer.words(talk.shown(work.de()).get(0).getRange()));

      buffer.replace("2 Marken.\n", "2 Marken.\n" + Ferry.FOG_DE + "\n");
      assertEquals(List.of(), talk.codes(work.de()));
    }
  }

  private static PublishDiagnosticsParams last(Talk talk, String uri) {
    List<PublishDiagnosticsParams> all = talk.all(uri);
    return all.get(all.size() - 1);
  }
}
