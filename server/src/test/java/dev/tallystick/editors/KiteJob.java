package dev.tallystick.editors;

import com.google.gson.Gson;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * A job with one source and three translations, one of them from right to left and one without
 * blanks, full of characters that take two UTF-16 units. The German file has CR LF at its lines'
 * ends. In each translation one sentence is missing.
 *
 * @param folder where the files lie
 * @param sentences the sentences by name and language; those without a language part paragraphs
 */
record KiteJob(Path folder, Map<String, Map<String, String>> sentences) {
  /** The source first. */
  static final List<String> LANGUAGES = List.of("en", "de", "he", "ja");

  private static final Map<String, String> PLANTED =
      Map.of("de", "tie", "he", "gloves", "ja", "knots");

  /** Comes into the source while the translators work. */
  private static final String NEW = "turn";

  private static final String DELETED = "lost";

  /** Writes the files of the job, and beside them what the source will be and the sentences. */
  static KiteJob in(Path parent) throws IOException {
    Path folder = Files.createDirectories(parent.resolve("job"));
    KiteJob job = new KiteJob(folder, read());
    Files.writeString(folder.resolve("tallystick.json"), "{}\n");
    for (String language : LANGUAGES) {
      String planted = PLANTED.getOrDefault(language, "");
      Files.writeString(job.file(language), job.text(language, Set.of(NEW, planted)));
    }
    Files.createDirectories(job.next());
    Files.writeString(job.next().resolve("first.md"), job.text("en", Set.of(NEW)));
    Files.writeString(job.next().resolve("longer.md"), job.text("en", Set.of()));
    Files.writeString(job.next().resolve("shorter.md"), job.text("en", Set.of(NEW, DELETED)));
    Files.writeString(job.named(), new Gson().toJson(job.sentences));
    return job;
  }

  private static Map<String, Map<String, String>> read() throws IOException {
    Map<String, Map<String, String>> sentences = new LinkedHashMap<>();
    try (InputStream in = KiteJob.class.getResourceAsStream("/editors/kites.txt")) {
      String table = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      for (String entry : table.split("\n\n")) {
        List<String> lines = entry.strip().lines().toList();
        String name = lines.get(0).equals("¶") ? "¶" + sentences.size() : lines.get(0);
        sentences.put(name, languages(lines));
      }
    }
    return sentences;
  }

  private static Map<String, String> languages(List<String> lines) {
    return lines.subList(1, lines.size()).stream()
        .filter(line -> !line.startsWith("#"))
        .collect(Collectors.toMap(line -> line.substring(0, 2), line -> line.substring(3)));
  }

  Path file(String language) {
    return folder.resolve("kites." + language + ".md");
  }

  /** What the source will be. */
  Path next() {
    return folder.resolveSibling("next");
  }

  /** The sentences by name and language, as JSON. */
  Path named() {
    return folder.resolveSibling("sentences.json");
  }

  String sentence(String name, String language) {
    return sentences.get(name).get(language);
  }

  /** A file without some sentences. */
  private String text(String language, Set<String> without) {
    StringBuilder text = new StringBuilder();
    sentences.forEach(
        (name, said) -> {
          if (name.startsWith("¶")) {
            text.append("\n\n");
          } else if (said.containsKey(language) && !without.contains(name)) {
            boolean begins = text.isEmpty() || text.charAt(text.length() - 1) == '\n';
            text.append(begins || language.equals("ja") ? "" : " ").append(said.get(language));
          }
        });
    return lines(language, text.append('\n').toString());
  }

  /** Every text that the source has at one time or another. */
  List<String> sources() {
    return Arrays.asList(
        text("en", Set.of(NEW)), text("en", Set.of()), text("en", Set.of(NEW, DELETED)));
  }

  /** The German file after the missing sentence was put into it, with a line end within. */
  String germanInTheEnd() {
    String before = sentence("box", "de");
    String added = sentence("tie", "de").replaceFirst(" ", "\n");
    String text = text("de", Set.of(NEW, PLANTED.get("de"))).replace("\r\n", "\n");
    return lines("de", text.replace(before + " ", before + " " + added + " "));
  }

  /** With the line ends that the file has. */
  private static String lines(String language, String text) {
    return language.equals("de") ? text.replace("\n", "\r\n") : text;
  }
}
