package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/**
 * What documents say by the Internationalization Tag Set 2.0 of the W3C. The examples are our own;
 * each names the section of the recommendation that it is about.
 */
class ItsTest {
  private static final String ITS = " xmlns:its='http://www.w3.org/2005/11/its'";

  /** 8.1, Translate, local selection; 5.4: it holds for what is inside. */
  @Test
  void translateLocally() {
    blocks(
        "<log"
            + ITS
            + "><p its:translate='no'>Orrow <b>5</b></p><p>A <b its:translate='no'>B</b>.</p>"
            + "<s its:translate='no'><p>Off</p><p its:translate='yes'>On</p></s>"
            + "<p><its:span translate='no'>Orrow 6</its:span></p></log>",
        """
        VERBATIM
        PARAGRAPH: A B.
        VERBATIM
        PARAGRAPH: On
        VERBATIM
        """);
  }

  /** 8.1, Translate, global rules; 5.5: the last rule wins, and a tag beats all rules. */
  @Test
  void translateByRules() {
    blocks(
        "<log"
            + ITS
            + "><its:rules version='2.0'>"
            + "<its:translateRule selector='//code' translate='no'/>"
            + "<its:translateRule selector='/log/code[@say=\"yes\"]' translate='yes'/>"
            + "<its:locNoteRule selector='//p' locNoteType='alert'>"
            + "<its:locNote>No prose</its:locNote></its:locNoteRule></its:rules>"
            + "<code>one</code><code say='yes'>two</code><p><code say='yes'>three</code></p>"
            + "<code its:translate='yes'>four</code></log>",
        """
        VERBATIM
        PARAGRAPH: two
        VERBATIM
        PARAGRAPH: four
        """);
  }

  /** 8.1: attributes are translated only if a rule selects them. */
  @Test
  void translateAttributes() {
    blocks(
        "<log"
            + ITS
            + "><its:rules version='2.0'>"
            + "<its:translateRule selector='//p/@tip | //@alt' translate='yes'/></its:rules>"
            + "<p tip='A tip' say='no'/><q tip='none'/><q alt='A lamp'/></log>",
        """
        PARAGRAPH: A tip
        PARAGRAPH: A lamp
        """);
  }

  /** 8.7, Elements Within Text, global rules: without one an element is a block. */
  @Test
  void withinTextByRules() {
    blocks(
        "<log"
            + ITS
            + "><its:rules version='2.0'>"
            + "<its:withinTextRule selector='//b | //i' withinText='yes'/>"
            + "<its:withinTextRule selector='//fn' withinText='nested'/></its:rules>"
            + "<p><b>One</b> <i>two</i> three.<fn>Aside.</fn> Four <fn>no</fn> five.</p>"
            + "<p>Six <u>seven</u> eight</p></log>",
        """
        PARAGRAPH: One two three. Four five.
        NOTE: Aside.
        NOTE: no
        PARAGRAPH: Six
        PARAGRAPH: seven
        PARAGRAPH: eight
        """);
  }

  /** 8.7, local selection. */
  @Test
  void withinTextLocally() {
    blocks(
        "<log"
            + ITS
            + "><p>One <b its:withinText='no'>two</b> three <i its:withinText='yes'>four</i>"
            + ".<n its:withinText='nested'>Aside.</n></p></log>",
        """
        PARAGRAPH: One
        PARAGRAPH: two
        PARAGRAPH: three four.
        NOTE: Aside.
        """);
  }

  /** 5.3.2: selectors are XPath; a prefix has the namespace that it has at the rule. */
  @Test
  void selectors() {
    selects("//p", "<p>", true);
    selects("/log/p", "<p>", true);
    selects("/p", "<p>", false);
    selects("/log//p", "<p>", true);
    selects("/*/*", "<p>", true);
    selects("//log/descendant::p", "<p>", true);
    selects("/child::log/child::p", "<p>", true);
    selects("//p[@a]", "<p>", false);
    selects("//p[not(@a)]", "<p>", true);
    selects("//p[@a and @b != 'x']", "<p a='' b='y'>", true);
    selects("//p[@a or (@b and not(@c='x'))]", "<p b='' c='y'>", true);
    selects("//*[local-name() = 'p'][self::p]", "<p>", true);
    selects("//h:p", "<h:p xmlns:h='urn:h'>", true);
    selects("//h:*", "<k:p xmlns:k='urn:h'>", true);
    selects("//p", "<p xmlns='urn:h'>", false);
    selects("//q | //p", "<p>", true);
  }

  /** What is beyond the part of XPath that is read selects nothing. */
  @Test
  void otherSelectors() {
    for (String selector :
        new String[] {
          "",
          "p",
          "//p[1]",
          "//p[",
          "//p]",
          "//p/..",
          "id('p')",
          "//x:p",
          "//p[@a='x]",
          "//p[@x:a]",
          "//ancestor::p",
          "//p//",
          "//p | ",
          "//text()",
          "//p[" + "(".repeat(900),
          "/@",
          "|"
        }) {
      selects(selector, "<p>", false);
    }
  }

  /** 5.2.1: rules in known vocabularies count as well, and beat what we know of them. */
  @Test
  void rulesInDocBook() {
    blocks(
        "<article><info>"
            + rules(
                "<its:translateRule selector='//emphasis' translate='no'/>"
                    + "<its:withinTextRule selector='//member' withinText='yes'/>")
            + "</info><para><emphasis>Orrow</emphasis></para>"
            + "<simplelist><member>One</member> <member>two</member></simplelist></article>",
        """
        VERBATIM
        PARAGRAPH: One two
        """);
  }

  /** 5.4: rules elsewhere are not read, and those of another query language do not count. */
  @Test
  void rulesThatAreNotRead() {
    blocks(
        "<log><its:rules"
            + ITS
            + " version='2.0' xmlns:xlink='http://www.w3.org/1999/xlink'"
            + " xlink:href='file:///rules.xml'/>"
            + "<its:rules"
            + ITS
            + " version='2.0' queryLanguage='css'>"
            + "<its:translateRule selector='//p' translate='no'/></its:rules><p>One</p></log>",
        "PARAGRAPH: One\n");
  }

  private static String rules(String rules) {
    return "<its:rules" + ITS + " version='2.0'>" + rules + "</its:rules>";
  }

  private static void selects(String selector, String tag, boolean expected) {
    String rule = "<its:translateRule selector=\"" + selector + "\" translate='no'/>";
    String name = tag.substring(1).split("[ >]")[0];
    String source = "<log xmlns:h='urn:h'>" + rules(rule) + tag + "x</" + name + "></log>";
    assertEquals(
        expected ? "VERBATIM\n" : "PARAGRAPH: x\n",
        Extraction.blocks(Format.XML, source),
        selector);
  }

  private static void blocks(String source, String expected) {
    assertEquals(expected, Extraction.blocks(Format.XML, source));
  }
}
