package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.eclipse.lsp4j.CodeLens;
import org.eclipse.lsp4j.CodeLensParams;
import org.eclipse.lsp4j.CodeLensWorkspaceCapabilities;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.InlayHint;
import org.eclipse.lsp4j.InlayHintParams;
import org.eclipse.lsp4j.InlayHintWorkspaceCapabilities;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.WorkspaceClientCapabilities;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Figures in the text: above the lines, and behind them. */
class ViewsSessionTest {
  private static final String EN =
      Ferry.EN
          .replace("\nPassengers pay", "\n## Tokens\n\nPassengers pay")
          .replace("\nAt the end", "\n## The night\n\nAt the end");

  private static final String DE =
      Ferry.DE_WITHOUT_FOG
          .replace("\nDie Fahrgäste", "\n## Marken\n\nDie Fahrgäste")
          .replace("\nAm Ende", "\n## Die Nacht\n\nAm Ende");

  static final Range ALL = new Range(new Position(0, 0), new Position(9999, 0));

  @TempDir Path folder;
  private Work work;

  @BeforeEach
  void work() {
    work = new Work(folder);
    work.write("en/ferry.md", EN);
    work.write("de/ferry.md", DE);
  }

  private static void refreshes(InitializeParams params) {
    WorkspaceClientCapabilities workspace = params.getCapabilities().getWorkspace();
    workspace.setCodeLens(new CodeLensWorkspaceCapabilities(true));
    workspace.setInlayHint(new InlayHintWorkspaceCapabilities(true));
  }

  private static void showsBoth(InitializeParams params) {
    refreshes(params);
    params.setInitializationOptions(Map.of("lens", true, "inlay", true));
  }

  static List<? extends CodeLens> lenses(Talk talk, Buffer buffer) {
    return Talk.answer(
        talk.server
            .getTextDocumentService()
            .codeLens(new CodeLensParams(new TextDocumentIdentifier(buffer.uri))));
  }

  static List<InlayHint> hints(Talk talk, Buffer buffer, Range range) {
    return Talk.answer(
        talk.server
            .getTextDocumentService()
            .inlayHint(new InlayHintParams(new TextDocumentIdentifier(buffer.uri), range)));
  }

  /** Each with the line that it stands above. */
  private static List<String> above(Talk talk, Buffer buffer) {
    List<String> lines = buffer.text.lines().toList();
    return lenses(talk, buffer).stream()
        .map(
            lens ->
                lens.getCommand().getTitle()
                    + " > "
                    + lines.get(lens.getRange().getStart().getLine()))
        .toList();
  }

  @Test
  void aLensAtTheTopCountsTheFileAndOneAtEachHeadingItsSection() {
    try (Talk talk = Talk.in(folder, ViewsSessionTest::showsBoth)) {
      Buffer english = talk.open(work.en(), EN);
      assertEquals(
          List.of(
              "Whole file: 16 of 17 sentences matched, 1 missing > # The chain ferry",
              "5 of 6 sentences matched, 1 missing > ## Tokens",
              "5 of 5 sentences matched > ## The night"),
          above(talk, english));
      for (CodeLens lens : lenses(talk, english)) {
        assertEquals("", lens.getCommand().getCommand());
        assertEquals(lens.getRange().getStart(), lens.getRange().getEnd());
      }
    }
  }

  @Test
  void inATranslationTheSentencesThatAreToComeAreNamed() {
    String cat = "Im Hafen schläft ein roter Kater unter dem großen Kran.\n";
    String text =
        DE.substring(0, DE.indexOf("Der letzte Wärter")).replace("Vor der", cat + "Vor der");
    try (Talk talk = Talk.in(folder, ViewsSessionTest::showsBoth)) {
      Buffer german = talk.open(work.de(), text);

      assertEquals(
          List.of(
              "Whole file: 13 of 14 sentences matched, 1 missing, 1 added, 3 pending"
                  + " > # Die Kettenfähre",
              "5 of 5 sentences matched, 1 missing > ## Marken",
              "2 of 2 sentences matched, 3 pending > ## Die Nacht"),
          above(talk, german));
    }
  }

  @Test
  void untouchedCopiesAtTheEndArePendingOnBothSides() {
    String rest = EN.substring(EN.indexOf("The last keeper"));
    String text = DE.substring(0, DE.indexOf("Der letzte Wärter")) + rest;
    try (Talk talk = Talk.in(folder, ViewsSessionTest::showsBoth)) {
      Buffer german = talk.open(work.de(), text);
      Buffer english = talk.open(work.en(), EN);

      String night = "2 of 5 sentences matched, 3 pending > ## ";
      assertEquals(night + "Die Nacht", above(talk, german).get(2));
      assertEquals(night + "The night", above(talk, english).get(2));
    }
  }

  @Test
  void oneSentenceIsOneSentence() {
    work.write("en/buoy.md", "# Buoy\n\n## Bell\n");
    Path german = work.write("de/buoy.md", "# Boje\n\n## Glocke\n");
    try (Talk talk = Talk.in(folder, ViewsSessionTest::showsBoth)) {
      assertEquals(
          List.of(
              "Whole file: 2 of 2 sentences matched > # Boje",
              "1 of 1 sentence matched > ## Glocke"),
          above(talk, talk.open(german, "# Boje\n\n## Glocke\n")));
    }
  }

