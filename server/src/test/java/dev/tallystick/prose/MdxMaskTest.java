package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose in MDX, character by character, and which blocks it comes apart into. */
class MdxMaskTest {
  @Test
  void scripts() {
    mask(
        """
        ---
        ···
        title: Lamp
        ·······Lamp
        ---
        ···
        import Tabs from '@a/b'
        ·······················
        import {
        ········
          B,
        ····
        } from './c'
        ············

        # Lamp
        ··Lamp

        export const b = () => {
        ························
          call()
        ········

          return 1
        ··········
        }
        ·

        We import oil and
        We import oil and
        export light.
        export light.

        ```js
        ·····

        import a
        ········
        ```
        ···
        """);
  }

  @Test
  void tagsAndExpressions() {
    mask(
        """
        <Note kind="a > b" on={() => <b>no</b>}>
        ········································
        The <b>lamp</b> burns {props.count > 1 ? "x}" : 'y'} hours.
        The ···lamp···· burns ······························ hours.
        </Note>
        ·······
        <Tabs
        ·····
          values={[
        ···········
            {label: 'No'},
        ··················
          ]}>
        ·····
          <Tab>Fog</Tab>
        ·······Fog······
              indented *text*
        ······indented ·text·
        </Tabs>
        ·······
        {/* don't
        ·········
           read */}
        ···········
        - item {a} <br />
        ··item ··········
        `<b>{a}` <> one </>
        ·<b>{a}· ·· one ···
        """);
  }

  @Test
  void whatIsNeverClosedIsProse() {
    mask(
        """
        A {brace and <b tag
        A {brace and <b tag

        <b on="no
        <b on="no

        1 < 2, a <3 and <!-- this -->
        1 < 2, a <3 and ·············
        """);
  }

  @Test
  void tagsOnTheirOwnPartBlocks() {
    Extraction.assertBlocks(
        Format.MDX,
        """
        import a from 'b'

        <Note>
        One.
        </Note>
        <Note>
        Two.

        :::tip Oil
        Three.[^1]
        :::

        [^1]: Four.
        """,
        """
        VERBATIM
        PARAGRAPH: One.
        PARAGRAPH: Two.
        PARAGRAPH: Oil
        PARAGRAPH: Three.
        NOTE: Four.
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.MDX, table);
  }
}
