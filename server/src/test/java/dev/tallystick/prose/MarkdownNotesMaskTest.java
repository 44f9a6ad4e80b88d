package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose in what writers of documentation add to Markdown, character by character. */
class MarkdownNotesMaskTest {
  @Test
  void footnotes() {
    mask(
        """
        Oil[^1] burns.[^b c]
        Oil···· burns.[^b c]
        [^1]: Whale *oil*,
        ······Whale ·oil·,
        mostly.
        mostly.
        [^word]:
        ········
            Also ~~rape~~.
        ····Also ~~rape~~.

            Even tallow.
        ····Even tallow.

                code
        ············
        Text.
        Text.
        """);
  }

  @Test
  void directives() {
    mask(
        """
        :::note The *lamp*
        ········The ·lamp·
        It burns.
        It burns.
        :::
        ···
        Text
        Text
        ::: tip
        ·······
        - Oil
        ··Oil
          :::caution[Fire]{.hot}
        ·············Fire·······
          Water.
        ··Water.
          :::
        ·····
        :::::{.wide #a}
        ···············
        ::: warning Fog ahead :::
        ············Fog ahead····
        ::: {note} Fog
        ···········Fog
        """);
  }

  @Test
  void admonitions() {
    mask(
        """
        !!! warning inline "The *lamp*"
        ····················The ·lamp··
            It burns.
        ····It burns.

            - Oil
        ······Oil
        Text
        Text
        ??? note
        ········
            Folded.
        ····Folded.
        ???+ tip ""
        ···········
        === "On land"
        ·····On land·
            Walk.
        ····Walk.
        !!! Fog! Fog!
        !!! Fog! Fog!
        """);
  }

  @Test
  void alerts() {
    mask(
        """
        > [!WARNING]
        ············
        > Fire.
        ··Fire.

        > [!note]- About *oil*
        ···········About ·oil·
        > It burns.
        ··It burns.

        > Not [!NOTE]
        ··Not [!NOTE]
        """);
  }

  @Test
  void shortcodesAndAttributes() {
    mask(
        """
        # The lamp {#lamp}
        ··The lamp ·······
        Oil {.thick} and wick
        Oil ········ and wick
        -------------------
        ···················
        {{< note >}}
        ············
        Burn {{% ref "a b" %}} the {{<br>}}oil {{ price }}.
        Burn ················· the ········oil {{ price }}.
        {{< /note >}} {% endif %}
        ·························
        {: .wide}
        ·········
        Never {{< closed, {% nor this. :smile:
        Never {{< closed, {% nor this. :smile:
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.MARKDOWN, table);
  }
}
