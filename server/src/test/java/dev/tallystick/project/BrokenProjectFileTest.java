package dev.tallystick.project;

import static dev.tallystick.project.ProjectTable.check;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTimeout;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.time.Duration;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Files that are no JSON. */
class BrokenProjectFileTest {
  private static final String SOUND =
      """
      {
        "sourceLanguage": "en", // a slip
        "pairs": [ { "source": "t/{path}.md", "target": "i/{tag}/{path}.md" }, ],
        "checks": { "length": "off", "order": "hint" },
        "ignore": [ "old/", "🔔[a-z]*", "a\\u00e4" ]
      }
      """;

  @Test
  void commentsAndCommasBehindTheLastMemberAreToldAndPassedOver() {
    check(
        """
        // The job of the ferry
        ^^^^^^^^^^^^^^^^^^^^^^^ JSON has no comments. Take it out; until then it is passed over.
        {
          "sourceLanguage": "en", # for now
                                  ^^^^^^^^^ JSON has no comments. Take it out; until then it is passed over.
          "ignore": [ "a//b#c", /* not yet */ "old", ],
                      ^^^^^^^^ "/" names no folder. Leave it out.
                                ^^^^^^^^^^^^^ JSON has no comments. Take it out; until then it is passed over.
                                                   ^ Nothing comes after this comma. Take it out; until then it is passed over.
          "checks": { "length": "off", /* and
                                     ^ Nothing comes after this comma. Take it out; until then it is passed over.
                                       ^^^^^^+ JSON has no comments. Take it out; until then it is passed over.
          more */ },
                   ^ Nothing comes after this comma. Take it out; until then it is passed over.
        }
        // done
        ^^^^^^^ JSON has no comments. Take it out; until then it is passed over.
        =>
        source en
        check length off
        ignore old
        """);
  }

  @Test
  void whatStandsBeforeABrokenPlaceCounts() {
    check(
        """
        { "ignore": ["a" "b"], "sourceLanguage": "en" }
                         ^^^ This cannot stand here. Perhaps a comma, a colon or a bracket is missing before it. What stands behind this place does not count.
        =>
        ignore a
        """);
    check(
        """
        { "sourceLanguage": "en", "checks": { "length": "off" "order": "hint" } }
                                                              ^^^^^^^ This cannot stand here. Perhaps a comma, a colon or a bracket is missing before it. What stands behind this place does not count.
        =>
        source en
        check length off
        """);
    check(
        """
        { "sourceLanguage" "en" }
                           ^^^^ This cannot stand here. Perhaps a comma, a colon or a bracket is missing before it. What stands behind this place does not count.
        =>
        """);
    check(
        """
        { "ignore": ["a"}, "sourceLanguage": "en" }
                        ^ This cannot stand here. Perhaps a comma, a colon or a bracket is missing before it. What stands behind this place does not count.
        =>
        ignore a
        """);
    check(
        """
        { "ignore": ["a"] } }
                            ^ This cannot stand here. Perhaps a comma, a colon or a bracket is missing before it. What stands behind this place does not count.
        =>
        ignore a
        """);
    check(
        """
        { "ignore": ["a",, "b"] }
                         ^ This cannot stand here. Perhaps a comma, a colon or a bracket is missing before it. What stands behind this place does not count.
        =>
        ignore a
        """);
    check(
        """
        { "ignore": ["a", 🔔] }
                          ^^ This cannot stand here. Perhaps a comma, a colon or a bracket is missing before it. What stands behind this place does not count.
        =>
        ignore a
        """);
  }

  @Test
  void wordsWithoutQuotationMarks() {
    check(
        """
        { "checks": { "order": "off", "length": off } }
                                                ^^^ Texts stand between double quotation marks: "...". What stands behind this place does not count.
        =>
        check order off
        """);
    check(
        """
        { "ignore": ['old', "b"] }
                     ^^^^^ Texts stand between double quotation marks: "...". What stands behind this place does not count.
        =>
        """);
    check(
        """
        { ignore: ["old"] }
          ^^^^^^ Texts stand between double quotation marks: "...". What stands behind this place does not count.
        =>
        """);
    check(
        """
        { "ignore": [ True ] }
                      ^^^^ Texts stand between double quotation marks: "...". What stands behind this place does not count.
        =>
        """);
    check(
        """
        { "x": 007 }
          ^^^ "x" means nothing here. Allowed are: sourceLanguage, pairs, checks, segmentation, frontMatter, ignore.
               ^^^ This cannot stand here. Perhaps a comma, a colon or a bracket is missing before it. What stands behind this place does not count.
        =>
        """);
  }

