package dev.tallystick.opendata;

import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import dev.tallystick.align.Aligner;
import dev.tallystick.align.Match;
import dev.tallystick.align.Unit;
import dev.tallystick.run.Cancellation;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;

/**
 * What the language toolkit NLTK (Debian's python3-nltk) makes of pairs of length sequences with
 * its form of the published model.
 *
 * @param constants its parameters
 * @param links for each pair what it links, as {@code [source, target]} in ascending order
 * @param exact the same, once its tail of the normal distribution is replaced by one that never
 *     comes to 0
 */
record Nltk(JsonObject constants, List<String> links, List<String> exact) {
  private static final Path PYTHON = Path.of("/usr/bin/python3");
  private static final int SECONDS = 120;

  /** Runs the script in the test resources; files are put into a folder. */
  static Nltk on(List<Lengths> asked, Path folder) throws Exception {
    Path script = Path.of(Nltk.class.getResource("/opendata/lengths.py").toURI());
    JsonArray pairs = new JsonArray();
    asked.forEach(lengths -> pairs.add(lengths.json()));
    Path in = Files.writeString(folder.resolve("in.json"), pairs.toString());
    Path out = folder.resolve("out.json");
    Path err = folder.resolve("err.txt");
    Process process =
        new ProcessBuilder(PYTHON.toString(), script.toString())
            .redirectInput(in.toFile())
            .redirectOutput(out.toFile())
            .redirectError(err.toFile())
            .start();
    boolean ended = process.waitFor(SECONDS, TimeUnit.SECONDS);
    if (!ended) {
      process.destroyForcibly().waitFor();
    }
    assertTrue(ended && process.exitValue() == 0, () -> told(err));
    JsonObject told = JsonParser.parseString(told(out)).getAsJsonObject();
    return new Nltk(
        told.getAsJsonObject("constants"),
        strings(told.getAsJsonArray("links")),
        strings(told.getAsJsonArray("exact")));
  }

  /** What {@link Aligner#PUBLISHED} links in a pair, in the same notation. */
  static String ours(Lengths lengths) {
    JsonArray links = new JsonArray();
    List<Match> matches =
        Aligner.PUBLISHED
            .align(units(lengths.source()), units(lengths.target()), Cancellation.NONE)
            .matches();
    for (Match match : matches) {
      for (int i = match.sourceFrom(); i < match.sourceTo(); i++) {
        for (int j = match.targetFrom(); j < match.targetTo(); j++) {
          JsonArray link = new JsonArray();
          link.add(i);
          link.add(j);
          links.add(link);
        }
      }
    }
    return links.toString();
  }

  private static List<Unit> units(int[] lengths) {
    List<Unit> units = new ArrayList<>();
    for (int length : lengths) {
      units.add(new Unit(length, length, length, units.isEmpty(), 0, 1, new Unit.Word[0], false));
    }
    return units;
  }

  private static List<String> strings(JsonArray links) {
    return links.asList().stream().map(JsonElement::toString).toList();
  }

  private static String told(Path file) {
    try {
      return Files.readString(file, StandardCharsets.UTF_8);
    } catch (IOException e) {
      return e.toString();
    }
  }
}
