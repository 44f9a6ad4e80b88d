package dev.tallystick.segment;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.prose.Format;
import dev.tallystick.text.Span;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Where sentences stand in their file. */
class SegmentSpansTest {
  private static final List<String> PIECES =
      List.of(
          "The sluice is open. ",
          "Wer war es? ",
          "Nein! ",
          "*",
          "**",
          "`dr.x`",
          "[",
          "](a.b)",
          "\n",
          "\r\n",
          "\n\n",
          "- ",
          "> ",
          "## ",
          "~~~\n",
          "\u00A0",
          "\u3000",
          "水車。",
          "\uFEFF",
          "\uD83D\uDE00",
          "...",
          ")",
          "\u201D ",
          "| a. B. | c |\n|---|---|\n",
          "z.B. ",
          "\t",
          "3. ");

  @Test
  void whiteSpaceAroundASentenceIsNotInIt() {
    String text = "  \u00A0One is here.  \u3000 Two is here.\u2003\n";
    List<Segment> segments = Sentences.segments("en", Format.PLAIN, text);
    assertEquals(
        List.of("One is here.", "Two is here."),
        segments.stream().map(segment -> segment.span().of(text)).toList());
  }

  @Test
  void marksInsideLieInTheSpanButNotInTheProse() {
    String text = "Mind the *third* step. See [the map](plan.md) first.\n";
    List<Segment> segments = Sentences.segments("en", Format.MARKDOWN, text);
    assertEquals("Mind the third step.", segments.get(0).prose());
    assertEquals("Mind the *third* step.", segments.get(0).span().of(text));
    assertEquals("See the map first.", segments.get(1).prose());
    assertEquals("See [the map](plan.md) first.", segments.get(1).span().of(text));
  }

  @Test
  void marksOfTheBlockAreLeftOut() {
    assertEquals(
        List.of("A title", "An item.", "Quoted text."),
        List.of(
            Sentences.inFile("en", "## A title ##\n").get(0),
            Sentences.inFile("en", "- An item. \n").get(0),
            Sentences.inFile("en", "> Quoted text.\n").get(0)));
  }

  @Test
  void quotedLinesAreReadThroughTheirMarks() {
    String text = "> The sluice\r\n> is open. It\r\n> stays so.\r\n";
    assertEquals(
        List.of("The sluice\r\n> is open.", "It\r\n> stays so."), Sentences.inFile("en", text));
  }

  @Test
  void aVerbatimBlockIsALandmarkWithoutProse() {
    String text = "Type this:\n\n```\ndrain. all. now.\n```\n\nThen wait.\n";
    List<Segment> segments = Sentences.segments("en", Format.MARKDOWN, text);
    assertEquals(3, segments.size());
    Segment code = segments.get(1);
    assertTrue(code.verbatim());
    assertTrue(code.opens());
    assertEquals("", code.prose());
    assertTrue(code.span().of(text).contains("drain. all. now."));
    assertFalse(segments.get(2).verbatim());
  }

  @Test
  void anAbbreviationInMarksStillAbbreviates() {
    assertEquals(
        List.of("Ask *Mr.* Smith now.", "He knows."),
        Sentences.inFile("en", "Ask *Mr.* Smith now. He knows."));
  }

  /** A law: spans lie in order inside their blocks, without white space at their ends. */
  @ParameterizedTest
  @EnumSource
  void sentencesOfAnyTextLieInOrder(Format format) {
    Random random = new Random(8);
    for (int i = 0; i < 1_500; i++) {
      StringBuilder built = new StringBuilder();
      for (int k = random.nextInt(20); k > 0; k--) {
        built.append(PIECES.get(random.nextInt(PIECES.size())));
      }
      String text = built.toString();
      Span before = new Span(0, 0);
      for (Segment segment : Sentences.segments("de", format, text)) {
        assertLaw(text, before, segment);
        before = segment.span();
      }
    }
  }

  private static void assertLaw(String text, Span before, Segment segment) {
    Span span = segment.span();
    assertTrue(before.end() <= span.start(), text);
    assertTrue(span.end() <= text.length(), text);
    if (segment.verbatim()) {
      assertEquals("", segment.prose(), text);
      return;
    }
    assertFalse(span.isEmpty(), text);
    assertFalse(Blank.is(text.charAt(span.start())), text);
    assertFalse(Blank.is(text.charAt(span.end() - 1)), text);
    assertEquals(segment.prose().charAt(0), text.charAt(span.start()), text);
    assertTrue(Fragments.letters(segment.prose(), 1) > 0, text);
    assertEquals(-1, segment.prose().indexOf('\n'), text);
    assertEquals(segment.block().extent(), segment.block().extent().cover(span), text);
  }
}
