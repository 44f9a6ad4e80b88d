package dev.tallystick.aid;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.prose.Format;
import org.junit.jupiter.api.Test;

/** What is put into a translation leaves the syntax of its format whole. */
class StubMarkupTest {
  @Test
  void inHtmlWhatComesIsWholeOrDoesNotCome() {
    String page =
        "<ul>\n<li>Row <b>the boat. Take it.</b> Wait &amp; see.</li>\n<li>Fog.</li>\n</ul>\n";
    assertEquals(
        "<ul>\n<li>Rudern Sie. Take it. Wait &amp; see.</li>\n<li>Nebel.</li>\n</ul>\n",
        Stubbed.in(
            Format.HTML,
            page,
            "<ul>\n<li>Rudern Sie.</li>\n<li>Nebel.</li>\n</ul>\n",
            "0-0 1- 2- 3-1"));
    String inside = "<p>\nRow.\n</p>\n<p>\nWait.\n</p>\n";
    String german = "<p>\nRudern.\n</p>\n";
    assertEquals(german + "<p>\nWait.\n</p>\n", Stubbed.in(Format.HTML, inside, german, "0-0 1-"));
    String line = "<p>Rudern.</p>\n";
    assertEquals(line, Stubbed.in(Format.HTML, "<p>Row.</p><p>Wait.</p>\n", line, "0-0 1-"));
  }

  @Test
  void aCueComesWholeOrNotAtAll() {
    String one = "1\n00:01:00,000 --> 00:01:02,000\n";
    String two = "2\n00:02:00,000 --> 00:02:02,000\n";
    String three = "3\n00:02:03,000 --> 00:02:05,000\n";
    assertEquals(
        one + "Rudern Sie.\n\n" + two + "Take it.\n\n" + three + "Warten Sie.\n",
        Stubbed.in(
            Format.SUBRIP,
            one + "Row.\n\n" + two + "Take it.\n\n" + three + "Wait.\n",
            one + "Rudern Sie.\n\n" + three + "Warten Sie.\n",
            "0-0 1- 2-1"));
    String german = one + "Rudern Sie los.\n\n" + three + "Warten Sie.\n";
    assertEquals(
        german,
        Stubbed.in(
            Format.SUBRIP,
            one + "Row.\n\n" + two + "Take it. Leave\n\n" + three + "it. Wait.\n",
            german,
            "0-0 1- 2- 3-1"));
  }

  @Test
  void frontMatterTakesNothingInAndGivesNothing() {
    String source = "---\ntitle: Lamp\ndescription: It burns.\n---\n\n# Oil\n\nOf whales.\n";
    assertEquals(
        "---\ntitle: Lampe\n---\n\n# Oil\n\nVon Walen.\n",
        Stubbed.in(
            Format.MARKDOWN, source, "---\ntitle: Lampe\n---\n\nVon Walen.\n", "0-0 1- 2- 3-1"));
  }

  @Test
  void inMdxTagsAndExpressionsComeAlong() {
    assertEquals(
        "# Öl\n\nRudern Sie los. Of {kind} <b>whales</b>.\n",
        Stubbed.in(
            Format.MDX,
            "# Oil\n\nRow the boat. Of {kind} <b>whales</b>.\n",
            "# Öl\n\nRudern Sie los.\n",
            "0-0 1-1 2-"));
  }

  @Test
  void inAsciiDocANoteComesWithItsSentenceOnly() {
    String source = "Row on. Wait there.footnote:[In the lee.] Take it.\n";
    assertEquals(
        "Rudern Sie los. Wait there.footnote:[In the lee.] Nehmen Sie es.\n",
        Stubbed.in(Format.ASCIIDOC, source, "Rudern Sie los. Nehmen Sie es.\n", "0-0 1- 2-1 3-"));
    String waits = "Rudern Sie los. Warten Sie. Nehmen Sie es.\n";
    assertEquals(waits, Stubbed.in(Format.ASCIIDOC, source, waits, "0-0 1-1 2-2 3-"));
  }
}
