package dev.tallystick.editors;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.tidy.Repository;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** {@code demo/run}, started from a folder that is not the project's. */
class DemoRunIT {
  private static final int SECONDS = 240;

  @TempDir Path folder;

  @Test
  void printsTheFindingsOfEveryPairAndHowToGoOn() throws Exception {
    Path out = folder.resolve("out.txt");
    Process process =
        new ProcessBuilder(Repository.root().resolve("demo/run").toString())
            .directory(folder.toFile())
            .redirectErrorStream(true)
            .redirectOutput(out.toFile())
            .start();
    process.getOutputStream().close();
    boolean ended = process.waitFor(SECONDS, TimeUnit.SECONDS);
    if (!ended) {
      process.descendants().forEach(ProcessHandle::destroyForcibly);
      process.destroyForcibly().waitFor();
    }
    String printed = Repository.read(out);
    assertTrue(ended, printed);
    assertEquals(0, process.exitValue(), printed);
    assertEquals(planted(), findings(printed), printed);
    assertTrue(printed.contains("README.md says under \"Set-up\""), printed);
  }

  private static List<String> planted() {
    return Repository.read(Repository.root().resolve("demo/planted.jsonl"))
        .lines()
        .map(line -> line.replaceFirst(".*\"code\":\"(\\w+)\".*", "$1"))
        .sorted()
        .toList();
  }

  /** The codes of the findings: {@code file:line:column: code: message}. */
  private static List<String> findings(String printed) {
    return printed
        .lines()
        .filter(line -> line.matches("demo/\\S+:\\d+:\\d+: \\w+: .*"))
        .map(line -> line.split(": ")[1])
        .sorted()
        .toList();
  }
}
