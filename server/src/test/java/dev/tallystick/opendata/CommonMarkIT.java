package dev.tallystick.opendata;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.prose.Block;
import dev.tallystick.prose.Format;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jsoup.Jsoup;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.Element;
import org.jsoup.nodes.TextNode;
import org.junit.jupiter.api.Test;

/**
 * The examples of the CommonMark specification 0.31.2, each a text and the HTML that it stands for,
 * from the npm package {@code commonmark-spec}. The words that we take for prose must be those that
 * the HTML shows outside of code blocks.
 */
class CommonMarkIT {
  private static final Path SPECIFICATION =
      Path.of("../test-fixtures/node_modules/commonmark-spec/spec.txt");
  private static final int EXAMPLES = 652;
  private static final Pattern EXAMPLE =
      Pattern.compile("(?m)^`{32} example\\n([\\s\\S]*?)^\\.\\n([\\s\\S]*?)^`{32}$|^#{1,6} *(.*)$");
  private static final Pattern WORD = Pattern.compile("[\\p{L}\\p{N}]+");

  @Test
  void thereAreAllExamples() throws IOException {
    assertEquals(EXAMPLES, examples().size());
  }

  /**
   * Two sections differ, and no example of any other: a block of HTML is none of ours to read, and
   * a character reference stays as it is written, for nothing is decoded.
   */
  @Test
  void theWordsOfTheProseAreThoseOfTheHtml() throws IOException {
    Map<String, Integer> differ = new TreeMap<>();
    for (Example example : examples()) {
      List<String> prose = words(prose(Format.MARKDOWN, example.markdown()));
      if (!prose.equals(words(shown(example.html())))) {
        differ.merge(example.section(), 1, Integer::sum);
      }
    }
    assertEquals(Map.of("Entity and numeric character references", 8, "HTML blocks", 21), differ);
  }

  @Test
  void theLawsHoldInEveryFormat() throws IOException {
    for (Example example : examples()) {
      for (Format format : Format.values()) {
        prose(format, example.markdown());
      }
    }
  }

  private record Example(int number, String section, String markdown, String html) {}

  private static List<Example> examples() throws IOException {
    String text = Files.readString(SPECIFICATION).replace("\r\n", "\n");
    Matcher matcher = EXAMPLE.matcher(text.split("<!-- END TESTS -->")[0]);
    List<Example> examples = new ArrayList<>();
    String section = "";
    while (matcher.find()) {
      if (matcher.group(3) != null) {
        section = matcher.group(3);
      } else {
        String markdown = matcher.group(1).replace('→', '\t');
        String html = matcher.group(2).replace('→', '\t');
        examples.add(new Example(examples.size() + 1, section, markdown, html));
      }
    }
    return examples;
  }

  /** The prose, a blank between two blocks; on the way the laws of extraction are held. */
  private static String prose(Format format, String markdown) {
    StringBuilder prose = new StringBuilder();
    int end = 0;
    for (Block block : format.blocks(new Text(markdown))) {
      assertTrue(block.extent().start() >= end, markdown);
      assertTrue(block.extent().end() <= markdown.length(), markdown);
      end = block.extent().end();
      for (Span piece : block.pieces()) {
        assertEquals(block.extent(), block.extent().cover(piece), markdown);
        prose.append(piece.of(markdown));
      }
      prose.append(' ');
    }
    return prose.toString();
  }

  /** The text that the HTML shows, with what stands for images, without blocks of code. */
  private static String shown(String html) {
    Document document = Jsoup.parseBodyFragment(html);
    document.select("pre").remove();
    for (Element image : document.select("img")) {
      image.after(new TextNode(image.attr("alt")));
    }
    return document.body().wholeText();
  }

  private static List<String> words(String text) {
    List<String> words = new ArrayList<>();
    Matcher word = WORD.matcher(text);
    while (word.find()) {
      words.add(word.group());
    }
    return words;
  }
}
