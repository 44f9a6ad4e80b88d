package dev.tallystick.pairing;

import static dev.tallystick.pairing.PairingTable.check;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** What a project states about its files. */
class StatedPairsTest {

  @Test
  void twoNamesThatTellNothing() {
    check(
        """
        handbook.md
        Handbuch.md
        pair: handbook.md -> Handbuch.md
        =>
        handbook.md -> Handbuch.md (und>und, project)
        """);
  }

  @Test
  void languagesOfTheRuleOfTheNamesAndOfTheSettings() {
    check(
        """
        handbook.md
        Handbuch.md
        plan.md
        de/Plan.md
        bell.fr.md
        glocke.md
        source: en
        pair: handbook.md (en-GB) -> Handbuch.md (de-AT)
        pair: plan.md -> de/Plan.md
        pair: bell.fr.md (fr) -> glocke.md
        =>
        bell.fr.md -> glocke.md (fr>und, project)
        handbook.md -> Handbuch.md (en-GB>de-AT, project)
        plan.md -> de/Plan.md (en>de, project)
        """);
  }

  @Test
  void tagInTheTargetNamesItsLanguage() {
    check(
        """
        text/boat.md
        text/bell/fog.md
        i18n/de/boat.md
        i18n/pt_BR/boat.md
        i18n/zh-Hant/bell/fog.md
        i18n/pictures/boat.md
        source: en
        pair: text/{path}.md -> i18n/{tag}/{path}.md
        =>
        text/bell/fog.md -> i18n/zh-Hant/bell/fog.md (en>zh-Hant, project)
        text/boat.md -> i18n/de/boat.md (en>de, project)
        text/boat.md -> i18n/pt_BR/boat.md (en>pt-BR, project)
        i18n/pictures/boat.md alone: No other file is called boat with a language in its name or folder.
        """);
  }

  @Test
  void tagOnBothSidesAndTheSourcesLanguageSet() {
    check(
        """
        fr-text/boat.txt
        en-text/boat.txt
        de-text/boat.txt
        de-text/bell.txt
        pair: {tag}-text/{path}.txt (fr) -> {tag}-text/{path}.txt
        =>
        fr-text/boat.txt -> de-text/boat.txt (fr>de, project)
        fr-text/boat.txt -> en-text/boat.txt (fr>en, project)
        de-text/bell.txt alone: tallystick.json pairs it with {tag}-text/bell.txt, and there is no such file.
        """);
  }

  @Test
  void tagTwiceIsTheSameTag() {
    check(
        """
        a.md
        de/a_de.md
        fr/a_de.md
        pair: {path}.md -> {tag}/{path}_{tag}.md
        =>
        a.md -> de/a_de.md (und>de, project)
        fr/a_de.md alone: tallystick.json pairs it with {tag}/fr/a_de_{tag}.md, and there is no such file.
        """);
  }

  @Test
  void longTagBeatsItsLastPart() {
    check(
        """
        a.md
        a-pt-BR.md
        pair: {path}.md -> {path}-{tag}.md
        =>
        a.md -> a-pt-BR.md (und>pt-BR, project)
        """);
  }

  @Test
  void shortTagWhereTheLongOneHasNoSource() {
    check(
        """
        a-pt.md
        a-pt-BR.md
        pair: {path}.md -> {path}-{tag}.md
        =>
        a-pt.md -> a-pt-BR.md (und>br, project)
        """);
  }

  @Test
  void everydayWordsAreTagsOnlyIfTheRuleNamesThem() {
    check(
        """
        a.md
        src/a.md
        new/a.md
        pair: {path}.md -> {tag}/{path}.md (new)
        =>
        a.md -> new/a.md (und>new, project)
        src/a.md alone: tallystick.json pairs it with {tag}/src/a.md, and there is no such file.
        """);
  }

  @Test
  void languageOfASidePicksAmongTags() {
    check(
        """
        a.en.md
        a.en-GB.md
        a.de.md
        a.de-AT.md
        a.fr.md
        pair: {path}.{tag}.md (en-GB) -> {path}.{tag}.md (de)
        =>
        a.en-GB.md -> a.de-AT.md (en-GB>de-AT, project)
        a.en-GB.md -> a.de.md (en-GB>de, project)
        a.en.md -> a.fr.md (en>fr, name)
        """);
  }

  @Test
  void exactLanguageIsTheSourceAmongSeveral() {
    check(
        """
        a.en-GB.md
        a.en.md
        a.de.md
        pair: {path}.{tag}.md (en) -> {path}.de.md
        =>
        a.en.md -> a.de.md (en>de, project)
        a.en-GB.md alone: a.en.md is the source already.
        """);
  }

  @Test
  void statedPairsComeBeforeTagsAndTheirFilesAreInNoGroup() {
    check(
        """
        guide.md
        guide.de.md
        Anleitung.md
        note.md
        note.de.md
        pair: guide.md -> Anleitung.md (de)
        =>
        guide.md -> Anleitung.md (und>de, project)
        note.md -> note.de.md (und>de, name)
        guide.de.md alone: The files that it could belong to are already matched with others.
        """);
  }

