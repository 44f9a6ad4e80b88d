package dev.tallystick.check;

import org.junit.jupiter.api.Test;

class EnglishGermanPairsTest {
  private static final String BEFORE =
      """
      ¶# The tide mill at Sallow Creek
      | # Die Gezeitenmühle am Sallow Creek
      ¶ The mill has stood on the dam since 1787, and it has ground barley for four villages.
      | Die Mühle steht seit 1787 auf dem Damm und hat für vier Dörfer Gerste gemahlen.
      Odile Brandt has run it for 31 years, together with her brother Emmerik.
      | Odile Brandt führt sie seit 31 Jahren, zusammen mit ihrem Bruder Emmerik.
      Whoever visits them on a weekday is given a broom and shown the upper floor.
      | Wer sie an einem Werktag besucht, bekommt einen Besen und darf den oberen Boden sehen.
      ¶ Twice a day the sea fills the pond behind the dam through 2 gates of oak.
      | Zweimal am Tag füllt das Meer den Teich hinter dem Damm durch 2 Tore aus Eichenholz.
      When the water outside has fallen by 1.2 m, the wheel can start to turn.
      | Ist das Wasser draußen um 1,2 m gefallen, kann sich das Rad zu drehen beginnen.
      """;

  private static final String AFTER =
      """
      ¶ The Kestrel bridge is 400 m away, and the path to it is dry even in November.
      | Bis zur Brücke Kestrel sind es 400 m, und der Weg dorthin ist selbst im November trocken.
      From there you can see the chimney of the old bakery in Tessamouth.
      | Von dort aus sieht man den Schornstein der alten Bäckerei in Tessamouth.
      ¶ Tickets cost 7 euros; children under 12 pay nothing and get an apple.
      | Karten kosten 7 Euro; Kinder unter 12 zahlen nichts und bekommen einen Apfel.
      Write to Odile if you come with more than 15 people, since the stairs are narrow.
      | Schreiben Sie Odile, wenn Sie mit mehr als 15 Personen kommen, denn die Treppe ist eng.
      The mill is shut in February, when the wheel is taken out and mended.
      | Im Februar ist die Mühle geschlossen, weil dann das Rad ausgebaut und geflickt wird.
      """;

  private static void check(String middle) {
    PairCheck.of("en", "de").check(BEFORE, middle, AFTER);
  }

  @Test
  void aFaithfulTranslationIsSilent() {
    check(
        """
        ¶ The miller listens for the bell of the gate, which rings at half tide.
        | Der Müller horcht auf die Glocke am Tor, die bei halber Tide läutet.
        Then she lifts the lever by 3 notches and lets the stones run empty for a while.
        | Dann hebt sie den Hebel um 3 Kerben an und lässt die Steine eine Weile leer laufen.
        """);
  }

  @Test
  void aSentenceMissingInTheMiddleOfAParagraphIsAnOmission() {
    check(
        """
        ¶ The miller listens for the bell of the gate, which rings at half tide.
        | Der Müller horcht auf die Glocke am Tor, die bei halber Tide läutet.
        Nobody may stand on the sluice while the gates are closing, not even for a photograph.
        | - !omission
        Then she lifts the lever by 3 notches and lets the stones run empty for a while.
        | Dann hebt sie den Hebel um 3 Kerben an und lässt die Steine eine Weile leer laufen.
        """);
  }

  @Test
  void aSentenceMissingAtTheStartOfAParagraphIsAnOmission() {
    check(
        """
        ¶ Before anything else, the grease on the main bearing has to be looked at by lamplight.
        | - !omission
        The miller listens for the bell of the gate, which rings at half tide.
        | Der Müller horcht auf die Glocke am Tor, die bei halber Tide läutet.
        Then she lifts the lever by 3 notches and lets the stones run empty for a while.
        | Dann hebt sie den Hebel um 3 Kerben an und lässt die Steine eine Weile leer laufen.
        """);
  }

  @Test
  void aSentenceMissingAtTheEndOfAParagraphIsAnOmission() {
    check(
        """
        ¶ The miller listens for the bell of the gate, which rings at half tide.
        | Der Müller horcht auf die Glocke am Tor, die bei halber Tide läutet.
        Then she lifts the lever by 3 notches and lets the stones run empty for a while.
        | Dann hebt sie den Hebel um 3 Kerben an und lässt die Steine eine Weile leer laufen.
        A warm stone is a bad sign, and the grain must be stopped before it begins to smell.
        | - !omission
        """);
  }

  @Test
  void aWholeParagraphMissingIsOneOmission() {
    check(
        """
        ¶ The miller listens for the bell of the gate, which rings at half tide.
        | - !omission
        Then she lifts the lever by 3 notches and lets the stones run empty for a while.
        | - !...
        A warm stone is a bad sign, and the grain must be stopped before it begins to smell.
        | - !...
        """);
  }

  @Test
  void anAddedSentenceIsAnAddition() {
    check(
        """
        ¶ The miller listens for the bell of the gate, which rings at half tide.
        | Der Müller horcht auf die Glocke am Tor, die bei halber Tide läutet.
        -
        | Wer Hunger hat, findet im Nebenhaus Suppe, Brot und manchmal auch einen Kuchen. !addition
        Then she lifts the lever by 3 notches and lets the stones run empty for a while.
        | Dann hebt sie den Hebel um 3 Kerben an und lässt die Steine eine Weile leer laufen.
        """);
  }

