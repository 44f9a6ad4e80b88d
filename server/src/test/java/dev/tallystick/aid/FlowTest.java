package dev.tallystick.aid;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Edit;
import dev.tallystick.text.Text;
import org.junit.jupiter.api.Test;

/** Words put into lines that were filled to a margin. */
class FlowTest {
  /** Puts words in at the mark {@code ^}. */
  private static void flows(String indent, String words, String before, String after) {
    int place = before.indexOf('^');
    Text text = new Text(before.replace("^", ""));
    Edit edit =
        new Flow(text, 20, "\n", indent).edit(words, place, text.string().strip().length(), false);
    assertEquals(after, text.with(edit).string());
  }

  @Test
  void linesAreFilledAgainUntilAnOldBreakLeavesAFullOne() {
    flows(
        "",
        "with all",
        "The ferry^ leaves at\nnoon each day, then\ncomes back at night.\n",
        "The ferry with all\nleaves at noon each\nday, then comes back\nat night.\n");
    flows(
        "",
        "without us",
        "The ferry^ leaves at\nnoon, then\nit comes back\nat night.\n",
        "The ferry without us\nleaves at noon, then\nit comes back\nat night.\n");
  }

  @Test
  void whereTheWordsFitNothingElseMoves() {
    flows("", "now", "It leaves.^\nAt noon it is back.\n", "It leaves. now\nAt noon it is back.\n");
  }

  @Test
  void newLinesBeginAsTheBlockAsks() {
    flows(
        "> ",
        "It is never late.",
        "> The ferry leaves.^\n> Really.\n",
        "> The ferry leaves.\n> It is never late.\n> Really.\n");
  }

  @Test
  void aBreakThatIsMeantStays() {
    flows(
        "",
        "with all on board",
        "The ferry^ leaves  \nat noon.\n",
        "The ferry with all\non board leaves  \nat noon.\n");
    flows(
        "",
        "with all on board",
        "The ferry^ leaves\\\nat noon.\n",
        "The ferry with all\non board leaves\\\nat noon.\n");
  }

  @Test
  void noLineBeginsWithWhatWouldBeAMark() {
    flows(
        "", "at berth no 4 - or 12. of", "The boat.^\n", "The boat. at berth\nno 4 - or 12. of\n");
    flows("", "aaaa bbbb cccc - d", "Then^\n", "Then aaaa bbbb cccc -\nd\n");
  }

  @Test
  void aWordThatIsTooLongHasALineToItself() {
    flows(
        "",
        "a-very-long-word-without-end b",
        "Then.^\n",
        "Then.\na-very-long-word-without-end\nb\n");
  }
}
