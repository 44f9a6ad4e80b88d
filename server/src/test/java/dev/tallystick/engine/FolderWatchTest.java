package dev.tallystick.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import java.util.function.Predicate;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The watch of this machine's own folders. Each test waits for an event that must come. */
class FolderWatchTest {
  private static final Event ANYTHING = new Event.FilesChanged(List.of(), true);
  private static final long FAR_TOO_LONG = 60;

  @TempDir Path folder;
  private final BlockingQueue<Event> events = new LinkedBlockingQueue<>();
  private final Watch watch = FolderWatch.open(events::add);

  @AfterEach
  void close() {
    watch.close();
  }

  private Event.FilesChanged await(Predicate<Event.FilesChanged> wanted)
      throws InterruptedException {
    while (true) {
      Event event = events.poll(FAR_TOO_LONG, TimeUnit.SECONDS);
      assertNotNull(event, "nothing came");
      if (event instanceof Event.FilesChanged changed && wanted.test(changed)) {
        return changed;
      }
    }
  }

  @Test
  void filesThatAppearChangeAndVanishAreTold() throws IOException, InterruptedException {
    Path file = Files.createDirectories(folder.resolve("en")).resolve("a.md");
    watch.over(List.of(new Folder(folder, Folder.DEEP)));
    await(ANYTHING::equals);

    Files.writeString(file, "one");
    assertTrue(await(changed -> changed.files().contains(file)).listing());
    Files.writeString(file, "two");
    await(changed -> changed.files().contains(file));
    Files.delete(file);
    assertTrue(await(changed -> changed.files().contains(file) && changed.listing()).listing());
  }

  @Test
  void aFolderThatAppearsIsWatchedToo() throws IOException, InterruptedException {
    watch.over(List.of(new Folder(folder, Folder.DEEP)));
    await(ANYTHING::equals);
    Path inner = Files.createDirectory(folder.resolve("de"));
    await(changed -> changed.files().contains(inner) && changed.listing());

    Path file = Files.writeString(inner.resolve("a.md"), "eins");
    assertEquals(
        List.of(file),
        await(changed -> changed.files().contains(file)).files().stream().distinct().toList());
  }

  @Test
  void theFactsOfAProjectAreTold() throws IOException, InterruptedException {
    watch.over(List.of(new Folder(folder, Folder.DEEP)));
    await(ANYTHING::equals);
    Path file = Files.writeString(folder.resolve("tallystick.json"), "{}");

    assertTrue(await(changed -> changed.files().contains(file)).listing());
  }

  @Test
  void otherFilesAreNotTold() throws IOException, InterruptedException {
    watch.over(List.of(new Folder(folder, Folder.DEEP)));
    await(ANYTHING::equals);
    Files.writeString(folder.resolve("picture.png"), "x");
    Path file = Files.writeString(folder.resolve("a.md"), "eins");

    assertEquals(List.of(file), await(changed -> true).files().stream().distinct().toList());
  }
}
