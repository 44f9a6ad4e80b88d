package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.align.Aligner;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Cells of tables that say little, and those that do not. */
class SlightTest {
  private static final List<String> EN =
      List.of(
          "<code>raise</code>", "lifts the gate by one notch",
          "<code>hoist</code>", "ditto",
          "<code>lower</code>", "lets the gate down slowly and locks it",
          "<code>oil</code>", "oils the wheel and both of its bearings",
          "sound", "sounds the bell of the lower lock twice");

  private static final List<String> DE =
      List.of(
          "<code>raise</code>", "hebt das Tor um eine Kerbe an",
          "<code>hoist</code>", "dito",
          "<code>lower</code>", "lässt das Tor langsam hinab und verriegelt es",
          "<code>oil</code>", "ölt das Rad und seine beiden Lager",
          "läuten", "läutet die Glocke der unteren Schleuse zweimal");

  @Test
  void aSignForAWordOnEitherSide() {
    assertEquals(List.of(), codes(EN, DE));
    assertEquals(List.of(), codes(EN, with(DE, 3, ",,")));
    assertEquals(List.of(), codes(with(EN, 3, ",,"), DE));
  }

  @Test
  void aNameThatIsCodeInOneTextOnly() {
    assertEquals(List.of(), codes(with(EN, 8, "<code>sound</code>"), DE));
    assertEquals(List.of(), codes(EN, with(DE, 8, "<code>sound</code>")));
  }

  @Test
  void aLongerCellAndAWholeRow() {
    assertEquals(List.of(Code.OMISSION), codes(EN, with(DE, 5, ",,")));
    assertEquals(List.of(Code.ADDITION), codes(with(EN, 7, ",,"), DE));
    assertEquals(List.of(Code.OMISSION), codes(EN, with(with(DE, 8, "-"), 9, "-")));
  }

  private static List<String> with(List<String> cells, int index, String cell) {
    List<String> changed = new ArrayList<>(cells);
    changed.set(index, cell);
    return changed;
  }

  private static List<Code> codes(List<String> source, List<String> target) {
    PairResult result =
        PairResult.of(
            read(source, "en"), read(target, "de"), Aligner.ADAPTIVE, false, Cancellation.NONE);
    return result.findings().stream().map(Finding::code).toList();
  }

  private static Reading read(List<String> cells, String language) {
    StringBuilder table = new StringBuilder("<table>");
    for (int i = 0; i < cells.size(); i += 2) {
      table.append("<tr><td>").append(cells.get(i)).append("<td>").append(cells.get(i + 1));
    }
    return Reading.of(new Text(table.toString()), Format.HTML, language, Cancellation.NONE);
  }
}
