package dev.tallystick.segment;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.ibm.icu.lang.UCharacter;
import com.ibm.icu.lang.UProperty;
import com.ibm.icu.text.BreakIterator;
import com.ibm.icu.util.ULocale;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What is left out has no say: ICU finds the same borders in the whole prose. */
class NearStopsTest {
  private static final int LINE_END = UCharacter.SentenceBreak.SEP;

  /** Up to three characters of each class of UAX #29 and each general category, by ICU. */
  private static final List<String> CHARACTERS = characters();

  private static List<String> characters() {
    int[][] seen = new int[UCharacter.getIntPropertyMaxValue(UProperty.SENTENCE_BREAK) + 1][256];
    List<String> found = new ArrayList<>();
    for (int c = ' '; c < 0x1F000; c++) {
      int type = UCharacter.getIntPropertyValue(c, UProperty.SENTENCE_BREAK);
      boolean surrogate = c >= 0xD800 && c < 0xE000;
      boolean end = type == LINE_END || c == '\n' || c == '\r';
      if (!surrogate && !end && seen[type][UCharacter.getType(c)]++ < 3) {
        found.add(Character.toString(c));
      }
    }
    return found;
  }

  @ParameterizedTest
  @ValueSource(strings = {"und", "el", "en", "ja", "th"})
  void bordersAreThoseOfTheWholeProse(String language) {
    BreakIterator iterator = BreakIterator.getSentenceInstance(ULocale.forLanguageTag(language));
    Random random = new Random(29);
    int borders = 0;
    for (int i = 0; i < 20_000; i++) {
      String prose = prose(random);
      List<Integer> whole = whole(iterator, prose);
      assertEquals(whole, near(iterator, prose), () -> "in " + escaped(prose));
      borders += whole.size();
    }
    assertTrue(borders > 10_000, "only " + borders);
  }

  /** Half of it is of what stops and marks are made of, lest borders be rare. */
  private static String prose(Random random) {
    String often = ".!?;。…\u00AD\u0301 ()\"“”aB7";
    StringBuilder prose = new StringBuilder();
    for (int length = 1 + random.nextInt(30); length > 0; length--) {
      if (random.nextBoolean()) {
        prose.append(often.charAt(random.nextInt(often.length())));
      } else {
        prose.append(CHARACTERS.get(random.nextInt(CHARACTERS.size())));
      }
    }
    return prose.toString();
  }

  private static List<Integer> whole(BreakIterator iterator, String prose) {
    List<Integer> borders = new ArrayList<>();
    iterator.setText(prose);
    for (int at = iterator.next(); at < prose.length() && at > 0; at = iterator.next()) {
      borders.add(at);
    }
    return borders;
  }

  /** The borders that the iterator finds in what is left of a text. */
  static List<Integer> near(BreakIterator iterator, String prose) {
    NearStops near = new NearStops(prose);
    List<Integer> borders = new ArrayList<>();
    iterator.setText(near.string());
    for (int at = iterator.next(); at < near.length() && at > 0; at = iterator.next()) {
      borders.add(near.inProse(at));
    }
    return borders;
  }

  @Test
  void theRestIsLeftOut() {
    String prose = "One brass lamp burns all night. Two more stand by it";
    assertEquals("t. T", new NearStops(prose).string());
    assertEquals("", new NearStops("No stop, no border").string());
  }

  private static String escaped(String prose) {
    StringBuilder escaped = new StringBuilder();
    prose.codePoints().forEach(c -> escaped.append(String.format("%04X ", c)));
    return escaped.toString();
  }
}
