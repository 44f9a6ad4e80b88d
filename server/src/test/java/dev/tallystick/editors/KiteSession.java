package dev.tallystick.editors;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The same job in any editor: its script does the work of a translator and looks at what is shown;
 * afterwards everything that passed between the editor and the server is looked at here.
 *
 * @param job the job
 * @param desk where the editor runs
 */
record KiteSession(KiteJob job, Desk desk) {
  private static final List<String> ASKED =
      List.of(
          "textDocument/publishDiagnostics",
          "textDocument/definition",
          "textDocument/references",
          "textDocument/hover",
          "textDocument/codeAction",
          "textDocument/documentHighlight",
          "textDocument/documentSymbol",
          "textDocument/selectionRange");

  static KiteSession in(Path folder) throws IOException {
    KiteJob job = KiteJob.in(folder);
    return new KiteSession(job, new Desk(folder, job.folder()));
  }

  /** Runs an editor, set up as README shows it in a language. */
  void run(String language, List<String> command) throws Exception {
    desk.run(
        command,
        Map.of(
            "SNIPPET", desk.snippet(language).toString(),
            "NEXT", job.next().toString(),
            "SENTENCES", job.named().toString()));
    desk.awaitEndOfServer();
  }

  /** No position is wrong, and many would be if columns were counted in another unit. */
  void assertPositions() throws IOException {
    Places places = exchange().places(desk.toEditor());
    assertEquals(List.of(), places.wrong());
    for (String method : ASKED) {
      assertTrue(places.telling().getOrDefault(method, 0) > 0, method + " " + places.telling());
    }
    assertEquals(List.of(), Exchange.errors(desk.toEditor()));
  }

  /** The server's texts are those on the disk, whose line ends are as they were. */
  void assertTexts() throws IOException {
    Map<String, String> open = exchange().open();
    for (String language : KiteJob.LANGUAGES) {
      String text = Files.readString(job.file(language));
      assertEquals(plain(text), plain(open.get(uri(language))), language);
    }
    assertEquals(job.germanInTheEnd(), Files.readString(job.file("de")));
  }

  private Exchange exchange() throws IOException {
    Map<String, List<String>> onDisk = new HashMap<>();
    for (String language : KiteJob.LANGUAGES) {
      onDisk.put(uri(language), List.of(Files.readString(job.file(language))));
    }
    onDisk.put(uri("en"), job.sources());
    return new Exchange(desk.toServer(), onDisk);
  }

  private String uri(String language) throws IOException {
    return "file://" + job.file(language).toRealPath();
  }

  private static String plain(String text) {
    return text.replace("\r\n", "\n");
  }
}
