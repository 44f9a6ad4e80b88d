package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.align.Aligner;
import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import dev.tallystick.engine.Examiner;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.List;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.DiagnosticRelatedInformation;
import org.eclipse.lsp4j.DiagnosticSeverity;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.Range;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What an editor shows in the two files of a pair. */
class FindingsSessionTest {
  @TempDir Path folder;

  @Test
  void anOmissionIsShownOnBothFilesThoughOnlyTheTranslationIsOpen() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();

      Diagnostic onSource = only(talk.shown(work.en()));
      assertEquals(Ferry.FOG_EN, Buffer.words(Ferry.EN, onSource.getRange()));
      assertEquals("omission", onSource.getCode().getLeft());
      assertEquals("tallystick", onSource.getSource());
      assertEquals(DiagnosticSeverity.Warning, onSource.getSeverity());
      assertTrue(onSource.getMessage().getLeft().startsWith("Not translated into German"));
      Diagnostic atGap = only(talk.shown(work.de()));
      assertEquals("Marken", german.words(atGap.getRange()));
      assertTrue(atGap.getMessage().getLeft().startsWith("Missing here"));
      assertEquals("omission", atGap.getCode().getLeft());
    }
  }

  @Test
  void eachPlaceOfAFindingPointsAtTheOther() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();

      DiagnosticRelatedInformation gap = only(talk.shown(work.en())).getRelatedInformation().get(0);
      assertEquals(german.uri, gap.getLocation().getUri());
      assertEquals("Marken", german.words(gap.getLocation().getRange()));
      assertTrue(gap.getMessage().startsWith("Missing here"));
      DiagnosticRelatedInformation source =
          only(talk.shown(work.de())).getRelatedInformation().get(0);
      assertEquals(work.en().toUri().toString(), source.getLocation().getUri());
      assertEquals(Ferry.FOG_EN, Buffer.words(Ferry.EN, source.getLocation().getRange()));
      assertEquals("The source sentence", source.getMessage());
    }
  }

  @Test
  void aClientThatShowsNoRelatedPlacesGetsNone() {
    Work work = Work.withoutFog(folder);
    try (Talk talk =
        Talk.in(
            folder,
            params -> params.getCapabilities().getTextDocument().setPublishDiagnostics(null))) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();

      assertNull(only(talk.shown(work.en())).getRelatedInformation());
    }
  }

  @Test
  void additionsAndCopiesAreShownOnTheTranslationOnly() {
    Work work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN.replace(Ferry.FOG_EN + "\n", ""));
    String copied = Ferry.line(Ferry.EN, "In winter the ferry");
    String german = Ferry.DE.replace(Ferry.line(Ferry.DE, "Im Winter ruht"), copied);
    work.write("de/ferry.md", german);
    try (Talk talk = Talk.in(folder)) {
      Buffer buffer = talk.open(work.de(), german);
      talk.settle();

      assertEquals(List.of("addition", "untranslated"), talk.codes(work.de()));
      Diagnostic addition = talk.shown(work.de()).get(0);
      assertEquals(Ferry.FOG_DE, buffer.words(addition.getRange()));
      assertEquals("The gap", addition.getRelatedInformation().get(0).getMessage());
      Diagnostic untranslated = talk.shown(work.de()).get(1);
      assertEquals(copied, buffer.words(untranslated.getRange()));
      assertEquals("The source sentence", untranslated.getRelatedInformation().get(0).getMessage());
      assertTrue(talk.all(work.en().toUri().toString()).isEmpty());
    }
  }

  @Test
  void everyPublishOfAnOpenFileCarriesItsVersionAndThatOfAnotherFileCarriesNone() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      german.replace("15 Minuten", "15 Minuten genau");
      german.replace("15 Minuten genau", "15 Minuten");

      List<Integer> versions =
          talk.all(german.uri).stream().map(PublishDiagnosticsParams::getVersion).toList();
      assertEquals(List.of(1, 2, 3), versions);
      talk.all(work.en().toUri().toString()).forEach(publish -> assertNull(publish.getVersion()));
    }
  }

  @Test
  void aFileThatIsNotOpenIsNotToldTheSameAgain() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      german.replace("Winter", "Frost");
      german.replace("# Die Kettenfähre", "# Die alte Kettenfähre");

      assertEquals(1, talk.all(work.en().toUri().toString()).size());
    }
  }

  @Test
  void findingsAtRestEqualThoseOfTheChecks() {
    Work work = Work.withoutFog(folder);
    String copied = Ferry.line(Ferry.EN, "In winter the ferry");
    String now = Ferry.DE_WITHOUT_FOG.replace(Ferry.line(Ferry.DE, "Im Winter ruht"), copied);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      german.replace(Ferry.line(Ferry.DE, "Im Winter ruht"), copied);
      talk.pass(1500);

      List<Finding> expected = findings(Ferry.EN, now);
      assertFalse(expected.isEmpty());
      for (OnSide side : OnSide.values()) {
        String text = side == OnSide.SOURCE ? Ferry.EN : now;
        Path file = side == OnSide.SOURCE ? work.en() : work.de();
        List<Range> ranges =
            expected.stream()
                .filter(finding -> finding.side() == side)
                .map(finding -> Encoding.UTF_16.range(new Text(text), finding.span()))
                .toList();
        assertEquals(
            ranges,
            talk.shown(file).stream()
                .filter(shown -> !shown.getMessage().getLeft().startsWith("Missing here"))
                .map(Diagnostic::getRange)
                .toList());
      }
    }
  }

  private static List<Finding> findings(String source, String target) {
    return PairResult.of(
            Reading.of(new Text(source), Format.MARKDOWN, "en", Cancellation.NONE),
            Reading.of(new Text(target), Format.MARKDOWN, "de", Cancellation.NONE),
            Aligner.ADAPTIVE,
            true,
            Cancellation.NONE)
        .findings();
  }

  @Test
  void aSourceShowsTheFindingsOfAllItsTranslations() {
    Work work = Work.withoutFog(folder);
    work.write("fr/ferry.md", Ferry.FR_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.en(), Ferry.EN);
      talk.settle();

      List<String> messages =
          talk.shown(work.en()).stream().map(shown -> shown.getMessage().getLeft()).toList();
      assertEquals(2, messages.size());
      assertTrue(messages.stream().anyMatch(message -> message.contains("into German")));
      assertTrue(messages.stream().anyMatch(message -> message.contains("into French")));
      assertEquals(List.of("omission"), talk.codes(work.de()));
      assertEquals(List.of("omission"), talk.codes(work.fr()));
    }
  }

  @Test
  void onlyThePairsOfAnOpenFileAreShown() {
    Work work = Work.withoutFog(folder);
    work.write("fr/ferry.md", Ferry.FR_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.fr(), Ferry.FR_WITHOUT_FOG);
      talk.settle();

      assertEquals(List.of("omission"), talk.codes(work.en()));
      assertTrue(talk.all(work.de().toUri().toString()).isEmpty());
    }
  }

  @Test
  void aFileWithoutACounterpartShowsNothing() {
    Work work = Work.withoutFog(folder);
    Path notes = work.write("notes.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      talk.open(notes, Ferry.EN);
      talk.settle();

      assertTrue(talk.shown(notes).isEmpty());
      assertTrue(talk.said.isEmpty());
    }
  }

  @Test
  void aTextWithoutAFileShowsNothing() {
    Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer scratch = talk.open("untitled:Untitled-1", Ferry.DE_WITHOUT_FOG);
      scratch.replace("Winter", "Frost");

      assertEquals(List.of(), talk.shown(scratch.uri));
      assertNull(scratch.hover("Frost"));
    }
  }

  @Test
  void aFaultInOnePairIsLoggedWithoutTextAndLeavesTheOthers() {
    Work work = Work.withoutFog(folder);
    work.write("fr/ferry.md", Ferry.FR_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder)) {
      talk.machine.examiner =
          (source, target, draft, known, cancellation) -> {
            if (target.language().equals("fr")) {
              throw new IllegalStateException(target.text().string());
            }
            return Examiner.ADAPTIVE.examine(source, target, draft, known, cancellation);
          };
      Buffer english = talk.open(work.en(), Ferry.EN);
      talk.settle();

      assertEquals(1, talk.shown(work.en()).size());
      assertEquals(1, talk.logged.size());
      assertTrue(talk.logged.get(0).contains("IllegalStateException at "));
      assertFalse(talk.logged.get(0).contains("bac"));

      talk.machine.examiner = Examiner.ADAPTIVE;
      english.replace("greases", "oils");
      assertEquals(2, talk.shown(work.en()).size());
    }
  }

  static Diagnostic only(List<Diagnostic> diagnostics) {
    assertEquals(1, diagnostics.size());
    return diagnostics.get(0);
  }
}
