package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose in the blocks of Markdown, character by character. */
class MarkdownBlockMaskTest {
  @Test
  void headings() {
    mask(
        """
        # The *old* ferry ##
        ··The ·old· ferry···

        Timetable of
        Timetable of
          the winter
        ··the winter
        ============
        ············
        Fares
        Fares
        -----
        ·····
        #
        ·
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
        lazily
        lazily
        * other
        ··other

          1) inner *one*
        ·····inner ·one·

             second paragraph
        ·····second paragraph
        - [ ] to do
        ······to do
        - [x] done [x] there
        ······done [x] there
        -
        ·
        """);
  }

  @Test
  void quotations() {
    mask(
        """
        > The tide
        ··The tide
        > waits *for
        ··waits ·for
          > no* one,
        ····no· one,
        they say.
        they say.
        >
        ·
        >> Deeper.
        ···Deeper.
        > - An item
        ····An item
        >   in it.
        ····in it.
        """);
  }

  @Test
  void tables() {
    mask(
        """
        | Day | Boat \\| *ship* |
        ··Day···Boat ·| ·ship···
        |-----|:----:|
        ··············
        | Mon |  `a\\|b` c \\\\| d |
        ··Mon·····a·|b· c ··| d··
        Tue | \\| &amp; [x](y) \\*
        Tue····| &amp; ·x···· ·*
        """);
  }

  @Test
  void tablesBehindTabs() {
    mask(
        """
        > | Port | Depth |
        ····Port···Depth··
        > |------|-------|
        ··················
        >\t| Velm | 4 *m* |
        ····Velm···4 ·m···
        >\t\s| Orr | \\| 3 |
        ·····Orr····| 3··
        - | Port | Depth |
        ····Port···Depth··
          |------|-------|
        ··················
        \t|| 4 m |
        ····4 m··
        """);
  }

  @Test
  void whatIsCopiedUnchanged() {
    mask(
        """
        Before
        Before
        ```sh
        ·····
        ferry # *now*
        ·············
        ```
        ···
        ~~~
        ···
          x
        ···

            indented
        ············
        ~~~
        ···
        <div>
        ·····
        <p>text</p>
        ···········
        </div>
        ······

            indented
        ············

        ***
        ···
        <!-- a comment
        ··············

        on lines -->
        ············
        After
        After
        """);
  }

  @Test
  void yamlFrontMatter() {
    mask(
        """
        ---
        ···
        # about
        ·······
        title: The ferry
        ·······The ferry
        tags: [a]
        ·········
        ---
        ···
        Prose: here.
        Prose: here.
        ---
        ···
        """);
  }

  @Test
  void tomlFrontMatter() {
    mask(
        """
        +++
        ···
        title = "The ferry"
        ·········The ferry·
        +++
        ···
        Prose.
        Prose.
        """);
  }

  @Test
  void thematicBreaksAreNoFrontMatter() {
    mask(
        """
        ---
        ···
        The ferry is late
        The ferry is late
        ---
        ···
        """);
  }

  @Test
  void commentsAloneAreNoFrontMatter() {
    mask(
        """
        ---
        ···
        # about
        ··about
        """);
  }

  @Test
  void frontMatterThatNeverEndsIsProse() {
    mask(
        """
        +++
        +++
        title = "The ferry"
        title = "The ferry"
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.MARKDOWN, table);
  }
}
