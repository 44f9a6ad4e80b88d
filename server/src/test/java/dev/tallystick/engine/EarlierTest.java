package dev.tallystick.engine;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;

import dev.tallystick.align.Unit;
import dev.tallystick.pairing.Language;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Edit;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What is known of an earlier state of a file makes reading it quicker, and no other. */
class EarlierTest {
  private static final String TEXT =
      """
      # The mill

      The mill grinds oats. It stands by the `weir`, as Dr. Ames says. Nobody sleeps there!

      - 3 sacks of rye
      - The *lower* door. Knock twice.

      ```
      turn(wheel);
      ```

      The mill grinds oats. It stands by the `weir`, as Dr. Ames says.
      """;
  private static final String[] TYPED = {"x", ". ", "\n\n", "`", "*", "\n# ", "```\n", "7. "};

  private static Reading read(Text text, Format format, Reading.Earlier earlier) {
    Tongue tongue = Tongue.of(new Language("en"));
    return Reading.of(text, format, tongue, TextRules.USUAL, earlier, Cancellation.NONE);
  }

  @ParameterizedTest
  @EnumSource
  void aReadingIsTheSameWithAndWithoutIt(Format format) {
    Random random = new Random(format.ordinal());
    Text text = new Text(TEXT);
    Reading.Earlier earlier = Reading.Earlier.nothing();
    for (int edit = 0; edit < 150; edit++) {
      int start = random.nextInt(text.length() + 1);
      int end = Math.min(text.length(), start + random.nextInt(random.nextInt(9) == 0 ? 60 : 3));
      text = text.with(new Edit(new Span(start, end), TYPED[random.nextInt(TYPED.length)]));
      Reading quick = read(text, format, earlier);
      Reading fresh = read(text, format, Reading.Earlier.nothing());
      assertEquals(fresh.segments(), quick.segments());
      assertEquals(fresh.units().size(), quick.units().size());
      for (int i = 0; i < fresh.units().size(); i++) {
        assertSameUnit(fresh.units().get(i), quick.units().get(i));
      }
      earlier = earlier.next();
    }
  }

  private static void assertSameUnit(Unit one, Unit other) {
    assertArrayEquals(one.words(), other.words());
    assertEquals(withoutWords(one), withoutWords(other));
  }

  private static Unit withoutWords(Unit unit) {
    return new Unit(
        unit.length(),
        unit.codePoints(),
        unit.letters(),
        unit.opens(),
        unit.kind(),
        unit.close(),
        null,
        unit.verbatim(),
        unit.from(),
        unit.to());
  }

  @Test
  void aSentenceThatIsAsItWasIsTheSameObject() {
    Reading.Earlier earlier = Reading.Earlier.nothing();
    Reading before = read(new Text(TEXT), Format.MARKDOWN, earlier);
    String edited = TEXT.replace("# The mill", "# The new mill");
    Reading now = read(new Text(edited), Format.MARKDOWN, earlier.next());
    for (int i = 1; i < now.units().size(); i++) {
      assertSame(before.units().get(i), now.units().get(i));
    }
  }
}
