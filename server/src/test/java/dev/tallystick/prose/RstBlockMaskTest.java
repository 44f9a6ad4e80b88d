package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/**
 * What is prose in the blocks of reStructuredText, character by character; the language from
 * memory.
 */
class RstBlockMaskTest {
  @Test
  void titlesAndAdornments() {
    mask(
        """
        ==========
        ··········
         The ferry
        ·The ferry
        ==========
        ··········

        Fares *now*
        Fares ·now·
        ===========
        ···········
        Winter
        Winter
        ------
        ······
        .. a comment
        ············

        Text below.
        Text below.

        ----
        ····

        Summer
        Summer
        ------
        ······
        =====
        ·····
        Not a pair
        Not a pair
        ~~~~~
        ·····

        An open title
        An open title
        ==
        ==
        goes on
        goes on
        """);
  }

  @Test
  void lists() {
    mask(
        """
        - first
        ··first
          goes on
        ··goes on

          again
        ··again
        - *second*
        ···second·

          * inner
        ····inner
        + other
        ··other

        1. one
        ···one
        2. two
        ···two
           more
        ···more
        #. three
        ···three

        (a) letter
        ····letter

        iv) roman
        ····roman

        A. Olm was here
        A. Olm was here
        and left.
        and left.

        -
        ·
          below
        ··below

        Tide : water
        Tide : water
          It rises.
        ··It rises.

          Twice.
        ··Twice.
        Ebb
        Ebb
          It falls.
        ··It falls.
        """);
  }

  @Test
  void fieldsOptionsAndLineBlocks() {
    mask(
        """
        :Author: Mira Olm
        ·················
        :Dedication: To all who
        ·············To all who
          wait.
        ··wait.
        :type x: int
        ············
        :param x: the *tide*
        ··········the ·tide·

        -v, --verbose  Tell more
        ···············Tell more
        --out=FILE     Where it goes,
        ···············Where it goes,
                       as a path
        ···············as a path
        -q
        ··
            Tell less
        ····Tell less
        -5 degrees
        -5 degrees

        | The tide
        ··The tide
        |   and the ebb,
        ····and the ebb,
          both
        ··both
        |
        ·
        | wait.
        ··wait.
        """);
  }

  @Test
  void literalBlocks() {
    mask(
        """
        Look here::
        Look here:·

          code *here*
        ·············

          more
        ······

        And here: ::
        And here:···

        > quoted
        ········
        > code
        ······

        ::
        ··

          alone
        ·······

        >>> ferry()
        ···········
        1
        ·

        Unclosed \\::
        Unclosed ·::

          quoted
        ··quoted
        """);
  }

  @Test
  void quotations() {
    mask(
        """
        Words.
        Words.

          The tide waits.
        ··The tide waits.

            Deeper.
        ····Deeper.

          -- Captain Orr,
        ·····Captain Orr,
             on duty
        ·····on duty

        Words
        Words
        on two
        on two
         oddly indented.
        ·oddly indented.
        """);
  }

  @Test
  void explicitMarkup() {
    mask(
        """
        .. A comment
        ············

           goes on.
        ···········

        ..
        ··

           A quotation.
        ···A quotation.

        .. [1] The *first* note
        ·······The ·first· note
           goes on.
        ···goes on.
        .. [#a] Other.
        ········Other.
        .. [Olm2031] A book.
        ·············A book.

        .. _harbour: https://velm.example
        ·································
        .. _`the quay`:
        ···············
        __ https://velm.example
        ·······················

        .. |name| replace:: the *ferry*
        ····················the ·ferry·
        .. |flag| image:: flag.png
        ··························
           :alt: A flag
        ·········A flag
        .. |now| date::
        ···············
        .. note: no directive
        ·····················
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.RST, table);
  }
}
