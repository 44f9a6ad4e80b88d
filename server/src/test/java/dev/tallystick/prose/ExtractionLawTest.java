package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.BitSet;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What holds for every text, however broken. */
class ExtractionLawTest {
  private static final int TEXTS = 2_000;
  private static final List<String> FRAGMENTS =
      List.of(
          "*",
          "**",
          "_",
          "`",
          "``",
          "~~~\n",
          "```\n",
          "[",
          "]",
          "![",
          "](",
          "](x \"t",
          ")",
          "<",
          ">",
          "<b\n",
          "<div>\n",
          "<!--",
          "-->",
          "<?",
          "&amp;",
          "&#0;",
          "&",
          "\\",
          "\\|",
          "\\\n",
          "|",
          "|-|-|\n",
          "| a | b |\n|---|---|\n",
          "a|b\n-|-\n",
          ">\t",
          "> ",
          ">",
          "- ",
          "-\t",
          "1. ",
          "2) ",
          "# ",
          "#",
          "===\n",
          "---\n",
          "+++\n",
          "***\n",
          "[^1]: ",
          "[^1]",
          "[a]: b\n",
          "[ ] ",
          "- [x] ",
          "\n",
          "\n\n",
          "\r\n",
          "\r",
          "  \n",
          "\t",
          "    ",
          " ",
          "\u00A0",
          "\u3000",
          "\0",
          "\uFEFF",
          "\u2028",
          "\u0085",
          "😀",
          "\uD83D",
          "\uDE00",
          "漢字。",
          "Word",
          "a line of words that is rather long",
          "END. ",
          "...",
          "key: value\n",
          "---\ntitle: ",
          "title: \"a\\",
          "  - summary: >-\n  ",
          "+++\ntitle = \"\"\"",
          "title = 'a",
          "• ",
          ":::note ",
          ":::\n",
          "!!! a \"b\"\n",
          "=== \"a",
          "{{< ",
          " >}}",
          "{%",
          "%}",
          "{#a}",
          "> [!NOTE] ",
          "import a\n",
          "\n\nexport {\n",
          "<A b={",
          "<A b=\"c\"\n",
          "{/*",
          "*/}",
          "}",
          "</A>\n",
          "WEBVTT\n",
          "NOTE ",
          "STYLE\n",
          "7\n",
          "00:00:01,000 --> 00:00:02,500\n",
          "00:02.000 --> 00:09.000 line:0\n",
          " --> ",
          "<v Mira>",
          "<00:01.000>",
          "{\\an8}",
          "\u266A",
          "\n\u2013 ",
          "<p>",
          "</p>",
          "<li>",
          "<pre>",
          "</pre>",
          "<table><tr><td>",
          "</table>",
          "</b>",
          "<i title=hint>",
          "</i>",
          "<code>",
          "</code>",
          "<br>",
          "<img alt='a light'>",
          "<h2 translate=no title=\"&quot;x\">",
          "<script>",
          "</script>",
          "<svg>",
          "</svg>",
          "<select><option label=l>",
          "<title>",
          "</title>",
          "&nbsp",
          "&notit;",
          "&#x1F600;",
          "&uuml;",
          "&rdquo;",
          "<article>",
          "<topic>",
          "<para>",
          "</para>",
          "<title>",
          "<section>",
          "</section>",
          "<emphasis>",
          "<footnote>",
          "</footnote>",
          "<fn>",
          "<listitem>",
          "<screen>",
          "<indexterm>",
          "<inlinemediaobject>",
          "<image><alt>",
          "<a xlink:title='t'>",
          "<log xmlns:its='http://www.w3.org/2005/11/its'>",
          "<its:rules>",
          "<its:withinTextRule selector='//b' withinText='nested'/>",
          "<its:translateRule selector='//@title' translate='yes'/>",
          "</its:rules>",
          "<![CDATA[",
          "]]>",
          "<!DOCTYPE a [<!ENTITY b 'c'>]>",
          "&b;",
          "== ",
          "====\n",
          "----\n",
          "____\n",
          "--\n",
          "////\n",
          "|===\n",
          ",===\n",
          "2+|",
          "+\n",
          "+",
          "++",
          "^",
          "~",
          "<<a,",
          ">>",
          "[[a]]",
          "[source]\n",
          "[quote]\n",
          ":a: b \\\n",
          "a:: ",
          ".",
          "// x\n",
          "ifdef::a[b]\n",
          "image::a[b, c]\n",
          "image:a[",
          "link:a[",
          "footnote:[",
          "menu:a[b]",
          "https://a[",
          "((",
          "))",
          " +\n",
          "NOTE: ",
          "{a}",
          "{",
          "}",
          "\\documentclass{a}\n",
          "\\begin{document}",
          "\\end{document}",
          "\\title{",
          "\\section*[a]{",
          "\\item",
          "\\item[",
          "\\footnote{",
          "\\caption{",
          "\\par ",
          "\\emph{",
          "\\href{a}{",
          "\\texorpdfstring{a}{b}",
          "\\epigraph{a}{b}",
          "\\enquote{",
          "\\a{b c}{d}",
          "\\a",
          "\\verb|a|",
          "\\begin{verbatim}",
          "\\end{verbatim}",
          "\\begin{itemize}",
          "\\end{itemize}",
          "\\begin{tabular}{ll}",
          "\\end{tabular}",
          "\\begin{frame}{a b}",
          "\\begin{lemma}[a b]",
          "\\begin{align}",
          "\\end{align}",
          "\\begin{comment}",
          "\\end{comment}",
          "\\iffalse",
          "\\fi",
          "$",
          "$$",
          "$x.$",
          "\\(",
          "\\)",
          "\\[",
          "\\]",
          "\\\\[2pt]",
          "\\%",
          "% a\n",
          "\\\"{a}",
          "\\c c",
          "\\😀",
          "== ==\n",
          "== ",
          "-- --\n",
          "+--+--+\n",
          "+==+==+\n",
          "|a |b |\n",
          "|  +--+\n",
          "| ",
          "::\n\n",
          "   ",
          ".. ",
          ".. note:: ",
          ".. code::\n\n",
          ".. figure:: a\n   :alt: b\n",
          ".. csv-table:: a\n   :header: b\n\n",
          ".. versionadded:: 1 ",
          ".. |a| replace:: ",
          ".. [1] ",
          ".. _a: ",
          ":a: ",
          ":ref:`",
          "`_ ",
          " <a>`_",
          "a_ ",
          "]_ ",
          "-a  ",
          "(b) ",
          "#. ",
          ">>> ",
          "=====\nTitle\n=====\n",
          "{{ ",
          "}}",
          "%1$s",
          "</0>",
          "https://a.b/",
          "a@b.c");

