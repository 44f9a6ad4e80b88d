package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose on the lines of AsciiDoc, character by character; the language from memory. */
class AsciiDocInlineMaskTest {
  @Test
  void formats() {
    mask(
        """
        She was *very* late, _truly *very* late_, so**mew**hat `mono` #lit#.
        She was ·very· late, ·truly ·very· late·, so··mew··hat ·mono· ·lit·.
        snake_case_name, 3 * 4 * 5, H~2~O, E=mc^2^, a ^ b ~ c
        snake_case_name, 3 * 4 * 5, H·2·O, E=mc·2·, a ^ b ~ c
        "`Hush`", [.small]#fine# [line-through]*gone* over *two
        "·Hush·", ·········fine· ···············gone· over ·two
        lines* ##all##of __it__.
        lines· ··all··of ··it··.

        An open *star and `tick, 2 * 3*d.
        An open *star and `tick, 2 * 3*d.
        """);
  }

  @Test
  void passthroughsAndEscapes() {
    mask(
        """
        A +*plain*+ and `+a_b_+` and ++x*y++ and +++<u>z</u>+++ and pass:q[<b>] 1 + 2 + 3.
        A ·*plain*· and ··a_b_·· and ··x*y·· and ···<u>z</u>··· and ·······<b>· 1 + 2 + 3.
        \\*not bold*, \\_nor this_, \\\\**none**, \\{name}, {name}, \\q, \\https://a.example[b].
        ·*not bold*, ·_nor this_, ··**none**, ·{name}, {name}, \\q, ·https://a.example[b].
        The end +
        The end··
        breaks + here +
        breaks + here··
        """);
  }

  @Test
  void linksAndReferences() {
    mask(
        """
        The https://velm.example/a_b[*quay* plan] or https://velm.example/a_b_c, or
        The ··························quay· plan· or https://velm.example/a_b_c, or
        link:plan.html[the plan^], link:plan.html["plan, new",window=_blank], link:a[x,role=y] and
        ···············the plan··, ················plan, new················, ·······x········ and
        xref:fares.adoc#x[fares], xref:a[], <<ports>>, <<ports,the ports>>, <https://a.example>,
        ··················fares·, ········, ·········, ········the ports··, ·https://a.example·,
        mailto:m@velm.example[Mira], https://b.example[] [[here]]there 1 << 2 [5] [[6]].
        ······················Mira·, https://b.example·· ········there 1 << 2 [5] [[6]].
        """);
  }

  @Test
  void otherMacros() {
    mask(
        """
        Press kbd:[Ctrl+_C_] or btn:[OK] in menu:File[Save > As] image:i.png[the *key*,20].
        Press ·····Ctrl+_C_· or ·····OK· in ·····File·Save > As· ············the ·key·····.
        Ropes ((knots)) hold(((knots,ropes))) icon:tick[] stem:[x^2] x:y[z] indexterm2:[sail].
        Ropes ··knots·· hold················· ··········· ······x^2· x:y[z] ············sail·.
        """);
  }

  @Test
  void footnotes() {
    mask(
        """
        The tide footnote:[It *comes* twice, see https://a.example[this].] turned.footnote:x[]
        The tide ··········It ·comes· twice, see ··················this·.· turned.············
        One footnote:b[goes
        One ···········goes
        on, footnote:[no] and] on footnoteref:[c, Old] and footnoteref:[b].
        on, ············· and· on ··············· Old· and ···············.
        |===
        ····
        | Oil footnote:[of *whales*] | Wick
        ··Oil ··········of ·whales·····Wick
        |===
        ····
        """);
  }

  @Test
  void scriptsOutsideTheBasicPlane() {
    mask(
        """
        *😀𝒜* and \\😀 `𝒜`
        ·😀𝒜· and \\😀 ·𝒜·
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.ASCIIDOC, table);
  }
}
