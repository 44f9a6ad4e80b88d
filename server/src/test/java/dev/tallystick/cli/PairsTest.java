package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Which files belong together, as the command line tells it. */
class PairsTest {
  @TempDir Path folder;

  @Test
  void aPairIsALineWithItsProgressAndFindings() {
    CableCar.write(folder.resolve("en/guide.md"), CableCar.ENGLISH);
    CableCar.write(folder.resolve("de/guide.md"), CableCar.untranslated());
    JsonObject pair = only();
    assertEquals(Outcome.shown(folder.resolve("en/guide.md")), Fields.string(pair, "source"));
    assertEquals(Outcome.shown(folder.resolve("de/guide.md")), Fields.string(pair, "target"));
    assertEquals("en", Fields.string(pair, "sourceLanguage"));
    assertEquals("de", Fields.string(pair, "targetLanguage"));
    assertEquals("folder", Fields.string(pair, "why"));
    assertEquals(0, Fields.number(pair, "pending", 0));
    assertEquals("{\"untranslated\":1}", pair.get("findings").toString());
  }

  @Test
  void aPairWithoutFindingsSaysSo() {
    CableCar.pair(folder, CableCar.GERMAN);
    JsonObject pair = only();
    assertEquals("und", Fields.string(pair, "sourceLanguage"));
    assertEquals("name", Fields.string(pair, "why"));
    assertEquals("{}", pair.get("findings").toString());
  }

  @Test
  void theFileItselfSaysItsLanguageWhereNothingElseDoes() {
    CableCar.write(folder.resolve("guide.md"), "---\nlang: en\n---\n" + CableCar.ENGLISH);
    CableCar.write(folder.resolve("guide.de.md"), "---\nlang: fr\n---\n" + CableCar.GERMAN);
    JsonObject pair = only();
    assertEquals("en", Fields.string(pair, "sourceLanguage"));
    assertEquals("de", Fields.string(pair, "targetLanguage"));
    assertEquals("{}", pair.get("findings").toString());

    Outcome stated = Outcome.of("pairs", "--format", "jsonl", "--source-language", "en-GB", folder);
    assertEquals("en-GB", Fields.string(stated.json().get(0), "sourceLanguage"));

    CableCar.write(folder.resolve("tallystick.json"), "{ \"sourceLanguage\": \"en-US\" }");
    assertEquals("en-US", Fields.string(only(), "sourceLanguage"));
  }

  @Test
  void aFileThatSaysNoLanguageIsInAnUnknownOne() {
    CableCar.write(folder.resolve("guide.md"), "---\nlang: elvish\n---\n" + CableCar.ENGLISH);
    CableCar.write(folder.resolve("guide.de.md"), CableCar.GERMAN);
    assertEquals("und", Fields.string(only(), "sourceLanguage"));
  }

  @Test
  void scriptsAndRegionsTellFilesApart() {
    for (String tag : List.of("pt", "pt_BR", "sr_Latn", "sr-Cyrl", "zh_TW", "zh-Hans")) {
      CableCar.write(folder.resolve(tag + "/guide.md"), CableCar.GERMAN);
      CableCar.write(folder.resolve("notes." + tag + ".md"), CableCar.GERMAN);
    }
    CableCar.write(folder.resolve("en/guide.md"), CableCar.ENGLISH);
    CableCar.write(folder.resolve("notes.md"), CableCar.ENGLISH);
    List<String> expected = List.of("pt", "pt-BR", "sr-Cyrl", "sr-Latn", "zh-Hans", "zh-TW");
    for (String source : List.of("en/guide.md", "notes.md")) {
      String file = Outcome.shown(folder.resolve(source));
      assertEquals(
          expected,
          json().stream()
              .filter(pair -> Fields.string(pair, "source").equals(file))
              .map(pair -> Fields.string(pair, "targetLanguage"))
              .sorted()
              .toList());
    }
  }

  @Test
  void whatNobodyHasGotToIsPendingAndAllOfItIsCounted() {
    CableCar.pair(folder, CableCar.GERMAN);
    int all = Fields.number(only(), "done", 1);
    CableCar.pair(folder, CableCar.firstHalf());
    JsonObject half = only();
    assertTrue(Fields.number(half, "pending", 1) < all, half::toString);
    assertEquals(all, Fields.number(half, "done", 1) + Fields.number(half, "pending", 1));
    assertEquals("{}", half.get("findings").toString());
  }

  @Test
  void aFileThatStandsAloneIsToldWithTheReasonButIsNoLineForPrograms() {
    CableCar.pair(folder, CableCar.GERMAN);
    CableCar.write(folder.resolve("notes.md"), "Nothing here.\n");
    assertEquals(1, json().size());
    Outcome people = Outcome.of("pairs", folder);
    assertEquals(0, people.exit());
    assertEquals(2, people.lines().size(), people::out);
    String alone = Outcome.shown(folder.resolve("notes.md")) + ": alone. ";
    assertTrue(people.lines().get(1).startsWith(alone), people::out);
  }

  @Test
  void anUnclearSourceIsAskedForAndCanBeChosen() {
    CableCar.write(folder.resolve("guide.fr.md"), "Bonjour.\n");
    CableCar.write(folder.resolve("guide.de.md"), "Guten Tag.\n");
    Outcome asked = Outcome.of("pairs", folder);
    assertEquals(2, asked.exit());
    assertTrue(asked.err().contains("Choose with --source-language: de, fr."), asked::err);
    Outcome chosen = Outcome.of("pairs", "--format", "jsonl", "--source-language", "fr", folder);
    assertEquals(0, chosen.exit(), chosen::err);
    assertEquals("fr", Fields.string(chosen.json().get(0), "sourceLanguage"));
  }

  @Test
  void anEmptyFolderHasNone() {
    assertEquals(new Outcome(0, "", ""), Outcome.of("pairs", "--format", "jsonl", folder));
  }

  private JsonObject only() {
    List<JsonObject> lines = json();
    assertEquals(1, lines.size());
    Fields.assertNames(
        lines.get(0),
        "source",
        "target",
        "sourceLanguage",
        "targetLanguage",
        "why",
        "done",
        "pending",
        "findings");
    return lines.get(0);
  }

  private List<JsonObject> json() {
    return Outcome.of("pairs", "--format", "jsonl", folder).json();
  }
}
