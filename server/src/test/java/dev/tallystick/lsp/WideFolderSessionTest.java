package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import java.util.function.Consumer;
import org.eclipse.lsp4j.DidChangeConfigurationParams;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * What is done most often must not look at all pairs of a folder. Memory is counted, not time, as
 * it is the same on a busy machine: what looks at each pair takes some for each.
 */
class WideFolderSessionTest {
  private static final int FEW = 4;
  private static final int MANY = 200;
  private static final int TIMES = 20;

  @TempDir Path folder;

  /** The bytes that the loop takes for something in a folder with so many pairs, all watched. */
  private long bytes(int pairs, Consumer<Buffer> something) {
    Work work = new Work(folder.resolve(String.valueOf(pairs)));
    for (int i = 0; i < pairs; i++) {
      work.write("en/fare" + i + ".md", "Carts cross for " + i + " tokens.\n");
      work.write("de/fare" + i + ".md", "Karren kosten " + i + " Marken.\n");
    }
    Set<Thread> before = new HashSet<>(Thread.getAllStackTraces().keySet());
    try (Talk talk = Talk.in(work.folder())) {
      talk.server
          .getWorkspaceService()
          .didChangeConfiguration(new DidChangeConfigurationParams(Map.of("scope", "folder")));
      talk.settle();
      Buffer buffer = talk.open(work.file("de/fare0.md"), "Karren kosten 0 Marken.\n");
      talk.settle();
      long loop =
          Thread.getAllStackTraces().keySet().stream()
              .filter(thread -> !before.contains(thread))
              .filter(thread -> thread.getName().startsWith("tallystick-loop"))
              .findFirst()
              .orElseThrow()
              .getId();
      var threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
      something.accept(buffer);
      long start = threads.getThreadAllocatedBytes(loop);
      for (int i = 0; i < TIMES; i++) {
        something.accept(buffer);
      }
      return threads.getThreadAllocatedBytes(loop) - start;
    }
  }

  private void costsTheSameInAnyFolder(Consumer<Buffer> something) {
    long few = bytes(FEW, something);
    long many = bytes(MANY, something);
    assertTrue(many < 2 * few, many + " bytes for " + MANY + " pairs, " + few + " for " + FEW);
  }

  @Test
  void aRequestCostsTheSameInAnyFolder() {
    costsTheSameInAnyFolder(buffer -> buffer.highlighted("Marken"));
  }

  @Test
  void anEditCostsTheSameInAnyFolder() {
    costsTheSameInAnyFolder(
        buffer -> {
          buffer.type(0, 0, "x");
          buffer.highlighted("Marken");
        });
  }
}
