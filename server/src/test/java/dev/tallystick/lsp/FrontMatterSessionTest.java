package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import org.eclipse.lsp4j.FileChangeType;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Which values of front matter are prose is up to the project, from one moment to the next. */
class FrontMatterSessionTest {
  private static final String NAMED = "{ \"frontMatter\": [\"title\", \"teaser\"] }";
  private static final String EN =
      "---\ntitle: The ferry\nteaser: The lamp burns from dusk till dawn.\n---\n" + Ferry.EN;
  private static final String DE = "---\ntitle: Die Fähre\n---\n" + Ferry.DE;

  @TempDir Path folder;

  @Test
  void theKeysThatTheProjectNamesCountAtOnce() {
    Work work = new Work(folder);
    work.write("en/ferry.md", EN);
    work.write("de/ferry.md", DE);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), DE);
      talk.settle();
      assertEquals(List.of(), talk.codes(work.en()));

      work.write("tallystick.json", NAMED);
      talk.wrote(FileChangeType.Created, work.file("tallystick.json"));
      assertEquals(List.of("omission"), talk.codes(work.en()));

      Buffer facts = talk.open(work.file("tallystick.json"), NAMED);
      facts.whole("{ \"frontMatter\": [] }");
      assertEquals(List.of(), talk.codes(work.en()));
    }
  }
}
