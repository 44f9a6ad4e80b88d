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

  /** Where they are parted is what ICU's dictionaries say. */
  @Test
  void scriptsWithoutBlanksArePartedByDictionary() {
    assertEquals(
        List.of("水車", "は", "1874", "年", "に", "川", "から", "3km", "で"),
        Words.of("水車は1874年に、川から3kmで。"));
    assertEquals(List.of("กังหัน", "น้ำ"), Words.of("กังหันน้ำ"));
    assertEquals(List.of("管理人", "odile", "さん"), Words.of("管理人Odileさん"));
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