  @Test
  void oneSourceMayHaveTranslationsByNameAndByTag() {
    check(
        """
        guide.md
        guide.de.md
        guide.fr.md
        Anleitung.md
        pair: guide.md (en) -> Anleitung.md (de-AT)
        pair: guide.md -> guide.{tag}.md
        =>
        guide.md -> Anleitung.md (en>de-AT, project)
        guide.md -> guide.de.md (en>de, project)
        guide.md -> guide.fr.md (en>fr, project)
        """);
  }

  @Test
  void filesOfATakenSourceAreStillPairedAmongEachOther() {
    check(
        """
        en/a.md
        de/a.md
        fr/a.md
        Anleitung.md
        source: de
        pair: en/a.md -> Anleitung.md (de)
        =>
        de/a.md -> fr/a.md (de>fr, folder)
        en/a.md -> Anleitung.md (en>de, project)
        """);
  }

  @Test
  void ruleWithoutItsFileLeavesTheOtherToTheTags() {
    check(
        """
        guide.md
        guide.de.md
        note.md
        pair: guide.md -> Anleitung.md
        pair: note.md -> Notiz.md
        pair: Bericht.md -> report.md
        =>
        guide.md -> guide.de.md (und>de, name)
        note.md alone: tallystick.json pairs it with Notiz.md, and there is no such file.
        """);
  }

  @Test
  void ofTwoRulesForATranslationTheFirstCounts() {
    check(
        """
        a.md
        b.md
        c.md
        pair: a.md -> c.md (de)
        pair: b.md -> c.md (fr)
        =>
        a.md -> c.md (und>de, project)
        b.md alone: tallystick.json pairs it with c.md, and there is no such file.
        """);
  }

  @Test
  void translationThatIsTranslatedOnHasOneLanguage() {
    check(
        """
        a.md
        b.md
        c.md
        pair: a.md (en) -> b.md (fr)
        pair: b.md (it) -> c.md (de)
        pair: c.md -> a.md
        =>
        a.md -> b.md (en>fr, project)
        b.md -> c.md (fr>de, project)
        """);
  }

  @Test
  void fileIsNotItsOwnTranslation() {
    check(
        """
        a.md
        pair: {path}.md -> {path}.md
        =>
        a.md alone: tallystick.json pairs it with a.md, and there is no such file.
        """);
  }

  @Test
  void onlyWantedTranslations() {
    check(
        """
        a.md
        a-de.md
        a-fr.md
        b.md
        b-fr.md
        c.md
        d.md
        target: de
        pair: {path}.md -> {path}-{tag}.md
        pair: c.md -> d.md
        =>
        a.md -> a-de.md (und>de, project)
        c.md -> d.md (und>de, project)
        a-fr.md alone: It is in French, but only translations into German are asked for.
        b-fr.md alone: It is in French, but only translations into German are asked for.
        b.md alone: No translation of it into German exists.
        """);
  }

  @Test
  void ignoredFilesDoNotCount() {
    check(
        """
        en/a.md
        de/a.md
        drafts/en/a.md
        drafts/de/a.md
        de/a.old.md
        b.md
        c.md
        pair: b.md -> c.md
        ignore: drafts
        ignore: **/*.old.md
        ignore: c.*
        =>
        en/a.md -> de/a.md (en>de, folder)
        b.md alone: tallystick.json pairs it with c.md, and there is no such file.
        c.md alone: tallystick.json ignores it by "c.*".
        de/a.old.md alone: tallystick.json ignores it by "**/*.old.md".
        drafts/de/a.md alone: tallystick.json ignores it by "drafts".
        drafts/en/a.md alone: tallystick.json ignores it by "drafts".
        """);
  }

  @Test
  void ignoredFilesDoNotDecideWhichSideIsTheSource() {
    check(
        """
        a.de.md
        a.fr.md
        b.fr.md
        b.it.md
        old/c.de.md
        old/c.it.md
        ignore: old
        =>
        a.fr.md -> a.de.md (fr>de, name)
        b.fr.md -> b.it.md (fr>it, name)
        old/c.de.md alone: tallystick.json ignores it by "old".
        old/c.it.md alone: tallystick.json ignores it by "old".
        """);
  }

  @Test
  void optionsBeatTheProject() {
    Optional<Language> french = Language.of("fr");
    Rules project =
        new Rules(
            Language.of("en"),
            Optional.empty(),
            List.of(
                new PairRule(
                    PathPattern.of("a-{tag}.md"),
                    PathPattern.of("a-{tag}.md"),
                    Language.of("en"),
                    Optional.empty())),
            List.of());
    List<String> paths = List.of("a-en.md", "a-fr.md");
    assertEquals(
        "a-en.md", Pairing.pairs(paths, project.under(Rules.NONE)).pairs().get(0).source());
    Rules options = new Rules(french, Optional.empty());
    assertEquals("a-fr.md", Pairing.pairs(paths, project.under(options)).pairs().get(0).source());
  }
}
