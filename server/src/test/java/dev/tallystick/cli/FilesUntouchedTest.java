package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** No command writes to, adds or removes a file. */
class FilesUntouchedTest {
  @TempDir Path folder;

  @Test
  void everyCommandLeavesTheFolderAsItWas() throws IOException {
    CableCar.pair(folder, CableCar.untranslated().replace("\n", "\r\n"));
    CableCar.write(folder.resolve("broken.md"), new byte[] {'a', (byte) 0xC3, '.', '\n'});
    CableCar.write(folder.resolve("broken.de.md"), new byte[] {0, 1, 2});
    Path source = folder.resolve("guide.md");
    Path target = folder.resolve("guide.de.md");
    Map<String, String> before = contents();
    for (String format : List.of("text", "jsonl")) {
      Outcome.of("check", "--format", format, folder);
      Outcome.of("check", "--draft", "--format", format, source, target);
      Outcome.of("align", "--format", format, source, target);
      Outcome.of("align", "--model", "published", "--format", format, source, target);
      Outcome.of("segments", "--format", format, folder.resolve("broken.md"));
      Outcome.of("segments", "--format", format, folder.resolve("broken.de.md"));
      Outcome.of("pairs", "--format", format, folder);
      assertEquals(before, contents());
    }
  }

  private Map<String, String> contents() throws IOException {
    Map<String, String> contents = new TreeMap<>();
    try (Stream<Path> paths = Files.walk(folder)) {
      for (Path path : paths.filter(Files::isRegularFile).toList()) {
        FileTime time = Files.getLastModifiedTime(path);
        String bytes = HexFormat.of().formatHex(Files.readAllBytes(path));
        contents.put(folder.relativize(path).toString(), time + " " + bytes);
      }
    }
    return contents;
  }
}
