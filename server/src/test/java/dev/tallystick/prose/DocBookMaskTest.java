package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose in DocBook, character by character. */
class DocBookMaskTest {
  @Test
  void sentencesRunThroughTheirParts() {
    mask(
        """
        <article xmlns="http://docbook.org/ns/docbook" version="5.0"><title>The lamp</title>
        ····································································The lamp········
        <para><emphasis>Always</emphasis> <emphasis role="bold">clean</emphasis> the
        ················Always··········· ······················clean··········· the
          <guilabel>Lens</guilabel> of <application>Orrow</application>.</para>
        ············Lens··········· of ·············Orrow··············.·······
        """);
  }

  @Test
  void whatIsNoProse() {
    mask(
        """
        <article><para>Oil<indexterm><primary>oil</primary></indexterm> the
        ···············Oil············································· the
        <remark>Is that so?</remark>wheel.</para><indexterm><primary>x</primary></indexterm>
        ····························wheel.··················································
        <programlisting>make <emphasis>lamp</emphasis></programlisting>
        ·······························································
        <screen>$ <userinput>ls</userinput></screen><para><filename>a.txt</filename></para>
        ···················································································
        """);
  }

  @Test
  void codeInASentenceIsAPartOfIt() {
    mask(
        """
        <section><para>Open <filename>a.txt</filename> with <command>ls</command>.</para></section>
        ···············Open ··········a.txt··········· with ·········ls··········.·················
        """);
  }

  @Test
  void notesAtTheFoot() {
    mask(
        """
        <section><para>It burns.<footnote><para>All night.</para></footnote> It hums.
        ···············It burns.················All night.·················· It hums.
        A lamp<footnote><para>Of oil.</para></footnote> burns<footnote><para>Well.</para></footnote>.
        A lamp················Of oil.·················· burns················Well.··················.
        Wait<footnote><para>At the end.</para></footnote></para></section>
        Wait················At the end.···································
        """);
  }

  @Test
  void picturesInASentence() {
    mask(
        """
        <article><para>Press<inlinemediaobject><imageobject><imagedata fileref="a.png"/></imageobject>
        ···············Press··········································································
        <textobject><phrase>the bell</phrase></textobject></inlinemediaobject>twice.</para>
        ····················the bell······················<···················twice.·······
        """);
  }

  @Test
  void menusAndKeys() {
    mask(
        """
        <section><para>(<menuchoice><guimenu>File</guimenu><guimenuitem>Open</guimenuitem></menuchoice>,
        ···············(·····················File··········<············Open···························,
        <keycombo><keycap>Ctrl</keycap><keycap>O</keycap></keycombo>)</para></section>
        ··················Ctrl·········<·······O····················)·················
        """);
  }

  @Test
  void attributes() {
    mask(
        """
        <section xreflabel="The lamp"><para>See <link xlink:title="no" xlink:href="b">it</link>.</para>
        ····················The lamp········See ······································it·······.·······
        <para xlink:title="Hint"/></section>
        ···················Hint·············
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.XML, table);
  }
}
