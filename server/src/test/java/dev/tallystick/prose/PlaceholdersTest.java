package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Text;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What is copied, and known by its looks in any format. */
class PlaceholdersTest {
  @ParameterizedTest
  @ValueSource(
      strings = {
        "{name}",
        "{0}",
        "{}",
        "{user.name}",
        "%{name}",
        "${path}",
        "{{ name }}",
        "{{name.first}}",
        "{% boat %}",
        "%s",
        "%d",
        "%1$s",
        "%-8.2f",
        "%02d",
        "%ld",
        "%@",
        "%(name)s",
        "<0>",
        "</12>",
        "<0/>",
        "<0 />",
        "&boat-name;"
      })
  void placesForValues(String value) {
    assertEquals("PLACEHOLDER " + value, found("The boat " + value + " is here, and one more."));
    assertEquals("PLACEHOLDER " + value, found("A (" + value + ")."));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "It costs 50 % des Preises, or 50%des.",
        "A set {of words} and {one, two}",
        "A < 0 > B, and <b>, and <1234>",
        "AT&T; Lock & Co.",
        "5%s of it",
        "$5 and $x",
        "100%",
        "a {",
        "www",
        "a@b",
        "http://"
      })
  void otherThings(String prose) {
    assertEquals("", found(prose));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "See https://a.example/b.html?c=1&d={e}. Then go. | ADDRESS https://a.example/b.html?c=1&d={e}",
        "See (http://a.example/b_(c)). | ADDRESS http://a.example/b_(c)",
        "(See http://a.example/b.) | ADDRESS http://a.example/b",
        "Schiff: http://ä.example/größe! | ADDRESS http://ä.example/größe",
        "请看http://a.example/b？好。 | ADDRESS http://a.example/b",
        "Ask mira.vale@post.example. | ADDRESS mira.vale@post.example",
        "Ask mailto:mira@post.example, or %s. | ADDRESS mailto:mira@post.example PLACEHOLDER %s",
      })
  void addresses(String prose, String expected) {
    assertEquals(expected, found(prose));
  }

  @Test
  void referencesToCharacters() {
    assertEquals("REFERENCE &nbsp; REFERENCE &#8212;", found("A&nbsp;boat &#8212; two &amp"));
  }

  @Test
  void codeIsCopiedAnyhow() {
    assertEquals("CODE `a {b}` PLACEHOLDER {c}", found(Format.MARKDOWN, "The `a {b}` is {c}."));
  }

  @Test
  void overTheEndOfALineAndAMark() {
    assertEquals("PLACEHOLDER {{ a⏎> b }}", found(Format.MARKDOWN, "> It is {{ a\n> b }} now."));
  }

  private static String found(String prose) {
    return found(Format.PLAIN, prose);
  }

  private static String found(Format format, String source) {
    return format.blocks(new Text(source)).stream()
        .flatMap(block -> block.inlines().stream())
        .map(inline -> inline.kind() + " " + inline.span().of(source).replace('\n', '⏎'))
        .collect(Collectors.joining(" "));
  }
}
