package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.FileChangeType;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What a file of rules for sentence borders does in an editor, and what is shown in it. */
class SegmentationSessionTest {
  private static final String JSON = "{ \"segmentation\": \"rules/borders.srx\" }";
  private static final String SRX = "rules/borders.srx";

  @TempDir Path folder;

  private static String srx(String rule) {
    return """
        <srx version="2.0"><body>
        <languagerules><languagerule languagerulename="all">
        %s
        </languagerule></languagerules>
        <maprules><languagemap languagepattern=".*" languagerulename="all"/></maprules>
        </body></srx>
        """
        .formatted(rule);
  }

  /** With this nothing but a paragraph ends a sentence. */
  private static final String WHOLE = srx("<rule><beforebreak>~</beforebreak></rule>");

  private static final String NAMES =
      srx("<rule break=\"no\"><beforebreak>Mill\\.</beforebreak></rule>");

  @Test
  void itsRulesCountInAllTextsAndAreFollowedOnTheDisk() {
    Work work = Work.withoutFog(folder);
    work.write("tallystick.json", JSON);
    work.write(SRX, WHOLE);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertTrue(!talk.codes(work.en()).contains("omission"), talk.codes(work.en())::toString);

      work.write(SRX, NAMES);
      talk.wrote(FileChangeType.Changed, work.file(SRX));
      assertEquals(List.of("omission"), talk.codes(work.en()));

      work.write(SRX, WHOLE);
      talk.wrote(FileChangeType.Changed, work.file(SRX));
      assertTrue(!talk.codes(work.en()).contains("omission"));

      work.write("tallystick.json", "{ \"ignore\": [\"nothing/at/all\"] }");
      talk.wrote(FileChangeType.Changed, work.file("tallystick.json"));
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void itsRulesAreFollowedWhileTheyAreEdited() {
    Work work = Work.withoutFog(folder);
    work.write("tallystick.json", JSON);
    work.write(SRX, NAMES);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      Buffer rules = talk.open(work.file(SRX), NAMES);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));

      rules.whole(WHOLE);
      assertTrue(!talk.codes(work.en()).contains("omission"), talk.codes(work.en())::toString);
      rules.whole(NAMES);
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void whatIsWrongIsShownAtItsRuleAndTheRestCounts() {
    Work work = Work.withoutFog(folder);
    work.write("tallystick.json", JSON);
    String broken = srx("<rule break=\"no\"><beforebreak>Mill\\.(</beforebreak></rule>");
    work.write(SRX, broken);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));
      List<Diagnostic> shown = talk.shown(work.file(SRX));
      assertEquals(1, shown.size());
      assertEquals("Mill\\.(", Buffer.words(broken, shown.get(0).getRange()));

      Buffer open = talk.open(work.file(SRX), broken);
      open.replace("Mill\\.(", "Mill\\.");
      assertEquals(List.of(), talk.shown(open.uri));
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aRuleWithoutAnEndOverATextIsShownAndHoldsNothingUp() {
    Work work = Work.withoutFog(folder);
    work.write("tallystick.json", JSON);
    String endless = srx("<rule break=\"no\"><beforebreak>(ä+ä+)+\\1z</beforebreak></rule>");
    work.write(SRX, endless);
    String german = Ferry.DE_WITHOUT_FOG + "\n" + "ä".repeat(90) + ". Ende.\n";
    try (Talk talk = Talk.in(folder)) {
      Buffer open = talk.open(work.de(), german);
      talk.settle();
      List<Diagnostic> shown = talk.shown(work.file(SRX));
      assertEquals(1, shown.size());
      assertTrue(shown.get(0).getMessage().getLeft().contains("too many steps"));
      assertEquals("<rule break=\"no\">", Buffer.words(endless, shown.get(0).getRange()));

      open.replace("ä".repeat(90) + ". Ende.\n", "");
      assertEquals(List.of(), talk.shown(work.file(SRX)));
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aFileThatIsNotThereIsShownWhereItIsNamed() {
    Work work = Work.withoutFog(folder);
    work.write("tallystick.json", JSON);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));
      List<Diagnostic> shown = talk.shown(work.file("tallystick.json"));
      assertEquals("\"" + SRX + "\"", Buffer.words(JSON, shown.get(0).getRange()));

      work.write(SRX, NAMES);
      talk.wrote(FileChangeType.Created, work.file(SRX));
      assertEquals(List.of(), talk.shown(work.file("tallystick.json")));
    }
  }
}
