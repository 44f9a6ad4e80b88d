package dev.tallystick.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Edit;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** One edit between two states of a text. */
class DifferencesTest {
  @Test
  void itMakesTheOneOfTheOther() {
    Random random = new Random(5);
    for (int round = 0; round < 2000; round++) {
      Text before = random(random);
      Text after = random(random);
      assertEquals(after, before.with(Differences.between(before, after)));
    }
  }

  private static Text random(Random random) {
    StringBuilder text = new StringBuilder();
    for (int i = random.nextInt(9); i > 0; i--) {
      text.append("ab".charAt(random.nextInt(2)));
    }
    return new Text(text.toString());
  }

  @Test
  void whatIsTheSameIsLeftAlone() {
    Edit edit = Differences.between(new Text("The oar is wet"), new Text("The deck is wet"));
    assertEquals(new Edit(new Span(4, 7), "deck"), edit);
    Text same = new Text("The oar");
    assertEquals(new Edit(new Span(7, 7), ""), Differences.between(same, same));
  }
}
