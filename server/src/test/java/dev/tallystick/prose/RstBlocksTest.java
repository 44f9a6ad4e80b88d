package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Text;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Which blocks reStructuredText comes apart into. */
class RstBlocksTest {
  @Test
  void titlesHaveTheirLevelByTheirFirstUse() {
    blocks(
        """
        =====
        Title
        =====

        Part
        ====

        Section
        ~~~~~~~

        Other part
        ==========

        Text
        """,
        """
        HEADING 1: Title
        HEADING 2: Part
        HEADING 3: Section
        HEADING 2: Other part
        PARAGRAPH: Text
        """);
  }

  @Test
  void itemsAndQuotationsHaveTheirNesting() {
    blocks(
        """
        - Cast off
          the lines

          1. bow

             ::

               code

        Term
          Text

            Quoted

              twice

        :Field: value
        """,
        """
        ITEM 1: Cast off⏎the lines
        ITEM 2: bow
        VERBATIM
        ITEM 1: Term
        ITEM 1: Text
        QUOTATION 1: Quoted
        QUOTATION 2: twice
        ITEM 1: value
        """);
  }

  @Test
  void codeIsALandmarkAndACommentIsNothing() {
    blocks(
        """
        Look::

          code

        .. code-block:: java

           code

        .. literalinclude:: a.py
        .. math::

           a^2

        .. A comment

        .. toctree::

           harbour

        .. _here:

        >>> code
        """,
        """
        PARAGRAPH: Look:
        VERBATIM
        VERBATIM
        VERBATIM
        VERBATIM
        VERBATIM
        """);
  }

  @Test
  void aCellOverSeveralLinesIsOneBlock() {
    blocks(
        """
        +-------------+-----------+
        | The tide    | It comes  |
        | rises.      | twice     |
        |             |           |
        | And falls.  | - a day   |
        +-------------+-----------+
        | one         | two       |
        |             |           |
        |             | three     |
        +-------------+-----------+

        ======  =========
        Low     The *ebb*
                is long.
        High    The flood
        ======  =========
        """,
        """
        CELL: The tide⏎rises.⏎And falls.
        CELL: It comes⏎twice
        CELL: a day
        CELL: one
        CELL: two
        CELL: three
        CELL: Low
        CELL: The ebb⏎is long.
        CELL: High
        CELL: The flood
        """);
  }

  @Test
  void whatIsBeingWrittenSwallowsNothing() {
    blocks(
        """
        .. note

        After.

        .. note::
        The words.

        +-----+----
        | a   | b

        Later *on

        =====  ====
        a      b
        """,
        """
        PARAGRAPH: After.
        PARAGRAPH: The words.
        PARAGRAPH: +-----+----⏎| a   | b
        PARAGRAPH: Later *on
        CELL: a
        CELL: b
        """);
  }

  @Test
  void tabsReachToTheNextMultipleOfEight() {
    blocks(
        """
        -\tone
        \ttwo

              \t- three

        =======\t====
        a\tb c
        =======\t====
        """,
        """
        ITEM 1: one⏎two
        ITEM 2: three
        CELL: a
        CELL: b c
        """);
  }

  @Test
  void extentsTakeInTheMarks() {
    Extraction.assertExtents(
        Format.RST,
        """
        =======
        *Title*
        =======

        * item::

            code

        .. note:: Mind *it*
        .. [1] A `note`

        == ==
        a  *b*
        == ==
        """,
        """
        =======⏎*Title*⏎=======
        * item::
        code
        .. note:: Mind *it*
        .. [1] A `note`
        a
        *b*
        """);
  }

  @Test
  void emptyFilesHaveNoBlocks() {
    for (String empty : List.of("", "\uFEFF", "\n", "..", ".. a", ".. _a: b", "====", "__ a")) {
      assertEquals(List.of(), Format.RST.blocks(new Text(empty)), empty);
    }
  }

  private static void blocks(String source, String expected) {
    Extraction.assertBlocks(Format.RST, source, expected);
  }
}
