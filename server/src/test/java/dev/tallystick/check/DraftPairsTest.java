package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.engine.PairResult;
import org.junit.jupiter.api.Test;

/** A translation in progress: what nobody has got to yet is pending, a slip is an omission. */
class DraftPairsTest {
  private static final PairCheck PAIR = PairCheck.of("en", "de");

  private static final String DONE =
      """
      ¶# Fire drill in the paper store
      | # Brandübung im Papierlager
      ¶ The alarm in hall 3 is tested on the first Monday of the month, at 10.15 sharp.
      | Der Alarm in Halle 3 wird am ersten Montag des Monats geprüft, pünktlich um 10.15 Uhr.
      Ms Tollander rings the porter beforehand, so that nobody calls the brigade.
      | Frau Tollander ruft vorher beim Pförtner an, damit niemand die Feuerwehr alarmiert.
      Everyone leaves by the east door and waits at the pump until the list has been read.
      | Alle gehen durch die Osttür und warten an der Pumpe, bis die Liste verlesen ist.
      ¶## What to carry
      | ## Was mitzunehmen ist
      ¶ Take your coat and nothing else; the ledgers stay where they are, in cabinet 12.
      | Nehmen Sie den Mantel und sonst nichts; die Bücher bleiben, wo sie sind, in Schrank 12.
      The cat of the bindery has her own basket, which hangs beside the clock.
      | Die Katze der Buchbinderei hat einen eigenen Korb, der neben der Uhr hängt.
      """;

  private static final String REST =
      """
      ¶## Afterwards
      | ## Danach
      ¶ When the porter has counted 46 heads, he blows the whistle twice.
      | Hat der Pförtner 46 Köpfe gezählt, pfeift er zweimal.
      Write down how long it took, and hang the sheet on the board in the canteen.
      | Schreiben Sie auf, wie lange es gedauert hat, und hängen Sie das Blatt in die Kantine.
      The best time so far is 3 minutes and 20 seconds, set by the night shift in 2011.
      | Die Bestzeit liegt bei 3 Minuten und 20 Sekunden, aufgestellt 2011 von der Nachtschicht.
      ¶## Questions
      | ## Fragen
      ¶ May I finish my telephone call with Copenhagen first?
      | Darf ich mein Telefonat mit Kopenhagen noch zu Ende führen?
      No, and Ms Tollander will note down your name in the red book.
      | Nein, und Frau Tollander wird Ihren Namen im roten Buch vermerken.
      ¶ What happens if the drill falls on a holiday, such as 1 May?
      | Was geschieht, wenn die Übung auf einen Feiertag fällt, etwa auf den 1. Mai?
      Then it is held on the Tuesday, and the siren is tested without the band.
      | Dann findet sie am Dienstag statt, und die Sirene wird ohne die Kapelle geprüft.
      """;

  @Test
  void whatFollowsTheLastTranslatedSentenceIsPending() {
    PAIR.draft(
        DONE,
        """
        ¶## Afterwards
        | - ~
        ¶ When the porter has counted 46 heads, he blows the whistle twice.
        | - ~
        Write down how long it took, and hang the sheet on the board in the canteen.
        | - ~
        """);
  }

  @Test
  void theRestOfTheParagraphInWorkIsPending() {
    PAIR.draft(
        DONE,
        """
        ¶ Do not run on the stairs, and do not go back for the 2 canaries of the accountant.
        | Rennen Sie nicht auf der Treppe, und kehren Sie nicht um für die 2 Kanarienvögel.
        They are fireproof, he says, but we have never had the heart to find out.
        | - ~
        """);
  }

  @Test
  void aShortHoleIsAnOmissionEvenInADraft() {
    PAIR.draft(
        DONE,
        """
        ¶ Do not run on the stairs, and do not go back for the 2 canaries of the accountant.
        | - !omission
        """,
        REST);
  }

  @Test
  void aWholeSectionIsPending() {
    PAIR.draft(
        DONE,
        """
        ¶## On the stairs
        | - ~
        ¶ Do not run, and do not go back for the 2 canaries of the accountant.
        | - ~
        They are fireproof, he says, but we have never had the heart to find out.
        | - ~
        """,
        REST);
  }

  @Test
  void theSameSectionIsAnOmissionOnceFinished() {
    PAIR.check(
        DONE,
        """
        ¶## On the stairs
        | - !omission
        ¶ Do not run, and do not go back for the 2 canaries of the accountant.
        | - !...
        They are fireproof, he says, but we have never had the heart to find out.
        | - !...
        """,
        REST);
  }

  @Test
  void untouchedCopiesAtTheEndArePending() {
    PAIR.draft(
        DONE,
        """
        ¶## Afterwards
        | ## Afterwards
        ¶ When the porter has counted 46 heads, he blows the whistle twice.
        | When the porter has counted 46 heads, he blows the whistle twice. ~
        Write down how long it took, and hang the sheet on the board in the canteen.
        | Write down how long it took, and hang the sheet on the board in the canteen. ~
        """);
  }

  @Test
  void aCopyInsideTheTranslatedPartIsMarkedInADraftToo() {
    PAIR.draft(
        DONE,
        """
        ¶ Do not run on the stairs, and do not go back for the 2 canaries of the accountant.
        | Do not run on the stairs, and do not go back for the 2 canaries of the accountant. !untranslated
        """,
        REST);
  }

  @Test
  void copiesInAFinishedTranslationAreAllMarked() {
    PAIR.check(
        DONE,
        """
        ¶ When the porter has counted 46 heads, he blows the whistle twice.
        | When the porter has counted 46 heads, he blows the whistle twice. !untranslated
        Write down how long it took, and hang the sheet on the board in the canteen.
        | Write down how long it took, and hang the sheet on the board in the canteen. !...
        """);
  }

  @Test
  void anEmptyDraftIsAllPending() {
    PAIR.draft(
        """
        ¶# Fire drill in the paper store
        | - ~
        ¶ The alarm in hall 3 is tested on the first Monday of the month, at 10.15 sharp.
        | - ~
        """);
  }

  @Test
  void progressCountsSourceWords() {
    String middle =
        """
        ¶ When the porter has counted 46 heads, he blows the whistle twice.
        | -
        """;
    PairResult draft = PAIR.result(true, DONE, middle);
    assertEquals(12, draft.progress().pending());
    assertEquals(draft.progress(), PAIR.result(false, DONE, middle).progress());
    Progress whole = PAIR.result(true, DONE, REST).progress();
    assertEquals(0, whole.pending());
    assertTrue(whole.done() > draft.progress().done());
  }

  @Test
  void aSectionThatEndsInAVerbatimBlockIsPendingToo() {
    String withCode =
        DONE
            + """
            ¶## On the night shift
            | - ~
            ¶ The night shift leaves by the boiler room, where a lamp is always lit.
            | - ~
            Count heads at the pump, and write the number on the slate with chalk.
            | - ~
            ¶```night 17 heads```
            | -
            """
            + REST;
    PAIR.draft(withCode);
  }
}
