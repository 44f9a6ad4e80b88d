package dev.tallystick.segment;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.prose.Format;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What inline elements do to sentences: their borders, their marks, their lengths. */
class SegmentInlinesTest {
  @ParameterizedTest
  @ValueSource(
      strings = {
        "Press `?` for help. / Then go on.",
        "Press `a! B` for help. / Then go on.",
        "Use the key <kbd>!</kbd> Now and then. / It helps.",
        "Open `lock.conf`. / It has all settings.",
        "Open `lock.conf`. / `lock.d` has the others.",
        "The user `Dr.` Is a name.",
        "Say {{ greeting! Long }} Now.",
        "It ends in `etc`. / Then go on.",
        "See https://a.example/b?c. / Then go on.",
        "It is e.g. `lock.conf` or another.",
        "`one. Two! Three?`",
        "Press (`?`) Now. / Then go on.",
      })
  void stopsInWhatIsCopiedEndNothing(String line) {
    assertParted("en", line);
  }

  @Test
  void inOtherScripts() {
    assertParted("zh", "按 `?` 键。 / `a` 在这里。");
    assertParted("zh", "`a` vs. `b`");
  }

  private static void assertParted(String language, String line) {
    String text = line.replace(" / ", " ");
    List<Segment> found = Sentences.segments(language, Format.MARKDOWN, text);
    String prose = line.replace("`", "").replaceAll("</?kbd>", "");
    assertEquals(prose, found.stream().map(Segment::prose).collect(Collectors.joining(" / ")));
  }

  @Test
  void eachSentenceHasItsOwn() {
    String text = "The *old lock. It is shut* and `a.b`. Press [it](x), {key}.\n";
    List<String> marked =
        Sentences.segments("en", Format.MARKDOWN, text).stream()
            .map(
                segment ->
                    segment.inlines().stream()
                        .map(m -> m.inline().kind() + " " + m.prose().of(segment.prose()))
                        .collect(Collectors.joining(", ")))
            .toList();
    assertEquals(List.of("EMPHASIS old lock.", "CODE a.b", "LINK it, PLACEHOLDER {key}"), marked);
  }

  @Test
  void aMarkInCodeClosesNoSentence() {
    assertEquals(Closing.OPEN, closing("Press the key `?`\n"));
    assertEquals(Closing.OPEN, closing("Press the key (`?`)\n"));
    assertEquals(Closing.STOP, closing("Press the key `?`.\n"));
    assertEquals(Closing.QUESTION, closing("Is it *open?*\n"));
  }

  private static Closing closing(String text) {
    return Sentences.segments("en", Format.MARKDOWN, text).get(0).closing();
  }

  /**
   * Lengths as a reader counts: clusters of UAX #29, blanks in a row once, what is copied little.
   */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "Boats. | 6",
        "Böats. | 6",
        "Bo\u0308ats. | 6",
        "Bo\u0308ats  two. | 10",
        "水车在河边。 | 6",
        "がぎぐ。 | 4",
        "か\u3099き\u3099く\u3099。 | 4",
        "กังหันน้ำ | 5",
        "Лодка\u0301. | 6",
        "One 👩‍👩‍👧‍👦 is 👍🏽. | 11",
        "Go ☂\uFE0F out. | 9",
        "Use `a_long_name` now. | 13",
        "Use `ab` now. | 11",
        "Use `a` `b` now. | 12",
        "See https://a.example/b/c/d/e. | 9",
        "Open {name_of_the_file}. | 10",
        "Fish &amp; Chips. | 13",
      })
  void lengths(String text, int length) {
    assertEquals(length, Sentences.segments("und", Format.MARKDOWN, text).get(0).length());
  }
}
