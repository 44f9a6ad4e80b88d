package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Text;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Which blocks Markdown comes apart into. */
class MarkdownBlocksTest {
  @Test
  void headingsHaveTheirLevel() {
    blocks(
        """
        Title
        ===
        Part
        ---
        ### Section
        ####### Not one
        """,
        """
        HEADING 1: Title
        HEADING 2: Part
        HEADING 3: Section
        PARAGRAPH: ####### Not one
        """);
  }

  @Test
  void listItemsHaveTheirNesting() {
    blocks(
        """
        1. Cast off
           the lines

           and wait.
           - Bow first
             * then stern
        2. > Quoted
        """,
        """
        ITEM 1: Cast off⏎the lines
        ITEM 1: and wait.
        ITEM 2: Bow first
        ITEM 3: then stern
        QUOTATION 1: Quoted
        """);
  }

  @Test
  void quotationsHaveTheirNesting() {
    blocks(
        """
        > Outer
        >> Inner
        >>
        >> # Heading
        >> - Item
        """,
        """
        QUOTATION 1: Outer
        QUOTATION 2: Inner
        HEADING 1: Heading
        ITEM 1: Item
        """);
  }

  @Test
  void tablesComeCellByCell() {
    blocks(
        """
        Port | Depth
        -----|---
        Velm | 4 m
        Orr  |
        | | 3 m | beyond the head

        After
        """,
        """
        CELL: Port
        CELL: Depth
        CELL: Velm
        CELL: 4 m
        CELL: Orr
        CELL: 3 m
        PARAGRAPH: After
        """);
  }

  @Test
  void codeAndHtmlAreLandmarks() {
    blocks(
        """
        ```
        code
        ```

            indented

        <div>
        text
        </div>

        - ~~~
          in a list
        """,
        """
        VERBATIM
        VERBATIM
        VERBATIM
        VERBATIM
        """);
  }

  @Test
  void commentsAreNothingAtAll() {
    blocks(
        """
        <!-- one -->

          <!-- two --> <!-- three

        <!-->

        <!-- four --> <hr>

        <!-- open
        """,
        """
        VERBATIM
        """);
  }

  @Test
  void whatHasNoProseIsNoBlock() {
    blocks(
        """
        #

        ![](map.png)

        <i></i> [](x)

        [a]: b

        ***
        """,
        "");
  }

  @Test
  void footnotesAreOneEachAndAbbreviatedOnesAreKept() {
    blocks(
        """
        [^1]: Word
        [^2]: Two words
        go on
        [^3]: Three more words

        > [^4]: Quoted
        "here"
        """,
        """
        NOTE: Word
        NOTE: Two words⏎go on
        NOTE: Three more words
        NOTE: Quoted⏎"here"
        """);
  }

  @Test
  void breaksInsideMarksStayOutAndBreaksOfTheTextStayIn() {
    blocks(
        """
        One <b
        c="d">[
        two](x
        "t")
        `three
        four` ![five
        six](y)
        """,
        """
        PARAGRAPH: One⏎two⏎three⏎four five⏎six
        """);
  }

  @Test
  void extentsTakeInTheMarksOfContainers() {
    Extraction.assertExtents(
        Format.MARKDOWN,
        """
        ## Heading ##
        > - An *item*
        >   goes on
        >
        > Next

          1. [^1]: note

        | a | *b* |
        |---|---|

        Title
        =====

        ```
        x
        ```
        """,
        """
        ## Heading ##
        > - An *item*⏎>   goes on
        > Next
        1. [^1]: note
        a
        *b*
        Title⏎=====
        ```⏎x⏎```
        """);
  }

  @Test
  void emptyFilesHaveNoBlocks() {
    for (String empty : List.of("", "\uFEFF", "\n", " \n\t\n", "---\na: b\n---")) {
      assertEquals(List.of(), Format.MARKDOWN.blocks(new Text(empty)));
    }
  }

  private static void blocks(String source, String expected) {
    Extraction.assertBlocks(Format.MARKDOWN, source, expected);
  }
}
