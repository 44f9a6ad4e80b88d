package dev.tallystick.aid;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.prose.Format;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Where stubs go, and what comes with them. */
class StubTest {
  private static void markdown(String source, String target, String matches, String expected) {
    assertEquals(expected, Stubbed.in(Format.MARKDOWN, source, target, matches));
  }

  private static void plain(String source, String target, String matches, String expected) {
    assertEquals(expected, Stubbed.in(Format.PLAIN, source, target, matches));
  }

  @Test
  void aSentenceGoesBehindTheOneBefore() {
    markdown(
        "Row away now. Drop the anchor. Wait for us.\n",
        "Rudern Sie hinaus. Warten Sie dort.\n",
        "0-0 1- 2-1",
        "Rudern Sie hinaus. Drop the anchor. Warten Sie dort.\n");
  }

  @Test
  void theFirstOfAParagraphGoesBeforeTheNext() {
    markdown(
        "- Row away now. *Drop* the anchor.\n- Wait for us.\n",
        "- Den *Anker* werfen.\n- Warten Sie dort.\n",
        "0- 1-0 2-1",
        "- Row away now. Den *Anker* werfen.\n- Warten Sie dort.\n");
  }

  @Test
  void behindTheLastLineWithoutALineEndThereIsNone() {
    markdown(
        "Row the boat. Take a rest.\n",
        "Rudern Sie los.",
        "0-0 1-",
        "Rudern Sie los. Take a rest.");
    markdown(
        "Row the boat.\n\nTake a rest.\n",
        "Rudern Sie los.",
        "0-0 1-",
        "Rudern Sie los.\n\nTake a rest.");
  }

  @Test
  void aRunGoesPartlyIntoWhatIsThereAndPartlyBetween() {
    markdown(
        "This is one. This is two.\n\nThis is three.\n\n## Four\n\nThis is five. This is six.\n",
        "Das ist eins.\n\nDas ist sechs.\n",
        "0-0 1- 2- 3- 4- 5-1",
        "Das ist eins. This is two.\n\nThis is three.\n\n## Four\n\nThis is five. Das ist sechs.\n");
  }

  @Test
  void whatTheTranslationHasPutTogetherStaysTogether() {
    markdown(
        "This is one.\n\nThis is two.\n\nThis is three.\n",
        "Das ist eins. Das ist drei.\n",
        "0-0 1- 2-1",
        "Das ist eins. This is two. Das ist drei.\n");
  }

  @Test
  void anItemComesWithItsMarkAndIndent() {
    markdown(
        "Gear:\n\n- Oars\n  - of ash\n  - of oak\n- Rope\n\nAll is done.\n",
        "Zeug:\n\n- Riemen\n  - aus Eiche\n- Tau\n\nAlles ist fertig.\n",
        "0-0 1-1 2- 3-2 4-3 5-4",
        "Zeug:\n\n- Riemen\n  - of ash\n  - aus Eiche\n- Tau\n\nAlles ist fertig.\n");
  }

  @Test
  void aTightListStaysTightAndALooseOneLoose() {
    markdown(
        "1. Oars\n2. Rope\n3. Bell\n\nAll is done.\n",
        "1. Riemen\n2. Tau\n\nAlles ist fertig.\n",
        "0-0 1-1 2- 3-2",
        "1. Riemen\n2. Tau\n3. Bell\n\nAlles ist fertig.\n");
    markdown(
        "1. Oars\n\n2. Rope\n\n3. Bell\n",
        "1. Riemen\n\n3. Glocke\n",
        "0-0 1- 2-1",
        "1. Riemen\n\n2. Rope\n\n3. Glocke\n");
  }

  @Test
  void aParagraphInAnItemStaysInIt() {
    markdown(
        "- Oars\n\n  Two of them.\n\n- Rope\n",
        "- Riemen\n\n- Tau\n",
        "0-0 1- 2-1",
        "- Riemen\n\n  Two of them.\n\n- Tau\n");
  }

  @Test
  void aQuotationStaysOne() {
    markdown(
        "> Row the boat.\n>\n> Take a rest.\n>\n> Go to sleep.\n",
        "> Rudern Sie los.\n>\n> Legen Sie sich hin.\n",
        "0-0 1- 2-1",
        "> Rudern Sie los.\n>\n> Take a rest.\n>\n> Legen Sie sich hin.\n");
  }

