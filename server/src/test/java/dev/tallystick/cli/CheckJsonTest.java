package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The lines of {@code check --format jsonl}. */
class CheckJsonTest {
  private static final String[] NAMES = {
    "code",
    "severity",
    "side",
    "file",
    "start",
    "end",
    "line",
    "column",
    "language",
    "counterpart",
    "confidence",
    "message"
  };

  @TempDir Path folder;

  @Test
  void anOmissionLiesOnTheSource() {
    String german = CableCar.withoutBrakes();
    JsonObject finding = only(german);
    assertShape(finding);
    assertEquals("omission", Fields.string(finding, "code"));
    assertEquals("warning", Fields.string(finding, "severity"));
    assertEquals("source", Fields.string(finding, "side"));
    assertEquals(shown("guide.md"), Fields.string(finding, "file"));
    assertEquals(CableCar.brakes(), Fields.covered(finding, CableCar.ENGLISH));
    assertPlace(finding, CableCar.ENGLISH);
    assertEquals("de", Fields.string(finding, "language"));
    JsonObject gap = finding.getAsJsonObject("counterpart");
    assertEquals(shown("guide.de.md"), Fields.string(gap, "file"));
    assertEquals("", Fields.covered(gap, german));
    String beforeGap = german.substring(0, Fields.number(gap, "start", 0));
    assertTrue(beforeGap.stripTrailing().endsWith("ein kranker singt."), beforeGap);
    assertTrue(
        Fields.string(finding, "message")
            .startsWith("Not translated into German: nothing stands for these 2 sentences"),
        finding::toString);
  }

  @Test
  void anUntranslatedSentenceLiesOnTheTarget() {
    String german = CableCar.untranslated();
    JsonObject finding = only(german);
    assertShape(finding);
    assertEquals("untranslated", Fields.string(finding, "code"));
    assertEquals("warning", Fields.string(finding, "severity"));
    assertEquals("target", Fields.string(finding, "side"));
    assertEquals(shown("guide.de.md"), Fields.string(finding, "file"));
    assertEquals(CableCar.GLOVES, Fields.covered(finding, german));
    assertPlace(finding, german);
    assertEquals("de", Fields.string(finding, "language"));
    JsonObject source = finding.getAsJsonObject("counterpart");
    assertEquals(shown("guide.md"), Fields.string(source, "file"));
    assertEquals(CableCar.GLOVES, Fields.covered(source, CableCar.ENGLISH));
    assertEquals("Still the same as the source.", Fields.string(finding, "message"));
  }

  @Test
  void aSentenceCutShortIsAnInformation() {
    JsonObject finding = only(CableCar.cutShort());
    assertShape(finding);
    assertEquals("length", Fields.string(finding, "code"));
    assertEquals("information", Fields.string(finding, "severity"));
    assertEquals("target", Fields.string(finding, "side"));
    assertTrue(
        Fields.string(finding, "message")
            .matches(
                "Much shorter than its source would suggest: 33 characters for 98"
                    + " \\(usual for this pair: \\d+ to \\d+\\)\\."),
        finding::toString);
  }

  @Test
  void nothingFoundPrintsNothing() {
    CableCar.pair(folder, CableCar.GERMAN);
    assertEquals("", Outcome.of("check", "--format", "jsonl", folder).out());
  }

  @Test
  void theOrderIsThatOfThePairsThenSourceBeforeTargetThenThePlace() {
    CableCar.pair(folder.resolve("b"), CableCar.untranslated());
    CableCar.pair(
        folder.resolve("a"),
        CableCar.withoutBrakes().replace(CableCar.HANDSCHUHE, CableCar.GLOVES));
    Outcome outcome = Outcome.of("check", "--format", "jsonl", folder);
    assertEquals(List.of("omission", "untranslated", "untranslated"), outcome.codes());
    List<String> files = outcome.json().stream().map(line -> Fields.string(line, "file")).toList();
    assertEquals(
        List.of(shown("a/guide.md"), shown("a/guide.de.md"), shown("b/guide.de.md")), files);
  }

  @Test
  void aLanguageOfNoTagIsWrittenUnd() {
    Path source = CableCar.write(folder.resolve("one.md"), CableCar.ENGLISH);
    Path target = CableCar.write(folder.resolve("two.md"), CableCar.untranslated());
    List<JsonObject> lines = Outcome.of("check", "--format", "jsonl", source, target).json();
    assertEquals("und", Fields.string(lines.get(0), "language"));
    Outcome told =
        Outcome.of("check", "--format", "jsonl", "--target-language", "de-AT", source, target);
    assertEquals("de-AT", Fields.string(told.json().get(0), "language"));
  }

  private JsonObject only(String german) {
    CableCar.pair(folder, german);
    Outcome outcome = Outcome.of("check", "--format", "jsonl", folder);
    assertEquals(1, outcome.json().size(), outcome::out);
    return outcome.json().get(0);
  }

  private String shown(String file) {
    return Outcome.shown(folder.resolve(file));
  }

  private static void assertShape(JsonObject finding) {
    Fields.assertNames(finding, NAMES);
    Fields.assertNames(finding.get("counterpart"), "file", "start", "end");
    assertTrue(Fields.share(finding, "confidence") > 0, finding::toString);
  }

  /** Line and column count from 1 and mean the same as the offset. */
  private static void assertPlace(JsonObject finding, String text) {
    String before = text.substring(0, Fields.number(finding, "start", 0));
    assertEquals(
        before.chars().filter(c -> c == '\n').count() + 1, Fields.number(finding, "line", 1));
    assertEquals(before.length() - before.lastIndexOf('\n'), Fields.number(finding, "column", 1));
  }

  /** Who names two files has said which is the source; each tells its own language. */
  @Test
  void aNamedPairMayRunFromAnyLanguageIntoAny() {
    Path german = CableCar.write(folder.resolve("cable.de.md"), CableCar.withoutBrakes());
    Path english = CableCar.write(folder.resolve("cable.en.md"), CableCar.ENGLISH);
    String line = Outcome.of("check", "--format", "jsonl", german, english).out();
    assertTrue(line.contains("\"code\":\"addition\""), line);
    assertTrue(line.contains("\"language\":\"en\""), line);
  }
}
