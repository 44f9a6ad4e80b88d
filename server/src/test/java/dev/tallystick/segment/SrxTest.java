package dev.tallystick.segment;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Sentence borders by the rules of an SRX file. The format and its meaning are from memory. */
class SrxTest {
  private static String file(String header, String rules, String maps) {
    return """
        <?xml version="1.0" encoding="UTF-8"?>
        <srx xmlns="http://www.lisa.org/srx20" version="2.0">
        <header segmentsubflows="yes" %s/>
        <body><languagerules>
        %s
        </languagerules><maprules>
        %s
        </maprules></body></srx>
        """
        .formatted(header, rules, maps);
  }

  private static String rules(String name, String... rules) {
    StringBuilder xml = new StringBuilder("<languagerule languagerulename=\"" + name + "\">\n");
    for (String rule : rules) {
      String[] parts = rule.split(" -- ", -1);
      xml.append("<rule break=\"").append(parts[0]).append("\"><beforebreak>").append(parts[1]);
      xml.append("</beforebreak><afterbreak>").append(parts[2]).append("</afterbreak></rule>\n");
    }
    return xml.append("</languagerule>\n").toString();
  }

  private static String map(String pattern, String name) {
    return "<languagemap languagepattern=\"" + pattern + "\" languagerulename=\"" + name + "\"/>\n";
  }

  private static SrxFile sound(String xml) {
    SrxFile file = SrxFile.of(new Text(xml));
    assertEquals(List.of(), file.problems());
    return file;
  }

  private static List<String> parted(SrxFile file, String language, String prose) {
    Text text = new Text(prose);
    return Segmenter.of(language, file.rules())
        .segments(text, Format.PLAIN.blocks(text), Cancellation.NONE)
        .stream()
        .map(Segment::prose)
        .toList();
  }

  /** The specification's own example, as we remember it: exceptions first, then stops. */
  @Test
  void theExampleOfTheSpecificationFromMemory() {
    SrxFile file =
        sound(
            file(
                "cascade=\"no\"",
                rules(
                    "Default",
                    "no -- ^\\s*[0-9]+\\. -- \\s",
                    "no -- [Ee][Tt][Cc]\\. -- \\s[a-z]",
                    "no -- \\bMr\\. -- \\s",
                    "no -- U\\.K\\. -- \\s",
                    "yes -- [\\.\\?!]+ -- \\s",
                    "yes --  -- \\n"),
                map("[Ee][Nn].*", "Default")));
    assertEquals(
        List.of(
            "The U.K. Prime Minister, Mr. Blair, was seen out with his family today.",
            "Nobody spoke, etc. and so on.",
            "Why?"),
        parted(
            file,
            "en-GB",
            "The U.K. Prime Minister, Mr. Blair, was seen out with his family today."
                + " Nobody spoke, etc. and so on. Why?"));
  }

  @Test
  void theFirstRuleThatTellsOfAPlaceDecides() {
    SrxFile file =
        sound(
            file(
                "",
                rules("A", "yes -- gate\\. -- \\s", "no -- \\w+\\. -- \\s", "yes -- [.!] -- \\s"),
                map("en", "A")));
    assertEquals(
        List.of("The gate.", "The mill. The wall!", "The end."),
        parted(file, "en", "The gate. The mill. The wall! The end."));
  }

  @Test
  void aCascadeTakesTheRulesOfAllPatternsThatFit() {
    String rules = rules("Names", "no -- Mill\\. -- \\s") + rules("Default", "yes -- [.] -- \\s");
    String maps = map("EN", "Names") + map(".*", "Default");
    String prose = "Near Mill. Lane it ends. Then on.";
    assertEquals(
        List.of("Near Mill. Lane it ends.", "Then on."),
        parted(sound(file("cascade=\"yes\"", rules, maps)), "en", prose));
    assertEquals(
        List.of("Near Mill. Lane it ends.", "Then on."),
        parted(sound(file("cascade=\"no\"", rules, maps)), "en", prose));
    assertEquals(
        List.of("Near Mill.", "Lane it ends.", "Then on."),
        parted(sound(file("cascade=\"no\"", rules, maps)), "fr", prose));
  }

  @Test
  void exceptionsAloneMendOurOwnBordersAndOtherLanguagesKeepThem() {
    SrxFile file = sound(file("", rules("A", "no -- Mill\\. -- \\s"), map("en", "A")));
    assertEquals(
        List.of("Ask Dr. Alder near Mill. Lane now.", "Then go."),
        parted(file, "en", "Ask Dr. Alder near Mill. Lane now. Then go."));
    assertEquals(List.of("Near Mill.", "Lane two."), parted(file, "nl", "Near Mill. Lane two."));
  }

