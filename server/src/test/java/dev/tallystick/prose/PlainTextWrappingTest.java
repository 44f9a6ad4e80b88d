package dev.tallystick.prose;

import java.util.List;
import org.junit.jupiter.api.Test;

/** How hard-wrapped lines of plain text are known and joined. */
class PlainTextWrappingTest {
  @Test
  void blankLinesPartHardWrappedParagraphs() {
    blocks(
        """
        The ferry to Orr leaves at six in the morning and again at
        noon, unless the tide is out. Nobody on the island can say
        when it will come back.

        Tickets are sold on board. Children under four years travel
        free of charge.
        \u00A0\t
        Have a good trip.
        """,
        """
        PARAGRAPH: The ferry to Orr leaves at six in the morning and again at⏎noon, unless the tide\
         is out. Nobody on the island can say⏎when it will come back.
        PARAGRAPH: Tickets are sold on board. Children under four years travel⏎free of charge.
        PARAGRAPH: Have a good trip.
        """);
  }

  @Test
  void wideCharactersCountTwice() {
    blocks(
        """
        港の朝は早く、霧の中を漁師たちが静かに歩いて
        いく。灯台の明かりはまだ消えていないが、空は
        もう白い。
        """,
        """
        PARAGRAPH: 港の朝は早く、霧の中を漁師たちが静かに歩いて⏎いく。灯台の明かりはまだ消えていないが、空は⏎もう白い。
        """);
  }

  @Test
  void koreanLinesBreakAtSpaces() {
    blocks(
        """
        항구의 아침은 이르고 안개 속을 어부들이 조용히
        걸어간다 등대의 불빛은 아직 꺼지지 않았지만
        하늘은 이미 밝다
        """,
        """
        PARAGRAPH: 항구의 아침은 이르고 안개 속을 어부들이 조용히⏎걸어간다 등대의 불빛은 아직 꺼지지 않았지만⏎하늘은 이미 밝다
        """);
  }

  @Test
  void verseInAWrappedFileKeepsItsLines() {
    blocks(
        WRAPPED
            + """

            Grey is the water
            and grey is the stone
            and grey is the gull
            that flies alone
            """,
        WRAPPED_BLOCK
            + """
            PARAGRAPH: Grey is the water
            PARAGRAPH: and grey is the stone
            PARAGRAPH: and grey is the gull
            PARAGRAPH: that flies alone
            """);
  }

  @Test
  void aWrappedParagraphAmongLongLinesIsJoined() {
    String line = "A line that no editor ever broke goes on and on. ".repeat(6).strip();
    blocks(
        (line + "\n").repeat(3) + "\n" + WRAPPED,
        ("PARAGRAPH: " + line + "\n").repeat(3) + WRAPPED_BLOCK);
  }

  @Test
  void aLineTooLongToBreakDoesNotHideTheWrapping() {
    String address = "https://velm.example/" + "harbour/".repeat(20);
    String joined = WRAPPED_BLOCK.strip();
    blocks(
        (WRAPPED + "\n").repeat(4) + address + "\n",
        (joined + "\n").repeat(4) + "PARAGRAPH: " + address + "\n");
  }

  @Test
  void aLineThatIsBeingEditedDoesNotUndoTheWrapping() {
    for (String typed :
        List.of("noon, and then", "noon, " + "and now and then ".repeat(5) + "if")) {
      String source = WRAPPED.replaceFirst("noon,.*", typed);
      blocks(source, "PARAGRAPH: " + source.strip().replace("\n", "⏎") + "\n");
    }
  }

  @Test
  void aFirstLineIndentOpensAParagraph() {
    blocks(
        """
          The ferry to Orr leaves at six in the morning and again at
        noon, unless the tide is out. Nobody on the island can say
        when it will come back, least of all the harbour master.
          He keeps a book of all the boats that come and go and sleeps
        on it, too.
        He has no other pillow, and the chair in the tower is as hard
        as it looks.
        """,
        """
        PARAGRAPH: The ferry to Orr leaves at six in the morning and again at⏎noon, unless the tide\
         is out. Nobody on the island can say⏎when it will come back, least of all the harbour\
         master.
        PARAGRAPH: He keeps a book of all the boats that come and go and sleeps⏎on it, too.
        PARAGRAPH: He has no other pillow, and the chair in the tower is as hard⏎as it looks.
        """);
  }

  @Test
  void itemsOpenEvenInsideWrappedLines() {
    blocks(
        """
        Whoever wants to sail with the ferry in the winter has to bring
        these things along:
        - a coat that keeps the water out and that has deep pockets for
          bread and a lamp,
        - rope.
        1. Tie the rope to the lamp, but not to the coat, and not to
        the bread.
        2. Wait.
        """,
        """
        PARAGRAPH: Whoever wants to sail with the ferry in the winter has to bring⏎these things\
         along:
        ITEM 1: a coat that keeps the water out and that has deep pockets for⏎bread and a lamp,
        ITEM 1: rope.
        ITEM 1: Tie the rope to the lamp, but not to the coat, and not to⏎the bread.
        ITEM 1: Wait.
        """);
  }

  @Test
  void aDateAtTheStartOfAWrappedLineIsNoItem() {
    blocks(
        """
        Die erste Fähre des Jahres fuhr nach langem Warten erst am
        12. Mai, weil das Eis im Hafen so lange liegen blieb, dass
        niemand mehr daran glaubte.
        """,
        """
        PARAGRAPH: Die erste Fähre des Jahres fuhr nach langem Warten erst am⏎12. Mai, weil das Eis\
         im Hafen so lange liegen blieb, dass⏎niemand mehr daran glaubte.
        """);
  }

  private static final String WRAPPED =
      """
      The ferry to Orr leaves at six in the morning and again at
      noon, unless the tide is out. Nobody on the island can say
      when it will come back, and those who wait for it have to
      bring a lamp, a coat and something to eat, because the inn
      is closed.
      """;

  private static final String WRAPPED_BLOCK =
      "PARAGRAPH: " + WRAPPED.strip().replace("\n", "⏎") + "\n";

  private static void blocks(String source, String expected) {
    Extraction.assertBlocks(Format.PLAIN, source, expected);
  }
}
