package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;

/** A single line of ten megabytes is read like any other. */
@Timeout(value = 60, unit = TimeUnit.SECONDS, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
class LongLineTest {
  private static final int SIZE = 10_000_000;
  private static final String SHORT = "The rope is long. It has no end.\n";

  @TempDir Path folder;

  @Test
  void ofOneWord() {
    Path source = CableCar.write(folder.resolve("rope.txt"), "a".repeat(SIZE));
    Path target = CableCar.write(folder.resolve("seil.txt"), "b".repeat(SIZE));
    Outcome outcome = Outcome.of("check", source, target);
    assertEquals(0, outcome.exit(), outcome::err);
  }

  @Test
  void ofManySentences() {
    String sentence =
        "The rope runs over the wheel and back to the valley again and again and on. ";
    int count = SIZE / sentence.length();
    Path source = CableCar.write(folder.resolve("rope.txt"), sentence.repeat(count));
    Path target = CableCar.write(folder.resolve("seil.txt"), SHORT);
    Outcome segments = Outcome.of("segments", "--format", "jsonl", source);
    assertEquals(count, segments.lines().size());
    Outcome check = Outcome.of("check", "--format", "jsonl", source, target);
    assertEquals(1, check.exit(), check::err);
    assertTrue(check.codes().contains("omission"), check::out);
  }

  @Test
  void onOneSideOnly() {
    Path source = CableCar.write(folder.resolve("rope.txt"), SHORT);
    Path target = CableCar.write(folder.resolve("seil.txt"), "b".repeat(SIZE));
    Outcome outcome = Outcome.of("align", "--format", "jsonl", source, target);
    assertEquals(0, outcome.exit(), outcome::err);
    List<Integer> sentences =
        outcome.json().stream().map(line -> Fields.number(line, "targetSentences", 0)).toList();
    assertEquals(1, sentences.stream().mapToInt(Integer::intValue).sum());
  }
}
