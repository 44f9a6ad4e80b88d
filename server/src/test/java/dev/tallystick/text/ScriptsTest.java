package dev.tallystick.text;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Which scripts write no blanks. */
class ScriptsTest {
  @ParameterizedTest
  @CsvSource({
    "e, false, false",
    "ж, false, false",
    "한, false, false",
    "灯, true, true",
    "ふ, true, true",
    "フ, true, true",
    "ㄅ, true, true",
    "ก, true, false",
    "ກ, true, false",
    "ក, true, false",
    "က, true, false",
    "𠀋, true, true"
  })
  void aScriptWritesNoBlanksOrDoes(String letter, boolean unspaced, boolean breaks) {
    assertEquals(unspaced, Scripts.isUnspaced(letter.codePointAt(0)));
    assertEquals(breaks, Scripts.breaksAnywhere(letter.codePointAt(0)));
  }
}
