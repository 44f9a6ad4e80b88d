package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Random;
import org.jsoup.nodes.CDataNode;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.Element;
import org.jsoup.nodes.Range;
import org.jsoup.nodes.TextNode;
import org.jsoup.parser.Parser;
import org.junit.jupiter.api.Test;

/**
 * The parser's places of text, and what it decodes there, held against the file. Framesets are left
 * out: browsers drop the words in them, and we read them all the same.
 */
class HtmlPositionsTest {
  private static final int PAGES = 4_000;
  private static final List<String> FRAGMENTS =
      List.of(
          "w",
          "w w",
          "<p>",
          "</p>",
          "<b>",
          "</b>",
          "<i>",
          "</i>",
          "<a href=x>",
          "</a>",
          "<li>",
          "<ul>",
          "</ul>",
          "<table>",
          "</table>",
          "<tr>",
          "<td>",
          "<caption>",
          "<br>",
          "</br>",
          "<select>",
          "<option>",
          "</select>",
          "<h1>",
          "</h2>",
          "<form>",
          "<button>",
          "</body>",
          "</html>",
          "<html>",
          "<body>",
          "<head>",
          "<title>",
          "</title>",
          "<pre>\n",
          "</pre>",
          "<div",
          ">",
          " title='x'",
          "\"",
          "<",
          "</",
          "<!-- w -->",
          "<!w>",
          "<?w?>",
          "]]>",
          "\0",
          "\r\n",
          "\r",
          "\n",
          " ",
          "\uFEFF",
          "😀",
          "\uD83D",
          "&amp;",
          "&ampw",
          "&nbsp",
          "&notit;",
          "&notin;",
          "&",
          "&;",
          "&#",
          "&#6",
          "&#65;",
          "&#x41 ",
          "&#x",
          "&#xD800;",
          "&#150;",
          "&#0;",
          "&#99999999999;",
          "&uuml;",
          "&Uuml",
          "&NotEqualTilde;",
          "<svg>",
          "</svg>",
          "<template>",
          "</template>",
          "<noscript>",
          "</noscript>",
          "<textarea>",
          "</textarea>",
          "<math>",
          "<nobr>",
          "<font>",
          "</font>");

  @Test
  void everyTextStandsWhereTheParserSaysAndReadsAsItDecodes() {
    Random random = new Random(71);
    for (int page = 0; page < PAGES; page++) {
      String source = page(random, FRAGMENTS);
      int end = 0;
      for (TextNode node : texts(source)) {
        int start = node.sourceRange().startPos();
        assertTrue(start >= end, source);
        end = node.sourceRange().endPos();
        String decoded = decoded(source, start, end, false);
        assertEquals(plain(node.getWholeText()), plain(decoded), source);
      }
    }
  }

  @Test
  void wordsOutsideOfTagsAreNeverLost() {
    Random random = new Random(72);
    List<String> safe =
        List.of(
            "w",
            "w ",
            "<p>",
            "</p>",
            "<b>",
            "</b>",
            "<i>",
            "</i>",
            "<li>",
            "</ul>",
            "<table>",
            "</table>",
            "<td>",
            "<tr>",
            "<br>",
            "<h1>",
            "</h2>",
            "<a>",
            "</a>",
            "<!-- -->",
            "\n",
            "</body>",
            "</html>",
            "<form>",
            "<div>",
            "</div>",
            "<button>",
            "<option>",
            "<dd>",
            "<noscript>",
            "&nbsp;",
            "&#65;",
            "<code>",
            "</code>",
            "<p translate=no>");
    for (int page = 0; page < PAGES; page++) {
      String source = page(random, safe);
      StringBuilder read = new StringBuilder();
      for (Block block : Format.HTML.blocks(new Text(source))) {
        boolean copied = block.kind() == Block.Kind.VERBATIM;
        read.append(copied ? block.extent().of(source) : block.prose(source));
      }
      assertEquals(source.replaceAll("[^w]", ""), read.toString().replaceAll("[^w]", ""), source);
    }
  }

  @Test
  void everyAttributeStandsWhereTheParserSaysAndReadsAsItDecodes() {
    Random random = new Random(73);
    List<String> values =
        List.of("w", " ", "&amp;", "&ampw", "&copy=", "&notin;", "&", "&#65", "\r\n", "<p>", "😀");
    for (int page = 0; page < PAGES; page++) {
      String value = page(random, values);
      List<String> tags =
          List.of(
              "<p title=\"" + value + "\">",
              "<i alt=x title='" + value + "' title=y/>",
              "<b TITLE = " + value.replaceAll("[\\s<>]", "") + "w>",
              "</b>",
              "<table>",
              "w",
              "\uFEFF",
              "\r\n");
      String source = page(random, tags);
      Document document = Parser.htmlParser().setTrackPosition(true).parseInput(source, "");
      for (Element element : document.select("[title]")) {
        Range range = element.attributes().sourceRange("title").valueRange();
        String decoded = decoded(source, range.startPos(), range.endPos(), true);
        assertEquals(plain(element.attr("title")), plain(decoded), source);
      }
    }
  }

  private static String page(Random random, List<String> fragments) {
    StringBuilder page = new StringBuilder();
    for (int i = random.nextInt(30); i >= 0; i--) {
      page.append(fragments.get(random.nextInt(fragments.size())));
    }
    return page.toString();
  }

  private static List<TextNode> texts(String source) {
    Document document = Parser.htmlParser().setTrackPosition(true).parseInput(source, "");
    List<TextNode> texts = new ArrayList<>();
    document.traverse(
        (node, depth) -> {
          if (node instanceof TextNode text && !(node instanceof CDataNode)) {
            assertTrue(text.sourceRange().isTracked(), source);
            texts.add(text);
          }
        });
    texts.sort(Comparator.comparingInt(text -> text.sourceRange().startPos()));
    return texts;
  }

  private static String decoded(String source, int start, int end, boolean attribute) {
    StringBuilder decoded = new StringBuilder();
    int at = start;
    while (at < end) {
      CharacterReference reference =
          source.charAt(at) == '&' ? CharacterReference.at(source, at, end, attribute) : null;
      if (reference == null) {
        decoded.append(source.charAt(at++));
      } else {
        decoded.appendCodePoint(reference.character());
        at = reference.end();
      }
    }
    return decoded.toString();
  }

  /** Without what parsers drop or unify, and without second code points of a reference. */
  private static String plain(String text) {
    return text.replace("\r\n", "\n")
        .replace('\r', '\n')
        .replace("</>", "")
        .replaceAll("[\\x{0}\\x{FFFD}\\x{338}\\p{Cs}]", "");
  }
}