  @Test
  void aHeadingIsPartedFromWhatFollows() {
    markdown(
        "Row the boat.\n\n# Night\n\nGo to sleep.\n",
        "Rudern Sie los.\n\nLegen Sie sich hin.\n",
        "0-0 1- 2-1",
        "Rudern Sie los.\n\n# Night\n\nLegen Sie sich hin.\n");
    markdown(
        "# Day\n\nRow the boat.\n\nTake a rest.\n",
        "# Tag\nRasten Sie dort.\n",
        "0-0 1- 2-1",
        "# Tag\n\nRow the boat.\n\nRasten Sie dort.\n");
  }

  @Test
  void aRowGoesIntoItsTableBehindTheHead() {
    markdown(
        "| Port | Depth |\n|---|---|\n| Velm | four |\n| Orr | three |\n\nAll is done.\n",
        "| Hafen | Tiefe |\n|---|---|\n| Orr | drei |\n\nAlles ist fertig.\n",
        "0-0 1-1 2- 3- 4-2 5-3 6-4",
        "| Hafen | Tiefe |\n|---|---|\n| Velm | four |\n| Orr | drei |\n\nAlles ist fertig.\n");
  }

  @Test
  void aWholeTableComesWithItsHead() {
    markdown(
        "Ports:\n\n| Port |\n|---|\n| Velm |\n\nAll is done.\n",
        "Häfen:\n\nAlles ist fertig.\n",
        "0-0 1- 2- 3-1",
        "Häfen:\n\n| Port |\n|---|\n| Velm |\n\nAlles ist fertig.\n");
  }

  @Test
  void aParagraphBehindATableIsNotPutIntoIt() {
    markdown(
        "| Port |\n|---|\n| Velm |\n\nMind the reef.\n\nAll is done.\n",
        "| Hafen |\n|---|\n| Velm |\n\nAlles ist fertig.\n",
        "0-0 1-1 2- 3-2",
        "| Hafen |\n|---|\n| Velm |\n\nMind the reef.\n\nAlles ist fertig.\n");
  }

  @Test
  void aCellOfARowThatIsThereAndTheHeadOfATableAreLeftAlone() {
    String table = "| Hafen | |\n|---|---|\n| Orr | drei |\n";
    markdown("| Port | Depth |\n|---|---|\n| Orr | three |\n", table, "0-0 1- 2-1 3-2", table);
    markdown("| Port |\n|---|\n| Orr |\n", "| Orr |\n|---|\n", "0- 1-0", "| Orr |\n|---|\n");
  }

  @Test
  void aSentenceOfACellStaysInIt() {
    markdown(
        "|A|\n|---|\n|Row the boat. Take a rest.|\n",
        "|A|\n|---|\n|Rudern Sie los.|\n",
        "0-0 1-1 2-",
        "|A|\n|---|\n|Rudern Sie los. Take a rest. |\n");
  }

  @Test
  void codeThatIsMissingTooComesAlong() {
    markdown(
        "Row the boat.\n\nType this:\n\n```\nrow --slow\n```\n\nAll is done.\n",
        "Rudern Sie los.\n\nAlles ist fertig.\n",
        "0-0 1- 2- 3-1",
        "Rudern Sie los.\n\nType this:\n\n```\nrow --slow\n```\n\nAlles ist fertig.\n");
  }

  @Test
  void aSentenceALineStaysOne() {
    markdown(
        "> Row the boat.\n> Take a rest.\n> Go to sleep.\n",
        "> Rudern Sie los.\n> Legen Sie sich hin.\n",
        "0-0 1- 2-1",
        "> Rudern Sie los.\n> Take a rest.\n> Legen Sie sich hin.\n");
    markdown(
        "- Row the boat.\n  Take a rest.\n- Eat the fish.\n",
        "- Rasten Sie dort.\n- Essen Sie Fisch.\n",
        "0- 1-0 2-1",
        "- Row the boat.\n  Rasten Sie dort.\n- Essen Sie Fisch.\n");
  }

