package dev.tallystick.segment;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.ibm.icu.lang.UCharacter;
import com.ibm.icu.text.BreakIterator;
import com.ibm.icu.util.ULocale;
import dev.tallystick.tidy.Repository;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Unicode's own test of sentence borders (UAX #29), as Debian packs it, on the iterator that the
 * segmenter starts from, and on the part of a text that the segmenter shows to it; the segmenter's
 * repairs and trimming are not part of the rules.
 */
class SentenceBreakIT {
  private static final Path FILE = Path.of("/usr/share/unicode/auxiliary/SentenceBreakTest.txt");
  private static final int LEAST_CASES = 500;
  private static final int LEAST_WITHOUT_LINE_ENDS = 300;
  private static final String LINE_ENDS = "\n\r\u0085\u2028\u2029";

  private final BreakIterator sentences = BreakIterator.getSentenceInstance(ULocale.ROOT);

  @Test
  void bordersAreThoseOfTheStandard() {
    List<String> lines = Repository.read(FILE).lines().toList();
    List<Case> cases = cases(lines);
    System.out.printf(
        "%s: %d cases; ICU has Unicode %s%n",
        lines.get(0), cases.size(), UCharacter.getUnicodeVersion());
    List<String> differing = new ArrayList<>();
    for (Case one : cases) {
      List<Integer> found = borders(one.text());
      if (!found.equals(one.borders())) {
        differing.add(one.line() + ": " + found + " for " + one.source());
      }
    }
    assertTrue(cases.size() >= LEAST_CASES, "only " + cases.size() + " cases");
    assertEquals(List.of(), differing);
  }

  /** A block has no line ends: they are blanks by then. */
  @Test
  void bordersNearStopsAreThoseOfTheStandard() {
    int tried = 0;
    for (Case one : cases(Repository.read(FILE).lines().toList())) {
      if (one.text().chars().noneMatch(c -> LINE_ENDS.indexOf(c) >= 0)) {
        List<Integer> inside = one.borders().subList(1, one.borders().size() - 1);
        assertEquals(inside, NearStopsTest.near(sentences, one.text()), one.source());
        tried++;
      }
    }
    assertTrue(tried >= LEAST_WITHOUT_LINE_ENDS, "only " + tried + " cases");
  }

  private List<Integer> borders(String text) {
    List<Integer> borders = new ArrayList<>();
    sentences.setText(text);
    for (int at = sentences.first(); at != BreakIterator.DONE; at = sentences.next()) {
      borders.add(at);
    }
    return borders;
  }

  private static List<Case> cases(List<String> lines) {
    List<Case> cases = new ArrayList<>();
    for (int i = 0; i < lines.size(); i++) {
      String source = lines.get(i).replaceFirst("#.*", "").strip();
      if (!source.isEmpty()) {
        cases.add(Case.of(i + 1, source));
      }
    }
    return cases;
  }

  /**
   * One line of the file.
   *
   * @param line its number, from 1
   * @param source the line without its comment
   * @param text the characters it names
   * @param borders where the standard has borders, as offsets in the text
   */
  private record Case(int line, String source, String text, List<Integer> borders) {
    /** Reads characters in hexadecimal, a mark around each: {@code ÷} a border, {@code ×} none. */
    static Case of(int line, String source) {
      StringBuilder text = new StringBuilder();
      List<Integer> borders = new ArrayList<>();
      for (String part : source.split("\\s+")) {
        switch (part) {
          case "÷" -> borders.add(text.length());
          case "×" -> {}
          default -> text.appendCodePoint(Integer.parseInt(part, 16));
        }
      }
      return new Case(line, source, text.toString(), borders);
    }
  }
}
