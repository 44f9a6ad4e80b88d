package dev.tallystick.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Random;
import java.util.concurrent.CompletableFuture;
import java.util.stream.Stream;
import org.eclipse.lsp4j.Position;

/**
 * How fast the live loop is, over JSON-RPC and between processes, beside a server that answers at
 * once and knows nothing. Writes {@code BENCHMARKS.md} into the folder that it is told.
 */
public final class LoopSpeed {
  private static final List<String> OURS = List.of("dev.tallystick.cli.Tallystick", "serve");
  private static final List<String> ECHO = List.of(EchoServer.class.getName());
  private static final int[] SIZES = {20, 200, 2000};
  private static final int TIMES = 200;
  private static final int WARM_UP = 50;
  private static final int PAIRS = 300;
  private static final int SENTENCES_EACH = 60;

  private final List<String> rows = new ArrayList<>();
  private final Path folder;

  private LoopSpeed(Path folder) {
    this.folder = folder;
  }

  /** Takes one argument: the folder to write the results into. */
  public static void main(String[] arguments) throws Exception {
    Path folder = Files.createTempDirectory("tallystick-bench");
    try {
      LoopSpeed speed = new LoopSpeed(folder);
      for (int sentences : SIZES) {
        speed.onePair(sentences);
      }
      speed.firstPass();
      Files.writeString(Path.of(arguments[0], "BENCHMARKS.md"), speed.page());
      System.out.println(speed.page());
    } finally {
      delete(folder);
    }
  }

  private void onePair(int sentences) throws IOException {
    Path job = folder.resolve("pair" + sentences);
    InventedPair pair = new InventedPair(sentences, 7);
    write(job.resolve("en/text.txt"), pair.source());
    Path target = write(job.resolve("de/text.txt"), pair.target());
    measure(job, target, pair.target(), sentences, "echo", ECHO);
    measure(job, target, pair.target(), sentences, "Tallystick", OURS);
  }

  private void measure(
      Path job, Path target, String text, int sentences, String name, List<String> main)
      throws IOException {
    Times edits = new Times();
    Times definitions = new Times();
    Times hovers = new Times();
    int lines = (int) text.lines().count();
    Random random = new Random(sentences);
    try (Peer peer = new Peer(job, main)) {
      peer.open(target, text);
      for (int i = -WARM_UP; i < TIMES; i++) {
        Position at = new Position(random.nextInt((lines + 1) / 2) * 2, 2); // every other is blank
        long edit = peer.edit(target, at);
        long definition = peer.definition(target, at);
        long hover = peer.hover(target, at);
        if (i >= 0) {
          edits.add(edit);
          definitions.add(definition);
          hovers.add(hover);
        }
      }
    }
    String size = sentences + " sentences";
    row("didChange to publishDiagnostics", size, name, edits);
    row("definition", size, name, definitions);
    row("hover", size, name, hovers);
  }

  /** Requests on an open pair while all other pairs of its folder are looked at for the first time. */
  private void firstPass() throws IOException {
    Path job = folder.resolve("many");
    for (int i = 0; i < PAIRS; i++) {
      InventedPair pair = new InventedPair(SENTENCES_EACH, i);
      write(job.resolve("en/text" + i + ".txt"), pair.source());
      write(job.resolve("de/text" + i + ".txt"), pair.target());
    }
    Path target = job.resolve("de/text7.txt");
    Times asked = new Times();
    Times edits = new Times();
    try (Peer peer = new Peer(job, OURS)) {
      peer.open(target, Files.readString(target));
      CompletableFuture<Object> pass = peer.checkFolder();
      for (int i = 0; !pass.isDone(); i++) {
        Position at = new Position(i % 10 * 2, 2);
        if (i % 10 == 9) {
          edits.add(peer.edit(target, at));
        }
        asked.add(i % 2 == 0 ? peer.hover(target, at) : peer.definition(target, at));
      }
      pass.join();
    }
    String size = PAIRS + " pairs of " + SENTENCES_EACH;
    row("definition and hover during the first pass", size, "Tallystick", asked);
    row("didChange to publishDiagnostics during it", size, "Tallystick", edits);
  }

  private void row(String what, String size, String server, Times times) {
    rows.add("| " + what + " | " + size + " | " + server + " | " + times.cells() + " |");
  }

  private String page() {
    rows.sort(Comparator.comparing((String row) -> !row.contains("publish")));
    return """
        # How fast the live loop is

        Written by `mvn verify -Pbench -DskipTests -Dbenchmark=dev.tallystick.bench.LoopSpeed -Dspeed=.`. A client talks JSON-RPC to servers that run as processes of their own. The echo server answers at once and knows nothing: its figures are what the protocol, the library and the machine cost by themselves. Compare figures of one run only. A new server process for each size; %d edits before the measured ones; each edit is followed by a definition and a hover at its place.

        Milliseconds; %s, Java %s, %d processors.

        | what | text | server | times | median | p99 | most |
        |---|---|---|---|---|---|---|
        %s
        """
        .formatted(
            WARM_UP,
            System.getProperty("os.name"),
            System.getProperty("java.version"),
            Runtime.getRuntime().availableProcessors(),
            String.join("\n", rows));
  }

  private static Path write(Path file, String text) throws IOException {
    Files.createDirectories(file.getParent());
    return Files.writeString(file, text);
  }

  private static void delete(Path folder) throws IOException {
    try (Stream<Path> files = Files.walk(folder)) {
      for (Path file : files.sorted(Comparator.reverseOrder()).toList()) {
        Files.delete(file);
      }
    }
  }
}