  @Test
  void marksComeAlongIfTheyAreWhole() {
    markdown(
        "Row the boat. **Mind** the [reef](reef.md). Take a rest.\n",
        "Rudern Sie los. Rasten Sie dort.\n",
        "0-0 1- 2-1",
        "Rudern Sie los. **Mind** the [reef](reef.md). Rasten Sie dort.\n");
    markdown(
        "**Row the boat. Mind the reef. Take a rest.**\n",
        "**Rudern Sie los. Rasten Sie dort.**\n",
        "0-0 1- 2-1",
        "**Rudern Sie los. Mind the reef. Rasten Sie dort.**\n");
    markdown(
        "Row the boat. **Mind the reef. Take a rest.** Go on then.\n",
        "Rudern Sie los. **Rasten Sie dort.** Nun geht es los.\n",
        "0-0 1- 2-1 3-2",
        "Rudern Sie los. Mind the reef. **Rasten Sie dort.** Nun geht es los.\n");
  }

  @Test
  void whatIsNoMarkDoesNotBecomeOne() {
    markdown(
        "Row the boat. Type \\*slow\\* twice. Take a rest.\n",
        "Rudern Sie los. Rasten Sie dort.\n",
        "0-0 1- 2-1",
        "Rudern Sie los. Type \\*slow\\* twice. Rasten Sie dort.\n");
    markdown(
        "Row the boat.\n_Go on then. Type \\*slow\\* twice._\nTake a rest.\n",
        "Rudern Sie los.\nRasten Sie dort.\n",
        "0-0 1- 2- 3-1",
        "Rudern Sie los.\nGo on then.\nType \\*slow\\* twice.\nRasten Sie dort.\n");
  }

  @Test
  void aFootnoteMarkBehindTheSentenceStaysThere() {
    markdown(
        "Row the boat.[^1] Take a rest. Go to sleep.\n\n[^1]: Very slowly.\n",
        "Rudern Sie los.[^1] Legen Sie sich hin.\n\n[^1]: Sehr langsam.\n",
        "0-0 1- 2-1 3-2",
        "Rudern Sie los.[^1] Take a rest. Legen Sie sich hin.\n\n[^1]: Sehr langsam.\n");
  }

  @Test
  void anEmptyTranslationBeginsWithIt() {
    markdown("# Day\n\nRow the boat.\n", "", "0- 1-", "# Day\n\nRow the boat.\n");
    markdown(
        "# Day\r\n\r\nRow the boat.\r\n",
        "\uFEFF",
        "0- 1-",
        "\uFEFF# Day\r\n\r\nRow the boat.\r\n");
    markdown(
        "---\ntitle: x\n---\n\nRow the boat.\n",
        "---\ntitle: x\n---\n",
        "0-0 1-",
        "---\ntitle: x\n---\n\nRow the boat.\n");
  }

  @Test
  void whatComesFirstGoesBeforeAll() {
    markdown(
        "# Day\n\nRow the boat.\n\nTake a rest.\n",
        "Rasten Sie dort.\n",
        "0- 1- 2-0",
        "# Day\n\nRow the boat.\n\nRasten Sie dort.\n");
    markdown(
        "Row the boat.\n\nTake a rest.\n",
        "\uFEFFRasten Sie dort.\n",
        "0- 1-0",
        "\uFEFFRow the boat.\n\nRasten Sie dort.\n");
    markdown(
        "\uFEFFRow the boat.\n\nTake a rest.\n",
        "\n\nRasten Sie dort.\n",
        "0- 1-0",
        "\n\nRow the boat.\n\nRasten Sie dort.\n");
  }

  @Test
  void linesEndAsTheTranslationHasThem() {
    markdown(
        "Row the boat.\n\nMind\nthe reef.\n\nTake a rest.\n",
        "Rudern Sie los.\r\n\r\nRasten Sie dort.\r\n",
        "0-0 1- 2-1",
        "Rudern Sie los.\r\n\r\nMind\r\nthe reef.\r\n\r\nRasten Sie dort.\r\n");
  }

