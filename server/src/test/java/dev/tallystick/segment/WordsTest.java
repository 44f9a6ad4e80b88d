package dev.tallystick.segment;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WordsTest {
  @Test
  void wordsAreRunsOfLettersAndDigitsInLowerCase() {
    assertEquals(
        List.of("the", "mill", "of", "1874", "stands", "the", "v4", "valve"),
        Words.of("The mill of 1874 stands; the V4-valve!"));
  }

  @Test
  void anEmptySentenceHasNone() {
    assertEquals(List.of(), Words.of(""));
    assertEquals(List.of(), Words.of(" \u2014 ?! "));
  }

  @ParameterizedTest
  @CsvSource({
    "'\u0661\u0668\u0667\u0664', 1874",
    "'\u096A\u0968', 42",
    "'\uFF11\uFF12', 12",
    "'\u06F1\u06F2\u06F3', 123"
  })
  void digitsOfOtherScriptsAreShownAsAscii(String digits, String ascii) {
    assertEquals(List.of(ascii), Words.of(digits));
  }

  /** Single letters of these say little, and without a dictionary there are no words. */
  @Test
  void scriptsWithoutBlanksArePassedOver() {
    assertEquals(List.of("1874", "3km"), Words.of("水車は1874年に、川から3kmで。"));
    assertEquals(List.of(), Words.of("กังหันน้ำ"));
    assertEquals(List.of("odile"), Words.of("管理人Odileさん"));
  }

  @Test
  void otherScriptsGiveWords() {
    assertEquals(List.of("мельница", "стоит"), Words.of("Мельница стоит."));
    assertEquals(List.of("הטחנה", "ליד"), Words.of("הטחנה ליד"));
    assertEquals(List.of("물레방아가", "돈다"), Words.of("물레방아가 돈다"));
  }

  @Test
  void combiningMarksBelongToTheirWord() {
    assertEquals(List.of("cafe\u0301", "bar"), Words.of("Cafe\u0301 bar"));
  }

  /** The suite runs with the Turkish locale, in which I would become a dotless one. */
  @Test
  void lowerCaseDoesNotDependOnTheMachine() {
    assertEquals("tr", Locale.getDefault().getLanguage());
    assertEquals(List.of("title", "in", "istanbul"), Words.of("TITLE IN ISTANBUL"));
  }

  @Test
  void lettersBeyondTheBasicPlaneAreWhole() {
    assertEquals(
        List.of("\uD835\uDC1A\uD835\uDC1B"), Words.of("\uD835\uDC1A\uD835\uDC1B \uD83D\uDE00"));
  }
}
