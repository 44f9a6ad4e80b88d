package dev.tallystick.pairing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Locale;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class LanguageTest {

  @ParameterizedTest
  @CsvSource({
    "de, de, German",
    "DE, de, German",
    "IT, it, Italian",
    "pt_BR, pt-BR, Portuguese (Brazil)",
    "pt-br, pt-BR, Portuguese (Brazil)",
    "zh-hant, zh-Hant, Chinese (Traditional)",
    "ZH_HANT_TW, zh-Hant-TW, 'Chinese (Traditional, Taiwan)'",
    "sr-Latn, sr-Latn, Serbian (Latin)",
    "es-419, es-419, Spanish (Latin America)",
    "en_in, en-IN, English (India)",
    "hi_latn_in, hi-Latn-IN, 'Hindi (Latin, India)'",
    "nb, nb, Norwegian Bokmål",
    "no, no, Norwegian",
    "fil, fil, Filipino",
    "deu, de, German",
    "ger, de, German",
    "iw, he, Hebrew",
    "en-UK, en-GB, English (United Kingdom)"
  })
  void normalisesAndNames(String written, String tag, String name) {
    Language language = Language.of(written).orElseThrow();
    assertEquals(tag, language.tag());
    assertEquals(name, language.name());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "x",
        "do",
        "xq",
        "doc",
        "und",
        "mul",
        "zxx",
        "root",
        "german",
        "de-",
        "-de",
        "de--AT",
        "de AT",
        "de-QX",
        "de-ZZ",
        "de-Abcd",
        "de-Zzzz",
        "de-x-home",
        "de-u-co-phonebk",
        "zh-yue",
        "de-nosuchvar",
        "de-AT-DE",
        "dé",
        "ıt",
        "../de"
      })
  void knowsOnlyWhatCldrKnows(String written) {
    assertEquals(Optional.empty(), Language.of(written));
  }

  @Test
  void canonicalTagsReadAsThemselves() {
    for (String tag : new String[] {"de", "pt-BR", "zh-Hant-TW", "he", "sr-Latn"}) {
      assertEquals(Optional.of(new Language(tag)), Language.of(tag));
    }
  }

  @Test
  void unknownLanguageHasANameForPeople() {
    assertEquals("Unknown language", Language.UNKNOWN.name());
  }

  @Test
  void coversItsNarrowerTagsOnly() {
    Language german = new Language("de");
    assertTrue(german.covers(german));
    assertTrue(german.covers(new Language("de-AT")));
    assertFalse(new Language("de-AT").covers(german));
    assertFalse(german.covers(new Language("del")));
    assertEquals("zh", new Language("zh-Hant-TW").primary());
  }

  @Test
  void aScriptThatIsNotWrittenIsTheLikeliest() {
    assertTrue(new Language("zh-Hant").covers(new Language("zh-TW")));
    assertTrue(new Language("zh-Hant").covers(new Language("zh-HK")));
    assertTrue(new Language("zh-Hans").covers(new Language("zh")));
    assertTrue(new Language("zh").covers(new Language("zh-TW")));
    assertTrue(new Language("zh-TW").covers(new Language("zh-Hant-TW")));
    assertTrue(new Language("sr").covers(new Language("sr-Latn")));
    assertFalse(new Language("zh-Hant").covers(new Language("zh")));
    assertFalse(new Language("zh-Hans").covers(new Language("zh-TW")));
    assertFalse(new Language("zh-TW").covers(new Language("zh-Hant")));
    assertFalse(new Language("sr-Latn").covers(new Language("sr-RS")));
    assertFalse(new Language("pt-BR").covers(new Language("pt-PT")));
  }

  @Test
  void wordsOfWhyAreLowerCase() {
    assertEquals("name", Why.NAME.word());
    assertEquals("folder", Why.FOLDER.word());
    assertEquals("project", Why.PROJECT.word());
    assertEquals("argument", Why.ARGUMENT.word());
  }

  /** ISO 639-1 as the JDK lists it; looked up in no table of names when a program starts. */
  @Test
  void everyTwoLetterLanguageHasAName() {
    for (String code : Locale.getISOLanguages()) {
      Language language = Language.of(code).orElseThrow();
      assertNotEquals(language.tag(), language.name());
    }
  }
}
