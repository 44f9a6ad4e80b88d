package dev.tallystick.tidy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Predicate;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** House rules that a machine can keep. */
class SourcesTest {
  private static final int LONGEST_FILE = 500;

  /** Words in pieces, so that this file does not hold what it forbids. */
  private static final Pattern SKIPPED =
      Pattern.compile(
          "@Dis"
              + "abled|@Enab"
              + "led|Assump"
              + "tions|\\bassum"
              + "e(That|True|False)\\(|abor"
              + "t\\(|\\.(sk"
              + "ip|to"
              + "do)\\(");

  /** Waiting for time instead of for something to happen. */
  private static final Pattern SLEEP =
      Pattern.compile(
          "\\.sle"
              + "ep\\(|\\((sle"
              + "ep|s"
              + "it)-for|vim\\.wa"
              + "it\\(\\s*\\d+\\s*\\)|Locks"
              + "upport\\.park|(set|waitFor)Time"
              + "out\\(");

  private static final Pattern MACHINE =
      Pattern.compile(
          "(?<![\\w.~-])/(wo"
              + "rk|t"
              + "mp|ro"
              + "ot|ho"
              + "me|Us"
              + "ers)/|[A-Z]:\\\\Us"
              + "ers");

  @Test
  void everyMainPackageSaysWhatItIsFor() {
    for (Path file : Repository.files(Repository.main(), ".java")) {
      Path info = file.resolveSibling("package-info.java");
      assertTrue(Files.exists(info), () -> Repository.shown(info) + " is missing");
      assertTrue(Repository.read(info).startsWith("/**"), () -> Repository.shown(info));
    }
  }

  @Test
  void noTestIsSkippedAndNoneSleeps() {
    List<Path> tests = Repository.files(Repository.tests(), ".java", ".lua", ".el");
    assertTrue(tests.size() > 10, tests::toString);
    assertNone(tests, code -> SKIPPED.matcher(code).find() || SLEEP.matcher(code).find());
    List<Path> client = Repository.files(Repository.client(), ".ts", ".mjs");
    assertTrue(client.size() > 10, client::toString);
    assertNone(client, code -> SKIPPED.matcher(code).find() || SLEEP.matcher(code).find());
  }

  @Test
  void noSourceIsTooLong() {
    List<Path> sources =
        Repository.files(Repository.root(), ".java", ".lua", ".el", ".js", ".mjs", ".ts");
    assertNone(sources, code -> code.lines().count() > LONGEST_FILE);
  }

  @Test
  void nothingTellsOfTheMachineItWasWrittenOn() {
    Path root = Repository.root();
    assertNone(
        Repository.files(
            root, ".java", ".lua", ".el", ".js", ".mjs", ".ts", ".md", ".xml", ".json", ".jsonl",
            ".txt", "run"),
        text -> MACHINE.matcher(text).find());
  }

  @Test
  void noLockFileNamesARegistry() {
    List<Path> locks = Repository.files(Repository.root(), "package-lock.json");
    assertTrue(locks.size() > 1, locks::toString);
    assertNone(locks, text -> text.contains("\"resolved\""));
  }

  private static void assertNone(List<Path> files, Predicate<String> forbidden) {
    List<String> found =
        files.stream()
            .filter(file -> forbidden.test(Repository.read(file)))
            .map(Repository::shown)
            .toList();
    assertEquals(List.of(), found);
  }
}
