package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** The names that clients give to files. */
class UrisTest {
  private static final Path FILE = Path.of("/srv/süd ufer/50%/a.md").toAbsolutePath();

  @Test
  void whatIsEscapedMakesNoDifference() {
    for (String uri :
        List.of(
            "file:///srv/s%C3%BCd%20ufer/50%25/a.md",
            "file:///srv/s%c3%bcd%20ufer/50%/a.md",
            "file:///srv/süd ufer/50%/a.md",
            "FILE:///srv/süd%20ufer/50%25/%61.md",
            "file://localhost/srv/süd ufer/50%25/a.md",
            "file:/srv/süd ufer/50%25/a.md",
            "file:///srv/./süd ufer/50%25/b/../a.md")) {
      assertEquals(Optional.of(FILE), Uris.file(uri), uri);
    }
  }

  @Test
  void aDriveMayBeEscaped() {
    assertEquals(Uris.file("file:///c:/job/a.md"), Uris.file("file:///c%3A/job/a.md"));
    assertEquals(Path.of("a.md"), Uris.file("file:///c%3A/job/a.md").orElseThrow().getFileName());
  }

  @Test
  void whatIsNoFileNamesNone() {
    for (String uri :
        List.of(
            "untitled:Untitled-1", "", "file:", "file:a.md", "git:/srv/a.md", "file:///a%00b")) {
      assertEquals(Optional.empty(), Uris.file(uri), uri);
    }
  }
}
