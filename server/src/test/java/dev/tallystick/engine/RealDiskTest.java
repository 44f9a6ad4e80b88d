package dev.tallystick.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is listed of this machine's folders. */
class RealDiskTest {
  @TempDir Path folder;

  private Path write(String name) throws IOException {
    Path file = folder.resolve(name);
    Files.createDirectories(file.getParent());
    return Files.writeString(file, "{}");
  }

  private List<Path> files(int depth, List<String> unread) throws Unreadable {
    return Disk.REAL.files(new Folder(folder, depth), unread::add);
  }

  @Test
  void theFactsOfAProjectAreListedAtTheRootOnly() throws IOException, Unreadable {
    Path project = write("tallystick.json");
    Path inside = write("de/a.md");
    write("de/tallystick.json");
    write("other.json");
    assertEquals(List.of(inside, project), files(Folder.DEEP, new ArrayList<>()));
    assertEquals(List.of(project), files(1, new ArrayList<>()));
  }

  @Test
  void theFactsOfAProjectThatLieElsewhereAreNotRead() throws IOException, Unreadable {
    Path outside = Files.writeString(folder.resolve("facts.json"), "{}");
    Path inner = Files.createDirectory(folder.resolve("inner"));
    Files.createSymbolicLink(inner.resolve("tallystick.json"), outside);
    assertEquals(List.of(), Disk.REAL.files(inner));
  }

  /**
   * Rights keep nobody out who is the administrator, as tests often are. But no system reaches a
   * folder whose name in full is longer than it can express.
   */
  @Test
  void whatCannotBeLookedIntoIsToldAndTheRestIsListed() throws IOException, Unreadable {
    Path file = write("a.md");
    String name = "n".repeat(200);
    Path upper = folder;
    Path lower = Files.createDirectory(folder.resolve("lower"));
    for (int i = 0; i < 15; i++) {
      upper = Files.createDirectory(upper.resolve(name));
      lower = Files.createDirectory(lower.resolve(name));
    }
    Path moved = upper.resolve("lower");
    Files.move(folder.resolve("lower"), moved);
    List<String> unread = new ArrayList<>();
    assertEquals(List.of(file), files(Folder.DEEP, unread));
    assertEquals(1, unread.size());
    assertTrue(unread.get(0).startsWith(moved.toString()));
    assertTrue(unread.get(0).contains("cannot be looked into, and was left out."));
    Files.move(moved, folder.resolve("lower"));
  }
}