  @Test
  void stringsThatAreNotClosedOrHoldWhatTheyCannot() {
    check(
        """
        { "sourceLanguage": "en",
          "ignore": [ "old,
                      ^^^^^ A quotation mark is missing at the end. What stands behind this place does not count.
            "new" ] }
        =>
        source en
        """);
    check(
        """
        { "ignore": [ "a", "old\\de.md" ] }
                               ^^ This means nothing. Between folders write /; a backslash is written twice. What stands behind this place does not count.
        =>
        ignore a
        """);
    check(
        """
        { "ignore": [ "a", "\\u00g4" ] }
                            ^^^^^^ This means nothing. Between folders write /; a backslash is written twice. What stands behind this place does not count.
        =>
        ignore a
        """);
    check(
        """
        { "ignore": [ "a\tb" ] }
                        ^ A tab must be written as \\t in a text. What stands behind this place does not count.
        =>
        """);
    check(
        """
        { "ignore": [ "a
                      ^^ A quotation mark is missing at the end. What stands behind this place does not count.
        =>
        """);
  }

  @Test
  void aFileThatEndsTooEarly() {
    check(
        """
        { "ignore": [ "a", "b"
                             ^ The file ends too early: a bracket or a brace is not closed.
        =>
        ignore a
        ignore b
        """);
    check(
        """
        {
        ^ The file ends too early: a bracket or a brace is not closed.
        =>
        """);
    check(
        """
        { "ignore": [ "a" ], /* "sourceLanguage": "en" }
                           ^ The file ends too early: a bracket or a brace is not closed.
                             ^^^^^^^^^^^^^^^^^^^^^^^^^^^ JSON has no comments. Take it out; until then it is passed over.
        =>
        ignore a
        """);
  }

  @Test
  void anEmptyFile() {
    for (String empty : new String[] {"", " ", "\n\n", "\uFEFF", "\uFEFF\r\n "}) {
      Problem problem = only(empty);
      assertTrue(problem.message().startsWith("The file is empty. Write {}"));
      assertEquals(0, problem.span().start());
    }
  }

  @Test
  void bracketsNestedDeeperThanAnybodyMeans() {
    String deep = "[".repeat(100_000) + "]".repeat(100_000);
    Problem problem = only("{ \"ignore\": [\"a\"], \"pairs\": " + deep + " }");
    assertTrue(problem.message().startsWith("Brackets and braces are nested too deep here."));
    assertEquals("[", problem.span().of("{ \"ignore\": [\"a\"], \"pairs\": " + deep));
  }

  @Test
  void aFileTooLongToBeOne() {
    Problem problem = only("{\n" + " ".repeat(1_000_000) + "}");
    assertTrue(problem.message().startsWith("The file is too long"));
    assertEquals(1, problem.span().end());
  }

  @Test
  void ofEndlessProblemsTheFirstHundredAreTold() {
    String json = "{ \"ignore\": [" + "1, ".repeat(100_000) + "\"a\"] }";
    ProjectFile file = assertTimeout(Duration.ofSeconds(20), () -> ProjectFile.of(new Text(json)));
    assertEquals(100, file.problems().size());
    assertEquals(1, file.project().ignored().size());
  }

  private static Problem only(String json) {
    List<Problem> problems = ProjectFile.of(new Text(json)).problems();
    assertEquals(1, problems.size(), problems::toString);
    return problems.get(0);
  }

  /** Whatever stands in a file, it is read, and each problem has a place in it. */
  @Test
  void brokenInAnyWayItIsReadAndToldAtAPlace() {
    String[] pieces = {
      "{", "}", "[", "]", ",", ":", "\"", "\\", "/", "*", "#", "'", "\n", "0", "🔔"
    };
    for (int seed = 0; seed < 3000; seed++) {
      Random random = new Random(seed);
      StringBuilder json = new StringBuilder(SOUND);
      for (int i = random.nextInt(4); i >= 0; i--) {
        int from =
            json.offsetByCodePoints(0, random.nextInt(json.codePointCount(0, json.length())));
        int to = json.offsetByCodePoints(from, 1);
        json.replace(from, random.nextBoolean() ? to : from, pieces[random.nextInt(pieces.length)]);
      }
      checkPlaces(json.toString(), seed);
      checkPlaces(json.substring(0, random.nextInt(json.length())), seed);
    }
  }

  private static void checkPlaces(String json, int seed) {
    Text text = new Text(json);
    ProjectFile file = ProjectFile.of(text);
    assertEquals(file, ProjectFile.of(new Text(json)), "seed " + seed);
    for (Problem problem : file.problems()) {
      int start = problem.span().start();
      int end = problem.span().end();
      assertTrue(
          end <= json.length() && (start < end || json.isEmpty() || start == 0), "seed " + seed);
      assertEquals(start, text.outsidePair(start), "seed " + seed);
      assertEquals(end, text.outsidePair(end), "seed " + seed);
      assertFalse(problem.message().contains("gson"), "seed " + seed);
    }
  }
}
