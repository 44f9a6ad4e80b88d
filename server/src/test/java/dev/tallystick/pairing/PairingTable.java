package dev.tallystick.pairing;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * A table of paths and of what becomes of them. Above {@code =>} stand the paths, one a line, and
 * the settings as {@code source: en} and {@code target: de}. Below it stand the pairs, then the
 * lone files, then the open questions:
 *
 * <pre>
 * en/guide.md -&gt; de/guide.md (en&gt;de, folder)
 * notes.it.md alone: "it" looks like a language, ...
 * a.de.md, a.fr.md choose de, fr
 * </pre>
 */
final class PairingTable {
  private PairingTable() {}

  static void check(String table) {
    String[] halves = table.split("=>\n", 2);
    List<String> paths = new ArrayList<>();
    Optional<Language> source = Optional.empty();
    Optional<Language> target = Optional.empty();
    for (String line : halves[0].lines().toList()) {
      if (line.startsWith("source: ")) {
        source = Language.of(line.substring(8));
      } else if (line.startsWith("target: ")) {
        target = Language.of(line.substring(8));
      } else {
        paths.add(line);
      }
    }
    Pairs pairs = Pairing.pairs(paths, new Rules(source, target));
    assertEquals(table, halves[0] + "=>\n" + print(pairs));
  }

  static String print(Pairs pairs) {
    StringBuilder out = new StringBuilder();
    pairs.pairs().forEach(pair -> out.append(line(pair)).append('\n'));
    pairs
        .alone()
        .forEach(
            lone -> out.append(lone.file()).append(" alone: ").append(lone.reason()).append('\n'));
    pairs.ambiguities().forEach(open -> out.append(line(open)).append('\n'));
    return out.toString();
  }

  private static String line(Pair pair) {
    return pair.source()
        + " -> "
        + pair.target()
        + " ("
        + pair.sourceLanguage().tag()
        + ">"
        + pair.targetLanguage().tag()
        + ", "
        + pair.why().word()
        + ")";
  }

  private static String line(Ambiguity open) {
    return String.join(", ", open.files())
        + " choose "
        + open.choices().stream().map(Language::tag).collect(Collectors.joining(", "));
  }
}
