package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** Which blocks there are in DocBook, and of what kind. */
class DocBookBlocksTest {
  @Test
  void headingsHaveTheLevelOfTheirSection() {
    blocks(
        """
        <!DOCTYPE book PUBLIC "-//OASIS//DTD DocBook XML V4.5//EN" "docbookx.dtd">
        <book><bookinfo><title>Orrow</title><author><firstname>Mira</firstname>
        <surname>Holm</surname></author><pubdate>1999</pubdate></bookinfo>
        <chapter><title>Lamp</title><sect1><title>Oil</title><para>Fill it.</para>
        <figure><title>The can</title><mediaobject><imageobject/><textobject><phrase>A can</phrase>
        </textobject><caption><para>Seen from above</para></caption></mediaobject></figure>
        <bridgehead>Later</bridgehead><refsect1><info><title>Deep</title></info></refsect1>
        </sect1></chapter></book>
        """,
        """
        HEADING 1: Orrow
        VERBATIM
        VERBATIM
        VERBATIM
        HEADING 2: Lamp
        HEADING 3: Oil
        PARAGRAPH: Fill it.
        PARAGRAPH: The can
        PARAGRAPH: A can
        PARAGRAPH: Seen from above
        HEADING 4: Later
        HEADING 4: Deep
        """);
  }

  @Test
  void listsCellsAndQuotations() {
    blocks(
        """
        <chapter><itemizedlist><listitem><para>one</para><orderedlist><listitem><simpara>two</simpara>
        </listitem></orderedlist></listitem></itemizedlist><variablelist><varlistentry>
        <term><option>-l</option> lights</term><listitem><para>Light it.</para></listitem>
        </varlistentry></variablelist><simplelist><member>three</member></simplelist>
        <table><title>Oil</title><tgroup><tbody><row><entry>Day</entry><entry><para>1 can</para>
        </entry></row></tbody></tgroup></table><warning><title>Heat</title><para>Wait.</para>
        </warning><blockquote><attribution>Holm</attribution><para>Now.</para></blockquote>
        <glosslist><glossentry><glossterm>Wick</glossterm><glossdef><para>It burns.</para></glossdef>
        </glossentry></glosslist><procedure><step><para>Stop.</para></step></procedure></chapter>
        """,
        """
        ITEM 1: one
        ITEM 2: two
        ITEM 1: -l lights
        ITEM 1: Light it.
        ITEM 1: three
        PARAGRAPH: Oil
        CELL: Day
        CELL: 1 can
        PARAGRAPH: Heat
        PARAGRAPH: Wait.
        QUOTATION 1: Holm
        QUOTATION 1: Now.
        PARAGRAPH: Wick
        PARAGRAPH: It burns.
        ITEM 1: Stop.
        """);
  }

  @Test
  void landmarks() {
    blocks(
        """
        <refentry xmlns:its="http://www.w3.org/2005/11/its"><refnamediv><refname>lamp</refname>
        <refpurpose>lights it</refpurpose></refnamediv><refsynopsisdiv><title>Use</title>
        <cmdsynopsis><command>lamp</command><arg>-l</arg></cmdsynopsis></refsynopsisdiv>
        &intro; <para>&product;</para><para>&product; shines.</para>
        <para translate="no">Orrow 5</para><para its:translate="no">Orrow 6</para>
        <para><ulink url="https://orrow.invalid/">https://orrow.invalid/</ulink></para>
        <title>Not &lt;b> this</title></refentry>
        """,
        """
        VERBATIM
        PARAGRAPH: lights it
        HEADING 2: Use
        VERBATIM
        VERBATIM
        VERBATIM
        PARAGRAPH: product shines.
        VERBATIM
        VERBATIM
        VERBATIM
        HEADING 1: Not &b> this
        """);
  }

  @Test
  void aBlockReachesFromTagToTag() {
    Extraction.assertExtents(
        Format.XML,
        "<article><title>Lamp</title><para>\n It <emphasis>is</emphasis> lit.\n</para>"
            + "<para>On<footnote><para>Off.</para></footnote> is on.</para></article>",
        """
        <title>Lamp</title>
        <para>⏎ It <emphasis>is</emphasis> lit.⏎</para>
        <para>On<footnote><para>Off.</para></footnote> is on.</para>
        <para>Off.</para>
        """);
  }

  @Test
  void aNoteComesBehindItsBlock() {
    blocks(
        """
        <article><para>One<footnote><para>Two.</para><para>Three.</para></footnote> goes<footnote>
        <para>Four <footnote><para>never</para></footnote></para><screen>no</screen></footnote>.
        <itemizedlist><listitem><para><footnote><para>Five.</para></footnote>Six.</para></listitem>
        </itemizedlist></para></article>
        """,
        """
        PARAGRAPH: One goes.
        NOTE: Two.
        NOTE: Three.
        NOTE: Four
        NOTE: Five.
        ITEM 1: Six.
        """);
  }

  private static void blocks(String source, String expected) {
    Extraction.assertBlocks(Format.XML, source, expected);
  }
}
