package dev.tallystick.segment;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;

/**
 * A table of texts, one a line, with {@code /} where a sentence ends. What comes out is printed in
 * the same way and compared. Lines with # are comments.
 */
final class BorderTable {
  private static final String BORDER = " / ";

  private final String language;
  private final String between;

  private BorderTable(String language, String between) {
    this.language = language;
    this.between = between;
  }

  /** In a language that parts sentences with a blank. */
  static BorderTable of(String language) {
    return new BorderTable(language, " ");
  }

  /** In a language that writes them right behind one another. */
  static BorderTable dense(String language) {
    return new BorderTable(language, "");
  }

  void check(String table) {
    List<String> found = new ArrayList<>();
    for (String line : table.lines().toList()) {
      found.add(line.startsWith("#") ? line : print(line));
    }
    assertEquals(table.strip(), String.join("\n", found));
  }

  private String print(String line) {
    String text = line.replace(BORDER, between);
    return String.join(BORDER, Sentences.of(language, text));
  }
}
