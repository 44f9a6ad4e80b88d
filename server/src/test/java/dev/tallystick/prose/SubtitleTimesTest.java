package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** When the text of subtitles is on the screen. */
class SubtitleTimesTest {
  private static List<Block> blocks(String file) {
    return Format.SUBRIP.blocks(new Text(file));
  }

  private static Optional<Times> shown(String file, String stretch) {
    int at = file.indexOf(stretch);
    Span span = new Span(at, at + stretch.length());
    return blocks(file).stream()
        .filter(block -> block.extent().overlaps(span))
        .findFirst()
        .flatMap(block -> block.shown(span));
  }

  @Test
  void aSentenceIsShownAsLongAsTheCuesThatItStandsIn() {
    String file =
        """
        00:01.000 --> 00:02.000
        The ferry that goes

        00:02.100 --> 00:03.000
        to Velm has left. We must

        1:00:03.100 --> 1:00:04.5
        wait.

        00:02.200 --> 00:04.000
        Again?
        """;
    assertEquals(
        Optional.of(new Times(1_000, 3_000)),
        shown(file, "The ferry that goes" + "\n\n00:02.100 --> 00:03.000\nto Velm has left."));
    assertEquals(Optional.of(new Times(2_100, 3_000)), shown(file, "We must"));
    assertEquals(Optional.of(new Times(3_603_100, 3_604_500)), shown(file, "wait."));
    assertEquals(Optional.of(new Times(2_200, 4_000)), shown(file, "Again?"));
  }

  @Test
  void twoSpeakersOfOneCueAreShownTogether() {
    String file =
        """
        7
        00:00:01,000 --> 00:00:02,000
        - Are you there, Mira?
        - No.
        """;
    assertEquals(Optional.of(new Times(1_000, 2_000)), shown(file, "Are you there"));
    assertEquals(Optional.of(new Times(1_000, 2_000)), shown(file, "No."));
  }

  @Test
  void strangeTimesAreReadAsTheyStand() {
    String file =
        """
        1
        -00:00:01,500 --> 00:00:02,000
        Before the start.

        2
        99:59:59,999 --> 00:00:00,000
        Behind the end.

        Without any.
        """;
    assertEquals(Optional.of(new Times(-1_500, 2_000)), shown(file, "Before the start."));
    assertEquals(Optional.of(new Times(359_999_999, 0)), shown(file, "Behind the end."));
    assertEquals(Optional.empty(), shown(file, "Without any."));
    assertEquals(3, blocks(file).size());
  }

  @Test
  void otherFormatsHaveNoTimes() {
    Block block = Format.PLAIN.blocks(new Text("00:01.000 --> 00:02.000\nNo.\n")).get(0);
    assertEquals(Optional.empty(), block.shown(block.extent()));
  }
}
