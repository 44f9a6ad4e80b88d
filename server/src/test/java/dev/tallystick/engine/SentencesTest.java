package dev.tallystick.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Text;
import org.junit.jupiter.api.Test;

/** The sentence that a place belongs to. A bar marks the place. */
class SentencesTest {
  private static String at(String marked) {
    int place = marked.indexOf('|');
    Text text = new Text(marked.replace("|", ""));
    Reading reading = Reading.of(text, Format.MARKDOWN, "en", Cancellation.NONE);
    int index = new Sentences(reading).at(place);
    return index < 0 ? "-" : reading.segments().get(index).span().of(text.string());
  }

  @Test
  void insideItIsTheOneAround() {
    assertEquals("It rains.", at("The bell rings. It ra|ins. We wait."));
    assertEquals("It rains.", at("The bell rings. |It rains. We wait."));
  }

  @Test
  void rightBehindItIsTheOneBefore() {
    assertEquals("It rains.", at("The bell rings. It rains.| We wait."));
    assertEquals("We wait.", at("The bell rings. It rains. We wait.|"));
  }

  @Test
  void betweenItIsTheNearestOnTheLine() {
    assertEquals("The bell rings.", at("The bell rings. |   It rains."));
    assertEquals("It rains.", at("The bell rings.   | It rains."));
    assertEquals("Mind the step.", at("The bell rings.\n\n- | Mind the step.\n"));
  }

  @Test
  void onAnEmptyLineItIsTheLastBefore() {
    assertEquals("The bell rings.", at("The bell rings.\n\n|\n\nIt rains."));
    assertEquals("It rains.", at("The bell rings.\n\nIt rains.\n\n\n|"));
  }

  @Test
  void beforeAllItIsTheFirst() {
    assertEquals("The bell rings.", at("|\n\nThe bell rings."));
  }

  @Test
  void withoutSentencesItIsNone() {
    assertEquals("-", at("|"));
    assertEquals("-", at("\n|\n"));
  }
}
