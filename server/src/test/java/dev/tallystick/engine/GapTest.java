package dev.tallystick.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** The word that a gap is shown on. A bar marks the gap. */
class GapTest {
  private static String word(String marked) {
    int place = marked.indexOf('|');
    String text = marked.replace("|", "");
    return Gap.word(text, place).map(span -> span.of(text)).orElse("-");
  }

  @Test
  void itIsTheLastOneBefore() {
    assertEquals("hält", word("Die Linse hält.| Und so."));
    assertEquals("12", word("Ein Bund zu **12**).\n\n|Karren"));
    assertEquals("e\u0301t\u00e9", word("un e\u0301t\u00e9 !|"));
    assertEquals("Mar", word("Mar|ken"));
  }

  @Test
  void withoutOneItIsTheFirstBehind() {
    assertEquals("Lampe", word("|# Lampe und"));
    assertEquals("𝔘hu", word("\uFEFF|“𝔘hu”"));
  }

  @Test
  void withoutAnyItIsNone() {
    assertEquals("-", word("|"));
    assertEquals("-", word("***|\n🛶\n"));
  }

  @Test
  void whereNoBlanksAreWrittenItIsShort() {
    assertEquals("きます", word("霧の中で動きます。|鐘"));
    assertEquals("灯台", word("|灯台へ"));
    assertTrue(word("ก".repeat(300) + "|").length() <= 20);
  }
}
