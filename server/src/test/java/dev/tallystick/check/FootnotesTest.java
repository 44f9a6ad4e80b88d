package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.align.Aligner;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Text;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Footnotes that one side only has. */
class FootnotesTest {
  private static final List<String> EN =
      List.of(
          "The lamp of Orr burns whale oil, and it burns it from dusk till dawn.",
          "In summer the keeper sleeps in the morning, when the sun has risen over Velm.",
          "Nobody has seen the tower without its light for a hundred and twenty years.",
          "The oil comes by boat, twice a year, in barrels of oak.",
          "Who wants to climb the 212 steps needs a good heart, and a coat even in July.",
          "At the top hangs a bell that was cast in 1834 and has rung in every fog since.",
          "The keeper writes down each ship that passes, with its flag and its course.",
          "His books fill a whole wall of the kitchen, and his wife reads them in winter.");
  private static final List<String> DE =
      List.of(
          "Die Lampe von Orr brennt mit Walöl, und zwar von der Dämmerung bis zum Morgen.",
          "Im Sommer schläft der Wärter am Vormittag, wenn die Sonne über Velm aufgegangen ist.",
          "Seit hundertzwanzig Jahren hat niemand den Turm ohne sein Licht gesehen.",
          "Das Öl kommt zweimal im Jahr mit dem Boot, in Fässern aus Eiche.",
          "Wer die 212 Stufen steigen will, braucht ein gutes Herz und selbst im Juli einen Mantel.",
          "Oben hängt eine Glocke, die 1834 gegossen wurde und seither in jedem Nebel läutet.",
          "Der Wärter schreibt jedes Schiff auf, das vorbeifährt, mit Flagge und Kurs.",
          "Seine Bücher füllen eine ganze Wand der Küche, und seine Frau liest sie im Winter.");
  private static final String NOTE_EN =
      "Velm is the smaller one of the two islands in the sound, with a church and eleven houses.";
  private static final String NOTE_DE =
      "Velm ist die kleinere der beiden Inseln im Sund, mit einer Kirche und elf Häusern.";

  private static String markdown(List<String> paragraphs, String note) {
    return String.join("\n\n", paragraphs).replace("Velm", "Velm[^1]") + "\n\n[^1]: " + note + "\n";
  }

  private static String asciiDoc(List<String> paragraphs, String note) {
    return String.join("\n\n", paragraphs).replace("Velm", "Velmfootnote:[" + note + "]") + "\n";
  }

  private static String without(List<String> paragraphs) {
    return String.join("\n\n", paragraphs) + "\n";
  }

  @Test
  void oneOnBothSidesIsNoFinding() {
    assertEquals("", check(Format.ASCIIDOC, asciiDoc(EN, NOTE_EN), asciiDoc(DE, NOTE_DE)));
    assertEquals("", check(Format.MARKDOWN, markdown(EN, NOTE_EN), markdown(DE, NOTE_DE)));
  }

  @Test
  void oneThatTheTranslatorAddsIsInformation() {
    String expected =
        "addition information: "
            + NOTE_DE
            + " (Nothing in the source stands for this sentence. A note of the translator's?)\n";
    assertEquals(expected, check(Format.MARKDOWN, without(EN), markdown(DE, NOTE_DE)));
    assertEquals(expected, check(Format.ASCIIDOC, without(EN), asciiDoc(DE, NOTE_DE)));
  }

  @Test
  void oneThatIsLostIsAnOmission() {
    assertEquals(
        "omission warning: " + NOTE_EN + "\n",
        check(Format.MARKDOWN, markdown(EN, NOTE_EN), without(DE)));
    assertEquals(
        "omission warning: " + NOTE_EN + "\n",
        check(Format.ASCIIDOC, asciiDoc(EN, NOTE_EN), without(DE)));
  }

  private static String check(Format format, String source, String target) {
    Reading one = Reading.of(new Text(source), format, "en", Cancellation.NONE);
    Reading other = Reading.of(new Text(target), format, "de", Cancellation.NONE);
    StringBuilder found = new StringBuilder();
    PairResult result = PairResult.of(one, other, Aligner.ADAPTIVE, false, Cancellation.NONE);
    for (Finding finding : result.findings()) {
      String side = finding.side() == OnSide.SOURCE ? source : target;
      found
          .append(finding.code().word() + " " + finding.severity().word() + ": ")
          .append(finding.span().of(side))
          .append(finding.code() == Code.ADDITION ? " (" + finding.message() + ")" : "")
          .append('\n');
    }
    return found.toString();
  }
}
