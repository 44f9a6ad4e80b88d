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
  void whatALetterQuotesIsJoinedByItsMarks() {
    blocks(
        """
        The harbour master answered at once and asked for the log of the whole
        winter, with the hours of fog.
        On Monday Mira wrote:
        > The lamp went out twice in the night from Sunday to Monday, and both
        > times I had to climb up there and light it again by hand. It was not
        > the oil.
        >> Was it the oil? The last barrel that came from Velm had water in it,
        >> or so says the keeper of the other tower.
        >
        > Bring:
        > - rope
        > - a new wick of the kind that we had before the storm, the broad one
        >   with the red thread
        I shall come on Friday with the noon boat, if there is one, and look at
        the burner myself.
        --\s
        Tomas Orr
        Harbour office
        """,
        """
        PARAGRAPH: The harbour master answered at once and asked for the log of the whole⏎winter,\
         with the hours of fog.
        PARAGRAPH: On Monday Mira wrote:
        QUOTATION 1: The lamp went out twice in the night from Sunday to Monday, and both⏎times I\
         had to climb up there and light it again by hand. It was not⏎the oil.
        QUOTATION 2: Was it the oil? The last barrel that came from Velm had water in it,⏎or so\
         says the keeper of the other tower.
        QUOTATION 1: Bring:
        ITEM 1: rope
        ITEM 1: a new wick of the kind that we had before the storm, the broad one⏎with the red\
         thread
        PARAGRAPH: I shall come on Friday with the noon boat, if there is one, and look at⏎the\
         burner myself.
        PARAGRAPH: Tomas Orr
        PARAGRAPH: Harbour office
        """);
  }

  @Test
  void theMarksOfAQuotationAreInItsBlock() {
    Extraction.assertExtents(
        Format.PLAIN, "He wrote:\n > > Fog.\n>- rope\n", "He wrote:\n> > Fog.\n>- rope\n");
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
