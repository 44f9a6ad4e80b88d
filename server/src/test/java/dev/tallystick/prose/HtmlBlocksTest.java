package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** Which blocks there are in HTML, and of what kind. */
class HtmlBlocksTest {
  @Test
  void headingsAndParagraphs() {
    blocks(
        "<title>Lamp</title><h1>The lamp</h1><div>Bare<p>One</p>two</div><h6>Deep</h6>"
            + "<figure><figcaption>View</figcaption></figure><details><summary>More</summary>x",
        """
        PARAGRAPH: Lamp
        HEADING 1: The lamp
        PARAGRAPH: Bare
        PARAGRAPH: One
        PARAGRAPH: two
        HEADING 6: Deep
        PARAGRAPH: View
        PARAGRAPH: More
        PARAGRAPH: x
        """);
  }

  @Test
  void listsCellsAndQuotations() {
    blocks(
        """
        <ul><li>one<ol><li><p>two</p></ol><li>three</ul>
        <dl><dt>Lamp<dd>A light</dl>
        <table><caption>Oil</caption><tr><th>Day<td>1 can<td><p>full</table>
        <blockquote>Wait<blockquote><p>Now</blockquote></blockquote>
        """,
        """
        ITEM 1: one
        ITEM 2: two
        ITEM 1: three
        ITEM 1: Lamp
        ITEM 1: A light
        CELL: Oil
        CELL: Day
        CELL: 1 can
        CELL: full
        QUOTATION 1: Wait
        QUOTATION 2: Now
        """);
  }

  @Test
  void landmarks() {
    blocks(
        """
        <pre>make lamp</pre>
        <p><code>make</code>, <kbd>lamp</kbd></p>
        <p><code>make</code> it</p>
        <h2><code>make</code></h2>
        <h2 translate="no">Orrow</h2>
        <p>See <a href="https://orrow.invalid/lamp">https://orrow.invalid/lamp</a></p>
        <p>→ <a href="https://orrow.invalid/?a&amp;b">https://orrow.invalid/?a&amp;b</a></p>
        """,
        """
        VERBATIM
        VERBATIM
        PARAGRAPH: make it
        HEADING 2: make
        VERBATIM
        PARAGRAPH: See https://orrow.invalid/lamp
        VERBATIM
        """);
  }

  @Test
  void aLineInTheMiddleOfASentence() {
    blocks(
        """
        <p>The ferry
           leaves <b>at
           noon</b></p>
        """,
        "PARAGRAPH: The ferry⏎leaves at⏎noon\n");
  }

  @Test
  void anElementWithoutOthersInsideIsABlockWithItsTags() {
    Extraction.assertExtents(
        Format.HTML,
        "<h1><b>The</b> lamp</h1><pre>a\n b\n</pre><p>\nLit.<br>\n</p><li>bare<ul><li>in</ul></li>"
            + "<p title=tip>x</p><p>y<i title=late></i></p><p>open<p>1<br><br>2</p>",
        """
        <h1><b>The</b> lamp</h1>
        a⏎ b
        <p>⏎Lit.<br>⏎</p>
        bare
        <li>in
        tip
        x</p>
        <p>y
        late
        <p>open
        <p>1
        2</p>
        """);
  }

  private static void blocks(String source, String expected) {
    for (String lineEnd : new String[] {"\n", "\r"}) {
      assertEquals(expected, Extraction.blocks(Format.HTML, source.replace("\n", lineEnd)));
    }
  }
}
