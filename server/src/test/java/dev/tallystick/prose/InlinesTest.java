package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Text;
import org.junit.jupiter.api.Test;

/** What is marked within running text. */
class InlinesTest {
  @Test
  void markdown() {
    assertInlines(
        Format.MARKDOWN,
        """
        # The *old* lock
        Press `?` and **hold** [the *bar*](bar.md), ![a bar](x.png) or <kbd>F1</kbd>.
        > Two lines of *words
        > that lean* here.

        | a | `b` |
        |---|-----|
        | *c* \\| `d` | e |
        """,
        """
        EMPHASIS *old*
        CODE `?`
        STRONG **hold**
        LINK [the *bar*](bar.md)
        EMPHASIS *bar*
        IMAGE ![a bar](x.png)
        CODE <kbd>F1</kbd>
        EMPHASIS *words⏎> that lean*
        CODE `b`
        EMPHASIS *c*
        CODE `d`
        """);
  }

  @Test
  void markdownFootnotesAndOpenTags() {
    assertInlines(
        Format.MARKDOWN,
        """
        Text[^1] with <b>a tag and <code>.

        [^1]: First *note*.
        [^2]: Second `note`.
        """,
        """
        EMPHASIS *note*
        CODE `note`
        """);
  }

  @Test
  void html() {
    assertInlines(
        Format.HTML,
        """
        <p>Press <code>?</code> or <kbd title="a key">F1</kbd> for <em>quick</em> <b>help</b>.
        <p>See <a href="x">the <i>page</i></a>, <img src=x alt="a lock"> or ask
        <span translate="no">Lock &amp; Co.</span>.</p>
        <p><code>only code</code></p>
        """,
        """
        CODE <code>?</code>
        CODE <kbd title="a key">F1</kbd>
        EMPHASIS <em>quick</em>
        STRONG <b>help</b>
        LINK <a href="x">the <i>page</i></a>
        EMPHASIS <i>page</i>
        IMAGE <img src=x alt="a lock">
        CODE <span translate="no">Lock &amp; Co.</span>
        """);
  }

  @Test
  void restructuredText() {
    assertInlines(
        Format.RST,
        """
        Press ``?`` or :kbd:`F1`, *not* **both**,
        see :ref:`the locks <locks>`, `the map`_ and |keeper|.
        """,
        """
        CODE ``?``
        CODE :kbd:`F1`
        EMPHASIS *not*
        STRONG **both**
        LINK :ref:`the locks <locks>`
        LINK `the map`_
        PLACEHOLDER |keeper|
        """);
  }

  @Test
  void latex() {
    assertInlines(
        Format.LATEX,
        """
        Press \\verb|?| where $a. > b$ and then $c > d.$
        """,
        """
        CODE ?
        CODE $a. > b$
        CODE $c > d
        """);
  }

  @Test
  void xml() {
    assertInlines(
        Format.XML,
        """
        <article xmlns="http://docbook.org/ns/docbook"><title>Locks</title>
        <para>Press <keycap>?</keycap> or call <code>open?</code> for
        <phrase translate="no">Lock &amp; Co.</phrase>.</para></article>
        """,
        """
        CODE <keycap>?</keycap>
        CODE <code>open?</code>
        CODE <phrase translate="no">Lock &amp; Co.</phrase>
        """);
  }

  @Test
  void htmlElementsThatReachOverBlocksBelongToTheFirst() {
    assertInlines(
        Format.HTML, "<b><p>One.</p><p>Two.</p></b>", "STRONG <b><p>One.</p><p>Two.</p></b>\n");
  }

  @Test
  void asciiDoc() {
    assertInlines(
        Format.ASCIIDOC,
        """
        Press `?` or kbd:[F1] and *hold* the _bar_ +a*b+.
        See link:x.html[the map], <<lock,the lock>> or https://a.example/b[this].

        |===
        |a `cell` |image:x.png[a lock]
        |===
        """,
        """
        CODE `?`
        CODE kbd:[F1]
        STRONG *hold*
        EMPHASIS _bar_
        CODE +a*b+
        LINK link:x.html[the map]
        LINK <<lock,the lock>>
        LINK https://a.example/b[this]
        CODE `cell`
        IMAGE image:x.png[a lock]
        """);
  }

  @Test
  void subtitles() {
    assertInlines(
        Format.SUBRIP,
        """
        1
        00:00:01,000 --> 00:00:02,000
        Come <i>here
        at once</i>, {name} and <b>you</b>

        2
        00:00:02,000 --> 00:00:03,000
        <i>who never closes.
        """,
        """
        EMPHASIS <i>here⏎at once</i>
        PLACEHOLDER {name}
        STRONG <b>you</b>
        """);
  }

  private static void assertInlines(Format format, String source, String expected) {
    StringBuilder found = new StringBuilder();
    for (Block block : format.blocks(new Text(source))) {
      for (Inline inline : block.inlines()) {
        String text = inline.span().of(source).replace('\n', '⏎');
        found.append(inline.kind()).append(' ').append(text).append('\n');
      }
    }
    assertEquals(expected, found.toString());
  }
}
