package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What a tallystick.json at the root of a folder does to the commands on it. */
class ProjectTest {
  @TempDir Path folder;

  private void project(String json) {
    CableCar.write(folder.resolve("tallystick.json"), json);
  }

  private List<JsonObject> pairs(Object... options) {
    return json("pairs", options).json();
  }

  private Outcome check(Object... options) {
    return json("check", options);
  }

  private Outcome json(String command, Object... options) {
    Object[] words = new Object[options.length + 4];
    words[0] = command;
    words[1] = "--format";
    words[2] = "jsonl";
    System.arraycopy(options, 0, words, 3, options.length);
    words[options.length + 3] = folder;
    return Outcome.of(words);
  }

  @Test
  void aStatedPairIsCheckedAndPairsSaysWhy() {
    CableCar.write(folder.resolve("handbook.md"), CableCar.ENGLISH);
    CableCar.write(folder.resolve("Handbuch.md"), CableCar.untranslated());
    assertEquals(List.of(), check().codes());
    project(
        """
        { "pairs": [ { "source": "handbook.md", "target": "Handbuch.md",
                       "sourceLanguage": "en", "targetLanguage": "de" } ] }
        """);
    Outcome outcome = check();
    assertEquals(List.of("untranslated"), outcome.codes());
    assertEquals(1, outcome.exit());
    JsonObject pair = pairs().get(0);
    assertEquals("project", Fields.string(pair, "why"));
    assertEquals("en", Fields.string(pair, "sourceLanguage"));
    assertEquals("de", Fields.string(pair, "targetLanguage"));
    assertEquals(Outcome.shown(folder.resolve("handbook.md")), Fields.string(pair, "source"));
    assertTrue(Outcome.of("pairs", folder).out().contains("paired by project"));
  }

  @Test
  void ignoredFilesStandAloneAndPairsSaysWhy() {
    CableCar.pair(folder.resolve("drafts"), CableCar.untranslated());
    CableCar.pair(folder, CableCar.GERMAN);
    project("{ \"ignore\": [\"drafts\"] }");
    assertEquals(List.of(), check().codes());
    Outcome people = Outcome.of("pairs", folder);
    String alone = Outcome.shown(folder.resolve("drafts/guide.md")) + ": alone. tallystick.json";
    assertTrue(people.out().contains(alone + " ignores it by \"drafts\"."), people::out);
    assertEquals(1, pairs().size());
  }

  @Test
  void theSourceLanguageOfTheProjectCountsUnlessAnOptionBeatsIt() {
    CableCar.write(folder.resolve("guide.fr.md"), "Bonjour.\n");
    CableCar.write(folder.resolve("guide.de.md"), "Guten Tag.\n");
    project("{ \"sourceLanguage\": \"fr\" }");
    assertEquals("fr", Fields.string(pairs().get(0), "sourceLanguage"));
    assertEquals("de", Fields.string(pairs("--source-language", "de").get(0), "sourceLanguage"));
    assertEquals(List.of(), pairs("--target-language", "nl"));
  }

  @Test
  void levelsChangeTheSeverityAndWhatFails() {
    CableCar.pair(folder, CableCar.cutShort());
    assertEquals("information", Fields.string(check().json().get(0), "severity"));
    assertEquals(0, check().exit());

    project("{ \"checks\": { \"length\": \"warning\" } }");
    assertEquals("warning", Fields.string(check().json().get(0), "severity"));
    assertEquals(1, check().exit());
    assertEquals(0, check("--fail-on", "never").exit());

    project("{ \"checks\": { \"length\": \"hint\" } }");
    assertEquals("hint", Fields.string(check().json().get(0), "severity"));
    assertEquals(0, check("--fail-on", "information").exit());
    assertEquals(1, check("--fail-on", "hint").exit());
    assertEquals(1, check("--fail-on", "length").exit());
  }

  @Test
  void aCodeThatIsOffIsNeitherPrintedNorCountedNorAFailure() {
    CableCar.pair(folder, CableCar.untranslated());
    assertEquals("{\"untranslated\":1}", pairs().get(0).get("findings").toString());
    project("{ \"checks\": { \"untranslated\": \"off\" } }");
    assertEquals(new Outcome(0, "", ""), check());
    assertEquals(0, check("--fail-on", "untranslated").exit());
    assertEquals("{}", pairs().get(0).get("findings").toString());
    assertTrue(Outcome.of("check", folder).out().startsWith("1 pair: no findings."));
  }

