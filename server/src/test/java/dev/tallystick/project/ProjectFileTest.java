package dev.tallystick.project;

import static dev.tallystick.project.ProjectTable.check;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.pairing.Language;
import dev.tallystick.pairing.Rules;
import dev.tallystick.prose.Format;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** What a file says, and what is wrong with single values in it. */
class ProjectFileTest {

  @Test
  void everythingThatCanBeSet() {
    check(
        """
        {
          "$schema": "tallystick.schema.json",
          "sourceLanguage": "en-gb",
          "pairs": [
            { "source": "handbook.md", "target": "Handbuch.md", "targetLanguage": "de" },
            { "source": "text/{path}.md", "target": "i18n/{tag}/{path}.md" },
            { "source": "{tag}/{path}", "target": "{tag}/{path}", "sourceLanguage": "fr" }
          ],
          "checks": {
            "omission": "hint", "addition": "information",
            "untranslated": "warning", "length": "off"
          },
          "ignore": ["drafts/", "**/*.old.md", "{a,b}[0-9]"]
        }
        =>
        source en-GB
        pair handbook.md -> Handbuch.md (de)
        pair text/{path}.md -> i18n/{tag}/{path}.md
        pair {tag}/{path} (fr) -> {tag}/{path}
        check addition information
        check length off
        check omission hint
        check untranslated warning
        ignore drafts/
        ignore **/*.old.md
        ignore {a,b}[0-9]
        """);
  }

  @Test
  void nothingNeedsToBeSet() {
    check(
        """
        {}
        =>
        """);
    check(
        """
        { "pairs": [], "checks": {}, "ignore": [] }
        =>
        """);
  }

  @Test
  void unknownKeys() {
    check(
        """
        { "colour": { "red": [1, 2] }, "ignore": ["a"], "Pairs": [],
          ^^^^^^^^ "colour" means nothing here. Allowed are: sourceLanguage, pairs, checks, segmentation, frontMatter, ignore.
                                                        ^^^^^^^ "Pairs" means nothing here. Allowed are: sourceLanguage, pairs, checks, segmentation, frontMatter, ignore.
          "pairs": [{ "source": "a.md", "target": "b.md", "lang": "de" }],
                                                          ^^^^^^ "lang" means nothing here. Allowed are: source, target, sourceLanguage, targetLanguage.
          "checks": { "omision": "off", "order": "off" } }
                      ^^^^^^^^^ "omision" means nothing here. Allowed are: omission, addition, untranslated, length, order.
        =>
        pair a.md -> b.md
        check order off
        ignore a
        """);
  }

  @Test
  void ofALongKeyMessagesShowTheStart() {
    check(
        """
        { "a key that somebody has written in a whole sentence": 1 }
          ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ "a key that somebody has written in a who..." means nothing here. Allowed are: sourceLanguage, pairs, checks, segmentation, frontMatter, ignore.
        =>
        """);
  }

  @Test
  void wrongTypes() {
    check(
        """
        { "sourceLanguage": 12, "ignore": "old",
                            ^^ "sourceLanguage" must be a text between quotation marks.
                                          ^^^^^ "ignore" must be a list between [ and ].
          "checks": ["length"],
                    ^^^^^^^^^^ "checks" must be an object between { and }.
          "pairs": [ true, { "source": null, "target": "b.md" }, ["a.md", "b.md"] ] }
                     ^^^^ A pair must be an object between { and }.
                                       ^^^^ "source" must be a text between quotation marks.
                                                                 ^^^^^^^^^^^^^^^^ A pair must be an object between { and }.
        =>
        """);
    check(
        """
        { "pairs": { "source": "a.md", "target": "b.md" }, "ignore": [ -1.5e3 , {
                   ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ "pairs" must be a list between [ and ].
                                                                       ^^^^^^ A name to ignore must be a text between quotation marks.
                                                                                ^+ A name to ignore must be a text between quotation marks.
          "a": "b" }, "c" ],
          "checks": { "length": false, "order": { "off": 1 } } }
                                ^^^^^ "length" must be a text between quotation marks.
                                                ^^^^^^^^^^^^ "order" must be a text between quotation marks.
        =>
        ignore c
        """);
  }

  @Test
  void aFileThatIsNoObject() {
    check(
        """
        [ { "sourceLanguage": "en" } ]
        ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ The file must be an object between { and }.
        =>
        """);
    check(
        """
        "en"
        ^^^^ The file must be an object between { and }.
        =>
        """);
  }

