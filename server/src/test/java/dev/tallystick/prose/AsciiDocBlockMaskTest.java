package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose in the blocks of AsciiDoc, character by character; the language from memory. */
class AsciiDocBlockMaskTest {
  @Test
  void headerHeadingsAndAttributes() {
    mask(
        """
        // a comment
        ············
        = The *old* ferry
        ··The ·old· ferry
        Mira Olm <mira@velm.example>
        ····························
        v1.2, 2031-04-05
        ················
        :toc: left
        ··········
        :description: A long \\
        ······················
          value
        ·······

        :!figure:
        ·········
        == Fares ==
        ···Fares···
        ## Tickets
        ···Tickets
        [discrete#id]
        ·············
        ====== Deep
        ·······Deep
        Winter
        Winter
        ------
        ······
        Text = here
        Text = here
        == not a heading
        == not a heading
        // a comment inside
        ···················
        goes on
        goes on
        """);
  }

  @Test
  void lists() {
    mask(
        """
        * first
        ··first
          goes on
        ··goes on
        lazily
        lazily
        ** [x] inner
        ·······inner
        - [ ] other
        ······other
        +
        ·
        attached
        attached

        . one
        ··one
        .. two
        ···two
        3. three
        ···three
        <1> called out
        ····called out

        Tide:: The water
        Tide···The water
        rises.
        rises.
        Ebb::
        Ebb··
          It falls.
        ··It falls.
        Low *ebb*;; lowest
        Low ·ebb····lowest

        std::x is no term
        std::x is no term
        * nor an item
        * nor an item
        """);
  }

  @Test
  void notesQuotationsAndContainers() {
    mask(
        """
        NOTE: Mind the gap.
        ······Mind the gap.

        [WARNING]
        ·········
        .Danger
        ·Danger
        ====
        ····
        Never *run*.
        Never ·run·.

        --
        ··
        Open.
        Open.
        --
        ··
        ====
        ····
        [quote, Captain Orr, Letters]
        ·····························
        ____
        ····
        The tide waits.
        The tide waits.

        * for no one
        ··for no one
        ____
        ····
        [verse]
        ·······
          a line
        ··a line
          another
        ··another

        > quoted
        ··quoted
        > lines
        ··lines

        ****
        ····
        Aside.
        Aside.
        ****
        ····
        """);
  }

  @Test
  void whatIsCopiedAndWhatIsNothing() {
    mask(
        """
        [source,java]
        ·············
        ----
        ····
        ferry(); // *now* <1>
        ·····················

        == no heading
        ·············
        ----
        ····
        ....
        ····
        literal
        ·······
        ....
        ····
        ++++
        ····
        <b>pass</b>
        ···········
        ++++
        ····
        ////
        ····
        a comment
        ·········

        of two paragraphs
        ·················
        ////
        ····
        ```sh
        ·····
        ls
        ··
        ```
        ···
         indented
        ·········
        text
        ····

        [stem]
        ······
        x = y
        ·····

        [comment]
        ·········
        nothing
        ·······

        include::fares.adoc[]
        ·····················
        ifdef::winter[]
        ···············
        Closed.
        Closed.
        endif::[]
        ·········
        ifndef::winter[Open *daily*.]
        ···············Open ·daily·.·

        image::map.png[A *small* map, 300, 200]
        ···············A ·small· map···········
        image::map.png[width=3,alt="A map, too"]
        ····························A map, too··
        toc::[]
        ·······
        video::x.mp4[start=3]
        ·····················
        [[anchor]]
        ··········
        '''
        ···
        <<<
        ···
        ---
        ···
        After
        After
        """);
  }

  @Test
  void delimitersThatAreNeverClosedOpenNothing() {
    mask(
        """
        Text before.
        Text before.
        ----
        ····
        Text behind.
        Text behind.

        ====
        ····
        More.
        More.
        |===
        ····
        """);
  }

  @Test
  void tables() {
    mask(
        """
        .Fares
        ·Fares
        [%header,cols="1,2a"]
        ·····················
        |===
        ····
        |Port |*Fare* \\| price
        ·Port···Fare· ·| price

        | Velm
        ··Velm
        | 4 marks
        ··4 marks
        for a child
        for a child

        // for now
        ··········
        2+^.>s|Both |a|b 3|c
        ·······Both··a·b 3·c
        l|code a|* item
        ···········item
        |!===
        ·····
        ! nested ! x!y
        ··nested···x!y
        !===
        ····
        |===
        ····
        ,===
        ····
        Velm,"4 marks, or 5",x
        Velm··4 marks, or 5··x
        ,===
        ····
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.ASCIIDOC, table);
  }
}