  @Test
  void whatIsWrongInTheFileIsToldWithItsPlaceAndTheRestCounts() {
    CableCar.pair(folder, CableCar.untranslated());
    project("{\n  \"colour\": 1,\n  \"checks\": { \"untranslated\": \"hint\" }\n}\n");
    Outcome outcome = check();
    assertEquals(2, outcome.exit());
    String place =
        Outcome.shown(folder.resolve("tallystick.json")) + ":2:3: \"\u2068colour\u2069\" means";
    assertTrue(outcome.err().startsWith(place), outcome::err);
    assertEquals(1, outcome.err().lines().count(), outcome::err);
    assertEquals("hint", Fields.string(outcome.json().get(0), "severity"));
    assertEquals(2, Outcome.of("pairs", folder).exit());
  }

  @Test
  void aFileThatIsNoTextOrInAnotherEncodingIsTold() {
    CableCar.pair(folder, CableCar.GERMAN);
    CableCar.write(folder.resolve("tallystick.json"), new byte[] {'{', 0, '}', 0});
    Outcome zeros = check();
    assertEquals(2, zeros.exit());
    assertTrue(zeros.err().contains("tallystick.json: this is no text file"), zeros::err);

    byte[] latin = "{ \"ignore\": [\"f\u00fcr\"] }".getBytes(StandardCharsets.ISO_8859_1);
    CableCar.write(folder.resolve("tallystick.json"), latin);
    Outcome foreign = check();
    assertEquals(2, foreign.exit());
    assertTrue(foreign.err().contains("tallystick.json:1:16: These bytes"), foreign::err);
  }

  @Test
  void aByteOrderMarkIsPassedOver() {
    CableCar.pair(folder, CableCar.untranslated());
    String json = "\uFEFF{ \"checks\": { \"untranslated\": \"off\" } }";
    for (var charset : List.of(StandardCharsets.UTF_8, StandardCharsets.UTF_16LE)) {
      CableCar.write(folder.resolve("tallystick.json"), json.getBytes(charset));
      assertEquals(new Outcome(0, "", ""), check());
    }
  }

  @Test
  void itCountsAtTheRootOnlyAndItsNamesAreSeenFromThere() {
    CableCar.pair(folder.resolve("de"), CableCar.untranslated());
    CableCar.write(folder.resolve("de/tallystick.json"), "{ \"ignore\": [\"guide.*\"] }");
    assertEquals(List.of("untranslated"), check().codes());
    assertEquals(
        new Outcome(0, "", ""), Outcome.of("check", "--format", "jsonl", folder.resolve("de")));
  }

  @Test
  void aFolderWithAProjectIsPairedByItself() {
    Path one = folder.resolve("one");
    Path two = folder.resolve("two");
    CableCar.write(one.resolve("en/guide.md"), CableCar.ENGLISH);
    CableCar.write(one.resolve("de/guide.md"), CableCar.untranslated());
    CableCar.write(two.resolve("en/guide.md"), CableCar.ENGLISH);
    CableCar.write(two.resolve("de/guide.md"), CableCar.untranslated());
    CableCar.write(
        two.resolve("tallystick.json"), "{ \"checks\": { \"untranslated\": \"hint\" } }");
    Outcome both = Outcome.of("check", "--format", "jsonl", one, two);
    List<String> severities =
        both.json().stream().map(finding -> Fields.string(finding, "severity")).toList();
    assertEquals(List.of("warning", "hint"), severities);
    Outcome nested = Outcome.of("check", "--format", "jsonl", folder, two);
    assertEquals(both.out(), nested.out());
  }

  @Test
  void aPairNamedByItsFilesIsNoProject() {
    CableCar.pair(folder, CableCar.untranslated());
    project("{ \"checks\": { \"untranslated\": \"off\" } }");
    Outcome named = Outcome.of("check", folder.resolve("guide.md"), folder.resolve("guide.de.md"));
    assertEquals(1, named.exit());
    assertFalse(named.out().isEmpty());
  }
}
