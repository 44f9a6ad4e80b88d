package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose on the lines of Markdown, character by character. */
class MarkdownInlineMaskTest {
  @Test
  void emphasis() {
    mask(
        """
        She was **very** late, *truly _very_ late*, ***so* late**.
        She was ··very·· late, ·truly ·very· late·, ···so· late··.
        A snake_case_name, 3 * 4 * 5, an open *star.
        A snake_case_name, 3 * 4 * 5, an open *star.
        """);
  }

  @Test
  void codeSpans() {
    mask(
        """
        Call `ferry --now` or ``the `odd` one`` and `a
        Call ·ferry --now· or ··the `odd` one·· and ·a
           b` then ` alone.
        ···b· then ` alone.
        """);
  }

  @Test
  void linksAndImages() {
    mask(
        """
        The [*quay* plan](plan.html "The (quay)") is ![a *small* map](map.png) here.
        The ··quay· plan························· is ··a ·small· map·········· here.
        See [the rules][rules], [rules][] and [Rules] but not [nothing].
        See ·the rules········, ·rules··· and ·Rules· but not [nothing].
        Ask <https://velm.example/a_b> or <mail@velm.example>.
        Ask ·https://velm.example/a_b· or ·mail@velm.example·.
        [![Logo](logo.svg)](home.html) of the [line](
        ···Logo······················· of the ·line··
          home.html
        ···········
          "a title") today
        ············ today

        [rules]: rules.html
        ···················
          'The rules'
        ·············
        """);
  }

  @Test
  void inlineHtml() {
    mask(
        """
        Press <kbd class="k">Q</kbd><br/> now<!-- which? --> and <b
        Press ···············Q··········· now··············· and ··
          id="x">go</b>, 3 < 4 > 2.
        ·········go····, 3 < 4 > 2.
        """);
  }

  @Test
  void lineBreaks() {
    mask(
        """
        One  \s
        One···
        two\\
        two·
          three\s
        ··three·
        \tfour *five\s
        ·four ·five·
        six* seven
        six· seven
        """);
  }

  @Test
  void escapesAndEntities() {
    mask(
        """
        1\\. A \\*star\\*, a \\\\ and \\q &amp; &#65; &nix; \\[^a].
        1·. A ·*star·*, a ·\\ and \\q &amp; &#65; &nix; ·[^a].
        """);
  }

  @Test
  void footnotes() {
    mask(
        """
        The tide[^1] turned.[^long-one] A [^ b] and [^
        The tide···· turned.··········· A [^ b] and [^

        [^1]: Word
        ······Word
        [^2]: Two words
        ······Two words
          go on[^1]
        ··go on····
        [^long-one]: More *words*
        ·············More ·words·
        """);
  }

  @Test
  void scriptsOutsideTheBasicPlane() {
    mask(
        """
        **😀𝒜** and \\😀 `𝒜`
        ··😀𝒜·· and \\😀 ·𝒜·
        """);
  }

  @Test
  void nulCharactersKeepTheirPlace() {
    mask("a\0b *c*\na\0b ·c·\n");
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.MARKDOWN, table);
  }
}
