package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What people read, and when it has colours. */
class CheckTextTest {
  private static final String ESCAPE = "\u001b[";

  @TempDir Path folder;

  @Test
  void aFindingIsALineUnderItsPairAndACountEndsTheList() {
    CableCar.pair(folder, CableCar.untranslated());
    String source = Outcome.shown(folder.resolve("guide.md"));
    String target = Outcome.shown(folder.resolve("guide.de.md"));
    Outcome outcome = Outcome.of("check", folder);
    assertEquals(
        List.of(
            source + " -> " + target,
            target + ":15:66: untranslated: Still the same as the source.",
            "",
            "1 pair: 1 untranslated."),
        outcome.lines());
  }

  @Test
  void aCleanResultPromisesNothingAboutMeaning() {
    CableCar.pair(folder, CableCar.GERMAN);
    List<String> lines = Outcome.of("check", folder).lines();
    assertEquals("1 pair: no findings.", lines.get(0));
    assertTrue(lines.get(1).contains("nothing about meaning"));
  }

  @Test
  void aFolderWithoutPairsSaysWhereToLook() {
    CableCar.write(folder.resolve("alone.md"), "One.\n");
    Outcome outcome = Outcome.of("check", folder);
    assertEquals(0, outcome.exit());
    assertTrue(outcome.out().startsWith("No pairs found."), outcome::out);
  }

  @Test
  void onlyATerminalSeesColoursAndTheyChangeNoWord() {
    CableCar.pair(folder, CableCar.untranslated());
    Outcome plain = Outcome.on(false, "check", folder);
    Outcome coloured = Outcome.on(true, "check", folder);
    assertFalse(plain.out().contains(ESCAPE));
    assertTrue(coloured.out().contains(ESCAPE));
    assertEquals(plain.out(), coloured.out().replaceAll("\u001b\\[\\d+m", ""));
    assertFalse(Outcome.on(true, "check", "--format", "jsonl", folder).out().contains(ESCAPE));
  }

  @Test
  void noColorAndADumbTerminalAreHonoured() {
    assertTrue(Console.colours(true, Map.of()));
    assertTrue(Console.colours(true, Map.of("TERM", "xterm-256color")));
    assertTrue(Console.colours(true, Map.of("NO_COLOR", "")));
    assertFalse(Console.colours(true, Map.of("NO_COLOR", "1")));
    assertFalse(Console.colours(true, Map.of("NO_COLOR", "0")));
    assertFalse(Console.colours(true, Map.of("TERM", "dumb")));
    assertFalse(Console.colours(false, Map.of()));
  }
}
