package dev.tallystick.prose;

import java.util.Map;
import java.util.Set;

/** The elements of DocBook, versions 4 and 5; those not listed here are parts of sentences. */
final class DocBook {
  static final Map<String, XmlRole> ROLES =
      new XmlRole.Table()
          .with(
              XmlRole.SECTION,
              """
              set book part chapter appendix article preface partintro dedication colophon\
               acknowledgements section sect1 sect2 sect3 sect4 sect5 simplesect topic reference\
               refentry refsect1 refsect2 refsect3 refsection refsynopsisdiv glossary glossdiv\
               bibliography bibliodiv index indexdiv setindex toc lot qandadiv""")
          .with(XmlRole.TITLE, "title subtitle titleabbrev")
          .with(XmlRole.HEADING, "bridgehead")
          .with(
              XmlRole.TEXT,
              """
              para simpara refpurpose caption attribution releaseinfo edition keyword\
               revremark label glosssee glossseealso tocentry lotentry""")
          .with(XmlRole.ITEM, "listitem member term step callout")
          .with(XmlRole.CELL, "entry td th seg segtitle")
          .with(XmlRole.QUOTATION, "blockquote epigraph")
          .with(
              XmlRole.CONTAINER,
              """
              abstract affiliation author authorgroup editor othercredit collab personblurb caution\
               note tip important warning danger example figure informalexample informalfigure\
               informaltable table tgroup thead tbody tfoot row tr entrytbl itemizedlist\
               orderedlist variablelist varlistentry simplelist segmentedlist seglistitem\
               calloutlist qandaset qandaentry question answer procedure substeps stepalternatives\
               task tasksummary taskprerequisites taskrelated sidebar formalpara glosslist\
               glossentry glossdef mediaobject mediaobjectco screenco programlistingco screenshot\
               equation informalequation revhistory revision revdescription legalnotice copyright\
               keywordset info bookinfo articleinfo chapterinfo sectioninfo refentryinfo\
               appendixinfo prefaceinfo partinfo sect1info sect2info sect3info sect4info sect5info\
               glossaryinfo bibliographyinfo referenceinfo setinfo refmeta refnamediv msgset\
               msgentry msg msgmain msgsub msgrel msgexplan msginfo msgtext""")
          .with(
              XmlRole.VERBATIM,
              """
              programlisting screen literallayout address synopsis cmdsynopsis funcsynopsis\
               classsynopsis fieldsynopsis constructorsynopsis destructorsynopsis methodsynopsis\
               enumsynopsis typedefsynopsis macrosynopsis unionsynopsis packagesynopsis\
               productionset biblioentry bibliomixed""")
          .with(
              XmlRole.CODE,
              """
              code literal filename command option parameter replaceable varname envar constant\
               function classname methodname interfacename exceptionname type returnvalue\
               structname structfield symbol systemitem userinput computeroutput prompt markup tag\
               sgmltag property uri email keycap keycode keysym errorcode errorname token\
               enumvalue package initializer modifier mathphrase refname refdescriptor\
               refentrytitle manvolnum refmiscinfo personname firstname surname givenname\
               othername honorific lineage orgname corpname corpauthor publishername\
               authorinitials contrib jobtitle date pubdate year holder revnumber productname productnumber isbn\
               issn biblioid pagenums volumenum issuenum artpagenums invpartnumber pubsnumber""")
          .with(
              XmlRole.SILENT,
              "indexterm remark comment primaryie secondaryie tertiaryie subjectset svg math script")
          .with(XmlRole.ASIDE, "footnote annotation")
          .with(XmlRole.SPACED, "inlinemediaobject")
          .with(XmlRole.CHAIN, "menuchoice keycombo")
          .roles();

  /** What a document or a part of one in a file of its own starts with. */
  static final Set<String> ROOTS =
      Set.of(
          "set book part chapter appendix article preface dedication colophon section sect1 sect2"
              .concat(
                  " sect3 sect4 sect5 simplesect refentry refsect1 refsect2 refsect3 refsection")
              .concat(" reference glossary bibliography index qandaset partintro")
              .split(" "));

  /** Attributes with text for the reader. */
  static final Set<String> ATTRIBUTES = Set.of("xlink:title", "xreflabel");

  private DocBook() {}
}