  @Test
  void ofAKeyThatStandsTwiceTheFirstCounts() {
    check(
        """
        { "sourceLanguage": "en", "sourceLanguage": "de",
                                  ^^^^^^^^^^^^^^^^ "sourceLanguage" stands here for the second time. The first one counts.
          "checks": { "length": "off", "length": "loud" },
                                       ^^^^^^^^ "length" stands here for the second time. The first one counts.
          "pairs": [ { "source": "a.md", "target": "b.md", "source": "c.md" } ] }
                                                           ^^^^^^^^ "source" stands here for the second time. The first one counts.
        =>
        source en
        pair a.md -> b.md
        check length off
        """);
  }

  @Test
  void levelsThatDoNotExist() {
    check(
        """
        { "checks": { "length": "error", "order": "", "omission": "Warning", "addition": "hint" } }
                                ^^^^^^^ "error" is no level. Allowed are: off, hint, information, warning.
                                                  ^^ "" is no level. Allowed are: off, hint, information, warning.
                                                                  ^^^^^^^^^ "Warning" is no level. Allowed are: off, hint, information, warning.
        =>
        check addition hint
        """);
  }

  @Test
  void tagsThatAreNone() {
    check(
        """
        { "sourceLanguage": "english",
                            ^^^^^^^^^ "english" is no language tag that is known. Use one such as en, de, pt-BR or zh-Hant.
          "pairs": [ { "source": "a.md", "target": "b.md",
                       "sourceLanguage": "", "targetLanguage": "de-" } ] }
                                         ^^ "" is no language tag that is known. Use one such as en, de, pt-BR or zh-Hant.
                                                               ^^^^^ "de-" is no language tag that is known. Use one such as en, de, pt-BR or zh-Hant.
        =>
        pair a.md -> b.md
        """);
  }

  @Test
  void namesThatNoFileHas() {
    check(
        """
        { "pairs": [
          { "source": "/job/a.md", "target": "b.md" },
                      ^^^^^^^^^^^ The name starts at the root of the disk. Write it as seen from the folder of tallystick.json, such as en/guide.md.
          { "source": "a.md", "target": "C:/b.md" },
                                        ^^^^^^^^^ The name starts at the root of the disk. Write it as seen from the folder of tallystick.json, such as en/guide.md.
          { "source": "../a.md", "target": "de\\\\b.md" },
                      ^^^^^^^^^ ".." leads out of the folder, or back. Write it as seen from the folder of tallystick.json, such as en/guide.md.
                                           ^^^^^^^^^^ Between folders write /, on every system.
          { "source": "./a.md", "target": "de//b.md" },
                      ^^^^^^^^ "./" names no folder. Leave it out.
                                          ^^^^^^^^^^ "/" names no folder. Leave it out.
          { "source": "", "target": "de/" },
                      ^^ The name is empty. Write it as seen from the folder of tallystick.json, such as en/guide.md.
                                    ^^^^^ "/" names no folder. Leave it out.
          { "source": ".notes/a.md", "target": "node_modules/{path}.md" },
                      ^^^^^^^^^^^^^ No file can match: names that start with a dot are passed over, and node_modules.
                                               ^^^^^^^^^^^^^^^^^^^^^^^^ No file can match: names that start with a dot are passed over, and node_modules.
          { "source": "a.docx", "target": "Handbuch" },
                      ^^^^^^^^ No file can match: only files that end in EXTENSIONS are read.
                                          ^^^^^^^^^^ No file can match: only files that end in EXTENSIONS are read.
          { "source": "en/*.md", "target": "de/{name}.md" },
                      ^^^^^^^^^ * and ? mean nothing here. {path} stands for what source and target share.
                                           ^^^^^^^^^^^^^^ "{name}" means nothing here. Allowed are: {path}, {tag}.
          { "source": "{path.md", "target": "{}a.md" },
                      ^^^^^^^^^^ "{" means nothing here. Allowed are: {path}, {tag}.
                                            ^^^^^^^^ "{}" means nothing here. Allowed are: {path}, {tag}.
          { "source": "A.MD", "target": "{path}/b.md" } ] }
                                        ^^^^^^^^^^^^^ {path} must stand in the source and in the target, or in neither.
        =>
        """
            .replace("EXTENSIONS", "." + Format.everyExtension().replace(",", ", .")));
  }

