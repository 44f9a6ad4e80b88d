package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import dev.tallystick.tidy.Repository;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The launcher beside the jar, with its archive of classes and without. */
class LauncherIT {
  private static final int SECONDS = 60;
  private static final Path BUILT = Repository.root().resolve("server/target");
  private static final String JAR = "tallystick.jar";
  private static final String ARCHIVE = "tallystick.jsa";
  private static final String LAUNCHER = "tallystick";

  /** With this Java refuses to start where the archive does not fit. */
  private static final Map<String, String> STRICT = Map.of("JDK_JAVA_OPTIONS", "-Xshare:on");

  @TempDir Path folder;

  private Path moved;
  private Run expected;

  @BeforeEach
  void prepare() throws Exception {
    moved = Files.createDirectory(folder.resolve("a place of its own"));
    for (String name : List.of(JAR, ARCHIVE, LAUNCHER)) {
      Files.copy(BUILT.resolve(name), moved.resolve(name));
    }
    moved.resolve(LAUNCHER).toFile().setExecutable(true);
    expected = run(Map.of(), "java", "-jar", BUILT.resolve(JAR).toString());
    assertEquals(1, expected.code);
    assertEquals("", expected.err);
  }

  @Test
  void printsWhatTheJarPrints() throws Exception {
    assertEquals(expected, run(Map.of(), BUILT.resolve(LAUNCHER).toString()));
  }

  @Test
  void startsFromTheArchiveFromWhereverItIsCalled() throws Exception {
    Path link = Files.createSymbolicLink(folder.resolve("link"), BUILT.resolve(LAUNCHER));
    Run linked = run(STRICT, link.toString());
    Files.delete(link);
    assertEquals(expected.out, linked.out);
  }

  @Test
  void saysNothingOfAnArchiveThatDoesNotFit() throws Exception {
    assertNotEquals(expected.out, run(STRICT, moved.resolve(LAUNCHER).toString()).out);
    assertEquals(expected, run(Map.of(), moved.resolve(LAUNCHER).toString()));
  }

  @Test
  void saysNothingOfAnArchiveThatIsNone() throws Exception {
    Files.writeString(moved.resolve(ARCHIVE), "no archive");
    assertEquals(expected, run(Map.of(), moved.resolve(LAUNCHER).toString()));
  }

  @Test
  void saysNothingOfAMissingArchive() throws Exception {
    Files.delete(moved.resolve(ARCHIVE));
    assertEquals(expected, run(Map.of(), moved.resolve(LAUNCHER).toString()));
  }

  private record Run(int code, String out, String err) {}

  /** Checks a pair of the demo: 1 and findings if all is well. */
  private Run run(Map<String, String> environment, String... command) throws Exception {
    Path out = folder.resolve("out.txt");
    Path err = folder.resolve("err.txt");
    ProcessBuilder builder = new ProcessBuilder(command);
    builder.command().addAll(List.of("check", "en/lamp.md", "de/lamp.md"));
    builder.environment().putAll(environment);
    Process process =
        builder
            .directory(Repository.root().resolve("demo").toFile())
            .redirectOutput(out.toFile())
            .redirectError(err.toFile())
            .start();
    if (!process.waitFor(SECONDS, TimeUnit.SECONDS)) {
      process.destroyForcibly().waitFor();
    }
    return new Run(process.exitValue(), Repository.read(out), Repository.read(err));
  }
}