  @Test
  void whatIsWrongIsToldAtItsPlaceAndTheRestCounts() {
    String xml =
        file(
            "cascade=\"maybe\"",
            rules("A", "no -- Mill\\.( -- \\s", "no -- (a+a+)+\\1b -- c", "yes -- [.] -- \\s"),
            map("en", "A") + map("de", "B") + map("[", "A"));
    SrxFile file = SrxFile.of(new Text(xml));
    List<String> told = new ArrayList<>();
    for (Problem problem : file.problems()) {
      told.add(problem.span().of(xml) + " " + problem.message().split("[.(]")[0].strip());
    }
    assertEquals(
        List.of(
            "<header segmentsubflows=\"yes\" cascade=\"maybe\"/> cascade must be \"yes\" or \"no\"",
            "Mill\\.( This is no regular expression",
            "<rule break=\"no\"> This rule takes too many steps over some texts",
            "<languagemap languagepattern=\"de\" languagerulename=\"B\"/>"
                + " No <languagerule> above has the name \"B\"",
            "<languagemap languagepattern=\"[\" languagerulename=\"A\"/> \"[\" is no regular"
                + " expression"),
        told);
    assertEquals(List.of("One here.", "Two here."), parted(file, "en", "One here. Two here."));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "no xml",
        "<srx>",
        "<srx><body><languagerules><languagerule languagerulename='A'><rule>",
        "<html/>",
        "<srx><body/></srx>",
        "\uFEFF<srx",
        "<srx>\uD83D\uDE00&x;</srx>",
        "<!DOCTYPE srx [<!ENTITY a \"aaaa\"><!ENTITY b \"&a;&a;&a;\">]><srx>&b;</srx>",
        "<!DOCTYPE srx SYSTEM \"file:///etc/hostname\"><srx></srx>"
      })
  void aFileThatIsNoSrxIsTold(String xml) {
    SrxFile file = SrxFile.of(new Text(xml));
    assertTrue(file.problems().size() > 0, xml);
    for (Problem problem : file.problems()) {
      assertTrue(problem.span().end() <= xml.length(), xml);
    }
    assertEquals(List.of("One here.", "Two here."), parted(file, "en", "One here. Two here."));
  }

  /** A pattern that no probe finds out, over a text that does. */
  @Test
  void aRuleWithoutAnEndIsToldAndTheTextIsPartedWithoutIt() {
    SrxFile file =
        sound(
            file("", rules("A", "yes -- (x+x+)+\\1y -- \\s", "yes -- [.] -- \\s"), map("en", "A")));
    Text text = new Text("One here. " + "x".repeat(400) + " Two. Three here.");
    List<Problem> endless = new ArrayList<>();
    List<Segment> segments =
        Segmenter.of("en", file.rules())
            .segments(
                text,
                Format.PLAIN.blocks(text),
                endless::add,
                KnownSentences.none(),
                Cancellation.NONE);
    assertEquals(3, segments.size());
    assertEquals(1, endless.size());
    assertTrue(endless.get(0).message().contains("too many steps"));
  }

  /** What the file cannot say: which quotation mark closes, and how a number heads a sentence. */
  @ParameterizedTest
  @ValueSource(strings = {"en", "de", "fr", "nl", "cs", "tr", "el", "ru", "ja", "hi", "und"})
  void ourOwnRulesAsAFileAreSoundAndPartAlike(String language) {
    SrxFile file = sound(SrxExport.of(language));
    String prose =
        switch (language) {
          case "en" -> "Ask Dr. Alder, e.g. Tom, at No. 4. Is it shut? \"Stop!\" he said. Then go.";
          case "de" -> "Fragen Sie Prof. Weiss am 3. Mai, z. B. Nr. 4. Dann ist Ruhe. Ist es zu?";
          case "fr" -> "M. Martin voit la fig. 4. Le tour est fini ! Il part.";
          case "nl" -> "Vraag dhr. Jansen, zie fig. 3. Dan verder.";
          case "cs" -> "Ptejte se Ing. Nováka. Viz obr. 3. Pak dál.";
          case "tr" -> "Dr. Yılmaz biliyor. Anahtar onda.";
          case "el" -> "Ο κ. Παππάς ήρθε. Μετά έφυγε.";
          case "ru" -> "Проф. Орлова пришла. Потом ушла.";
          case "ja" -> "水車は川にあります。朝に回ります！見に来てください。";
          case "hi" -> "चक्की नदी पर है। वह सुबह चलती है।";
          default -> "One is here. Two is there! U.S. ships came.";
        };
    assertEquals(Sentences.of(language, prose), parted(file, language, prose));
    assertTrue(Sentences.of(language, prose).size() > 1);
  }

  /** A law: a file with anything in it is read, what is wrong lies in it, and texts are parted. */
  @Test
  void anyFileIsRead() {
    String sound =
        file(
            "cascade=\"yes\"",
            rules("A", "no -- Mill\\. -- \\s", "yes -- [.!]+ -- \\s") + rules("B", "yes -- x -- y"),
            map("en.*", "A") + map(".*", "B"));
    List<String> scraps =
        List.of(
            "<", ">", "&", "</rule>", "<rule>", "(", "[", "*", "\"", "\uD83D", "\r", "\u0000",
            "<!--");
    Random random = new Random(5);
    for (int i = 0; i < 2_000; i++) {
      StringBuilder xml = new StringBuilder(sound);
      for (int k = 1 + random.nextInt(3); k > 0; k--) {
        int at = random.nextInt(xml.length());
        int end = Math.min(xml.length(), at + random.nextInt(20));
        xml.replace(at, end, scraps.get(random.nextInt(scraps.size())));
      }
      SrxFile file = SrxFile.of(new Text(xml.toString()));
      for (Problem problem : file.problems()) {
        assertTrue(problem.span().end() <= xml.length(), xml::toString);
      }
      assertTrue(parted(file, "en", "One is here. Two is there.").size() > 0, xml::toString);
    }
  }

  @Test
  void patternsNestedTooDeepAreTold() {
    String deep = "(".repeat(20_000) + "a" + ")".repeat(20_000);
    SrxFile file =
        SrxFile.of(new Text(file("", rules("A", "yes -- " + deep + " -- "), map(deep, "A"))));
    assertEquals(2, file.problems().size());
  }
}
