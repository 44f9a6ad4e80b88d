package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose in XML whatever its vocabulary, character by character. */
class XmlMaskTest {
  @Test
  void whereTextStandsTellsWhatIsABlock() {
    mask(
        """
        <?xml version="1.0"?>
        ·····················
        <log lang="en"><entry day="3"><wind>From the west.</wind><who>Mira</who>
        ····································From the west.············Mira······
        <note>The <b>old <i>boat</i></b> leaves.<b/></note></entry></log>
        ······The ···old ···boat········ leaves.·························
        """);
  }

  @Test
  void whatIsNoProse() {
    mask(
        """
        <?xml version="1.0"?><!DOCTYPE log [
        ····································
          <!ENTITY boat "The old > boat"> <!-- no ]> prose -->
        ······················································
          <!ELEMENT log (#PCDATA)> <?no prose?>
        ·······································
        ]>
        ··
        <log title="none">Before<!-- a > comment --> and<?page break > ?> after</log>
        ··················Before···················· and················· after······
        """);
  }

  @Test
  void characterData() {
    mask(
        """
        <log><p>If <![CDATA[a < b & c &amp; d]]> then</p><p><![CDATA[alone]]></p>
        ········If ·········a < b & c &amp; d··· then················alone·······
        <p>a<![CDATA[]]>b<![CDATA[]]]]>c<![CDATA[never closed
        ···a············b·········]]···c·········never closed
        """);
  }

  @Test
  void references() {
    mask(
        """
        <!DOCTYPE p [<!ENTITY copy "our whole copyright"> <!ENTITY nbsp "&#160;">]>
        ···········································································
        <p>R &amp; D, &lt;b> &mdash; 10&nbsp;km, &#228;&#xE4; of &orrow; by &copy; & &copy &;</p>
        ···R &···· D, &···b> &······ 10&·····km, ··2·····x··· of ·orrow· by ·copy· & &copy &;····
        """);
  }

  @Test
  void entitiesAreNamedButNeverExpanded() {
    mask(
        """
        <!DOCTYPE a [<!ENTITY b "ha"><!ENTITY c "&b;&b;&b;"><!ENTITY d SYSTEM "file:///d">]>
        ····················································································
        <a>It says &c; and &d;, &eg; &rarr;.</a>
        ···It says ·c· and ·d·, ·eg· &·····.····
        """);
  }

  @Test
  void brokenMarkup() {
    mask(
        """
        <log><p>One <em</p><p>Two</p>
        ········One ··········Two····
        <p>Three <em>four</p><p>five</em> a < b & c</ p></p>
        ···Three ····four·······five····· a < b & c·········
        </log> tail <p a="never
        ·······tail············
        """);
  }

  @Test
  void xhtmlIsReadAsHtml() {
    mask(
        """
        <html xmlns="http://www.w3.org/1999/xhtml"><p>A <script>no</script><img alt="a lamp"/>.</p>
        ··············································A ·····························a lamp"··.····
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.XML, table);
  }
}
