package dev.tallystick.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SpanTest {
  @ParameterizedTest
  @CsvSource({"-1, 2", "3, 2", "-2, -1"})
  void aSpanOutOfOrderIsRefused(int start, int end) {
    assertThrows(IllegalArgumentException.class, () -> new Span(start, end));
  }

  @Test
  void theEndIsOutsideButTouched() {
    Span span = new Span(2, 4);
    assertFalse(span.contains(1));
    assertTrue(span.contains(2));
    assertTrue(span.contains(3));
    assertFalse(span.contains(4));
    assertFalse(span.touches(1));
    assertTrue(span.touches(2));
    assertTrue(span.touches(4));
    assertFalse(span.touches(5));
  }

  @Test
  void anEmptySpanHasAPlaceButNothingInside() {
    Span caret = new Span(3, 3);
    assertTrue(caret.isEmpty());
    assertEquals(0, caret.length());
    assertFalse(caret.contains(3));
    assertTrue(caret.touches(3));
    assertEquals("", caret.of("abcdef"));
  }

  @ParameterizedTest
  @CsvSource({
    "0, 2, 2, 4, false",
    "0, 3, 2, 4, true",
    "2, 4, 0, 9, true",
    "5, 6, 2, 4, false",
    "2, 3, 2, 3, true"
  })
  void spansThatOnlyTouchDoNotOverlap(int s1, int e1, int s2, int e2, boolean overlap) {
    assertEquals(overlap, new Span(s1, e1).overlaps(new Span(s2, e2)));
    assertEquals(overlap, new Span(s2, e2).overlaps(new Span(s1, e1)));
  }

  @Test
  void theCoverHoldsBothAndWhatLiesBetween() {
    assertEquals(new Span(1, 9), new Span(1, 3).cover(new Span(7, 9)));
    assertEquals(new Span(1, 9), new Span(7, 9).cover(new Span(1, 3)));
    assertEquals(new Span(1, 9), new Span(1, 9).cover(new Span(3, 3)));
  }

  @Test
  void spansAreSortedByStartThenEnd() {
    List<Span> sorted =
        List.of(new Span(4, 5), new Span(1, 9), new Span(1, 3), new Span(0, 0)).stream()
            .sorted()
            .toList();
    assertEquals(List.of(new Span(0, 0), new Span(1, 3), new Span(1, 9), new Span(4, 5)), sorted);
  }

  @Test
  void aSpanCutsItsTextOut() {
    assertEquals("cd", new Span(2, 4).of("abcdef"));
    assertEquals(2, new Span(2, 4).length());
  }
}
