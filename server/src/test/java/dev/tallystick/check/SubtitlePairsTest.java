package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.check.CueTable.Timing;
import org.junit.jupiter.api.Test;

/** Subtitles of a film for lighthouse keepers: what their times tell, and what they do not. */
class SubtitlePairsTest {
  /** Timed alike, for another cut, and for other pictures a second. */
  private static final Timing[] TIMINGS = {
    Timing.PLAIN, new Timing(1, 40), new Timing(1, -3.7), new Timing(25 * 1001.0 / 24_000, 0)
  };

  private static void check(String table) {
    CueTable cues = new CueTable(table);
    for (Timing timing : TIMINGS) {
      assertEquals(cues.expected(), cues.print(timing), timing::toString);
    }
  }

  @Test
  void anOmissionBetweenSentencesOfOneLength() {
    check(
        """
        1.0-3.4 The harbour is closed. | 1.0-3.4 Der Hafen ist gesperrt.
        4.2-6.3 One stroke is fire. | 4.2-6.3 Ein Schlag heißt Feuer.
        6.5-9.0 Two strokes are fog. | -  !omission
        10.1-12.2 Three are a wreck. | 10.1-12.2 Drei sind ein Wrack.
        12.4-14.9 Four are the mail. | 12.4-14.9 Vier sind die Post.
        17.0-19.1 Five are the doctor. | 17.0-19.1 Fünf sind der Arzt.
        19.3-22.0 Six are for Anselm. | 19.3-22.0 Sechs sind für Anselm.
        23.5-25.0 Nobody rings seven. | 23.5-25.0 Sieben läutet niemand.
        25.4-28.0 Now to the lamp. | 25.4-28.0 Nun zur Lampe.
        28.2-31.0 Wind it up at dusk. | 28.2-31.0 Abends aufziehen.
        """);
  }

  @Test
  void aSentenceOverThreeCues() {
    check(
        """
        1.0-3.4 The harbour is closed. | 1.0-3.4 Der Hafen ist gesperrt.
        4.2-6.3 Nobody leaves tonight, / not even Orla. | 4.2-6.3 Heute fährt niemand mehr, / nicht einmal Orla.
        8.0-10.1 If the horn is silent | -  !omission
        10.2-12.9 and the bell as well, | -  !omission
        13.0-15.8 wake the second keeper. | -  !omission
        16.9-19.0 He sleeps below the stairs. | 16.9-19.0 Er schläft unter der Treppe.
        19.2-21.7 Knock three times. | 19.2-21.7 Klopfen Sie dreimal.
        24.5-27.0 The cat sleeps there too. | 24.5-27.0 Die Katze schläft auch dort.
        27.8-30.0 Mind her tail. | 27.8-30.0 Vorsicht mit ihrem Schwanz.
        30.9-33.3 Then climb up to the lamp. | 30.9-33.3 Dann hinauf zur Lampe.
        """);
  }

  @Test
  void aCueWithoutItsText() {
    check(
        """
        1.0-3.4 The harbour is closed. | 1.0-3.4 Der Hafen ist gesperrt.
        4.2-6.3 Take the left rope. | 4.2-6.3 Nehmen Sie das linke Seil.
        7.1-9.5 The right one is rotten. | 7.1-9.5  !omission
        9.9-12.2 The boat is called Tern. | 9.9-12.2 Das Boot heißt Tern.
        13.4-14.9 She leaks a little. | 13.4-14.9 Es leckt ein wenig.
        17.0-19.1 Bail before you row. | 17.0-19.1 Erst schöpfen, dann rudern.
        19.3-22.0 The bucket is red. | 19.3-22.0 Der Eimer ist rot.
        23.5-25.0 Bring it back. | 23.5-25.0 Bringen Sie ihn zurück.
        """);
  }

  @Test
  void twoSpeakersInOneCue() {
    check(
        """
        1.0-3.4 - Who has the key? / - Mira has it. | 1.0-3.4 - Wer hat den Schlüssel? / - Den hat Mira.
        4.2-6.3 - And the lamp oil? / - In the shed. | 4.2-6.3 - Und das Lampenöl? / - Im Schuppen.
        7.0-9.5 - Is it locked? / - Since Monday. | -  !omission
        9.9-12.2 - Then we wait. / - Until when? | 9.9-12.2 - Dann warten wir. / - Bis wann?
        13.4-14.9 - Until she is back. / - In the dark? | 13.4-14.9 - Bis sie kommt. / - Im Dunkeln?
        17.0-19.1 - Light a candle. / - Good. | 17.0-19.1 - Zünd eine Kerze an. / - Gut.
        19.3-22.0 Here she comes. | 19.3-22.0 Da kommt sie.
        23.5-25.0 Nothing happened. | 23.5-25.0 Es ist nichts passiert.
        """);
  }

  @Test
  void cuesThatAreCutElsewhereStillMatch() {
    check(
        """
        1.0-3.4 The harbour is closed. | 1.0-3.4 Der Hafen ist gesperrt.
        4.2-8.0 Light the lamp when the sun / touches the water. | 4.2-6.3 Zünden Sie die Lampe an,
        - | 6.4-8.0 wenn die Sonne das Wasser berührt.
        9.1-11.0 Not before. | 9.1-13.5 Nicht früher. / Und nicht später.
        11.2-13.5 And not later. | -
        15.0-17.0 Ships rely on it, | 15.0-19.4 Die Schiffe verlassen sich darauf, / auch wenn keines zu sehen ist.
        17.1-19.4 even if you see none. | -
        20.2-22.9 The log is on the desk. | 20.2-22.9 Das Logbuch liegt auf dem Tisch.
        23.5-26.0 Write down the hour. | 23.5-26.0 Schreiben Sie die Stunde auf.
        27.0-29.4 Good night. | 27.0-29.4 Gute Nacht.
        """);
  }

  @Test
  void aShortSentenceTooManyIsAnAddition() {
    check(
        """
        1.0-3.4 The harbour is closed. | 1.0-3.4 Der Hafen ist gesperrt.
        4.2-6.3 Take the left rope. | 4.2-6.3 Nehmen Sie das linke Seil.
        - | 7.1-9.5 Das rechte ist morsch. !addition
        9.9-12.2 The boat is called Tern. | 9.9-12.2 Das Boot heißt Tern.
        13.4-14.9 She leaks a little. | 13.4-14.9 Es leckt ein wenig.
        17.0-19.1 Bail before you row. | 17.0-19.1 Erst schöpfen, dann rudern.
        19.3-22.0 The bucket is red. | 19.3-22.0 Der Eimer ist rot.
        23.5-25.0 Bring it back. | 23.5-25.0 Bringen Sie ihn zurück.
        """);
  }
}