  @ParameterizedTest
  @EnumSource
  void anyTextComesApartInOrder(Format format) {
    Random random = new Random(20261);
    for (int i = 0; i < TEXTS; i++) {
      String source = randomText(random);
      List<Block> blocks = format.blocks(new Text(source));
      assertLaw(source, blocks, format == Format.RST);
      assertEquals(blocks, format.blocks(new Text(source)));
    }
  }

  @Test
  void wordsOutsideOfMarksAreNeverLost() {
    Random random = new Random(20262);
    List<String> safe =
        List.of("*", "**", "_", "\n", "\n\n", "- ", "> ", ">\t", "| ", "\\|", " ", "[", "]");
    for (int i = 0; i < TEXTS; i++) {
      // A row may be as long as the head: what goes beyond is dropped by definition.
      StringBuilder source = new StringBuilder("| w ".repeat(31) + "\n" + "|---".repeat(31) + "\n");
      for (int k = 0; k < 30; k++) {
        source.append(safe.get(random.nextInt(safe.size()))).append("w");
      }
      assertEquals(letters(source.toString()), letters(prose(source.toString())), source::toString);
    }
  }

  private static String letters(String text) {
    return text.replaceAll("[^w]", "");
  }

  private static String prose(String source) {
    StringBuilder prose = new StringBuilder();
    Format.MARKDOWN.blocks(new Text(source)).forEach(b -> prose.append(b.prose(source)));
    return prose.toString();
  }

  private static String randomText(Random random) {
    StringBuilder text = new StringBuilder();
    int count = 1 + random.nextInt(40);
    for (int i = 0; i < count; i++) {
      text.append(FRAGMENTS.get(random.nextInt(FRAGMENTS.size())));
    }
    return text.toString();
  }

  private static void assertLaw(String source, List<Block> blocks, boolean sideBySide) {
    Text text = new Text(source);
    Span before = new Span(0, source.startsWith("\uFEFF") ? 1 : 0);
    Span farthest = before;
    boolean cell = false;
    BitSet taken = new BitSet();
    for (Block block : blocks) {
      Span extent = block.extent();
      // Of cells side by side, the first may go on where the next has begun.
      // A note may lie between the pieces of the block that it belongs to.
      boolean inside = block.kind() == Block.Kind.NOTE || sideBySide && cell;
      assertTrue(extent.start() >= farthest.end() || inside, source);
      assertTrue(extent.start() >= before.start(), source);
      assertTrue(extent.end() <= source.length(), source);
      assertEquals(block.kind() == Block.Kind.VERBATIM, block.pieces().isEmpty(), source);
      assertPieces(text, block);
      assertOnce(source, block, taken);
      assertInlines(text, block);
      if (extent.end() >= farthest.end()) {
        farthest = extent;
        cell = block.kind() == Block.Kind.CELL;
      }
      before = extent;
    }
  }

  private static void assertOnce(String source, Block block, BitSet taken) {
    for (Span piece : block.pieces()) {
      for (int at = piece.start(); at < piece.end(); at++) {
        assertFalse(taken.get(at) && !Characters.isSpace(source.charAt(at)), source);
      }
      taken.set(piece.start(), piece.end());
    }
  }

  private static void assertInlines(Text text, Block block) {
    int start = 0;
    for (Inline inline : block.inlines()) {
      Span span = inline.span();
      assertTrue(span.start() >= start && span.overlaps(block.extent()), text::string);
      assertTrue(span.end() <= text.string().length(), text::string);
      assertEquals(span.start(), text.outsidePair(span.start()), text::string);
      assertEquals(span.end(), text.outsidePair(span.end()), text::string);
      start = span.start();
    }
  }

  private static void assertPieces(Text text, Block block) {
    int end = -1;
    for (Span piece : block.pieces()) {
      assertFalse(piece.isEmpty(), text::string);
      assertTrue(piece.start() > end, text::string);
      assertEquals(piece.start(), text.outsidePair(piece.start()), text::string);
      assertEquals(piece.end(), text.outsidePair(piece.end()), text::string);
      assertEquals(block.extent(), block.extent().cover(piece), text::string);
      end = piece.end();
    }
  }
}
