package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import dev.tallystick.text.Text;
import java.time.Duration;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A hundred thousand repetitions end; the limit only guards against hanging. */
class LinearTimeTest {
  private static final int TIMES = 100_000;
  private static final Duration LIMIT = Duration.ofSeconds(20);

  @ParameterizedTest
  @ValueSource(
      strings = {
        "[",
        "![",
        "[a](",
        "[^",
        "[^a]: b\n",
        "*a_ ",
        "***a",
        "`",
        "> ",
        "- ",
        "- a\n",
        "> > a\n\n",
        "<",
        "<!--",
        "<!-- a -->\n",
        "\\",
        "\\|",
        "|a",
        "| a\n",
        "a\\\n",
        "a  \n",
        "&",
        "[[]]()",
        "[^a]: ",
        "[^a]: b\n\n    ",
        ":::a\n",
        ":::",
        "!!! a\n",
        "!!! a \"\n    ",
        "=== \"",
        "> [!A]\n",
        "{{<",
        "{{% {{<",
        "{%",
        "{#a",
        "{{< a >}}\n",
        "{#a} "
      })
  void markdownEnds(String fragment) {
    assertEnds(Format.MARKDOWN, fragment);
    assertEnds(Format.MDX, fragment);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "a",
        "a\n",
        "- ",
        "- a\n",
        "1. a\n",
        " ",
        "\n",
        "...",
        "漢",
        "A B\n===\n",
        "\t",
        ">",
        "> a\n",
        "{",
        "{{ ",
        "{a}",
        "%",
        "%(a",
        "%0",
        "${",
        "<1",
        "&a",
        "&#",
        "http://",
        "http://a(",
        "http://a)",
        "a@",
        "a@b.",
        "@"
      })
  void plainTextEnds(String fragment) {
    assertEnds(Format.PLAIN, fragment);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "a",
        "a\n",
        "7\n",
        "7\n\n",
        "<",
        "<v ",
        "<v\t",
        "<a>",
        "{\\",
        "- ",
        "-\n",
        "(",
        "\u266A",
        "00:01.000 --> 00:02.000\n",
        "00:01.000 --> 00:02.000\na\n",
        "00:01.000 --> 00:02.000\n-a\n\n",
        "00:01.000 ",
        "NOTE\n",
        "STYLE\n\n"
      })
  void subtitlesEnd(String fragment) {
    assertEnds(Format.SUBRIP, fragment);
    assertEnds(Format.WEBVTT, fragment);
    assertEnds(Format.WEBVTT, "00:01.000 --> 00:02.000\n" + fragment.repeat(TIMES), 1);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "<div>",
        "<div>a",
        "</div>",
        "<b>a",
        "<b><p>a",
        "<i></b>",
        "<a><table>a",
        "<table><tr><td>a",
        "<ul><li>a",
        "<p title=a>",
        "a<i title=a>",
        "<img alt=a>",
        "<p title=\"",
        "<a b",
        "a<br>",
        "<code>a",
        "<",
        "</",
        "<!--",
        "<!-- a -->",
        "<![CDATA[",
        "&",
        "&amp",
        "&a",
        "&#",
        "&#1",
        "&nbsp;",
        "\0",
        "a ",
        "<script>",
        "<svg>",
        "<pre>a",
        "<option>a",
        "<title>"
      })
  void htmlEnds(String fragment) {
    assertEnds(Format.HTML, fragment);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "<a>",
        "<a>a",
        "a<a/>",
        "</a>",
        "<a></b>",
        "<para>a",
        "a.<footnote>a",
        "a<footnote/>",
        "a<footnote>a</footnote>)",
        "<section><title>a",
        "<listitem>",
        "<indexterm>a",
        "<screen>a",
        "<inlinemediaobject>",
        "<a its:translate='no'>a",
        "<its:rules><its:translateRule selector='//a:a' translate='no'/>",
        "<its:withinTextRule selector='//a//b//c' withinText='nested'/>a",
        "<its:withinTextRule selector='//a[(' withinText='yes'/></its:rules>",
        "<a xmlns='u'>",
        "<a b='",
        "<a b",
        "<",
        "<!--",
        "<?",
        "<![CDATA[",
        "<![CDATA[a]]>",
        "]]>",
        "<!DOCTYPE a [",
        "<!ENTITY a 'b'>",
        "&a;",
        "&a",
        "&amp;",
        "&#1"
      })
  void xmlEnds(String fragment) {
    assertEnds(Format.XML, fragment);
    assertEnds(
        Format.XML,
        "<section xmlns:its='http://www.w3.org/2005/11/its'><its:rules><its:withinTextRule"
            + " selector='//b//a | //a//para' withinText='nested'/></its:rules><para>"
            + fragment.repeat(TIMES),
        1);
    assertEnds(Format.XML, "<!DOCTYPE a [" + fragment.repeat(TIMES), 1);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "a",
        "a\n",
        "*",
        "*a ",
        " a*",
        "**a",
        "^a",
        "_a_ ",
        "+",
        "+a ",
        "++a",
        "+++a",
        "\\",
        "\\*",
        "[",
        "]",
        "[[",
        "[a]#",
        "<<a",
        "<<a>>",
        "<<a,",
        "((a",
        "(((",
        "<https://",
        "https://a[",
        "https://",
        "link:",
        "link:a[",
        "link:a[b,",
        "link:a[\"",
        "image:a[b=",
        "footnote:[",
        "footnote:[] ",
        "footnote:[a]\n",
        "footnoteref:[a,b] ",
        "footnote:[a\n",
        "* ",
        "* a\n",
        "* a\n+\n",
        "a:: ",
        "a::b",
        "a::[",
        "a::\n",
        "::: ",
        ". a\n",
        "= ",
        "= a ",
        "====\n",
        "====\n\n",
        "----\na\n",
        "--\n",
        "|===\n",
        "////\n",
        "[a]\n",
        "[a\n",
        ":a: \\\n",
        "ifdef::a[b]\n",
        "ifdef::a[",
        "> a\n",
        "a\n-\n",
        "//\n",
        ".a\n",
        " a\n\n"
      })
  void asciiDocEnds(String fragment) {
    assertEnds(Format.ASCIIDOC, fragment);
    assertEnds(Format.ASCIIDOC, "|===\n|" + fragment.repeat(TIMES) + "\n|===", 1);
    assertEnds(Format.ASCIIDOC, "= a" + " ".repeat(TIMES) + fragment, 1);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "a",
        "a\n",
        "\n\n",
        "{",
        "}",
        "{}",
        "{a\n\n",
        "[",
        "\\[",
        "\\(",
        "$",
        "$$",
        "$ ",
        "$$ $",
        "\\a{",
        "\\a{a",
        "\\a[",
        "\\a{b}{c}",
        "\\a{b c}",
        "\\emph{",
        "\\emph{a ",
        "\\label{",
        "\\label{a}",
        "\\footnote{",
        "\\footnote{a",
        "a\\footnote{b}",
        "\\section{",
        "\\section{a}",
        "\\epigraph{a}",
        "\\title{\\footnote{",
        "\\texorpdfstring{",
        "\\enquote{a",
        "\\item",
        "\\item[",
        "\\item[a]",
        "\\begin{a}",
        "\\begin{a}\\end{b}",
        "\\end{a}",
        "\\begin{itemize}",
        "\\begin{itemize}\\item a",
        "\\begin{verbatim}",
        "\\begin{verbatim}\\end{verbatim}",
        "\\begin{align}",
        "\\begin{tabular}{l}",
        "\\begin{document}",
        "\\begin{lemma}[",
        "\\begin{frame}{",
        "\\begin",
        "\\verb|",
        "\\lstinline{",
        "\\mintinline[",
        "\\verb",
        "\\newcommand",
        "\\newcommand{",
        "\\iffalse",
        "\\iffalse \\fi",
        "%",
        "%\n",
        "\\",
        "\\\\[",
        "&",
        "~",
        "\\\"{",
        "\\par "
      })
  void latexEnds(String fragment) {
    assertEnds(Format.LATEX, fragment);
    assertEnds(Format.LATEX, "\\begin{tabular}" + fragment.repeat(TIMES) + "\\end{tabular}", 1);
    assertEnds(Format.LATEX, fragment.repeat(TIMES) + "\\begin{document}a", 1);
    assertEnds(Format.LATEX, fragment.repeat(TIMES) + "}".repeat(TIMES), 1);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "a \n",
        "*",
        "*a ",
        "**a",
        " a*",
        "`",
        "`a ",
        "``a",
        "```",
        "`a`",
        "`a <",
        "`a>`",
        "`:a",
        "_`a",
        "_",
        "a_ ",
        "a-",
        "-a",
        "a:",
        "|",
        "|a",
        "||\n",
        "| a\n",
        "[",
        "[a",
        "[a]_",
        ":",
        ":a",
        ":a:",
        ":a:`",
        ":a: ",
        ":a: b\n",
        "\\",
        "\\ ",
        "- ",
        "- a\n",
        "-\n",
        "1. ",
        "1. a\n",
        "(a) ",
        "-a, ",
        "-a  b\n",
        ".. ",
        ".. a\n",
        ".. [1] ",
        ".. _a\n",
        ".. a:: ",
        ".. a::\n",
        ".. |a|",
        "..\n\n",
        ".. code::\n\n",
        "::\n",
        "::\n\n",
        "a::\n\n b\n",
        "=",
        "==\n",
        "====\n",
        "==== ",
        "== ==\n",
        "== ==\n\n",
        "== ==\na b\n",
        "-- --\n",
        "+-+\n",
        "+-",
        "+-+\n|a|\n",
        "|a|",
        "+\n",
        ">>> \n",
        " a\n",
        " a\n\n",
        "a\n b\n",
        "\t",
        "a\n=\n",
        "=\na\n=\n",
        "\"a,",
        "\""
      })
  void restructuredTextEnds(String fragment) {
    String many = fragment.repeat(TIMES);
    assertEnds(Format.RST, fragment);
    assertEnds(Format.RST, "+" + "-+".repeat(TIMES) + "\n|" + many, 1);
    assertEnds(Format.RST, "== ".repeat(TIMES) + "\n" + many + "\n== ==\n", 1);
    assertEnds(Format.RST, ".. csv-table::\n\n   " + many, 1);
  }

  @ParameterizedTest
  @ValueSource(strings = {"- ", "| a ", "\\|"})
  void rowsOfATableEnd(String fragment) {
    assertEnds(Format.MARKDOWN, "| a |\n|---|\n| " + fragment.repeat(TIMES), 1);
  }

  private static void assertEnds(Format format, String fragment) {
    assertEnds(format, fragment, TIMES);
  }

  private static void assertEnds(Format format, String fragment, int times) {
    Text text = new Text(fragment.repeat(times));
    assertNotNull(assertTimeoutPreemptively(LIMIT, () -> format.blocks(text)));
  }
}
