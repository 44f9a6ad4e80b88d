package dev.tallystick.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class EditTest {
  private static final int EDITS = 5_000;

  /** In "abcdef", "cd" becomes "XYZ". */
  @ParameterizedTest
  @CsvSource({"0, 0", "1, 1", "2, 5", "3, 5", "4, 5", "5, 6", "6, 7"})
  void whatWasInsideEndsUpBehindTheReplacement(int before, int after) {
    assertEquals(after, new Edit(new Span(2, 4), "XYZ").map(before));
  }

  @Test
  void anInsertionPushesWhatTouchesIt() {
    Edit typed = new Edit(new Span(2, 2), "XY");
    assertEquals(1, typed.map(1));
    assertEquals(4, typed.map(2));
    assertEquals(5, typed.map(3));
  }

  @Test
  void anEditLeavesTheTextBeforeAsItWas() {
    Text before = new Text("one two");
    Text after = before.with(new Edit(new Span(0, 3), "1\n"));
    assertEquals("one two", before.string());
    assertEquals("1\n two", after.string());
    assertEquals(2, after.lines());
  }

  @Test
  void whatIsNotReplacedKeepsItsCharacters() {
    RandomTexts texts = new RandomTexts(5);
    for (int i = 0; i < EDITS; i++) {
      Text before = new Text(texts.next());
      Edit edit = randomEdit(texts, before);
      Text after = before.with(edit);
      int shift = edit.replacement().length() - edit.span().length();
      assertEquals(before.length() + shift, after.length());
      assertEquals(edit.replacement(), inserted(edit).of(after.string()));
      for (int offset = 0; offset < before.length(); offset++) {
        if (!edit.span().contains(offset)) {
          char kept = after.string().charAt(edit.map(offset));
          assertEquals(before.string().charAt(offset), kept);
        }
      }
    }
  }

  @Test
  void mappingKeepsOrderAndStaysInTheText() {
    RandomTexts texts = new RandomTexts(6);
    for (int i = 0; i < EDITS; i++) {
      Text before = new Text(texts.next());
      Edit edit = randomEdit(texts, before);
      int last = 0;
      for (int offset = 0; offset <= before.length(); offset++) {
        int mapped = edit.map(offset);
        assertTrue(mapped >= last, () -> edit.toString());
        last = mapped;
      }
      assertEquals(before.with(edit).length(), last);
    }
  }

  private static Span inserted(Edit edit) {
    int start = edit.span().start();
    return new Span(start, start + edit.replacement().length());
  }

  private static Edit randomEdit(RandomTexts texts, Text before) {
    int start = texts.below(before.length() + 1);
    int end = start + texts.below(before.length() - start + 1);
    return new Edit(new Span(start, end), texts.next(texts.below(4)));
  }
}
