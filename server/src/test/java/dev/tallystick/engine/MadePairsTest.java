package dev.tallystick.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** The pairs that the user has made. */
class MadePairsTest {
  private static final Path JOB = Path.of("/job").toAbsolutePath();

  private final MadePairs made = new MadePairs();

  private void add(String source, String target) {
    made.add(
        new Event.Paired(
            JOB.resolve(source), JOB.resolve(target), Optional.empty(), Optional.empty()));
  }

  @Test
  void noneIsLostWhereNamesAreExchanged() {
    add("one.md", "eins.md");
    add("two.md", "zwei.md");
    Path one = JOB.resolve("eins.md");
    Path two = JOB.resolve("zwei.md");
    made.rename(new Renaming(Map.of(one, two, two, one)));

    assertEquals(
        Set.of("one.md zwei.md", "two.md eins.md"),
        made.all().stream()
            .map(pair -> JOB.relativize(pair.source()) + " " + JOB.relativize(pair.target()))
            .collect(Collectors.toSet()));
  }
}
