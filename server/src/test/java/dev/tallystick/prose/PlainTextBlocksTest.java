package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Text;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Which blocks plain text comes apart into. */
class PlainTextBlocksTest {
  @Test
  void aParagraphOnEachLineIsABlockEach() {
    blocks(
        """
        The ferry to Orr leaves at six in the morning and again at noon, unless the tide is out.
        Nobody knows when it will come back.
        Tickets are sold on board, and children under four years travel free of charge, as do dogs.
        Have a good trip.
        """,
        """
        PARAGRAPH: The ferry to Orr leaves at six in the morning and again at noon, unless the tide\
         is out.
        PARAGRAPH: Nobody knows when it will come back.
        PARAGRAPH: Tickets are sold on board, and children under four years travel free of charge,\
         as do dogs.
        PARAGRAPH: Have a good trip.
        """);
  }

  @Test
  void sentencesOfNearlyOneWidthAreABlockEach() {
    blocks(
        """
        The ferry to Orr leaves at six in the morning.
        The boats of the others go whenever they like.
        (The harbour master writes down every hour.)
        "Nobody in the village has ever read the book."
        """,
        """
        PARAGRAPH: The ferry to Orr leaves at six in the morning.
        PARAGRAPH: The boats of the others go whenever they like.
        PARAGRAPH: (The harbour master writes down every hour.)
        PARAGRAPH: "Nobody in the village has ever read the book."
        """);
  }

  @Test
  void shortLinesAreABlockEach() {
    blocks(
        "Cast off\nHoist the sail\nTurn back\n",
        """
        PARAGRAPH: Cast off
        PARAGRAPH: Hoist the sail
        PARAGRAPH: Turn back
        """);
  }

  @Test
  void spokenLinesAreABlockEach() {
    blocks(
        """
        「港の朝は早いから、早く寝なさいと母はいつも言う」
        「霧の中を漁師たちが静かに歩いていくのを見たよ」
        「灯台の明かりはまだ消えていないが空はもう白い」
        """,
        """
        PARAGRAPH: 「港の朝は早いから、早く寝なさいと母はいつも言う」
        PARAGRAPH: 「霧の中を漁師たちが静かに歩いていくのを見たよ」
        PARAGRAPH: 「灯台の明かりはまだ消えていないが空はもう白い」
        """);
  }

  @Test
  void itemsNestByTheirIndent() {
    blocks(
        """
        - rope
            * thin
            * thick
          goes on
        - oil
        no item
        """,
        """
        ITEM 1: rope
        ITEM 2: thin
        ITEM 2: thick
        PARAGRAPH: goes on
        ITEM 1: oil
        PARAGRAPH: no item
        """);
  }

  @Test
  void headingsAreUnderlinedOrInCapitals() {
    blocks(
        """
        The Ferry
        =========
        Fares
        -----
        THE WINTER OF 1890
        It was cold.

        İSKELE SAATLERİ

        THE COMPANY IS NOT LIABLE FOR ANYTHING
        THAT HAPPENS ON BOARD OR OFF IT.

        NO SMOKING.

        Farewell, and write to us as soon as you arrive.
        ---
        """,
        """
        HEADING 1: The Ferry
        HEADING 2: Fares
        HEADING 1: THE WINTER OF 1890
        PARAGRAPH: It was cold.
        HEADING 1: İSKELE SAATLERİ
        PARAGRAPH: THE COMPANY IS NOT LIABLE FOR ANYTHING
        PARAGRAPH: THAT HAPPENS ON BOARD OR OFF IT.
        PARAGRAPH: NO SMOKING.
        PARAGRAPH: Farewell, and write to us as soon as you arrive.
        """);
  }

  @Test
  void extentsTakeInMarkersAndUnderlines() {
    Extraction.assertExtents(
        Format.PLAIN,
        """
          The Ferry
        ===========

          - Rope
            and oil
        """,
        """
        The Ferry⏎===========
        - Rope⏎    and oil
        """);
  }

  @Test
  void emptyFilesHaveNoBlocks() {
    for (String empty : List.of("", "\uFEFF", "\n", " \r\n\t\n", "----\n***\n\uFEFF")) {
      assertEquals(List.of(), Format.PLAIN.blocks(new Text(empty)));
    }
  }

  private static void blocks(String source, String expected) {
    Extraction.assertBlocks(Format.PLAIN, source, expected);
  }
}
