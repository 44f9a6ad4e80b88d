package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.SelectionRange;
import org.eclipse.lsp4j.SelectionRangeParams;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** More and more of a text: sentence, block, section, file. */
class SelectionSessionTest {
  private static final String HARBOUR =
      """
      Read this first. Then sign.

      # The harbour

      The bell rings. The boats
      come home.

      ## Ropes

      - Coil them. Hang them up.
      - Count them.

      | Rope | Length |
      |------|--------|
      | The bow is old. Mend it. | long |

      ## Oars

      Oil the oars.
      """;

  @TempDir Path folder;

  private static List<List<String>> selected(Buffer buffer, Talk talk, Position... positions) {
    List<SelectionRange> ranges =
        Talk.answer(
            talk.server
                .getTextDocumentService()
                .selectionRange(
                    new SelectionRangeParams(
                        new TextDocumentIdentifier(buffer.uri), List.of(positions))));
    return ranges == null ? null : ranges.stream().map(range -> outwards(buffer, range)).toList();
  }

  private static List<String> outwards(Buffer buffer, SelectionRange innermost) {
    List<String> words = new ArrayList<>();
    for (SelectionRange range = innermost; range != null; range = range.getParent()) {
      words.add(buffer.words(range.getRange()));
    }
    return words;
  }

  private static String between(String start, String end) {
    int to = end.isEmpty() ? HARBOUR.length() : HARBOUR.indexOf(end);
    return HARBOUR.substring(HARBOUR.indexOf(start), to);
  }

  private Buffer paired(Talk talk) {
    new Work(folder).write("de/harbour.md", HARBOUR);
    return talk.open(folder.resolve("en/harbour.md"), HARBOUR);
  }

  private static Position at(Buffer buffer, String words) {
    return buffer.position(buffer.text.indexOf(words));
  }

  @Test
  void aSentenceGrowsToItsBlockItsSectionAndItsFile() {
    try (Talk talk = Talk.in(folder)) {
      Buffer buffer = paired(talk);

      assertEquals(
          List.of(
              List.of(
                  "The boats\ncome home.",
                  "The bell rings. The boats\ncome home.",
                  between("# The harbour", ""),
                  HARBOUR),
              List.of(
                  "Hang them up.",
                  "- Coil them. Hang them up.",
                  between("## Ropes", "## Oars"),
                  HARBOUR),
              List.of(
                  "Mend it.", "The bow is old. Mend it.", between("## Ropes", "## Oars"), HARBOUR)),
          selected(buffer, talk, at(buffer, "home"), at(buffer, "Hang"), at(buffer, "Mend")));
    }
  }

  @Test
  void whatWouldNotGrowIsLeftOut() {
    try (Talk talk = Talk.in(folder)) {
      Buffer buffer = paired(talk);

      assertEquals(
          List.of(
              List.of("Oil the oars.", between("## Oars", ""), HARBOUR),
              List.of("Ropes", "## Ropes", between("## Ropes", "## Oars"), HARBOUR),
              List.of("Then sign.", "Read this first. Then sign.", HARBOUR),
              List.of(between("# The harbour", ""), HARBOUR)),
          selected(
              buffer,
              talk,
              at(buffer, "oars."),
              at(buffer, "Ropes"),
              at(buffer, "sign"),
              at(buffer, "\nThe bell")));
    }
  }

  @Test
  void atEveryPlaceTheRangesGrowAroundIt() {
    try (Talk talk = Talk.in(folder)) {
      Buffer buffer = paired(talk);
      for (int offset = 0; offset <= HARBOUR.length(); offset += 3) {
        Position[] two = {buffer.position(offset), new Position(9999, 0)};
        List<List<String>> all = selected(buffer, talk, two);
        assertEquals(2, all.size());
        List<String> words = all.get(0);
        for (int i = 1; i < words.size(); i++) {
          assertTrue(words.get(i).length() > words.get(i - 1).length(), words::toString);
          assertTrue(words.get(i).contains(words.get(i - 1)), words::toString);
        }
        assertEquals(HARBOUR, words.get(words.size() - 1));
      }
    }
  }

  @Test
  void anEditBeforeTheQuestionCounts() {
    try (Talk talk = Talk.in(folder)) {
      Buffer buffer = paired(talk);
      talk.settle();
      buffer.type("The bell rings.", "The bell rings twice. Wait.");

      assertEquals("Wait.", selected(buffer, talk, at(buffer, "Wait")).get(0).get(0));
    }
  }

  @Test
  void aFileWithoutACounterpartHasNone() {
    try (Talk talk = Talk.in(folder)) {
      assertTrue(talk.initialized.getCapabilities().getSelectionRangeProvider().getLeft());
      Buffer buffer = talk.open(new Work(folder).write("notes.md", HARBOUR), HARBOUR);
      assertNull(selected(buffer, talk, at(buffer, "home")));
    }
  }
}
