package dev.tallystick.prose;

import java.util.Map;
import java.util.Set;

/** The elements of DITA 1.3; those not listed here are parts of sentences. */
final class Dita {
  static final Map<String, XmlRole> ROLES =
      new XmlRole.Table()
          .with(
              XmlRole.SECTION,
              """
              topic concept task reference glossentry glossgroup troubleshooting map bookmap\
               subjectScheme section example refsyn learningBase learningAssessment\
               learningContent learningOverview learningPlan learningSummary""")
          .with(XmlRole.TITLE, "title mainbooktitle")
          .with(
              XmlRole.TEXT,
              """
              p shortdesc note cmd info stepresult stepxmp steptroubleshooting tutorialinfo\
               stepsection prereq context result postreq steps-informal cause remedy condition\
               linktext linkinfo navtitle searchtitle booktitlealt booklibrary figgroup glossterm\
               glossdef responsibleParty div sectiondiv bodydiv itemgroup""")
          .with(XmlRole.ITEM, "li sli step substep choice dt dd dthd ddhd pt pd")
          .with(
              XmlRole.CELL,
              """
              entry stentry choptionhd chdeschd choption chdesc proptypehd propvaluehd propdeschd\
               proptype propvalue propdesc""")
          .with(XmlRole.QUOTATION, "lq")
          .with(
              XmlRole.CONTAINER,
              """
              dita abstract body conbody taskbody refbody troublebody troubleSolution titlealts\
               prolog metadata topicmeta bookmeta booktitle keywords critdates copyright ul ol sl\
               dl dlhead dlentry parml plentry steps steps-unordered substeps choices fig table\
               tgroup thead tbody row simpletable sthead strow choicetable chhead chrow properties\
               prophead property related-links linklist linkpool link topicref topichead\
               topicgroup mapref keydef chapter appendix part frontmatter backmatter preface\
               notices reltable relheader relrow relcell relcolspec""")
          .with(
              XmlRole.VERBATIM, "codeblock msgblock screen pre lines syntaxdiagram synblk imagemap")
          .with(
              XmlRole.CODE,
              """
              codeph filepath cmdname varname msgnum parmname apiname option systemoutput userinput\
               synph tt kwd var oper delim sep repsep xmlelement xmlatt xmlnsname xmlpi\
               numcharref parameterentity textentity author publisher publisherinformation\
               copyrholder copyryear prodname vrm brand series component featnum platform prognum\
               source""")
          .with(
              XmlRole.SILENT,
              """
              indexterm index-base draft-comment required-cleanup data data-about foreign unknown\
               sort-as svg svg-container mathml math ditavalref""")
          .with(XmlRole.ASIDE, "fn desc")
          .with(XmlRole.SPACED, "image")
          .with(XmlRole.CHAIN, "menucascade")
          .roles();

  /** What a topic or a map starts with. */
  static final Set<String> ROOTS =
      Set.of(
          "topic concept task reference glossentry glossgroup troubleshooting map bookmap dita"
              .concat(" subjectScheme")
              .split(" "));

  /** Attributes with text for the reader. */
  static final Set<String> ATTRIBUTES =
      Set.of("navtitle", "title", "spectitle", "specentry", "alt");

  private Dita() {}
}
