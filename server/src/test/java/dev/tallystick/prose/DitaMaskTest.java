package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** What is prose in DITA. */
class DitaMaskTest {
  @Test
  void aTask() {
    mask(
        """
        <task id="t"><title>Light the <ph>lamp</ph></title><shortdesc>In the evening.</shortdesc>
        ····················Light the ····lamp························In the evening.············
        <taskbody><steps><step><cmd>Press <uicontrol>On</uicontrol>.</cmd><info>It <b>hums</b>.</info>
        ····························Press ···········On············.············It ···hums····.·······
        </step></steps><result>It burns<indexterm>light</indexterm>.</result></taskbody></task>
        ·······················It burns····························.···························
        """);
  }

  @Test
  void whatIsNoProse() {
    mask(
        """
        <topic id="t"><body><p>Run <codeph>ls</codeph>.<draft-comment>Why?</draft-comment></p>
        ·······················Run ········ls·········.·······································
        <codeblock>ls -l</codeblock><p translate="no">Orrow 5</p><msgblock>Lost</msgblock>
        ··················································································
        <p>See<image href="a.png"><alt>the lamp</alt></image>here.<fn>A note.</fn></p></body></topic>
        ···See<························the lamp······<·······here.····A note.························
        """);
  }

  @Test
  void aMap() {
    mask(
        """
        <map title="Handbook"><topicref href="a.dita" navtitle="The lamp"><topicmeta><linktext>Go
        ············Handbook····································The lamp·······················Go
        on</linktext></topicmeta></topicref><topichead><topicmeta><navtitle>Oil</navtitle></topicmeta>
        on··································································Oil·······················
        </topichead></map>
        ··················
        """);
  }

  /** DITA 1.3, 2.5.3: the attribute class tells what an element is a specialization of. */
  @Test
  void specializedElements() {
    assertEquals(
        "HEADING 1: Lamp\nITEM 1: Light it.\nVERBATIM\nPARAGRAPH: It is lit.\n",
        Extraction.blocks(
            Format.XML,
            """
            <chore class="- topic/topic chore/chore "><name class="- topic/title chore/name ">Lamp</name>
            <do class="- topic/body chore/do "><act class="- topic/li chore/act ">Light it.</act>
            <run class="+ topic/pre pr-d/codeblock x/run ">ls</run>
            <say class="- topic/p chore/say ">It <x class="+ topic/ph x/x ">is</x> lit.</say></do></chore>
            """));
  }

  @Test
  void listsTablesAndQuotations() {
    Extraction.assertBlocks(
        Format.XML,
        """
        <concept id="c"><title>Oil</title><conbody><section><title>Cans</title><ul><li>one <ol>
        <li><p>two</p></li></ol></li></ul></section><simpletable><strow><stentry>Day</stentry></strow>
        </simpletable><lq>Wait.</lq><dl><dlentry><dt>Wick</dt><dd>It burns.</dd></dlentry></dl>
        <fig><title>A can</title></fig></conbody></concept>
        """,
        """
        HEADING 1: Oil
        HEADING 2: Cans
        ITEM 1: one
        ITEM 2: two
        CELL: Day
        QUOTATION 1: Wait.
        ITEM 1: Wick
        ITEM 1: It burns.
        PARAGRAPH: A can
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.XML, table);
  }
}
