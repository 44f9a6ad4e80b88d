package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WordCountTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "The mill stands on the dam.   | 6",
        "well-known words, and/or not  | 4",
        "it's 3.5 m                    | 3",
        "\u2014 ... !                  | 0",
        "one\u00A0two\u2003three       | 3",
        "мельница у реки               | 3",
        "הטחנה ליד הנהר                | 3",
        "물레방아가 돈다                | 2",
        "水車は川。                     | 4",
        "水車は1874年 km               | 6",
        "Text水車text                  | 4",
        "กังหันน้ำ                     | 6"
      })
  void wordsAreCountedAsTranslatorsDo(String prose, int words) {
    assertEquals(words, WordCount.of(prose));
  }

  @ParameterizedTest
  @CsvSource({"水車は川。, 4", "Text, 0", "漢字かなカナ, 6", "'', 0"})
  void lettersOfScriptsWithoutBlanksAreCounted(String prose, int letters) {
    assertEquals(letters, WordCount.unspaced(prose));
  }
}
