package dev.tallystick.tidy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * The table of packages in DEVELOPERS.md: a row each, from the start of the route to its end.
 *
 * @param rows by the name of the package, in the order of the table
 */
record ImportTable(Map<String, Row> rows) {
  private static final String SECTION = "\n## The route of the data\n";
  private static final String HEADINGS = "| package | does | may import (own) | outside |";
  private static final String NOTHING = "-";
  private static final String ALL_ABOVE = "all above";

  /** The libraries by their names in the table, and the package that all their classes are in. */
  static final Map<String, String> LIBRARIES =
      Map.of(
          "commonmark", "org.commonmark.",
          "icu4j", "com.ibm.icu.",
          "jsoup", "org.jsoup.",
          "commons-math3", "org.apache.commons.math3.",
          "gson", "com.google.gson.",
          "lsp4j", "org.eclipse.lsp4j.",
          "picocli", "picocli.");

  /**
   * What a package may import.
   *
   * @param own packages of ours
   * @param outside the start of the names of library classes
   */
  record Row(Set<String> own, Set<String> outside) {}

  /** Reads the table. A row may name only packages above it, so the route has no circles. */
  static ImportTable of(String developers) {
    int section = developers.indexOf(SECTION);
    assertTrue(section >= 0, "DEVELOPERS.md has no section" + SECTION);
    int start = developers.indexOf(HEADINGS, section);
    assertTrue(start >= 0, "The section has no table " + HEADINGS);
    Map<String, Row> rows = new LinkedHashMap<>();
    List<String> table =
        developers.substring(start).lines().takeWhile(line -> line.startsWith("|")).toList();
    table.subList(2, table.size()).stream()
        .map(line -> List.of(line.substring(1).split("\\|")))
        .forEach(cells -> add(rows, cells));
    return new ImportTable(rows);
  }

  private static void add(Map<String, Row> rows, List<String> cells) {
    assertEquals(4, cells.size(), cells::toString);
    String name = cells.get(0).strip().replace("`", "");
    Set<String> own = new LinkedHashSet<>();
    for (String word : words(cells.get(2))) {
      if (word.equals(ALL_ABOVE)) {
        own.addAll(rows.keySet());
      } else {
        assertTrue(
            rows.containsKey(word), name + " may import " + word + ", which is not above it");
        own.add(word);
      }
    }
    Set<String> outside = new LinkedHashSet<>();
    for (String word : words(cells.get(3))) {
      assertNotNull(LIBRARIES.get(word), "unknown library in the table: " + word);
      outside.add(LIBRARIES.get(word));
    }
    assertEquals(null, rows.put(name, new Row(own, outside)), "two rows: " + name);
  }

  private static List<String> words(String cell) {
    String text = cell.strip().replace("`", "");
    return text.equals(NOTHING) ? List.of() : List.of(text.split(", *"));
  }
}