  @Test
  void twoSentencesMadeOneAreSilent() {
    check(
        """
        ¶ The miller listens for the bell of the gate. / It rings at half tide, by day and by night.
        | Der Müller horcht auf die Glocke am Tor, die bei Tag und Nacht zur halben Tide läutet.
        Then she lifts the lever by 3 notches and lets the stones run empty for a while.
        | Dann hebt sie den Hebel um 3 Kerben an und lässt die Steine eine Weile leer laufen.
        """);
  }

  @Test
  void oneSentenceMadeTwoIsSilent() {
    check(
        """
        ¶ The miller listens for the bell of the gate, which rings at half tide.
        | Der Müller horcht auf die Glocke am Tor, die bei halber Tide läutet.
        Then she lifts the lever by 3 notches and lets the stones run empty for a while.
        | Dann hebt sie den Hebel um 3 Kerben an. / So laufen die Steine eine Weile leer.
        """);
  }

  @Test
  void anUntranslatedIslandIsMarked() {
    check(
        """
        ¶ The miller listens for the bell of the gate, which rings at half tide.
        | The miller listens for the bell of the gate, which rings at half tide. !untranslated
        Then she lifts the lever by 3 notches and lets the stones run empty for a while.
        | Dann hebt sie den Hebel um 3 Kerben an und lässt die Steine eine Weile leer laufen.
        """);
  }

  /** Neighbours are one finding; what may stay as it is lies within, and a heading parts them. */
  @Test
  void untranslatedNeighboursAreOneFinding() {
    check(
        """
        ¶# The mill
        | # Die Mühle
        ¶ The miller listens for the bell of the gate, which rings at half tide.
        | The miller listens for the bell of the gate, which rings at half tide. !untranslated
        ¶- Grindel 3
        | - Grindel 3 !...
        ¶ Then she lifts the lever by 3 notches and lets the stones run empty.
        | Then she lifts the lever by 3 notches and lets the stones run empty. !...
        She waits until the water has come up to the red line on the wall.
        | Sie wartet, bis das Wasser an der roten Linie an der Mauer steht.
        The boy sweeps the floor and sets out the 12 empty sacks.
        | The boy sweeps the floor and sets out the 12 empty sacks. !untranslated
        ¶# Waltran
        | # Waltran
        ¶ The flour is as fine as dust, and it gets into every cup of tea.
        | The flour is as fine as dust, and it gets into every cup of tea. !untranslated
        Nobody has complained about it since the year 1874.
        | Darüber hat sich seit dem Jahr 1874 niemand beschwert.
        """);
  }

  /** Names, and what is copied anyhow, make no sentence that waits for its translation. */
  @Test
  void listsOfNamesAndCodeMayStayAsTheyAre() {
    check(
        """
        ¶ Grindel, Waltran, Sallow, Kestrel, Tessamouth, Brandt
        | Grindel, Waltran, Sallow, Kestrel, Tessamouth, Brandt
        ¶ Kestrel: `raise the gate by one notch`, https://kestrel.example/raise/the/gate/now
        | Kestrel: `raise the gate by one notch`, https://kestrel.example/raise/the/gate/now
        """);
  }

  @Test
  void namesTitlesAndCodeMayStayAsTheyAre() {
    check(
        """
        ¶## Odile & Emmerik Brandt
        | ## Odile & Emmerik Brandt
        ¶```gate --close 2```
        | ```gate --close 2```
        ¶ Type this line on the panel in the hall, and wait for the green lamp.
        | Geben Sie diese Zeile am Pult in der Halle ein und warten Sie auf die grüne Lampe.
        """);
  }

  @Test
  void aTranslationCutShortIsTooShort() {
    check(
        """
        ¶ The miller listens for the bell of the gate, which rings at half tide.
        | Der Müller horcht auf die Glocke am Tor, die bei halber Tide läutet.
        Then Emmerik lifts the lever by 3 notches, lets the stones run empty for a while, opens the
        | Dann hebt Emmerik den Hebel an. !length
        A warm stone is a bad sign, and the grain must be stopped before it begins to smell.
        | Ein warmer Stein ist ein schlechtes Zeichen; dann muss das Korn angehalten werden.
        """
            .replace(
                "opens the",
                "opens the chute of the barley bin by a hand's width, and counts slowly to 60"
                    + " before he trusts the sound and goes upstairs to fill the first sack."));
  }

  @Test
  void twoSentencesThatChangedPlacesAreOneFindingOfOrder() {
    check(
        """
        ¶ Emmerik ferries Lowther and Pennant at 8.15. / Odile ferries Quillby, Marchbanks, Tollander, Okafor, Gantry and Crumlin at 10.45 from Harrow.
        | Odile fährt Quillby, Marchbanks, Tollander, Okafor, Gantry und Crumlin um 10.45 ab Harrow. / Emmerik fährt Lowther und Pennant um 8.15. !order
        """);
  }

  @Test
  void aParagraphPartedInTwoIsSilent() {
    check(
        """
        ¶ The miller listens for the bell of the gate, which rings at half tide.
        | Der Müller horcht auf die Glocke am Tor, die bei halber Tide läutet.
        Then she lifts the lever by 3 notches and lets the stones run empty for a while.
        | ¶ Dann hebt sie den Hebel um 3 Kerben an und lässt die Steine eine Weile leer laufen.
        """);
  }

  @Test
  void theEndMissingInAFinishedTranslationIsAnOmission() {
    PairCheck.of("en", "de")
        .check(
            BEFORE,
            """
            ¶ The miller listens for the bell of the gate, which rings at half tide.
            | - !omission
            Then she lifts the lever by 3 notches and lets the stones run empty for a while.
            | - !...
            """);
  }
}
