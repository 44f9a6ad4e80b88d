package dev.tallystick.pairing;

import static dev.tallystick.pairing.PairingTable.check;

import org.junit.jupiter.api.Test;

/** Which file of a group is the source, and which translations are wanted. */
class SidesTest {

  @Test
  void settingBeatsEnglishAndTheUntaggedFile() {
    check(
        """
        a.de.md
        a.en.md
        b.md
        b.de.md
        b.en.md
        source: de
        =>
        a.de.md -> a.en.md (de>en, name)
        b.de.md -> b.en.md (de>en, name)
        b.md alone: Nothing tells its language, and b.de.md is the source already.
        """);
  }

  @Test
  void settingMatchesTheExactTagFirst() {
    check(
        """
        a.en.md
        a.en-GB.md
        a.de.md
        b.en-US.md
        b.de.md
        source: en-GB
        =>
        a.en-GB.md -> a.de.md (en-GB>de, name)
        a.en-GB.md -> a.en.md (en-GB>en, name)
        b.en-US.md -> b.de.md (en-US>de, name)
        """);
  }

  @Test
  void settingThatNoFileHasFallsThrough() {
    check(
        """
        a.en.md
        a.de.md
        source: fr
        =>
        a.en.md -> a.de.md (en>de, name)
        """);
  }

  @Test
  void otherRegionBesideTheUntaggedSourceIsATranslation() {
    check(
        """
        a.md
        a.pt-BR.md
        source: pt-PT
        =>
        a.md -> a.pt-BR.md (pt-PT>pt-BR, name)
        """);
  }

  @Test
  void settingPrefersItsScript() {
    check(
        """
        a.zh-Hans.md
        a.zh-Hant.md
        a.de.md
        b.zh_CN.md
        b.zh_HK.md
        source: zh-TW
        =>
        a.zh-Hant.md -> a.de.md (zh-Hant>de, name)
        a.zh-Hant.md -> a.zh-Hans.md (zh-Hant>zh-Hans, name)
        b.zh_HK.md -> b.zh_CN.md (zh-HK>zh-CN, name)
        """);
  }

  @Test
  void targetMayBeNamedByItsScript() {
    check(
        """
        a.md
        a.zh_TW.md
        a.zh_CN.md
        target: zh-Hant
        =>
        a.md -> a.zh_TW.md (und>zh-TW, name)
        a.zh_CN.md alone: It is in Chinese (China), but only translations into Chinese (Traditional) are asked for.
        """);
  }

  @Test
  void untaggedFileIsTheOnlyTranslationOfATaggedSource() {
    check(
        """
        a.md
        a.en.md
        source: en
        =>
        a.en.md -> a.md (en>und, name)
        """);
  }

  @Test
  void untaggedFileIsInTheWantedLanguageIfNoTaggedOneIs() {
    check(
        """
        a.md
        a.en.md
        a.fr.md
        source: en
        target: de
        =>
        a.en.md -> a.md (en>de, name)
        a.fr.md alone: It is in French, but only translations into German are asked for.
        """);
  }

  @Test
  void untaggedFileBeatsEnglish() {
    check(
        """
        a.md
        a.en.md
        a.de.md
        =>
        a.md -> a.de.md (und>de, name)
        a.md -> a.en.md (und>en, name)
        """);
  }

  @Test
  void languageThatEveryGroupHasBeatsEnglish() {
    check(
        """
        a.de.md
        a.en.md
        b.de.md
        b.fr.md
        c.md
        c.it.md
        =>
        a.de.md -> a.en.md (de>en, name)
        b.de.md -> b.fr.md (de>fr, name)
        c.md -> c.it.md (und>it, name)
        """);
  }

  @Test
  void twoLanguagesThatEveryGroupHasLeaveEnglish() {
    check(
        """
        a.de.md
        a.en-GB.md
        a.en-US.md
        b.de.md
        b.en-GB.md
        b.en-US.md
        =>
        a.en-GB.md -> a.de.md (en-GB>de, name)
        a.en-GB.md -> a.en-US.md (en-GB>en-US, name)
        b.en-GB.md -> b.de.md (en-GB>de, name)
        b.en-GB.md -> b.en-US.md (en-GB>en-US, name)
        """);
  }

  @Test
  void withoutEnglishTheTranslatorChooses() {
    check(
        """
        b/de/a.md
        b/fr/a.md
        a.fr.md
        a.it.md
        a.de.md
        =>
        a.de.md, a.fr.md, a.it.md choose de, fr, it
        b/de/a.md, b/fr/a.md choose de, fr
        """);
  }

  @Test
  void wantedTargetIsNoSource() {
    check(
        """
        a.de.md
        a.en.md
        target: en
        =>
        a.de.md -> a.en.md (de>en, name)
        """);
  }

  @Test
  void wantedTargetLeavesOneSource() {
    check(
        """
        a.de.md
        a.fr.md
        b.de.md
        b.fr.md
        b.it.md
        target: de
        =>
        a.fr.md -> a.de.md (fr>de, name)
        b.fr.md -> b.de.md (fr>de, name)
        b.it.md alone: It is in Italian, but only translations into German are asked for.
        """);
  }

  @Test
  void onlyWantedTargetsIncludingNarrowerTags() {
    check(
        """
        a.md
        a.de.md
        a.de-AT.md
        a.fr.md
        b.md
        b.fr.md
        target: de
        =>
        a.md -> a.de-AT.md (und>de-AT, name)
        a.md -> a.de.md (und>de, name)
        a.fr.md alone: It is in French, but only translations into German are asked for.
        b.fr.md alone: It is in French, but only translations into German are asked for.
        b.md alone: No translation of it into German exists.
        """);
  }

  @Test
  void widerTagIsNotTheWantedTarget() {
    check(
        """
        a.md
        a.pt.md
        a.pt-PT.md
        target: pt-PT
        =>
        a.md -> a.pt-PT.md (und>pt-PT, name)
        a.pt.md alone: It is in Portuguese, but only translations into Portuguese (Portugal) are asked for.
        """);
  }

  @Test
  void secondFileInTheLanguageOfTheSourceStandsAlone() {
    check(
        """
        en/a.md
        a.en.md
        a.de.md
        =>
        a.en.md -> a.de.md (en>de, name)
        en/a.md alone: It is in English like a.en.md, which is the source already.
        """);
  }
}
