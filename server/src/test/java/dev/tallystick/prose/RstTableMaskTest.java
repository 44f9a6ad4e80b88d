package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/**
 * What is prose in tables of reStructuredText, character by character; the language from memory.
 */
class RstTableMaskTest {
  @Test
  void gridTables() {
    mask(
        """
        +--------+-----------+
        ······················
        | Port   | *Depth*   |
        ··Port······Depth·····
        +========+===========+
        ······················
        | Velm   | - low     |
        ··Velm·······low······
        |        | - high    |
        ·············high·····
        +--------+-----+-----+
        ······················
        | all over     | 漢  |
        ··all over·······漢···
        | two          +-----+
        ··two·················
        |              | end |
        ·················end··
        +--------------+-----+
        ······················

          +---+---+
        ···········
          | a | b |
        ····a···b··

        +---+---+
        ·········
        | too long | b |
        ··too long | b··
        +---+---+
        ·········
        """);
  }

  @Test
  void simpleTables() {
    mask(
        """
        =====  =====  ====
        ··················
        Inputs        Out
        Inputs········Out
        ------------  ----
        ··················
         One   Two    not
        ·One···Two····not
        =====  =====  ====
        ··················
        A      *one*  goes
        A·······one···goes
                      on
        ··············on
               blank  two
        ·······blank··two

        Velm   x      y
        Velm···x······y
        =====  =====  ====
        ··················

        ====  ====
        ··········
        open  table
        open··table
        much too long  cell
        much too long··cell

        .. list-table:: Ports
        ················Ports
           :header-rows: 1
        ··················

           * - Port
        ·······Port
             - Depth
        ·······Depth

        .. csv-table:: Values
        ···············Values
           :header: "One", Two
        ·············One···Two

           "a, b", c
        ····a, b···c
           "over
        ····over
           two", d
        ···two···d
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.RST, table);
  }
}
