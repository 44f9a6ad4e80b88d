package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/**
 * What is prose in directives, character by character; those of docutils and Sphinx from memory.
 */
class RstDirectiveMaskTest {
  @Test
  void notesAndTitles() {
    mask(
        """
        .. note:: Mind the gap
        ··········Mind the gap
           and the rail.
        ···and the rail.

           - At night
        ·····At night
        .. warning::
        ············
           :class: loud
        ···············

           Never run.
        ···Never run.

        .. admonition:: By the *way*
        ················By the ·way·
           :name: x
        ···········

           It rains.
        ···It rains.

        .. topic:: Fares
        ···········Fares

           They rise.
        ···They rise.

        .. rubric:: Notes
        ············Notes
        .. versionchanged:: 3.2 The quay
        ························The quay
           is new.
        ···is new.
        .. deprecated:: 4.0
        ···················

           Use boats.
        ···Use boats.
        .. epigraph::
        ·············

           Wait.
        ···Wait.

        .. container:: box wide
        ·······················

           Boxed.
        ···Boxed.
        .. only:: html
        ··············

           Shown.
        ···Shown.

        .. ferry:function:: cast_off(lines)
        ···································
           another(x)
        ·············

           Casts off.
        ···Casts off.
        """);
  }

  @Test
  void imagesCodeAndWhatIsSilent() {
    mask(
        """
        .. figure:: map.png
        ···················
           :alt: A map of
        ·········A map of
                 the bay
        ·········the bay
           :width: 40
        ·············

           The bay
        ···The bay

           Drawn by hand.
        ···Drawn by hand.
        .. image:: a.png
        ················
        .. code-block:: python
        ······················
           :caption: Casting off
        ·············Casting off
           :linenos:
        ············

           ferry()
        ··········

        .. toctree::
        ············
           :maxdepth: 2
        ···············

           harbour
        ··········
           Fares <fares>
        ················
        .. raw:: html
        ·············

           <b>
        ······
        .. math:: a^2
        ·············
        .. literalinclude:: ferry.py
        ····························
        .. index:: tide
        ···············
        .. meta::
        ·········
           :description: All of it
        ·················All of it
           :author: Olm
        ···············
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.RST, table);
  }
}
