package dev.tallystick.segment;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class SegmenterTest {
  /** Language and a text in which a bar stands where a sentence ends. */
  static List<Arguments> texts() {
    return List.of(
        of("en", "The gate is shut. | Who has the key? | Nobody! | So be it."),
        of("en", "Water stood 3.5 m high at 14.30 h. | Then it fell."),
        of("en", "He said \"Wait there.\" | Then he left."),
        of("en", "Look at tide.example.org before you go. | Bring boots."),
        of("en", "Is it open?! | Yes, it is."),
        of("en", "The mill (see the map.) is old. | It still turns."),
        of("en", "Mr. Smith and Prof. Alder met Mrs. Finch. | They talked."),
        of("en", "Bring tools, E.g. Hammers, and rope. | That is all."),
        of("en", "It was on. | Then it stopped."),
        of("en", "All ten came in. | We shut the door."),
        of("de", "Es war. | Nun ist es nicht mehr."),
        of("de", "Das ist gut, z.B. Wasser und Brot. | Mehr braucht es nicht."),
        of("de", "Fragen Sie Dr. Ahlers oder Frau Weiss. | Beide helfen gern."),
        of("de", "Die Fahrt wird ggf. Unterbrochen und dauert dann. | Danach ruht die Bahn."),
        of("fr", "M. Martin garde la cl\u00E9. | Il habite ici."),
        of("fr", "Le moulin tourne-t-il ? | Oui, le matin !"),
        of(
            "es",
            "\u00BFD\u00F3nde est\u00E1 el molino? | Junto al r\u00EDo. | \u00A1Venga pronto!"),
        of("ru", "Где стоит мельница? | У самой реки. | Приходите утром!"),
        of("he", "היכן הטחנה? | ליד הנהר. | בואו מוקדם!"),
        of("he", "הוא אמר: \"חכו כאן.\" | אחר כך הלך למרחק 3 ק\"מ."),
        of("ar", "أين الطاحونة؟ | قرب النهر؛ عند الجسر. | قال: «انتظر هنا.» | ثم ذهب."),
        of("fa", "آسیاب کجاست؟ | کنار رود. | گفت: «همین‌جا بمان!» | بعد رفت."),
        of("ur", "چکی کہاں ہے؟ | دریا کے پاس۔ | اس نے کہا، “یہیں ٹھہرو۔” | پھر وہ چلا گیا۔"),
        of("el", "Πού είναι ο μύλος; | Δίπλα στο ποτάμι."),
        of("ja", "水車は川にあります。| 朝に回ります。| 見に来てください！"),
        of("zh", "水磨在河边。| 它早上转动！| 谁来看？"),
        of("hi", "चक्की नदी पर है। | वह सुबह चलती है।"),
        of("zh-Hant", "水磨在河邊。| 它早上轉動！| 誰來看？"),
        of("zh-TW", "水磨在河邊。| 它早上轉動！| 誰來看？"),
        of("pt-BR", "O Sr. Alves e a Dra. Lima têm a chave. | Moram aqui."),
        of("de-CH", "Fragen Sie Dr. Ahlers am 3. Mai. | Er hilft gern."),
        of("en-GB", "Mr. Smith met Prof. Alder. | They talked."),
        of("nn-NO", "Ta med verktøy, f.eks. ein hammar. | Det er alt."),
        of("sr-Latn", "Mlin stoji na reci. | Ko čuva ključ?"),
        of("sr-Cyrl-RS", "Млин стоји на реци. | Ко чува кључ?"),
        of("my", "တံခါး၊ ပြတင်းပေါက်၊ မီးတို့ကို ပိတ်ပါ။ | သော့ကို ယူပါ။"),
        of("und", "One here. | Another there."));
  }

  private static Arguments of(String language, String marked) {
    return Arguments.of(language, marked);
  }

  @ParameterizedTest(name = "{0}: {1}")
  @MethodSource("texts")
  void sentencesEndWhereTheLanguageEndsThem(String language, String marked) {
    List<String> expected = List.of(marked.split(" ?\\| "));
    String parted = marked.contains(" |") ? marked.replace(" | ", " ") : marked.replace("| ", "");
    assertEquals(marked(expected), marked(Sentences.of(language, parted)));
  }

  private static String marked(List<String> sentences) {
    List<String> stripped = new ArrayList<>();
    for (String part : String.join("|", sentences).split("\\|")) {
      stripped.add(part.strip());
    }
    return String.join(" | ", stripped);
  }

  /** UAX #29 alone parts here: a bracket, a number of a list, an ellipsis make no sentence. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "1. Open the sluice and wait.",
        "He waited ... ... and went.",
        "(Nobody knows why.)",
        "Why? ?",
        "A. Voss wrote it down."
      })
  void fragmentsJoinTheSentenceBesideThem(String text) {
    assertEquals(List.of(text), Sentences.of("en", "Text:\n\n" + text).subList(1, 2));
    assertEquals(2, Sentences.of("en", "Text:\n\n" + text).size());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", " ", "* * *", "...", "\u2014", "\n\n?\n\n!\n", "\uFEFF", "\u3000"})
  void aBlockWithoutALetterGivesNoSentence(String text) {
    assertEquals(List.of(), Sentences.of("en", text));
  }

  @Test
  void aNumberAloneIsASentence() {
    assertEquals(List.of("42"), Sentences.of("en", "42"));
  }

  @Test
  void twoLettersAreASentenceWhereALetterIsAWord() {
    assertEquals(List.of("開く。", "閉じる。"), Sentences.of("ja", "開く。閉じる。"));
    assertEquals(List.of("Go! Now it is time."), Sentences.of("en", "Go! Now it is time."));
  }

  @Test
  void noSentenceCrossesABlock() {
    assertEquals(
        List.of("A title without a stop", "Then text", "and more"),
        Sentences.of("en", "A title without a stop\n\nThen text\n\nand more"));
  }

  @Test
  void aSentenceOverSeveralLinesIsOneLine() {
    List<Segment> segments =
        Sentences.segments("en", Format.MARKDOWN, "The sluice\r\nis open. It\nstays so.");
    assertEquals("The sluice  is open.", segments.get(0).prose());
    assertEquals("It stays so.", segments.get(1).prose());
  }

  @Test
  void onlyTheFirstSentenceOpensItsBlock() {
    List<Boolean> opens =
        Sentences.segments("en", Format.PLAIN, "One here. Two here.\n\nThree here. Four here.")
            .stream()
            .map(Segment::opens)
            .toList();
    assertEquals(List.of(true, false, true, false), opens);
  }

  @Test
  void cancellingStopsTheWork() {
    Text text = new Text("One here.\n\nTwo here.");
    Segmenter segmenter = Segmenter.of("en");
    assertThrows(
        Cancellation.Cancelled.class,
        () -> segmenter.segments(text, Format.PLAIN.blocks(text), () -> true));
  }
}
