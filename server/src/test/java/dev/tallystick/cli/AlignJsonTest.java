package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The lines of {@code align --format jsonl}. */
class AlignJsonTest {
  @TempDir Path folder;

  @ParameterizedTest
  @ValueSource(strings = {"adaptive", "published"})
  void everySentenceOfBothSidesStandsInOneMatchAndInOrder(String model) {
    CableCar.pair(folder, CableCar.withoutBrakes());
    List<JsonObject> matches = align("--model", model);
    assertCovers(matches, "source", segments("guide.md"));
    assertCovers(matches, "target", segments("guide.de.md"));
  }

  @Test
  void theFieldsStandInTheirOrder() {
    CableCar.pair(folder, CableCar.GERMAN);
    for (JsonObject match : align()) {
      Fields.assertNames(
          match, "source", "target", "sourceSentences", "targetSentences", "confidence");
      Fields.share(match, "confidence");
    }
  }

  @Test
  void aFaithfulTranslationIsMatchedSentenceBySentence() {
    CableCar.pair(folder, CableCar.GERMAN);
    boolean found = false;
    for (JsonObject match : align()) {
      if (Fields.covered(match.get("source"), CableCar.ENGLISH).equals(CableCar.GLOVES)) {
        assertEquals(CableCar.HANDSCHUHE, Fields.covered(match.get("target"), CableCar.GERMAN));
        found = true;
      }
    }
    assertTrue(found);
  }

  @Test
  void aMissingSideIsNull() {
    CableCar.pair(folder, CableCar.withoutBrakes());
    List<JsonObject> alone =
        align().stream().filter(match -> match.get("target").isJsonNull()).toList();
    assertFalse(alone.isEmpty());
    for (JsonObject match : alone) {
      assertEquals(0, Fields.number(match, "targetSentences", 0));
      assertTrue(CableCar.brakes().contains(Fields.covered(match.get("source"), CableCar.ENGLISH)));
    }
  }

  @ParameterizedTest
  @CsvSource({"source, target, adaptive", "target, source, adaptive", "source, target, published"})
  void allStandsAloneWhereTheOtherSideIsEmpty(String full, String empty, String model) {
    CableCar.pair(folder, CableCar.GERMAN);
    CableCar.write(folder.resolve(full.equals("source") ? "guide.de.md" : "guide.md"), "");
    List<JsonObject> matches = align("--model", model);
    assertCovers(matches, full, segments(full.equals("source") ? "guide.md" : "guide.de.md"));
    for (JsonObject match : matches) {
      assertTrue(match.get(empty).isJsonNull(), match::toString);
      assertEquals(0, Fields.number(match, empty + "Sentences", 0));
    }
  }

  @Test
  void twoEmptyFilesHaveNoMatches() {
    CableCar.write(folder.resolve("guide.md"), "");
    CableCar.write(folder.resolve("guide.de.md"), "");
    assertEquals(List.of(), align());
  }

  @Test
  void peopleSeeBothSidesAndADashForNothing() {
    CableCar.pair(folder, CableCar.withoutBrakes());
    Outcome outcome =
        Outcome.of("align", folder.resolve("guide.md"), folder.resolve("guide.de.md"));
    assertEquals(0, outcome.lines().size() % 3);
    int gloves = outcome.lines().indexOf("  " + CableCar.GLOVES);
    assertTrue(gloves > 0, outcome::out);
    assertTrue(outcome.lines().get(gloves - 1).matches("1-1  [01]\\.\\d{3}"), outcome::out);
    assertEquals("  " + CableCar.HANDSCHUHE, outcome.lines().get(gloves + 1));
    assertTrue(outcome.lines().contains("  -"), outcome::out);
  }

  private List<JsonObject> align(Object... options) {
    Object[] words = new Object[options.length + 5];
    words[0] = "align";
    words[1] = "--format";
    words[2] = "jsonl";
    System.arraycopy(options, 0, words, 3, options.length);
    words[options.length + 3] = folder.resolve("guide.md");
    words[options.length + 4] = folder.resolve("guide.de.md");
    Outcome outcome = Outcome.of(words);
    assertEquals(0, outcome.exit(), outcome::err);
    return outcome.json();
  }

  private List<JsonObject> segments(String file) {
    String language = file.contains(".de.") ? "de" : "en";
    Path path = folder.resolve(file);
    return Outcome.of("segments", "--format", "jsonl", "--language", language, path).json();
  }

  /** The matches take the sentences of a side one after the other until none is left. */
  private static void assertCovers(
      List<JsonObject> matches, String side, List<JsonObject> sentences) {
    int next = 0;
    for (JsonObject match : matches) {
      int count = Fields.number(match, side + "Sentences", 0);
      assertEquals(count == 0, match.get(side).isJsonNull(), match::toString);
      if (count > 0) {
        JsonObject span = match.getAsJsonObject(side);
        Fields.assertNames(span, "start", "end");
        assertEquals(sentences.get(next).get("start"), span.get("start"));
        assertEquals(sentences.get(next + count - 1).get("end"), span.get("end"));
        next += count;
      }
    }
    assertEquals(sentences.size(), next);
  }
}
