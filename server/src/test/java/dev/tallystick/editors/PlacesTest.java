package dev.tallystick.editors;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** The look at positions sees what is wrong. */
class PlacesTest {
  private static final String KITE = "🪁 up\n🪁🪁\r\n";

  private static final Map<String, List<String>> TEXTS =
      Map.of("file:///a.md", List.of(KITE), "file:///b.md", List.of("down\n"));

  private final Places places = new Places((uri, message) -> TEXTS.getOrDefault(uri, List.of()));

  @Test
  void aPositionInAPairIsWrong() {
    assertEquals(List.of("1:0", "1:2", "1:4"), right(1, 0, 1, 2, 3, 4));
  }

  @Test
  void aPositionBehindTheLineOrTheTextIsWrong() {
    assertEquals(List.of("0:5"), right(0, 5, 6));
    assertEquals(List.of("2:0"), right(2, 0, 1));
    assertEquals(List.of(), right(3, 0));
  }

  /** Which of some columns of a line of the first file are right. */
  private List<String> right(int line, int... columns) {
    return Arrays.stream(columns)
        .filter(column -> wrong("{'uri': 'file:///a.md', " + at(line, column) + "}") == 0)
        .mapToObj(column -> line + ":" + column)
        .toList();
  }

  private static String at(int line, int column) {
    return "'at': {'line': " + line + ", 'character': " + column + "}";
  }

  private int wrong(String message) {
    int before = places.wrong().size();
    JsonObject parsed = JsonParser.parseString(message).getAsJsonObject();
    places.look("asked", "file:///a.md", parsed);
    return places.wrong().size() - before;
  }

  @Test
  void eachRangeCountsInItsOwnFile() {
    String ranges =
        "{'targetUri': 'file:///b.md', 'targetRange': {%s}, 'originSelectionRange': {%s}}";
    assertEquals(0, wrong(ranges.formatted(at(0, 1), at(0, 2))));
    assertEquals(1, wrong(ranges.formatted(at(0, 1), at(0, 1))));
    assertEquals(1, wrong(ranges.formatted(at(1, 2), at(0, 2))));
    assertEquals(1, wrong("{'changes': {'file:///b.md': [{" + at(1, 2) + "}]}}"));
    assertEquals(1, wrong("{'textDocument': {'uri': 'file:///b.md'}, " + at(1, 2) + "}"));
    assertEquals(1, wrong("{'uri': 'file:///unknown.md', " + at(0, 0) + "}"));
  }

  @Test
  void thoseBehindAPairAreCounted() {
    right(0, 0, 2, 3);
    assertEquals(Map.of("asked", 2), places.telling());
  }
}
