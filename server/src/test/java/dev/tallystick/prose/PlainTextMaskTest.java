package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose in plain text, character by character. */
class PlainTextMaskTest {
  @Test
  void indentsAndTrailingBlanksAreNotProse() {
    mask(
        """
          The ferry left.\t\s
        ··The ferry left.··
        ^~
        ··
        ~霧が出た。~
        ·霧が出た。·
        """
            .replace('^', '\u00A0')
            .replace('~', '\u3000'));
  }

  @Test
  void markersOfListsAreNotProse() {
    mask(
        """
        Bring:
        Bring:
        - rope - long
        ··rope - long
        * oil
        ··oil
        •\u00A0bread
        ··bread
          ◦ salted
        ····salted
        1. one sail
        ···one sail
        2) two oars
        ···two oars
        -not a marker
        -not a marker
        """);
  }

  @Test
  void chineseMarkersOfListsAreNotProse() {
    mask(
        """
        1、绳子
        ··绳子
        2、灯油
        ··灯油
        """);
  }

  @Test
  void marksOfQuotationsAreNotProse() {
    mask(
        """
        On Monday Mira wrote:
        On Monday Mira wrote:
        > The lamp is out. >Now< it is dark.
        ··The lamp is out. >Now< it is dark.
        >The oil too.
        ·The oil too.
        >
        ·
        >> Who has the key?
        ···Who has the key?
        > > - rope
        ······rope
         >   an indent
        ·····an indent
        a > b
        a > b
        --\s
        ···
        Tomas
        Tomas
        """);
  }

  @Test
  void aNumberAloneIsProse() {
    mask(
        """
        12. Mai, Hafen
        12. Mai, Hafen

        1990. A bad year
        1990. A bad year
        3. Juni, See
        3. Juni, See
        """);
  }

  @Test
  void rulesAndUnderlinesAreNotProse() {
    mask(
        """
        ***
        ···
        The Ferry
        The Ferry
        =========
        ·········
        Left at noon.
        Left at noon.
        * * *
        ·····
        ...!?
        ·····
        Came back.
        Came back.
        """);
  }

  @Test
  void lineEndsInsideJoinedLinesAreKeptAndIndentsAreNot() {
    mask(
        """
          The harbour master wrote down the hour of every boat and kept
        ··The harbour master wrote down the hour of every boat and kept
          the book under his pillow, where nobody would think of looking
        ··the book under his pillow, where nobody would think of looking
        for it.
        for it.
        - Take the book to the tower and read out every line of it, with
        ··Take the book to the tower and read out every line of it, with
          the dates.
        ··the dates.
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.PLAIN, table);
  }
}
