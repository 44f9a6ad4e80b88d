package dev.tallystick.editors;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.tidy.Repository;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * A real Neovim with the packaged server. The scripts in the test resources do the work of a
 * translator and write down what they see.
 */
class NeovimIT {
  @TempDir Path folder;

  @Test
  void aTranslatorSeesWhatIsMissingAndJumpsBothWays() throws Exception {
    Path demo = copyOf(Repository.root().resolve("demo"), folder.resolve("demo"));
    Map<String, String> before = contents(demo);
    new Desk(folder, demo)
        .run(neovim("neovim.lua"), Map.of("JAVA", Desk.java(), "JAR", Desk.jar()));
    assertEquals(before, contents(demo), "a file was changed");
  }

  @Test
  void findingsFollowInThreeLanguagesWithTheSetUpOfTheReadme() throws Exception {
    KiteSession session = KiteSession.in(folder);
    session.run("lua", neovim("kites.lua"));
    session.assertPositions();
    session.assertTexts();
  }

  private static List<String> neovim(String script) throws Exception {
    String path = Desk.scripts().resolve(script).toString();
    return List.of("nvim", "--headless", "-u", "NONE", "-i", "NONE", "-n", "-c", "luafile " + path);
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
        contents.put(demo.relativize(path).toString(), Files.readString(path));
      }
    }
    return contents;
  }
}
