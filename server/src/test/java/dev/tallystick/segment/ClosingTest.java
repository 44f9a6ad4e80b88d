package dev.tallystick.segment;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ClosingTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "It is open.        | STOP",
        "水車は回る。         | STOP",
        "全角．              | STOP",
        "半角｡              | STOP",
        "चक्की चलती है।       | STOP",
        "چکی چلتی ہے۔        | STOP",
        "እሺ።                | STOP",
        "Եկեք։               | STOP",
        "And so on …        | STOP",
        "Is it open?        | QUESTION",
        "開いていますか？       | QUESTION",
        "هل هي مفتوحة؟        | QUESTION",
        "Πού είναι ο μύλος; | QUESTION",
        "Ո՞ւր է։              | STOP",
        "Shut it!           | EXCLAMATION",
        "閉めて！             | EXCLAMATION",
        "What?!             | EXCLAMATION",
        "Bring this:        | COLON",
        "持ち物：             | COLON",
        "A title            | OPEN",
        "one, two,          | OPEN",
        "42                 | OPEN",
        "``                 | OPEN",
        "***                | OPEN"
      })
  void marksOfAllScriptsAreKnown(String sentence, Closing closing) {
    assertEquals(closing, Closing.of(sentence));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "He said \"Wait.\"   | STOP",
        "Er sagte: „Halt!“  | EXCLAMATION",
        "Il dit « Où ? »    | QUESTION",
        "(It is open.)      | STOP",
        "「開いていますか？」   | QUESTION",
        "It is **open.**    | STOP",
        "She said 'No.'     | STOP",
        "[See above:]       | COLON",
        "Really?)\"'        | QUESTION"
      })
  void theMarkCountsBehindQuotesAndBrackets(String sentence, Closing closing) {
    assertEquals(closing, Closing.of(sentence));
  }
}
