package dev.tallystick.pairing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTimeout;

import java.time.Duration;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Wildcards. The meaning of each is that of {@code Pattern} in the specification of the Language
 * Server Protocol 3.17, section "Document Filter"; that a folder stands for all in it is our own.
 */
class GlobTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "a.md            | a.md               | true",
        "a.md            | b/a.md             | false",
        "a.md            | a.mdx              | false",
        "*.md            | a.md               | true",
        "*.md            | .md                | true",
        "*.md            | b/a.md             | false",
        "*/a.md          | b/a.md             | true",
        "*/a.md          | a.md               | false",
        "b*d/a.md        | b/d/a.md           | false",
        "?.md            | a.md               | true",
        "?.md            | ab.md              | false",
        "?.md            | 🔔.md              | true",
        "a?b             | a/b                | false",
        "**              | a/b/c.md           | true",
        "**/a.md         | a.md               | true",
        "**/a.md         | b/c/a.md           | true",
        "**/a.md         | b/ca.md            | false",
        "b/**/a.md       | b/a.md             | true",
        "b/**/a.md       | b/c/d/a.md         | true",
        "b/**/a.md       | c/a.md             | false",
        "b/**            | b/c/a.md           | true",
        "b/**            | bc/a.md            | false",
        "b**d.md         | b/c/d.md           | true",
        "{a,bc}.md       | a.md               | true",
        "{a,bc}.md       | bc.md              | true",
        "{a,bc}.md       | ab.md              | false",
        "{a,bc}.md       | abc.md             | false",
        "{a,}.md         | .md                | true",
        "{**/a,b}.md     | c/d/a.md           | true",
        "{a{b,c},d}.md   | ac.md              | true",
        "{a{b,c},d}.md   | d.md               | true",
        "{a{b,c},d}.md   | a.md               | false",
        "a,b.md          | a,b.md             | true",
        "[ab].md         | b.md               | true",
        "[a-c].md        | b.md               | true",
        "[a-c].md        | d.md               | false",
        "[!a-c].md       | d.md               | true",
        "[!a-c].md       | b.md               | false",
        "a[!b]c          | a/c                | false",
        "[]].md          | ].md               | true",
        "[*].md          | *.md               | true",
        "[*].md          | a.md               | false",
        "[ä-ü].md        | ö.md               | true",
        "drafts          | drafts/de/a.md     | true",
        "drafts/         | drafts/de/a.md     | true",
        "drafts          | de/drafts/a.md     | false",
        "**/drafts       | de/drafts/a.md     | true",
        "dra             | drafts/a.md        | false",
        "d*/x            | drafts/x/y/a.md    | true"
      })
  void matches(String glob, String path, boolean matches) {
    assertEquals(matches, Glob.of(glob).orElseThrow().matches(path));
  }

  @ParameterizedTest
  @ValueSource(strings = {"[a.md", "[]", "[!]", "{a,b", "a}", "{a}}", "{{a}", "a/{b/[c}"})
  void aBracketThatIsNotClosedOrClosesNothingIsNoGlob(String written) {
    assertEquals(Optional.empty(), Glob.of(written));
  }

  @Test
  void isCalledWhatWasWritten() {
    assertEquals("drafts/", Glob.of("drafts/").orElseThrow().toString());
    assertEquals(Glob.of("a*"), Glob.of("a*"));
    assertEquals(Glob.of("a*").hashCode(), Glob.of("a*").hashCode());
  }

  /** What would keep a matcher that goes back busy for years. */
  @Test
  void manyWildcardsTakeNoLongerThanTheyAreLong() {
    String path = "a".repeat(4000);
    for (String part : new String[] {"*a", "**a", "{a,aa}", "[a-z]*"}) {
      Glob glob = Glob.of(part.repeat(500) + "b").orElseThrow();
      assertFalse(assertTimeout(Duration.ofSeconds(10), () -> glob.matches(path)));
    }
  }
}
