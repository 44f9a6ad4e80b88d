package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The sentences of one file. */
class SegmentsTest {
  private static final String MIXED =
      """
      # Winter opening

      The kiosk opens at 7. 🎿 Skis stay outside!

      - One hook a guest.

      > Mind the step.

      | Day | Hours |
      |---|---|
      | Monday | none |

          kiosk --open
      """;

  @TempDir Path folder;

  @Test
  void eachSentenceIsALineWithItsBlock() {
    Path file = CableCar.write(folder.resolve("kiosk.md"), MIXED);
    List<String> seen = new ArrayList<>();
    for (JsonObject line : Outcome.of("segments", "--format", "jsonl", file).json()) {
      Fields.assertNames(line, "start", "end", "block");
      seen.add(Fields.string(line, "block") + ": " + Fields.covered(line, MIXED));
    }
    assertEquals(
        List.of(
            "heading: Winter opening",
            "paragraph: The kiosk opens at 7.",
            "paragraph: 🎿 Skis stay outside!",
            "item: One hook a guest.",
            "quotation: Mind the step.",
            "cell: Day",
            "cell: Hours",
            "cell: Monday",
            "cell: none"),
        seen);
  }

  @Test
  void theFileMaySayItsLanguage() {
    String german = "Fragen Sie am 3. Mai nach dem Schlüssel.";
    Path page = CableCar.write(folder.resolve("kiosk.html"), "<html lang=de><p>" + german);
    assertEquals(List.of("paragraph\t" + german), Outcome.of("segments", page).lines());
    Path log =
        CableCar.write(folder.resolve("kiosk.xml"), "<log xml:lang='de'>" + german + "</log>");
    assertEquals(List.of("paragraph\t" + german), Outcome.of("segments", log).lines());
    assertEquals(2, Outcome.of("segments", "--language", "en", log).lines().size());
  }

  @Test
  void peopleSeeTheBlockAndTheProse() {
    Path file = CableCar.write(folder.resolve("kiosk.txt"), "It snows. We open.\n");
    assertEquals(
        List.of("paragraph\tIt snows.", "paragraph\tWe open."),
        Outcome.of("segments", file).lines());
  }

  @Test
  void anAbbreviationOfTheLanguageEndsNoSentence() {
    Path file =
        CableCar.write(folder.resolve("kiosk.txt"), "Die Werkstatt ruft Dr. Brankamp an.\n");
    assertEquals(1, Outcome.of("segments", "--language", "de", file).lines().size());
  }

  @Test
  void anEmptyFileHasNone() {
    Path file = CableCar.write(folder.resolve("kiosk.md"), "");
    Outcome outcome = Outcome.of("segments", "--format", "jsonl", file);
    assertEquals(new Outcome(0, "", ""), outcome);
  }

  @Test
  void anUnknownLanguageIsRefused() {
    Path file = CableCar.write(folder.resolve("kiosk.md"), MIXED);
    Outcome outcome = Outcome.of("segments", "--language", "qqz", file);
    assertEquals(2, outcome.exit());
    assertTrue(outcome.err().contains("\"qqz\" is no language tag"), outcome::err);
  }
}
