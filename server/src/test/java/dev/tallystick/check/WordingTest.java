package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class WordingTest {
  private static final String BEFORE = "Ziehen Sie die Schraube an.";
  private static final String BEHIND = "Schmieren Sie das Lager.";
  private final Wording german = new Wording("de");

  @Test
  void anOmissionNamesTheLanguageAndTheNeighbours() {
    assertEquals(
        "Not translated into German: nothing stands for this sentence between"
            + " \"\u2068Ziehen Sie die Schraube an.\u2069\" and \"\u2068Schmieren Sie das Lager.\u2069\".",
        german.omission(1, BEFORE, BEHIND));
  }

  @Test
  void aRunOfSentencesIsCounted() {
    String message = german.omission(3, BEFORE, BEHIND);
    assertTrue(message.contains("nothing stands for these 3 sentences between"), message);
  }

  @Test
  void atAnEndThereIsOneNeighbourOrNone() {
    assertTrue(german.omission(1, BEFORE, "").endsWith(" after \"\u2068" + BEFORE + "\u2069\"."));
    assertTrue(german.omission(1, "", BEHIND).endsWith(" before \"\u2068" + BEHIND + "\u2069\"."));
    assertTrue(german.omission(1, "", "").endsWith("nothing stands for this sentence."));
  }

  @Test
  void anUnknownLanguageIsLeftUnsaid() {
    assertTrue(new Wording("und").omission(1, "", "").startsWith("Not translated: nothing"));
  }

  @Test
  void languagesAreNamedInEnglishWithTheirRegion() {
    String message = new Wording("pt-BR").omission(1, "", "");
    assertTrue(message.startsWith("Not translated into Portuguese (Brazil):"), message);
    assertTrue(new Wording("tr").omission(1, "", "").contains(" into Turkish:"));
  }

  @Test
  void theGapShowsWhatIsMissing() {
    assertEquals(
        "Missing here: \"\u2068Water above the red line.\u2069\"",
        german.missingHere("Water above the red line.", 1));
    assertEquals(
        "Missing here: \"\u2068Water above the red line.\u2069\" and 2 more",
        german.missingHere("Water above the red line.", 3));
  }

  @Test
  void sentencesLeftAsTheyAreAreCounted() {
    assertEquals("Still the same as the source.", german.untranslated(1));
    assertEquals("These 4 sentences are still the same as the source.", german.untranslated(4));
  }

  @Test
  void additionsAreCounted() {
    assertEquals("Nothing in the source stands for this sentence.", german.addition(1));
    assertEquals("Nothing in the source stands for these 2 sentences.", german.addition(2));
  }

  @Test
  void aLengthSaysWhichWayAndHowFar() {
    assertEquals(
        "Much shorter than its source would suggest: 31 characters for 180"
            + " (usual for this pair: 165 to 240).",
        german.length(180, 31, 165, 240));
    assertTrue(german.length(50, 400, 45, 70).startsWith("Much longer than its source"));
  }

  @Test
  void movedSentencesAreCounted() {
    assertEquals("This sentence stands at another place in the source.", german.order(1));
    assertEquals("These 2 sentences stand at another place in the source.", german.order(2));
  }

  @Test
  void longQuotesAreCutBetweenWords() {
    assertEquals("\"\u2068The gate and ...\u2069\"", Wording.quote(" The gate and the wheel ", 15));
    assertEquals("\"\u2068The gate and the\u2069\"", Wording.quote("The gate and the", 16));
  }

  @Test
  void aTextWithoutBlanksIsCutBetweenCharacters() {
    assertEquals("\"\u2068水車は川 ...\u2069\"", Wording.quote("水車は川にあります。", 4));
    String faces = "\uD83D\uDE00".repeat(8);
    assertEquals("\"\u2068" + "\uD83D\uDE00".repeat(5) + " ...\u2069\"", Wording.quote(faces, 5));
  }

  /** A lone blank near the start is no good place: too little would be shown. */
  @Test
  void aQuoteIsNotCutTooEarly() {
    assertEquals(
        "\"\u2068A Donaudampfsch ...\u2069\"", Wording.quote("A Donaudampfschifffahrt", 15));
  }
}
