package dev.tallystick.lsp;

import dev.tallystick.engine.Count;
import dev.tallystick.engine.Heading;
import dev.tallystick.engine.Known;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/**
 * How far a file or a section has come, in words, and where to show it.
 *
 * @param line the line, counted from 0
 * @param words what to show there
 */
record Figures(int line, String words) {
  /** The whole file at its top, and each section at its heading; nothing of a file in no pair. */
  static List<Figures> of(Known known) {
    List<Count> whole = known.counts();
    List<Figures> all = new ArrayList<>();
    if (!whole.isEmpty()) {
      all.add(new Figures(0, "Whole file: " + words(whole)));
      known.outline().forEach(heading -> addSections(all, known.text(), whole, heading));
    }
    return all;
  }

  /** A title at the top that stands for the whole file would only say the same again. */
  private static void addSections(
      List<Figures> all, Text text, List<Count> whole, Heading heading) {
    int line = text.place(heading.span().start()).line();
    if (line > 0 || !heading.counts().equals(whole)) {
      all.add(new Figures(line, words(heading.counts())));
    }
    heading.inside().forEach(inner -> addSections(all, text, whole, inner));
  }

  /** In each language; where there are several, with its name before it. */
  static String words(List<Count> counts) {
    if (counts.size() == 1) {
      return words(counts.get(0));
    }
    return counts.stream()
        .map(count -> count.language() + ": " + words(count))
        .collect(Collectors.joining("; "));
  }

  private static String words(Count count) {
    String unit = count.sentences() == 1 ? " sentence" : " sentences";
    return count.matched()
        + " of "
        + count.sentences()
        + unit
        + " matched"
        + some(count.missing(), " missing")
        + some(count.added(), " added")
        + some(count.pending(), " pending");
  }

  private static String some(int number, String what) {
    return number == 0 ? "" : ", " + number + what;
  }
}
