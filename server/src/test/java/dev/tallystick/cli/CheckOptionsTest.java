package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What {@code check} takes for a failure, a draft, and a language. */
class CheckOptionsTest {
  @TempDir Path folder;

  /** The exit code with an information only, and with a warning only. */
  @ParameterizedTest
  @CsvSource({
    "hint, 1, 1",
    "information, 1, 1",
    "warning, 0, 1",
    "never, 0, 0",
    "length, 1, 0",
    "untranslated, 0, 1",
    "omission, 0, 0",
    "'omission,addition', 0, 0",
    "'omission,length', 1, 0",
    "'length, untranslated', 1, 1",
    "ADDITION, 0, 0",
    "UNTRANSLATED, 0, 1"
  })
  void failOnTakesALevelOrCodes(String failOn, int information, int warning) {
    CableCar.pair(folder, CableCar.cutShort());
    assertEquals(List.of("length"), codes());
    assertEquals(information, Outcome.of("check", "--fail-on", failOn, folder).exit());
    CableCar.pair(folder, CableCar.untranslated());
    assertEquals(List.of("untranslated"), codes());
    assertEquals(warning, Outcome.of("check", "--fail-on", failOn, folder).exit());
  }

  @Test
  void withoutFailOnAWarningFailsAndAnInformationDoesNot() {
    CableCar.pair(folder, CableCar.cutShort());
    assertEquals(0, Outcome.of("check", folder).exit());
    CableCar.pair(folder, CableCar.untranslated());
    assertEquals(1, Outcome.of("check", folder).exit());
  }

  @ParameterizedTest
  @CsvSource({"error", "omisson", "'omission,,length'", "''", "'warning,omission'"})
  void failOnRefusesWhatItDoesNotKnow(String failOn) {
    CableCar.pair(folder, CableCar.GERMAN);
    Outcome outcome = Outcome.of("check", "--fail-on", failOn, folder);
    assertEquals(2, outcome.exit());
    assertTrue(outcome.err().contains("is neither a level"), outcome::err);
  }

  @Test
  void failOnHidesNothing() {
    CableCar.pair(folder, CableCar.untranslated());
    String all = Outcome.of("check", folder).out();
    assertEquals(all, Outcome.of("check", "--fail-on", "never", folder).out());
    assertEquals(all, Outcome.of("check", "--fail-on", "length", folder).out());
  }

  @Test
  void aMissingTailIsAnOmissionUnlessTheTranslationIsADraft() {
    CableCar.pair(folder, CableCar.firstHalf());
    assertEquals(List.of("omission"), codes());
    assertEquals(1, Outcome.of("check", folder).exit());
    assertEquals(List.of(), codes("--draft"));
    assertEquals(0, Outcome.of("check", "--draft", folder).exit());
  }

  @Test
  void aGapInTheMiddleIsAnOmissionInADraftToo() {
    CableCar.pair(folder, CableCar.withoutBrakes());
    assertEquals(List.of("omission"), codes("--draft"));
  }

  @Test
  void anEmptyTranslationIsAllMissingOrAllPending() {
    CableCar.pair(folder, "");
    assertEquals(List.of("omission"), codes());
    assertEquals(List.of(), codes("--draft"));
  }

  @Test
  void theTargetLanguagePicksAmongTranslations() {
    CableCar.write(folder.resolve("en/guide.md"), CableCar.ENGLISH);
    CableCar.write(folder.resolve("de/guide.md"), CableCar.untranslated());
    CableCar.write(folder.resolve("nl/guide.md"), CableCar.untranslated());
    assertEquals(List.of("untranslated", "untranslated"), codes());
    Outcome dutch = Outcome.of("check", "--format", "jsonl", "--target-language", "nl", folder);
    assertEquals(List.of("untranslated"), dutch.codes());
    assertEquals("nl", Fields.string(dutch.json().get(0), "language"));
  }

  @Test
  void bothModelsCheck() {
    CableCar.pair(folder, CableCar.untranslated());
    for (String model : List.of("adaptive", "published", "Published")) {
      Outcome outcome = Outcome.of("check", "--model", model, "--format", "jsonl", folder);
      assertTrue(outcome.codes().contains("untranslated"), outcome::out);
    }
  }

  private List<String> codes(String... options) {
    Object[] words = new Object[options.length + 4];
    words[0] = "check";
    words[1] = "--format";
    words[2] = "jsonl";
    System.arraycopy(options, 0, words, 3, options.length);
    words[options.length + 3] = folder;
    return Outcome.of(words).codes();
  }
}
