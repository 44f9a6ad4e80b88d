package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Values of front matter on the command line. */
class FrontMatterTest {
  @TempDir Path folder;

  @Test
  void aLostDescriptionIsFoundUnlessTheProjectPassesItOver() {
    String about = "---\nweight: 3\ndescription: The car runs from morning till night.\n---\n";
    CableCar.pair(folder, "---\nweight: 3\n---\n" + CableCar.GERMAN);
    Path source = folder.resolve("guide.md");
    CableCar.write(source, about + CableCar.ENGLISH);
    assertEquals(List.of("omission"), codes());
    CableCar.write(folder.resolve("tallystick.json"), "{ \"frontMatter\": [\"title\"] }");
    assertEquals(List.of(), codes());
  }

  private List<String> codes() {
    return Outcome.of("check", "--format", "jsonl", folder).codes();
  }
}
