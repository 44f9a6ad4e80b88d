package dev.tallystick.editors;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.tidy.Repository;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * A real Neovim with the packaged server on a copy of the demo job. The script in the test
 * resources does the work of a translator and writes down what it sees.
 */
class NeovimIT {
  private static final int SECONDS = 240;

  @TempDir Path folder;

  @Test
  void aTranslatorSeesWhatIsMissingAndJumpsBothWays() throws Exception {
    Path demo = copyOf(Repository.root().resolve("demo"), folder.resolve("demo"));
    Map<String, String> before = contents(demo);
    Path told = folder.resolve("told.txt");
    Path log = folder.resolve("neovim.log");

    int exit = neovim("neovim.lua", demo, told, log);

    assertEquals(0, exit, () -> told(told) + told(log));
    assertTrue(told(told).endsWith("all seen\n"), () -> told(told) + told(log));
    assertEquals(before, contents(demo), "a file was changed");
  }

  /** Both files open, one server, each finding once. */
  @Test
  void theSetUpInTheReadmeWorks() throws Exception {
    Path demo = copyOf(Repository.root().resolve("demo"), folder.resolve("demo"));
    Path told = folder.resolve("told.txt");
    Path log = folder.resolve("neovim.log");
    String readme = Repository.read(Repository.root().resolve("README.md"));
    int from = readme.indexOf("```lua") + "```lua".length();
    String snippet =
        readme
            .substring(from, readme.indexOf("```", from))
            .replace("/path/to/tallystick.jar", jar())
            .replace("\"java\"", "\"" + java() + "\"");
    Files.writeString(folder.resolve("init.lua"), snippet);

    int exit = neovim("readme.lua", demo, told, log);

    assertEquals("1 clients, 3 and 1 findings", told(told), () -> told(log));
    assertEquals(0, exit);
  }

  private static String java() {
    return Path.of(System.getProperty("java.home"), "bin", "java").toString();
  }

  private static String jar() {
    return Repository.root().resolve("server/target/tallystick.jar").toString();
  }

  private int neovim(String name, Path demo, Path told, Path log) throws Exception {
    Path script = Path.of(getClass().getResource("/editors/" + name).toURI());
    ProcessBuilder builder =
        new ProcessBuilder(
            "nvim", "--headless", "-u", "NONE", "-i", "NONE", "-n", "-c", "luafile " + script);
    Map<String, String> environment = builder.environment();
    environment.put("JAVA", java());
    environment.put("JAR", jar());
    environment.put("SNIPPET", folder.resolve("init.lua").toString());
    environment.put("DEMO", demo.toRealPath().toString());
    environment.put("TOLD", told.toString());
    for (String kind : List.of("CONFIG", "DATA", "STATE", "CACHE")) {
      Path own = Files.createDirectories(folder.resolve("xdg").resolve(kind));
      environment.put("XDG_" + kind + "_HOME", own.toString());
    }
    Process process = builder.redirectErrorStream(true).redirectOutput(log.toFile()).start();
    process.getOutputStream().close();
    boolean ended = process.waitFor(SECONDS, TimeUnit.SECONDS);
    if (!ended) {
      process.descendants().forEach(ProcessHandle::destroyForcibly);
      process.destroyForcibly().waitFor();
    }
    assertTrue(ended, () -> "Neovim did not end\n" + told(told) + told(log));
    return process.exitValue();
  }

  private static String told(Path file) {
    return Files.exists(file) ? Repository.read(file) : "(no " + file.getFileName() + ")\n";
  }

  private static Path copyOf(Path from, Path to) throws IOException {
    try (Stream<Path> paths = Files.walk(from)) {
      for (Path path : paths.toList()) {
        Path copy = to.resolve(from.relativize(path).toString());
        if (Files.isDirectory(path)) {
          Files.createDirectories(copy);
        } else {
          Files.copy(path, copy);
        }
      }
    }
    return to;
  }

  private static Map<String, String> contents(Path demo) throws IOException {
    Map<String, String> contents = new TreeMap<>();
    try (Stream<Path> paths = Files.walk(demo)) {
      for (Path path : paths.filter(Files::isRegularFile).toList()) {
        String bytes = new String(Files.readAllBytes(path), StandardCharsets.UTF_8);
        contents.put(demo.relativize(path).toString(), bytes);
      }
    }
    return contents;
  }
}
