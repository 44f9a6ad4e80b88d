package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.DocumentSymbol;
import org.eclipse.lsp4j.DocumentSymbolParams;
import org.eclipse.lsp4j.SymbolInformation;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.jsonrpc.messages.Either;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The headings of a text, and how much below each is matched. */
@SuppressWarnings("deprecation") // older clients take the list only
class OutlineSessionTest {
  private static final String EN =
      Ferry.EN
          .replace("\nPassengers pay", "\n## Tokens *and* tolls\n\nPassengers pay")
          .replace("\nAt the end", "\n```\nwinch --slow 3\n```\n\n## The night\n\nAt the end");

  private static final String DE =
      Ferry.DE_WITHOUT_FOG
          .replace("\nDie Fahrgäste", "\n## Marken *und* Preise\n\nDie Fahrgäste")
          .replace("\nAm Ende", "\n```\nwinch --slow 3\n```\n\n## Die Nacht\n\nAm Ende");

  @TempDir Path folder;
  private Work work;

  @BeforeEach
  void work() {
    work = new Work(folder);
    work.write("en/ferry.md", EN);
    work.write("de/ferry.md", DE);
  }

  private static CompletableFuture<List<Either<SymbolInformation, DocumentSymbol>>> ask(
      Talk talk, Buffer buffer) {
    return talk.server
        .getTextDocumentService()
        .documentSymbol(new DocumentSymbolParams(new TextDocumentIdentifier(buffer.uri)));
  }

  private static List<DocumentSymbol> tree(Talk talk, Buffer buffer) {
    return Talk.answer(ask(talk, buffer)).stream().map(Either::getRight).toList();
  }

  /** Each with its detail, those inside indented. */
  private static List<String> shown(List<DocumentSymbol> symbols, String indent) {
    List<String> lines = new ArrayList<>();
    for (DocumentSymbol symbol : symbols) {
      lines.add(indent + symbol.getName() + " - " + symbol.getDetail());
      lines.addAll(shown(symbol.getChildren(), indent + "  "));
    }
    return lines;
  }

  @Test
  void headingsTellHowMuchOfTheirSectionIsMatched() {
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), EN);
      Buffer german = talk.open(work.de(), DE);

      assertEquals(
          List.of(
              "The chain ferry - 16 of 17 sentences matched, 1 missing",
              "  Tokens and tolls - 5 of 6 sentences matched, 1 missing",
              "  The night - 5 of 5 sentences matched"),
          shown(tree(talk, english), ""));
      assertEquals(
          List.of(
              "Die Kettenfähre - 16 of 16 sentences matched, 1 missing",
              "  Marken und Preise - 5 of 5 sentences matched, 1 missing",
              "  Die Nacht - 5 of 5 sentences matched"),
          shown(tree(talk, german), ""));
    }
  }

  @Test
  void aRangeIsTheSectionAndItsSelectionTheHeading() {
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), EN);
      DocumentSymbol ferry = tree(talk, english).get(0);
      DocumentSymbol tokens = ferry.getChildren().get(0);

      assertEquals(EN, english.words(ferry.getRange()));
      assertEquals("# The chain ferry", english.words(ferry.getSelectionRange()));
      assertEquals(
          EN.substring(EN.indexOf("## Tokens"), EN.indexOf("## The night")),
          english.words(tokens.getRange()));
      assertEquals("## Tokens *and* tolls", english.words(tokens.getSelectionRange()));
    }
  }

  @Test
  void severalLanguagesAreCountedEach() {
    work.write("fr/ferry.md", Ferry.FR);
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), EN);

      assertEquals(
          "German: 16 of 17 sentences matched, 1 missing; French: 15 of 17 sentences matched, 2 missing",
          tree(talk, english).get(0).getDetail());
    }
  }

  @Test
  void headingsThatSkipALevelOrGoUpAreWhereTheyBelong() {
    String text = "## Bow\n\n#### Rope\n\n### Knot\n\n# Stern\n\nIt leaks.\n";
    work.write("en/boat.md", text);
    Path file = work.write("de/boat.md", text);
    try (Talk talk = Talk.in(folder)) {
      assertEquals(
          List.of(
              "Bow - 3 of 3 sentences matched",
              "  Rope - 1 of 1 sentence matched",
              "  Knot - 1 of 1 sentence matched",
              "Stern - 2 of 2 sentences matched"),
          shown(tree(talk, talk.open(file, text)), ""));
    }
  }

  @Test
  void theOutlineWaitsForTheTextAfterTheEdit() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), DE);
      talk.settle();
      talk.machine.hold();
      german.type("Die Nacht", "Bei Nacht");
      var asked = ask(talk, german);
      talk.barrier();
      assertFalse(asked.isDone());

      talk.machine.release();
      DocumentSymbol ferry = Talk.answer(asked).get(0).getRight();
      assertEquals("Bei Nacht", ferry.getChildren().get(1).getName());
    }
  }

  @Test
  void aClientWithoutTreesGetsAList() {
    try (Talk talk =
        Talk.in(
            folder, params -> params.getCapabilities().getTextDocument().setDocumentSymbol(null))) {
      assertTrue(talk.initialized.getCapabilities().getDocumentSymbolProvider().getLeft());
      Buffer english = talk.open(work.en(), EN);
      List<SymbolInformation> list =
          Talk.answer(ask(talk, english)).stream().map(Either::getLeft).toList();

      assertEquals(
          List.of(
              "null/The chain ferry",
              "The chain ferry/Tokens and tolls",
              "The chain ferry/The night"),
          list.stream().map(one -> one.getContainerName() + "/" + one.getName()).toList());
      assertEquals(english.uri, list.get(1).getLocation().getUri());
      assertTrue(english.words(list.get(2).getLocation().getRange()).startsWith("## The night"));
    }
  }

  @Test
  void aFileWithoutACounterpartHasNoOutline() {
    Path notes = work.write("notes.md", EN);
    try (Talk talk = Talk.in(folder)) {
      assertTrue(tree(talk, talk.open(notes, EN)).isEmpty());
    }
  }
}