  @Test
  void aSentenceOfAParagraphThatNobodyHasGotToBecomesOne() {
    assertEquals(
        "- Rudern Sie los.\n- Take a rest.\n",
        Stubbed.apply(
            "- Rudern Sie los.\n",
            Stub.edits(
                Stubbed.pair(
                    Format.MARKDOWN,
                    "- Row the boat.\n- Take a rest. Go to sleep.\n",
                    "- Rudern Sie los.\n",
                    "0-0 1- 2-"),
                Format.MARKDOWN,
                List.of(1))));
  }

  @Test
  void wherePlainTextHasNoBlankLinesNoneCome() {
    plain(
        "Row the boat.\nTake a rest.\nGo to sleep.\n",
        "Rudern Sie los.\nLegen Sie sich hin.\n",
        "0-0 1- 2-1",
        "Rudern Sie los.\nTake a rest.\nLegen Sie sich hin.\n");
    plain(
        "Row the boat.\nTake a rest.\nGo to sleep.\n",
        "Rudern Sie los.\n\nLegen Sie sich hin.\n",
        "0-0 1- 2-1",
        "Rudern Sie los.\n\nTake a rest.\n\nLegen Sie sich hin.\n");
  }

  @Test
  void betweenLettersThatTakeNoBlanksThereAreNone() {
    markdown("船を漕ぎます。船を休めます。船で寝ます。\n", "我们划船。我们睡觉。\n", "0-0 1- 2-1", "我们划船。船を休めます。我们睡觉。\n");
    markdown(
        "Row the boat. Take a rest. Go to sleep.\n",
        "我们划船。我们睡觉。\n",
        "0-0 1- 2-1",
        "我们划船。 Take a rest. 我们睡觉。\n");
  }

  @Test
  void edgesLieBetweenCharactersNotInside() {
    markdown(
        "🛶 Row the boat 🛶. 🔔 Take a rest 🔔. Go to sleep.\n",
        "🛶 Rudern Sie los 🛶. Legen Sie sich hin.\n",
        "0-0 1- 2-1",
        "🛶 Rudern Sie los 🛶. 🔔 Take a rest 🔔. Legen Sie sich hin.\n");
  }

  @Test
  void onlyTheLinesThatChangeAreReplaced() {
    List<LineEdit> edits =
        Stub.edits(
            Stubbed.pair(
                Format.MARKDOWN,
                "Go on then.\n\nRow the boat. Take a rest.\n\nGo to sleep.\n",
                "Nun geht es los.\n\nRudern Sie los.\n\nLegen Sie sich hin.\n",
                "0-0 1-1 2- 3-2"),
            Format.MARKDOWN,
            List.of(2));
    assertEquals(List.of(new LineEdit(2, 3, "Rudern Sie los. Take a rest.\n")), edits);
  }

  @Test
  void aPageGetsTheParagraphWithItsTags() {
    assertEquals(
        """
        <h1>Fähre</h1>
        <p>
          Sie legt ab.
        </p>
        <p>
          The <b>bell</b> rings.
        </p>
        <p>Niemand schwimmt.</p>
        """,
        Stubbed.in(
            Format.HTML,
            """
            <h1>Ferry</h1>
            <p>
              It leaves.
            </p>
            <p>
              The <b>bell</b> rings.
            </p>
            <p>Nobody swims.</p>
            """,
            """
            <h1>Fähre</h1>
            <p>
              Sie legt ab.
            </p>
            <p>Niemand schwimmt.</p>
            """,
            "0-0 1-1 2- 3-2"));
  }

  @Test
  void aSentenceGoesIntoItsParagraphOfAPageWithItsMarks() {
    assertEquals(
        "<p>Sie legt ab. The <b>bell</b>&nbsp;rings. Niemand schwimmt.</p>\n",
        Stubbed.in(
            Format.HTML,
            "<p>It leaves. The <b>bell</b>&nbsp;rings. Nobody swims.</p>\n",
            "<p>Sie legt ab. Niemand schwimmt.</p>\n",
            "0-0 1- 2-1"));
  }

