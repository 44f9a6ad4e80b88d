package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import dev.tallystick.tidy.Repository;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** The demo job: all that {@code demo/planted.jsonl} lists is found, and nothing else. */
class DemoTest {
  private static final Path DEMO = Repository.root().resolve("demo");
  private static final String JAPANESE = "ja/fog-signal.md";

  private final List<Fault> planted = planted();

  /**
   * A fault of a translation.
   *
   * @param translation the file that has it, as seen from the demo's folder
   * @param code its kind
   * @param side the side that it is told on
   * @param text the sentence, or the first one of several
   */
  private record Fault(String translation, String code, String side, String text)
      implements Comparable<Fault> {
    @Override
    public int compareTo(Fault other) {
      return toString().compareTo(other.toString());
    }

    /** The same fault with only so much of its text as was planted. */
    Fault cutTo(List<Fault> planted) {
      return planted.stream()
          .filter(fault -> text.startsWith(fault.text) && equals(fault.with(text)))
          .findFirst()
          .orElse(this);
    }

    private Fault with(String other) {
      return new Fault(translation, code, side, other);
    }

    @Override
    public String toString() {
      return translation + " " + code + " on the " + side + ": " + text;
    }
  }

  @Test
  void eachQuoteStandsOnceInItsFile() {
    for (Fault fault : planted) {
      String file = fault.side.equals("source") ? english(fault.translation) : fault.translation;
      String text = Repository.read(DEMO.resolve(file));
      int at = text.indexOf(fault.text);
      assertTrue(at >= 0, fault::toString);
      assertEquals(-1, text.indexOf(fault.text, at + 1), fault::toString);
    }
  }

  @Test
  void inADraftAllThatIsPlantedIsFoundAndNothingElse() {
    List<Fault> found = found("--draft");
    assertEquals(lines(planted), lines(found.stream().map(fault -> fault.cutTo(planted)).toList()));
  }

  @Test
  void finishedTheMissingTailOfTheJapaneseIsOneOmissionMore() {
    List<Fault> found = found();
    List<Fault> japanese =
        found.stream().filter(fault -> fault.translation.equals(JAPANESE)).toList();
    List<Fault> others =
        found.stream().filter(fault -> !fault.translation.equals(JAPANESE)).toList();
    assertEquals(
        lines(planted), lines(others.stream().map(fault -> fault.cutTo(planted)).toList()));
    assertEquals(1, japanese.size(), () -> lines(japanese));
    Fault tail = japanese.get(0);
    assertEquals("omission", tail.code);
    assertTrue(Repository.read(DEMO.resolve(english(JAPANESE))).strip().endsWith(tail.text));
  }

  @Test
  void onlyWhatRunsOverSeveralSentencesIsLongerThanItsQuote() {
    List<String> longer =
        found("--draft").stream()
            .filter(fault -> !fault.cutTo(planted).equals(fault))
            .map(Fault::translation)
            .toList();
    assertEquals(List.of("de/boat-and-stores.md"), longer);
  }

  @Test
  void everyChapterIsPairedWithEveryTranslationOfIt() {
    List<String> targets =
        Outcome.of("pairs", "--format", "jsonl", DEMO).json().stream()
            .map(pair -> relative(pair.get("target").getAsString()))
            .toList();
    assertEquals(
        List.of(
            "de/boat-and-stores.md",
            "fr/boat-and-stores.md",
            "de/fog-signal.md",
            "fr/fog-signal.md",
            "he/fog-signal.md",
            JAPANESE,
            "de/lamp.md",
            "fr/lamp.md",
            "de/safety-film.srt",
            "de/visitors.html",
            "de/weather-log.adoc"),
        targets);
  }

  private static List<Fault> found(String... options) {
    Object[] words = new Object[options.length + 4];
    words[0] = "check";
    words[1] = "--format";
    words[2] = "jsonl";
    System.arraycopy(options, 0, words, 3, options.length);
    words[options.length + 3] = DEMO;
    return Outcome.of(words).json().stream().map(DemoTest::fault).toList();
  }

  private static Fault fault(JsonObject finding) {
    String file = relative(finding.get("file").getAsString());
    String side = finding.get("side").getAsString();
    String counterpart = relative(finding.getAsJsonObject("counterpart").get("file").getAsString());
    return new Fault(
        side.equals("source") ? counterpart : file,
        finding.get("code").getAsString(),
        side,
        Fields.covered(finding, Repository.read(DEMO.resolve(file))));
  }

  private static List<Fault> planted() {
    return Repository.read(DEMO.resolve("planted.jsonl"))
        .lines()
        .map(line -> JsonParser.parseString(line).getAsJsonObject())
        .map(
            line ->
                new Fault(
                    line.get("file").getAsString(),
                    line.get("code").getAsString(),
                    line.get("side").getAsString(),
                    line.get("quote").getAsString()))
        .toList();
  }

  private static String english(String translation) {
    return "en" + translation.substring(translation.indexOf('/'));
  }

  private static String relative(String file) {
    return Outcome.shown(DEMO.relativize(Path.of(file)));
  }

  private static String lines(List<Fault> faults) {
    return faults.stream().sorted().map(fault -> fault + "\n").collect(Collectors.joining());
  }
}
