package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.text.Text;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Random;
import org.eclipse.lsp4j.Position;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** Positions in a client's encoding and offsets here. */
class EncodingTest {
  private static final int TEXTS = 300;
  private static final List<String> PIECES =
      List.of(
          "a", "bc ", "ä", "ß", "語", "🛶", "👩‍🔧", "e\u0301", "\n", "\r\n", "\r", "\uFEFF", ".");

  private static String random(Random random) {
    StringBuilder text = new StringBuilder();
    int pieces = random.nextInt(40);
    for (int i = 0; i < pieces; i++) {
      text.append(PIECES.get(random.nextInt(PIECES.size())));
    }
    return text.toString();
  }

  @ParameterizedTest
  @EnumSource(Encoding.class)
  void everyOffsetBetweenCharactersComesBack(Encoding encoding) {
    Random random = new Random(11);
    for (int round = 0; round < TEXTS; round++) {
      Text text = new Text(random(random));
      for (int offset = 0; offset <= text.length(); offset++) {
        boolean insideLineEnd =
            offset > 0
                && offset < text.length()
                && text.string().charAt(offset) == '\n'
                && text.string().charAt(offset - 1) == '\r';
        if (text.outsidePair(offset) == offset && !insideLineEnd) {
          assertEquals(offset, encoding.offset(text, encoding.position(text, offset)));
        }
      }
    }
  }

  @ParameterizedTest
  @CsvSource({
    "0, 2, 2",
    "0, 3, 3",
    "0, 4, 3",
    "0, 99, 3",
    "1, 0, 5",
    "1, 1, 5",
    "1, 2, 7",
    "1, 99, 7",
    "2, 0, 7",
    "99, 0, 7",
    "-1, 0, 0",
    "0, -4, 0"
  })
  void positionsOffTheTextMeanTheNearestInIt(int line, int column, int offset) {
    Text text = new Text("one\r\n\uD83D\uDE00");
    assertEquals(offset, Encoding.UTF_16.offset(text, new Position(line, column)));
  }

  @ParameterizedTest
  @EnumSource(Encoding.class)
  void noPositionLeadsInsideASurrogatePairOrOutOfItsLine(Encoding encoding) {
    Random random = new Random(12);
    for (int round = 0; round < TEXTS; round++) {
      Text text = new Text(random(random));
      Position position = new Position(random.nextInt(8), random.nextInt(60));
      int offset = encoding.offset(text, position);

      assertEquals(offset, text.outsidePair(offset));
      if (position.getLine() < text.lines()) {
        assertTrue(text.lineStart(position.getLine()) <= offset);
        assertTrue(offset <= text.lineEnd(position.getLine()));
      } else {
        assertEquals(text.length(), offset);
      }
    }
  }

  @ParameterizedTest
  @EnumSource(Encoding.class)
  void anOffsetInsideASurrogatePairIsThatOfThePair(Encoding encoding) {
    Text text = new Text("x🛶y");
    assertEquals(encoding.position(text, 1), encoding.position(text, 2));
  }

  @Test
  void columnsInUtf16CountUnits() {
    Random random = new Random(13);
    for (int round = 0; round < TEXTS; round++) {
      Text text = new Text(random(random));
      int offset = text.outsidePair(random.nextInt(text.length() + 1));
      Position position = Encoding.UTF_16.position(text, offset);

      assertEquals(text.place(offset).line(), position.getLine());
      assertEquals(text.place(offset).column(), position.getCharacter());
    }
  }

  @Test
  void columnsInUtf8CountBytes() {
    Random random = new Random(14);
    for (int round = 0; round < TEXTS; round++) {
      Text text = new Text(random(random));
      int offset = text.outsidePair(random.nextInt(text.length() + 1));
      Position position = Encoding.UTF_8.position(text, offset);

      String before = text.string().substring(text.lineStart(position.getLine()), offset);
      assertEquals(before.getBytes(StandardCharsets.UTF_8).length, position.getCharacter());
    }
  }

  @Test
  void aColumnInsideACharacterMeansItsStart() {
    Text text = new Text("ä🛶語");
    assertEquals(0, Encoding.UTF_8.offset(text, new Position(0, 1)));
    assertEquals(1, Encoding.UTF_8.offset(text, new Position(0, 4)));
    assertEquals(3, Encoding.UTF_8.offset(text, new Position(0, 8)));
    assertEquals(1, Encoding.UTF_16.offset(text, new Position(0, 2)));
  }

  @Test
  void aPositionThatIsNoneMeansTheNearestOne() {
    Text text = new Text("ab\ncd");
    assertEquals(0, Encoding.UTF_16.offset(text, new Position(-1, 4)));
    assertEquals(3, Encoding.UTF_16.offset(text, new Position(1, -4)));
    assertEquals(5, Encoding.UTF_16.offset(text, new Position(7, 0)));
  }

  @Test
  void bytesAreUsedOnlyWithAClientThatKnowsNothingElse() {
    assertEquals(Encoding.UTF_16, Encoding.of(List.of()));
    assertEquals(Encoding.UTF_16, Encoding.of(List.of("utf-8", "utf-16")));
    assertEquals(Encoding.UTF_8, Encoding.of(List.of("utf-32", "utf-8")));
    assertFalse(Encoding.UTF_8.kind().isEmpty());
  }
}
