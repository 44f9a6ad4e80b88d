package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/**
 * What is prose on the lines of reStructuredText, character by character; the language from memory.
 */
class RstInlineMaskTest {
  @Test
  void emphasisAndLiterals() {
    mask(
        """
        She was *very* late, **truly** so, ``a*b\\`` and `titled`.
        She was ·very· late, ··truly·· so, ··a*b\\·· and ·titled·.
        2 * 3 * 4, a*b*c, "*", (*), re\\ *start*\\ ed, \\*no\\*, C:\\\\dir, \\(x, *open
        2 * 3 * 4, a*b*c, "*", (*), re···start···ed, ·*no·*, C:·\\dir, ·(x, ·open
        and *two
        and *two
        lines* «*x*», *x*，*x*:sub:`2`, *a\\*b*, ``on
        lines· «·x·», ·x·，·x·······2·, ·a·*b·, ··on
        two lines`` **half
        two lines·· **half

        The **second ``half
        The **second ``half
        """);
  }

  @Test
  void rolesAndReferences() {
    mask(
        """
        See :ref:`the fares <fares>`, :ref:`fares`, :doc:`/a`, :func:`~a.b`, :kbd:`a <b>`, `x`:sup:,
        See ······the fares·········, ············, ·········, ········a.b·, ······a <b>·, ·x······,
        :py:class:`!Boat`, `the quay`_, `the plan <https://velm.example/a_b>`__, `<https://b.example>`_,
        ············Boat·, ·the quay··, ·the plan······························, ··https://b.example···,
        harbour_, the-quay__, snake_case, _private, https://velm.example/a_b, [1]_ [#a]_ [*]_ [Olm2031]_,
        harbour·, the-quay··, snake_case, _private, https://velm.example/a_b, ···· ····· ···· ··········,
        [2] |flag| |flag|_ a | b _`here it is` :open:`x and `open <x>
        [2] ·flag· ·flag·· a | b ··here it is· :open:`x and `open <x>
        """);
  }

  @Test
  void scriptsOutsideTheBasicPlane() {
    mask(
        """
        *😀𝒜* and \\😀 ``𝒜``
        ·😀𝒜· and ·😀 ··𝒜··
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.RST, table);
  }
}
