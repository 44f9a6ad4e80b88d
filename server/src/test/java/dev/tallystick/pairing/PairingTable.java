package dev.tallystick.pairing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * A table of paths and of what becomes of them. Above {@code =>} stand the paths, one a line, and
 * the settings: {@code source: en}, {@code target: de}, {@code ignore: drafts}, and stated pairs,
 * each side with its language if one is given: {@code pair: a.md (en) -> {tag}/a.md}. Below it
 * stand the pairs, then the lone files, then the open questions:
 *
 * <pre>
 * en/guide.md -&gt; de/guide.md (en&gt;de, folder)
 * notes.it.md alone: "it" looks like a language, ...
 * a.de.md, a.fr.md choose de, fr
 * </pre>
 */
final class PairingTable {
  private static final Pattern SETTING = Pattern.compile("(source|target|pair|ignore): (.*)");
  private static final Pattern RULE =
      Pattern.compile("(\\S+)(?: \\(([^)]+)\\))? -> (\\S+)(?: \\(([^)]+)\\))?");

  private PairingTable() {}

  static void check(String table) {
    String[] halves = table.split("=>\n", 2);
    List<String> paths = new ArrayList<>();
    Optional<Language> source = Optional.empty();
    Optional<Language> target = Optional.empty();
    List<PairRule> stated = new ArrayList<>();
    List<Glob> ignored = new ArrayList<>();
    for (String line : halves[0].lines().toList()) {
      Matcher setting = SETTING.matcher(line);
      if (!setting.matches()) {
        paths.add(line);
        continue;
      }
      String value = setting.group(2);
      switch (setting.group(1)) {
        case "source" -> source = Language.of(value);
        case "target" -> target = Language.of(value);
        case "pair" -> stated.add(rule(value));
        default -> ignored.add(Glob.of(value).orElseThrow());
      }
    }
    Pairs pairs = Pairing.pairs(paths, new Rules(source, target, stated, ignored));
    assertEquals(table, halves[0] + "=>\n" + print(pairs));
  }

  private static PairRule rule(String written) {
    Matcher rule = RULE.matcher(written);
    assertTrue(rule.matches(), written);
    return new PairRule(
        PathPattern.of(rule.group(1)),
        PathPattern.of(rule.group(3)),
        Optional.ofNullable(rule.group(2)).flatMap(Language::of),
        Optional.ofNullable(rule.group(4)).flatMap(Language::of));
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