  @Test
  void aSubtitleComesWithItsTimes() {
    String times = "00:00:01,000 --> 00:00:02,000\n";
    String later = "00:00:03,000 --> 00:00:04,000\n";
    String last = "00:00:05,000 --> 00:00:06,000\n";
    assertEquals(
        "1\n"
            + times
            + "Rudern Sie los.\n\n2\n"
            + later
            + "Take a rest.\n\n"
            + "2\n"
            + last
            + "Warten Sie dort.\n",
        Stubbed.in(
            Format.SUBRIP,
            "1\n"
                + times
                + "Row the boat.\n\n2\n"
                + later
                + "Take a rest.\n\n"
                + "3\n"
                + last
                + "Wait for us.\n",
            "1\n" + times + "Rudern Sie los.\n\n2\n" + last + "Warten Sie dort.\n",
            "0-0 1- 2-1"));
  }

  @Test
  void whatASecondSpeakerSaysComesWithItsDash() {
    String times = "00:01.000 --> 00:02.000\n";
    assertEquals(
        "WEBVTT\n\n" + times + "- Wer ist da?\n- It is me.\n",
        Stubbed.in(
            Format.WEBVTT,
            "WEBVTT\n\n" + times + "- Who is there?\n- It is me.\n",
            "WEBVTT\n\n" + times + "- Wer ist da?\n",
            "0-0 1-"));
  }

  @Test
  void inAsciiDocABlockComesWithItsMarks() {
    assertEquals(
        "== Zeug\n\nRudern Sie *los*. Take a *rest*.\n\n* Riemen\n** of ash\n* Tau\n",
        Stubbed.in(
            Format.ASCIIDOC,
            "== Gear\n\nRow the *boat*. Take a *rest*.\n\n* Oars\n** of ash\n* Rope\n",
            "== Zeug\n\nRudern Sie *los*.\n\n* Riemen\n* Tau\n",
            "0-0 1-1 2- 3-2 4- 5-3"));
  }

  @Test
  void inLatexABlockComesWithItsMarksAndASentenceWithItsNote() {
    assertEquals(
        "\\section{Zeug}\n\nRudern Sie los. Take a \\emph{rest}\\footnote{Or not.} at 5\\%.\n\n"
            + "Nehmen Sie alles mit.\n\n\\item Tau\n\\item Oars\n",
        Stubbed.in(
            Format.LATEX,
            "\\section{Gear}\n\nRow the boat. Take a \\emph{rest}\\footnote{Or not.} at 5\\%.\n\n"
                + "Take all of it along.\n\n\\item Rope\n\\item Oars\n",
            "\\section{Zeug}\n\nRudern Sie los.\n\nNehmen Sie alles mit.\n\n\\item Tau\n",
            "0-0 1-1 2- 3- 4-2 5-3 6-"));
  }

  @Test
  void inLatexABlockGoesBehindTheTextThatANoteStandsIn() {
    assertEquals(
        "Weit\\footnote{Sehr weit.} draußen.\nNoch weiter.\n\nCome back now.\n\nSchluss.\n",
        Stubbed.in(
            Format.LATEX,
            "Far\\footnote{Very far.} out.\nFarther.\n\nCome back now.\n\nThe end.\n",
            "Weit\\footnote{Sehr weit.} draußen.\nNoch weiter.\n\nSchluss.\n",
            "0-0 1-1 2-2 3- 4-3"));
  }

  @Test
  void inLatexHalfOfAPairOfBracesIsLeftOut() {
    assertEquals(
        "Ja gewiss. Stop here at 5\\%! Go. Rudern Sie los.\n",
        Stubbed.in(
            Format.LATEX,
            "Yes indeed. \\textbf{Stop {\\em here} at 5\\%!} Go. Row the boat.\n",
            "Ja gewiss. Rudern Sie los.\n",
            "0-0 1- 2-1"));
  }

  @Test
  void inRestructuredTextABlockComesWithItsMarks() {
    assertEquals(
        "Zeug\n----\n\nRudern Sie *los*. Take a *rest*.\n\n- Riemen\n\n  - of ash\n\n- Tau\n",
        Stubbed.in(
            Format.RST,
            "Gear\n----\n\nRow the *boat*. Take a *rest*.\n\n- Oars\n\n  - of ash\n\n- Rope\n",
            "Zeug\n----\n\nRudern Sie *los*.\n\n- Riemen\n\n- Tau\n",
            "0-0 1-1 2- 3-2 4- 5-3"));
  }
}
