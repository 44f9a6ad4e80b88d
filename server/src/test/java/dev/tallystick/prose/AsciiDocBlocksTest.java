package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Text;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Which blocks AsciiDoc comes apart into. */
class AsciiDocBlocksTest {
  @Test
  void headingsHaveTheirLevel() {
    blocks(
        """
        = Title
        Mira Olm

        == Part
        === Section

        Winter
        ~~~~~~

        .A caption
        Text
        """,
        """
        HEADING 1: Title
        HEADING 2: Part
        HEADING 3: Section
        HEADING 3: Winter
        PARAGRAPH: A caption
        PARAGRAPH: Text
        """);
  }

  @Test
  void itemsHaveTheirNestingAndWhatIsAttached() {
    blocks(
        """
        * Cast off
        the lines

        ** bow
        . first
        +
        and wait

         literal

        * stern
        +
        --
        Open

        - inner
        --

        Term::
        Text
        +
        more

        A paragraph
        """,
        """
        ITEM 1: Cast off⏎the lines
        ITEM 2: bow
        ITEM 3: first
        ITEM 3: and wait
        VERBATIM
        ITEM 1: stern
        ITEM 1: Open
        ITEM 2: inner
        ITEM 2: Term
        ITEM 2: Text
        ITEM 2: more
        PARAGRAPH: A paragraph
        """);
  }

  @Test
  void quotationsHaveTheirNesting() {
    blocks(
        """
        ____
        Outer

        [quote]
        _____
        Inner
        _____
        ____

        [verse,Orr]
        Of tides
        and ebbs
        """,
        """
        QUOTATION 1: Outer
        QUOTATION 2: Inner
        QUOTATION 1: Of tides⏎and ebbs
        """);
  }

  @Test
  void tablesComeCellByCell() {
    blocks(
        """
        |===
        | Port
        | Depth

        a| Velm

        at sea
        l| code
        |===
        """,
        """
        CELL: Port
        CELL: Depth
        CELL: Velm
        CELL: at sea
        VERBATIM
        """);
  }

  @Test
  void codeIsALandmarkAndACommentIsNothing() {
    blocks(
        """
        ----
        code
        ----

        [source]
        code

         literal

        [listing]
        --
        code
        --

        ////
        no
        ////

        // no

        [comment]
        --
        no
        --

        image::map.png[]
        """,
        """
        VERBATIM
        VERBATIM
        VERBATIM
        VERBATIM
        """);
  }

  @Test
  void extentsTakeInTheMarks() {
    Extraction.assertExtents(
        Format.ASCIIDOC,
        """
        == Heading ==
        NOTE: Mind *it*

        ** item
        Term:: text

        Title
        -----

        image::map.png[A map]

        |===
        2+| a | *b*
        |===
        """,
        """
        == Heading ==
        NOTE: Mind *it*
        ** item
        Term::
        text
        Title⏎-----
        image::map.png[A map]
        a
        *b*
        """);
  }

  @Test
  void emptyFilesHaveNoBlocks() {
    for (String empty : List.of("", "\uFEFF", "\n", ":a: b", "//", "[[a]]", "====\n====")) {
      assertEquals(List.of(), Format.ASCIIDOC.blocks(new Text(empty)), empty);
    }
  }

  @Test
  void footnotesComeBehindTheBlockThatTheyStandIn() {
    String file = "== Oilfootnote:[Of whales.]\n\nA footnote:[One.] B.\nC.footnote:[Two\nlines.]\n";
    Extraction.assertBlocks(
        Format.ASCIIDOC,
        file,
        """
        HEADING 2: Oil
        NOTE: Of whales.
        PARAGRAPH: A  B.⏎C.
        NOTE: One.
        NOTE: Two⏎lines.
        """);
    Extraction.assertExtents(
        Format.ASCIIDOC,
        file,
        """
        == Oilfootnote:[Of whales.]
        footnote:[Of whales.]
        A footnote:[One.] B.⏎C.footnote:[Two⏎lines.]
        footnote:[One.]
        footnote:[Two⏎lines.]
        """);
  }

  private static void blocks(String source, String expected) {
    Extraction.assertBlocks(Format.ASCIIDOC, source, expected);
  }
}
