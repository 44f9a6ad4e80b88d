package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Text;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Which blocks subtitles come apart into. */
class SubtitlesBlocksTest {
  @Test
  void aSentenceRunsOverCuesUntilItEnds() {
    blocks(
        """
        1
        00:00:01,000 --> 00:00:02,000
        The ferry that goes
        to Velm

        2
        00:00:02,100 --> 00:00:03,000
        has left. We must

        3
        00:00:03,100 --> 00:00:04,000
        wait.

        4
        00:00:04,100 --> 00:00:05,000
        “Again?”

        5
        00:00:05,100 --> 00:00:06,000
        Again...

        6
        00:00:06,100 --> 00:00:07,000
        ...and again.
        """,
        """
        PARAGRAPH: The ferry that goes⏎to Velm⏎has left. We must⏎wait.
        PARAGRAPH: “Again?”
        PARAGRAPH: Again...⏎...and again.
        """);
  }

  @Test
  void silenceAndTimesThatRunBackPartSentences() {
    blocks(
        """
        00:01.000 --> 00:02.000
        I thought

        00:06.000 --> 00:07.000
        you knew

        00:11.001 --> 00:12.000
        the way

        00:05.000 --> 00:06.000
        home.

        00:06.100 --> 00:07.000
        Yes.
        """,
        """
        PARAGRAPH: I thought⏎you knew
        PARAGRAPH: the way
        PARAGRAPH: home.
        PARAGRAPH: Yes.
        """);
  }

  @Test
  void whatStandsElsewhereOnTheScreenIsAnotherText() {
    blocks(
        """
        00:01.000 --> 00:02.000 line:0
        The old port

        00:02.100 --> 00:03.000 align:start
        {\\an8}The new port

        00:03.100 --> 00:04.000
        There is

        00:04.100 --> 00:05.000
        no other.
        """,
        """
        PARAGRAPH: The old port
        PARAGRAPH: The new port
        PARAGRAPH: There is⏎no other.
        """);
  }

  @Test
  void everySpeakerHasBlocksOfTheirOwn() {
    blocks(
        """
        00:01.000 --> 00:02.000
        Where is the boat
        -At the pier,

        00:02.100 --> 00:03.000
        as always.

        00:03.100 --> 00:04.000
        <v Mira>And the crew

        00:04.100 --> 00:05.000
        <v Mira>of the boat

        00:05.100 --> 00:06.000
        <v Olm>is asleep.
        """,
        """
        PARAGRAPH: Where is the boat
        PARAGRAPH: At the pier,⏎as always.
        PARAGRAPH: And the crew⏎of the boat
        PARAGRAPH: is asleep.
        """);
  }

  @Test
  void soundsAndSongsStandForThemselves() {
    blocks(
        """
        00:01.000 --> 00:02.000
        We must

        00:02.100 --> 00:03.000
        [horn]
        (bell)
        go.

        00:03.100 --> 00:04.000
        ♪

        00:04.100 --> 00:05.000
        ♪ Row the boat ♪

        00:05.100 --> 00:06.000
        ♪ to the shore ♪
        """,
        """
        PARAGRAPH: We must
        PARAGRAPH: [horn]
        PARAGRAPH: (bell)
        PARAGRAPH: go.
        PARAGRAPH: ♪ Row the boat ♪
        PARAGRAPH: ♪ to the shore ♪
        """);
  }

  @Test
  void whereNoSentenceIsClosedEachCueStandsForItself() {
    blocks(
        """
        00:01.000 --> 00:02.000
        渡し船は

        00:02.100 --> 00:03.000
        もう出た
        次は夜だ
        """,
        """
        PARAGRAPH: 渡し船は
        PARAGRAPH: もう出た⏎次は夜だ
        """);
  }

  @Test
  void aStyleSheetIsALandmarkAndParts() {
    blocks(
        """
        WEBVTT

        00:01.000 --> 00:02.000
        We must

        STYLE
        ::cue { color: red }

        00:02.100 --> 00:03.000
        go.
        """,
        """
        PARAGRAPH: We must
        VERBATIM
        PARAGRAPH: go.
        """);
  }

  @Test
  void extentsTakeInTheCues() {
    Extraction.assertExtents(
        Format.SUBRIP,
        """
        1
        00:00:01,000 --> 00:00:02,000
        We must

        2
        00:00:02,100 --> 00:00:03,000
        <i>go</i>
        - No.

        00:00:04,000 --> 00:00:05,000
        <b>Yes.</b>
        """,
        """
        1⏎00:00:01,000 --> 00:00:02,000⏎We must⏎⏎2⏎00:00:02,100 --> 00:00:03,000⏎<i>go</i>
        - No.
        00:00:04,000 --> 00:00:05,000⏎<b>Yes.</b>
        """);
  }

  @Test
  void emptyFilesHaveNoBlocks() {
    for (String empty : List.of("", "\uFEFF", "\n", "WEBVTT", "1", "1\n00:01.000 --> 00:02.000")) {
      assertEquals(List.of(), Format.SUBRIP.blocks(new Text(empty)));
    }
  }

  private static void blocks(String source, String expected) {
    Extraction.assertBlocks(Format.WEBVTT, source, expected);
  }
}