  @Test
  void aTitleThatIsNotTheWholeFileHasItsOwnFigures() {
    work.write("en/buoy.md", "# Buoy\n\n# Bell\n");
    Path german = work.write("de/buoy.md", "# Boje\n\n# Glocke\n");
    try (Talk talk = Talk.in(folder, ViewsSessionTest::showsBoth)) {
      assertEquals(
          List.of(
              "Whole file: 2 of 2 sentences matched > # Boje",
              "1 of 1 sentence matched > # Boje",
              "1 of 1 sentence matched > # Glocke"),
          above(talk, talk.open(german, "# Boje\n\n# Glocke\n")));
    }
  }

  @Test
  void severalLanguagesAreNamed() {
    work.write("fr/ferry.md", Ferry.FR);
    try (Talk talk = Talk.in(folder, ViewsSessionTest::showsBoth)) {
      assertEquals(
          "Whole file: German: 16 of 17 sentences matched, 1 missing;"
              + " French: 15 of 17 sentences matched, 2 missing > # The chain ferry",
          above(talk, talk.open(work.en(), EN)).get(0));
    }
  }

  @Test
  void hintsStandBehindTheLinesOfTheRangeThatIsAskedFor() {
    try (Talk talk = Talk.in(folder, ViewsSessionTest::showsBoth)) {
      Buffer english = talk.open(work.en(), EN);
      List<InlayHint> all = hints(talk, english, ALL);
      assertEquals(
          List.of(
              "Whole file: 16 of 17 sentences matched, 1 missing",
              "5 of 6 sentences matched, 1 missing",
              "5 of 5 sentences matched"),
          all.stream().map(hint -> hint.getLabel().getLeft()).toList());
      Position end = english.position(EN.indexOf("## Tokens") + "## Tokens".length());
      assertEquals(end, all.get(1).getPosition());

      Range one = new Range(new Position(end.getLine(), 3), new Position(end.getLine(), 4));
      assertEquals(List.of(all.get(1)), hints(talk, english, one));
    }
  }

  @Test
  void behindAnEmojiAHintStandsWhereTheClientCountsIt() {
    for (String encoding : List.of("utf-16", "utf-8")) {
      try (Talk talk =
          Talk.in(
              folder,
              params -> {
                showsBoth(params);
                LifecycleSessionTest.offer(params, encoding);
              })) {
        Buffer english = talk.open(work.en(), EN.replace("## Tokens", "## Tokens 🪙"));
        int bytes = "## Tokens 🪙".getBytes(StandardCharsets.UTF_8).length;
        int units = "## Tokens 🪙".length();
        assertEquals(
            encoding.equals("utf-8") ? bytes : units,
            hints(talk, english, ALL).get(1).getPosition().getCharacter());
      }
    }
  }

  @Test
  void bothAreOffUntilTheUserSetsThem() {
    try (Talk talk = Talk.in(folder, ViewsSessionTest::refreshes)) {
      assertFalse(talk.initialized.getCapabilities().getCodeLensProvider().getResolveProvider());
      assertTrue(talk.initialized.getCapabilities().getInlayHintProvider().getLeft());
      Buffer english = talk.open(work.en(), EN);
      assertEquals(List.of(), lenses(talk, english));
      assertEquals(List.of(), hints(talk, english, ALL));
      talk.settle();
      assertEquals(List.of(), talk.refreshed);

      SettingsSessionTest.push(talk, Map.of("tallystick", Map.of("lens", true)));
      assertEquals(List.of("lenses"), talk.refreshed);
      assertEquals(3, lenses(talk, english).size());
      assertEquals(List.of(), hints(talk, english, ALL));

      SettingsSessionTest.push(talk, Map.of("inlay", true));
      assertEquals(List.of("lenses", "lenses", "hints"), talk.refreshed);
      assertEquals(List.of(), lenses(talk, english));
      assertEquals(3, hints(talk, english, ALL).size());
    }
  }

  @Test
  void whoCannotAskAgainIsNotTold() {
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), EN);
      SettingsSessionTest.push(talk, Map.of("lens", true, "inlay", true));

      assertEquals(List.of(), talk.refreshed);
      assertEquals(3, lenses(talk, english).size());
    }
  }

  @Test
  void figuresThatChangeOnTheOtherSideAreAnnounced() {
    try (Talk talk = Talk.in(folder, ViewsSessionTest::showsBoth)) {
      talk.open(work.en(), EN);
      Buffer german = talk.open(work.de(), DE);
      talk.settle();
      talk.refreshed.clear();
      german.replace("Die Winde zieht", "Die Winde holt");
      assertEquals(List.of(), talk.refreshed, "nothing to count has changed");

      german.replace("Klemmt die Kette", Ferry.FOG_DE + "\nKlemmt die Kette");
      assertEquals(List.of("lenses", "hints"), talk.refreshed);
    }
  }

  @Test
  void aFileInNoPairHasNoFigures() {
    Path notes = work.write("notes.md", EN);
    try (Talk talk = Talk.in(folder, ViewsSessionTest::showsBoth)) {
      Buffer alone = talk.open(notes, EN);
      assertEquals(List.of(), lenses(talk, alone));
      assertEquals(List.of(), hints(talk, alone, ALL));
    }
  }
}
