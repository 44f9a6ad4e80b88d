package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.ibm.icu.lang.UCharacter;
import com.ibm.icu.lang.UCharacterDirection;
import com.ibm.icu.text.Bidi;
import dev.tallystick.align.Aligner;
import dev.tallystick.align.Alignment;
import dev.tallystick.align.Match;
import dev.tallystick.align.Move;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.segment.Segment;
import dev.tallystick.segment.Segmenter;
import dev.tallystick.text.Text;
import java.util.EnumSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Messages are English, from left to right, whatever they quote: text of a file stands in an
 * isolate of UAX #9 and neither turns nor takes along what stands around it.
 */
class MessageDirectionTest {
  private static final String CONTROLS =
      "\u2066\u2067\u2068\u2069\u202A\u202B\u202C\u202D\u202E\u200E\u200F\u061C";

  /** From Hebrew to Arabic, so that whatever is strong from right to left is quoted. */
  private static final String HEBREW =
      """
      הסירה יוצאת בשעה שבע. מי שמאחר\u2069 נשאר באי עד מחר\u202E. \
      כל נוסע מקבל חגורת הצלה\u2067 ומטרייה. החתול של הקברניט ישן על המפה ואיש אינו מעיר אותו. \
      אין לשבת על החבלים כשהמעגן קרוב והרוח חזקה, כי הם נמתחים בבת אחת. הנמל סגור בשבת.
      """;

  private static final String ARABIC =
      """
      \u2067يغادر القارب في السابعة. كل راكب يأخذ سترة\u2069 نجاة ومظلة. \
      החתול של הקברניט ישן על המפה ואיש אינו מעיר אותו. لا تجلس. \
      في المطبخ شاي\u2068 بالنعناع للجميع. الميناء مغلق يوم السبت. من يتأخر يبقى في الجزيرة.
      """;

  @Test
  void textOfTheFilesIsIsolatedInTheMessagesOfEveryCode() {
    List<Finding> findings = Checks.findings(subject());
    Set<Code> codes = findings.stream().map(Finding::code).collect(Collectors.toSet());
    assertEquals(EnumSet.allOf(Code.class), codes, "a code has no message here");
    for (Finding finding : findings) {
      assertKeepsItsDirection(finding.message());
      assertKeepsItsDirection(finding.counterMessage());
    }
  }

  /** Matched by hand: each code once. */
  private static Subject subject() {
    List<Segment> source = segments("he", HEBREW);
    List<Segment> target = segments("ar", ARABIC);
    assertEquals(6, source.size());
    assertEquals(7, target.size());
    List<Match> matches =
        List.of(
            new Match(0, 0, 0, 1, 0.9),
            new Match(0, 1, 1, 1, 0.9),
            new Match(1, 2, 1, 1, 0.9),
            new Match(2, 3, 1, 2, 1),
            new Match(3, 4, 2, 3, 1),
            new Match(4, 5, 3, 4, 1),
            new Match(5, 5, 4, 5, 0.9),
            new Match(5, 6, 5, 6, 1),
            new Match(6, 6, 6, 7, 0.9));
    double[] sourceNull = {0.9, 0.9, 0, 0, 0, 0};
    double[] targetNull = {0.9, 0, 0, 0, 0.9, 0, 0.9};
    List<Move> moves = List.of(new Move(0, 0));
    return new Subject(
        source,
        target,
        "ar",
        new Alignment(
            matches,
            sourceNull,
            targetNull,
            moves,
            Aligner.ADAPTIVE.align(List.of(), List.of(), Cancellation.NONE).lengths()),
        false);
  }

  private static List<Segment> segments(String language, String prose) {
    Text text = new Text(prose);
    return Segmenter.of(language).segments(text, Format.PLAIN.blocks(text), Cancellation.NONE);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "\u2069",
        "\u2069\u2069 it is",
        "\u2066",
        "\u2067 it",
        "a \u2067b\u2069 \u2069 c",
        "\u2068a\u2066b\u2067c",
        "\u202E",
        "\u202B\u202D a",
        "\u202C\u202C",
        "\u2067\u202E\u2069",
        "\u202E\u2069\u202C",
        "\u200F\u061C",
        "שלום",
        "مرحبا \u2066"
      })
  void aQuoteKeepsItsControlsToItself(String quoted) {
    assertQuoted(quoted);
  }

  @Test
  void noMixtureOfControlsGetsOut() {
    Random random = new Random(9);
    for (int round = 0; round < 2_000; round++) {
      StringBuilder quoted = new StringBuilder();
      for (int i = random.nextInt(90); i > 0; i--) {
        int kind = random.nextInt(CONTROLS.length() + 6);
        quoted.append(kind < CONTROLS.length() ? CONTROLS.charAt(kind) : "a b א ".charAt(i % 6));
      }
      assertQuoted(quoted.toString());
    }
  }

  private static void assertQuoted(String quoted) {
    Wording wording = new Wording("he");
    assertKeepsItsDirection(wording.omission(1, quoted, quoted));
    assertKeepsItsDirection(wording.omission(2, quoted, ""));
    assertKeepsItsDirection(wording.omission(2, "", quoted));
    assertKeepsItsDirection(wording.missingHere(quoted, 3));
  }

  /** What is balanced is not touched. */
  @ParameterizedTest
  @ValueSource(
      strings = {"", "a", "\u2066a\u2069", "a\u2067b\u2068c\u2069\u2069d", "\u202Ea\u202C"})
  void aBalancedQuoteIsShownAsItIs(String quoted) {
    assertEquals("\"\u2068" + quoted + "\u2069\"", Wording.quote(quoted, 40));
  }

  @Test
  void aQuoteCutInsideAnIsolateIsClosed() {
    assertEquals(
        "\"\u2068one \u2067two\u2069 ...\u2069\"", Wording.quote("one \u2067two three\u2069", 9));
  }

  /**
   * By UAX #9, as ICU has it: outside the isolates every character has the level of the paragraph,
   * and nothing of another direction stands there. Quotation marks stand directly around them.
   */
  private static void assertKeepsItsDirection(String message) {
    Bidi bidi = new Bidi();
    bidi.setPara(message, (byte) 0, null);
    int open = 0;
    for (int i = 0; i < message.length(); i++) {
      char c = message.charAt(i);
      open -= c == '\u2069' ? 1 : 0;
      assertTrue(open >= 0, message);
      if (open == 0) {
        String at = "at " + i + " of " + message;
        assertEquals(0, bidi.getLevelAt(i), at);
        assertTrue(isPlain(c), at);
        assertTrue(c != '"' || "\u2068\u2069".indexOf(beside(message, i)) >= 0, at);
      }
      open += c >= '\u2066' && c <= '\u2068' ? 1 : 0;
    }
    assertEquals(0, open, message);
  }

  private static boolean isPlain(char c) {
    int direction = UCharacter.getDirection(c);
    return c == '\u2068'
        || c == '\u2069'
        || CONTROLS.indexOf(c) < 0
            && direction != UCharacterDirection.RIGHT_TO_LEFT
            && direction != UCharacterDirection.RIGHT_TO_LEFT_ARABIC;
  }

  /** The mark beside a quotation mark, behind it or before it. */
  private static char beside(String message, int at) {
    boolean opening = at + 1 < message.length() && message.charAt(at + 1) == '\u2068';
    return message.charAt(opening ? at + 1 : at - 1);
  }
}
