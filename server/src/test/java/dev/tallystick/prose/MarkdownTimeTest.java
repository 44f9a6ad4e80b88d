package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import dev.tallystick.text.Text;
import java.time.Duration;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * A hundred thousand repetitions end in MDX and in front matter; the limit guards against hanging.
 */
class MarkdownTimeTest {
  private static final int TIMES = 100_000;
  private static final Duration LIMIT = Duration.ofSeconds(20);

  @ParameterizedTest
  @ValueSource(
      strings = {
        "<a ",
        "<a",
        "<a>",
        "<a>\n",
        "<a\n",
        "<a\n\n",
        "</",
        "<a b={",
        "<a b=\"",
        "{",
        "{a",
        "{\n",
        "{}",
        "{'",
        "{/*",
        "import a\n",
        "import a\n\n",
        "export {\n\n",
        "export }\n\n "
      })
  void mdxEnds(String fragment) {
    assertEnds(Format.MDX, fragment.repeat(TIMES));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "title: a\n",
        "title: \"a\n",
        "title: >\n  a\n",
        " title:\n",
        "title: a #",
        "title = '''",
        "title = \"\"\"\n",
        "title = '''\ntitle = \"\"\"\n",
        "a.",
        "- "
      })
  void frontMatterEnds(String fragment) {
    for (String fence : List.of("---\n", "+++\n")) {
      String key = fence.startsWith("-") ? "key: a\n" : "";
      assertEnds(Format.MARKDOWN, fence + key + fragment.repeat(TIMES) + "\n" + fence);
    }
  }

  private static void assertEnds(Format format, String file) {
    Text text = new Text(file);
    assertNotNull(assertTimeoutPreemptively(LIMIT, () -> format.blocks(text)));
  }
}
