package dev.tallystick.engine;

import static java.util.stream.Collectors.toSet;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotSame;
import static org.junit.jupiter.api.Assertions.assertSame;

import dev.tallystick.pairing.Pairs;
import dev.tallystick.pairing.Rules;
import java.nio.file.Path;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** When the files of a folder are paired anew. */
class RootTest {
  private static final Path JOB = Path.of("/job").toAbsolutePath();

  private final Root root = new Root(new Folder(JOB, Folder.DEEP));

  private Pairs pairs(String... names) {
    root.forget();
    return root.pairs(() -> Set.of(names).stream().map(JOB::resolve).collect(toSet()), Rules.NONE);
  }

  /** As when one of them is opened in the editor. */
  @Test
  void theSameFilesAreNotPairedAgain() {
    Pairs first = pairs("a.md", "a.de.md");
    assertSame(first, pairs("a.md", "a.de.md"));

    Pairs more = pairs("a.md", "a.de.md", "a.fr.md");
    assertNotSame(first, more);
    assertEquals(2, more.pairs().size());
  }
}
