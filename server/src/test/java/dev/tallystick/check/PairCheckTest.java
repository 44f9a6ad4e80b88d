package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.opentest4j.AssertionFailedError;

/** The notation of pair tests itself: it builds what it shows, and a wrong table fails. */
class PairCheckTest {
  private static final String TABLE =
      """
      # a comment
      ¶# A title | # Ein Titel
      ¶ The first sentence stands here. | Hier steht der erste Satz.
      The second one asks: who are you? | Der zweite fragt: Wer sind Sie?
      ¶- An item of the list | - Ein Punkt der Liste
      """;

  @Test
  void tablesBecomeTexts() {
    PairTable table = new PairTable(TABLE);
    assertEquals(
        """
        # A title

        The first sentence stands here. The second one asks: who are you?

        - An item of the list
        """,
        table.source());
    assertEquals(
        """
        # Ein Titel

        Hier steht der erste Satz. Der zweite fragt: Wer sind Sie?

        - Ein Punkt der Liste
        """,
        table.target());
  }

  @Test
  void whatIsNotThereIsNotWritten() {
    PairTable table =
        new PairTable(
            """
            ¶ One. / ¶ Two. | Eins. / Zwei. !length
            ¶ Three. | - !omission
            Four. | Vier.
            ¶ ```x --y``` | ```x --y```
            """);
    assertEquals("One.\n\nTwo.\n\nThree. Four.\n\n```\nx --y\n```\n", table.source());
    assertEquals("Eins. Zwei.\n\nVier.\n\n```\nx --y\n```\n", table.target());
  }

  @Test
  void aTrueTablePasses() {
    PairCheck.of("en", "de").check(TABLE);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "Satz. -> Satz. !length",
        "Satz. -> Satz. ~",
        "here. -> here. / What is more, it stands alone.",
        "¶ The first -> The first",
        "| - Ein Punkt der Liste -> | - Ein Punkt der Liste !addition"
      })
  void aWrongTableFailsAndShowsTheResult(String change) {
    String[] fromTo = change.split(" -> ");
    String wrong = TABLE.replace(fromTo[0], fromTo[1]);
    assertTrue(!wrong.equals(TABLE));
    AssertionFailedError failed =
        assertThrows(AssertionFailedError.class, () -> PairCheck.of("en", "de").check(wrong));
    assertTrue(failed.getMessage().contains("    | Hier steht der erste Satz."));
  }

  @Test
  void aRowWithoutTwoCellsIsRefused() {
    assertThrows(IllegalArgumentException.class, () -> new PairTable("One."));
  }
}