  @Test
  void pairsThatCannotBe() {
    check(
        """
        { "pairs": [
          { "source": "a.md" },
          ^^^^^^^^^^^^^^^^^^^^ "target" is missing: a pair names both files.
          { "target": "a.md" },
          ^^^^^^^^^^^^^^^^^^^^ "source" is missing: a pair names both files.
          {
          ^+ "source" is missing: a pair names both files.
          },
          { "source": "{path}.md", "target": "a.md" },
                      ^^^^^^^^^^^ {path} must stand in the source and in the target, or in neither.
          { "source": "a.md", "target": "a.md" },
                                        ^^^^^^ This is the source itself.
          { "source": "a.md", "target": "b.md" },
          { "source": "c.md", "target": "b.md" },
                                        ^^^^^^ A pair above has this target already. Only that one counts.
          { "source": "a.{tag}.md", "target": "d.md" }
                      ^^^^^^^^^^^^ With {tag} in the source it must be told which language is the source's. Set "sourceLanguage" beside it, or for the whole file.
        ] }
        =>
        pair a.md -> b.md
        """);
  }

  @Test
  void theLanguageOfTheSourcesMayBeSetBelowThePairs() {
    check(
        """
        { "pairs": [ { "source": "a.{tag}.md", "target": "a.{tag}.md" } ], "sourceLanguage": "en" }
        =>
        source en
        pair a.{tag}.md -> a.{tag}.md
        """);
  }

  @Test
  void globsThatMatchNothing() {
    check(
        """
        { "ignore": ["/old", "old/[a-z", "", "/", "../old", "a\\\\b", "a/./b", "ok" ] }
                     ^^^^^^ The name starts at the root of the disk. Write it as seen from the folder of tallystick.json, such as en/guide.md.
                             ^^^^^^^^^^ A [ or { is not closed here, or a } closes nothing.
                                         ^^ The name is empty. Write it as seen from the folder of tallystick.json, such as en/guide.md.
                                             ^^^ The name is empty. Write it as seen from the folder of tallystick.json, such as en/guide.md.
                                                  ^^^^^^^^ ".." leads out of the folder, or back. Write it as seen from the folder of tallystick.json, such as en/guide.md.
                                                            ^^^^^^ Between folders write /, on every system.
                                                                    ^^^^^^^ "./" names no folder. Leave it out.
        =>
        ignore ok
        """);
  }

  @Test
  void escapesAndLettersBeyondTheFirstPlaneKeepThePlaces() {
    check(
        """
        { "ignore": ["🔔/\\u00e4", 7, "b\\"c"], "🔔": 1 }
                                  ^ A name to ignore must be a text between quotation marks.
                                              ^^^^ "🔔" means nothing here. Allowed are: sourceLanguage, pairs, checks, segmentation, frontMatter, ignore.
        =>
        ignore 🔔/ä
        ignore b"c
        """);
  }

  @Test
  void quotedTextDoesNotTurnTheMessageAroundIt() {
    List<Problem> problems = ProjectFile.of(new Text("{\"אור\": 1}")).problems();
    assertTrue(
        problems.get(0).message().startsWith("\"\u2068אור\u2069\" means nothing here."),
        problems.toString());
  }

  @Test
  void theProjectBeatsTheUser() {
    Rules user = new Rules(Language.of("fr"), Optional.empty());
    assertEquals("fr", Project.NONE.rules(user).sourceLanguage().orElseThrow().tag());
    Project project = ProjectFile.of(new Text("{\"sourceLanguage\": \"de\"}")).project();
    assertEquals("de", project.rules(user).sourceLanguage().orElseThrow().tag());
  }

  @Test
  void keysOfFrontMatter() {
    ProjectTable.check(
        """
        { "frontMatter": ["title", "teaser", 3, "title"] }
                                             ^ A key of front matter must be a text between quotation marks.
        =>
        front matter [teaser, title]
        """);
    ProjectTable.check(
        """
        { "frontMatter": [] }
        =>
        front matter []
        """);
    ProjectTable.check(
        """
        { "frontMatter": "title" }
                         ^^^^^^^ "frontMatter" must be a list between [ and ].
        =>
        """);
  }

  @Test
  void rulesForSentenceBordersAreNamedInside() {
    ProjectTable.check(
        """
        { "segmentation": "rules/borders.srx" }
        =>
        segmentation rules/borders.srx
        """);
    ProjectTable.check(
        """
        { "segmentation": "borders.xml" }
                          ^^^^^^^^^^^^^ Rules for sentence borders are in a file that ends in .srx.
        =>
        """);
    ProjectTable.check(
        """
        { "segmentation": ["borders.srx"], "ignore": [] }
                          ^^^^^^^^^^^^^^^ "segmentation" must be a text between quotation marks.
        =>
        """);
    ProjectTable.check(
        """
        { "segmentation": "../borders.srx" }
                          ^^^^^^^^^^^^^^^^ ".." leads out of the folder, or back. Write it as seen from the folder of tallystick.json, such as en/guide.md.
        =>
        """);
  }
}
