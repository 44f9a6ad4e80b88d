package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Rules for sentence borders from a file, on the command line. */
class SegmentationTest {
  private static final String SRX =
      """
      <srx version="2.0"><body>
      <languagerules><languagerule languagerulename="all">
      <rule><beforebreak>%s</beforebreak></rule>
      </languagerule></languagerules>
      <maprules><languagemap languagepattern=".*" languagerulename="all"/></maprules>
      </body></srx>
      """;

  @TempDir Path folder;

  private Outcome check() {
    CableCar.pair(folder, CableCar.withoutBrakes());
    return Outcome.of("check", "--format", "jsonl", folder);
  }

  @Test
  void theRulesThatTheProjectNamesCount() {
    assertEquals(List.of("omission"), check().codes());
    CableCar.write(folder.resolve("tallystick.json"), "{ \"segmentation\": \"a/borders.srx\" }");
    CableCar.write(folder.resolve("a/borders.srx"), SRX.formatted("~"));
    assertTrue(!check().codes().contains("omission"));
    assertTrue(check().exit() < 2);
    assertEquals("", check().err());
  }

  @Test
  void whatIsWrongInThemIsToldWithLineAndColumn() {
    CableCar.write(folder.resolve("tallystick.json"), "{ \"segmentation\": \"borders.srx\" }");
    Path rules = folder.resolve("borders.srx");
    CableCar.write(rules, SRX.formatted("Mill("));
    Outcome outcome = check();
    assertEquals(2, outcome.exit());
    assertTrue(outcome.err().startsWith(Outcome.shown(rules) + ":3:20: "), outcome.err());
    assertEquals(List.of("omission"), outcome.codes());
  }

  @Test
  void aRuleWithoutAnEndOverATextIsToldOnce() {
    CableCar.write(folder.resolve("tallystick.json"), "{ \"segmentation\": \"borders.srx\" }");
    Path rules = folder.resolve("borders.srx");
    CableCar.write(rules, SRX.formatted("(ä+ä+)+\\1z"));
    CableCar.pair(folder, CableCar.GERMAN + "\n" + "ä".repeat(90) + ".\n\nEnde.\n");
    Outcome outcome = Outcome.of("check", folder);
    assertEquals(2, outcome.exit());
    assertEquals(1, outcome.err().lines().count());
    assertTrue(outcome.err().contains("too many steps"), outcome.err());
  }

  @Test
  void aFileThatIsNotThereIsToldWhereItIsNamed() {
    Path project = folder.resolve("tallystick.json");
    CableCar.write(project, "{ \"segmentation\": \"borders.srx\" }");
    Outcome outcome = check();
    assertEquals(2, outcome.exit());
    assertTrue(outcome.err().startsWith(Outcome.shown(project) + ":1:19: "), outcome.err());
    assertEquals(List.of("omission"), outcome.codes());
  }

  @Test
  void ourOwnRulesAreAFileThatCanBeNamed() {
    Outcome own = Outcome.of("segments", "--rules", "--language", "de");
    assertEquals(0, own.exit());
    assertTrue(own.out().contains("<beforebreak>"));
    CableCar.write(folder.resolve("tallystick.json"), "{ \"segmentation\": \"borders.srx\" }");
    CableCar.write(folder.resolve("borders.srx"), own.out());
    Outcome outcome = check();
    assertEquals("", outcome.err());
    assertEquals(List.of("omission"), outcome.codes());
  }

  @Test
  void eitherAFileOrTheRules() {
    Path file = CableCar.write(folder.resolve("a.txt"), "One here.\n");
    assertEquals(2, Outcome.of("segments", "--rules", file).exit());
    assertEquals(2, Outcome.of("segments").exit());
  }
}
