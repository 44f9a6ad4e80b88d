package dev.tallystick.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TextTest {
  private static final int TEXTS = 3_000;

  @Test
  void anEmptyTextHasOneLine() {
    Text text = new Text("");
    assertEquals(1, text.lines());
    assertEquals(new Place(0, 0), text.place(0));
    assertEquals(0, text.lineEnd(0));
  }

  @ParameterizedTest
  @ValueSource(strings = {"\n", "\r\n", "\r"})
  void everyKindOfLineEndPartsLines(String end) {
    Text text = new Text("one" + end + "two" + end);
    assertEquals(3, text.lines());
    assertEquals(0, text.lineStart(0));
    assertEquals(3, text.lineEnd(0));
    assertEquals(3 + end.length(), text.lineStart(1));
    assertEquals(6 + end.length(), text.lineEnd(1));
    assertEquals(text.length(), text.lineStart(2));
    assertEquals(text.length(), text.lineEnd(2));
  }

  @Test
  void separatorsOfUnicodePartNoLines() {
    assertEquals(1, new Text("one\u2028two\u2029three\u0085four\u000Bfive\f").lines());
  }

  @Test
  void carriageReturnsBeforeALineFeedAreNoLineTwice() {
    assertEquals(3, new Text("a\r\r\nb").lines());
    assertEquals(3, new Text("a\n\rb").lines());
    assertEquals(2, new Text("a\r\nb").lines());
  }

  @Test
  void placesGrowWithOffsets() {
    RandomTexts texts = new RandomTexts(2);
    for (int i = 0; i < TEXTS; i++) {
      Text text = new Text(texts.next());
      assertEquals(new Place(0, 0), text.place(0));
      for (int offset = 1; offset <= text.length(); offset++) {
        Place before = text.place(offset - 1);
        Place here = text.place(offset);
        boolean sameLine = here.equals(new Place(before.line(), before.column() + 1));
        assertTrue(sameLine || here.equals(new Place(before.line() + 1, 0)), text::string);
      }
    }
  }

  @Test
  void linesTileTheText() {
    RandomTexts texts = new RandomTexts(3);
    for (int i = 0; i < TEXTS; i++) {
      Text text = new Text(texts.next());
      for (int line = 0; line < text.lines(); line++) {
        int next = line + 1 < text.lines() ? text.lineStart(line + 1) : text.length();
        String end = text.string().substring(text.lineEnd(line), next);
        String content = text.string().substring(text.lineStart(line), text.lineEnd(line));
        boolean last = line + 1 == text.lines();
        assertTrue(last ? end.isEmpty() : end.matches("\r\n|\n|\r"), text::string);
        assertFalse(content.contains("\n") || content.contains("\r"), text::string);
      }
    }
  }

  @Test
  void loneHalvesOfPairsAreLeftAlone() {
    Text text = new Text("\uDE00\uD83D");
    assertEquals(1, text.outsidePair(1));
    assertEquals(2, text.outsidePair(2));
    assertEquals(1, new Text("\uD83D\uD83D\uDE00").outsidePair(1));
    assertEquals(1, new Text("\uD83D\uD83D\uDE00").outsidePair(2));
  }

  @Test
  void manyLinesAreFound() {
    Text text = new Text("x\n".repeat(10_000));
    assertEquals(10_001, text.lines());
    assertEquals(new Place(7_000, 1), text.place(14_001));
  }

  @Test
  void textsAreEqualByTheirCharacters() {
    Text text = new Text("one\n");
    assertEquals(text, new Text("one\n"));
    assertEquals(text.hashCode(), new Text("one\n").hashCode());
    assertNotEquals(text, new Text("one\r\n"));
    assertNotEquals(text, (Object) "one\n");
    assertEquals("one\n", text.toString());
  }
}
