package dev.tallystick.pairing;

import static dev.tallystick.pairing.PairingTable.check;

import org.junit.jupiter.api.Test;

/** Which files are found to belong together. */
class PairingTest {

  @Test
  void tagInNameBesideUntaggedFile() {
    check(
        """
        guide.md
        guide.de.md
        =>
        guide.md -> guide.de.md (und>de, name)
        """);
  }

  @Test
  void tagsInBothNames() {
    check(
        """
        guide.en.md
        guide.de.md
        guide_en.txt
        guide_de.txt
        =>
        guide.en.md -> guide.de.md (en>de, name)
        guide_en.txt -> guide_de.txt (en>de, name)
        """);
  }

  @Test
  void foldersAtAnyDepth() {
    check(
        """
        en/guide.md
        de/guide.md
        work/docs/en/a/boat.md
        work/docs/de/a/boat.md
        =>
        en/guide.md -> de/guide.md (en>de, folder)
        work/docs/en/a/boat.md -> work/docs/de/a/boat.md (en>de, folder)
        """);
  }

  @Test
  void folderBesideUntaggedFile() {
    check(
        """
        docs/guide.md
        docs/de/guide.md
        docs/fr/guide.md
        source: en
        =>
        docs/guide.md -> docs/de/guide.md (en>de, folder)
        docs/guide.md -> docs/fr/guide.md (en>fr, folder)
        """);
  }

  @Test
  void severalTargets() {
    check(
        """
        guide.en.md
        guide.pl.md
        guide.de.md
        guide.uk.md
        =>
        guide.en.md -> guide.de.md (en>de, name)
        guide.en.md -> guide.pl.md (en>pl, name)
        guide.en.md -> guide.uk.md (en>uk, name)
        """);
  }

  @Test
  void tagsOfSeveralParts() {
    check(
        """
        guide.txt
        guide_pt_BR.txt
        guide_PT_pt.txt
        note.en.md
        note.zh-Hant.md
        note.sr_Latn.md
        docs/en/a.md
        docs/zh_hant_TW/a.md
        =>
        docs/en/a.md -> docs/zh_hant_TW/a.md (en>zh-Hant-TW, folder)
        guide.txt -> guide_PT_pt.txt (und>pt-PT, name)
        guide.txt -> guide_pt_BR.txt (und>pt-BR, name)
        note.en.md -> note.sr_Latn.md (en>sr-Latn, name)
        note.en.md -> note.zh-Hant.md (en>zh-Hant, name)
        """);
  }

  @Test
  void scriptsAndRegionsInNamesAndFoldersAtAnyDepth() {
    check(
        """
        guide.md
        guide.zh-Hant.md
        guide.pt-BR.md
        guide.sr-Latn.md
        guide.zh-Hant-TW.md
        guide.es-419.md
        a/b/en/c/note.md
        a/b/zh-Hant-HK/c/note.md
        a/b/es-419/c/note.md
        a/b/sr_Cyrl/c/note.md
        plan_en.txt
        plan_es_419.txt
        plan_zh_Hant_TW.txt
        =>
        a/b/en/c/note.md -> a/b/es-419/c/note.md (en>es-419, folder)
        a/b/en/c/note.md -> a/b/sr_Cyrl/c/note.md (en>sr-Cyrl, folder)
        a/b/en/c/note.md -> a/b/zh-Hant-HK/c/note.md (en>zh-Hant-HK, folder)
        guide.md -> guide.es-419.md (und>es-419, name)
        guide.md -> guide.pt-BR.md (und>pt-BR, name)
        guide.md -> guide.sr-Latn.md (und>sr-Latn, name)
        guide.md -> guide.zh-Hant-TW.md (und>zh-Hant-TW, name)
        guide.md -> guide.zh-Hant.md (und>zh-Hant, name)
        plan_en.txt -> plan_es_419.txt (en>es-419, name)
        plan_en.txt -> plan_zh_Hant_TW.txt (en>zh-Hant-TW, name)
        """);
  }

  @Test
  void longTagBeatsItsLastPart() {
    check(
        """
        guide_pt_BR.txt
        guide_pt_PT.txt
        source: pt-PT
        =>
        guide_pt_PT.txt -> guide_pt_BR.txt (pt-PT>pt-BR, name)
        """);
  }

  @Test
  void shortTagWhereTheLongOneHasNoSibling() {
    check(
        """
        page_it_de.txt
        page_it_en.txt
        =>
        page_it_en.txt -> page_it_de.txt (en>de, name)
        """);
  }

  @Test
  void upperCaseTagsUnderAnyLocale() {
    check(
        """
        README.md
        README.IT.md
        README_ID.md
        =>
        README.md -> README.IT.md (und>it, name)
        README.md -> README_ID.md (und>id, name)
        """);
  }

  @Test
  void taggedTwice() {
    check(
        """
        en/guide.en.md
        de/guide.de.md
        fr/guide_fr.md
        =>
        en/guide.en.md -> de/guide.de.md (en>de, name)
        en/guide.en.md -> fr/guide_fr.md (en>fr, name)
        """);
  }

  @Test
  void mixedLayouts() {
    check(
        """
        docs/en/guide.md
        docs/guide.de.md
        =>
        docs/en/guide.md -> docs/guide.de.md (en>de, name)
        """);
  }

  @Test
  void translationsGoWithTheSourceOfTheirLayout() {
    check(
        """
        en/docs/guide.md
        de/docs/guide.md
        docs/en/guide.md
        docs/de/guide.md
        =>
        docs/en/guide.md -> docs/de/guide.md (en>de, folder)
        en/docs/guide.md -> de/docs/guide.md (en>de, folder)
        """);
  }

  @Test
  void extensionsMustAgree() {
    check(
        """
        guide.en.md
        guide.de.txt
        =>
        guide.de.txt alone: "de" looks like a language, but no other language of this file exists.
        guide.en.md alone: "en" looks like a language, but no other language of this file exists.
        """);
  }

  @Test
  void oneLanguageTwiceIsNoPair() {
    check(
        """
        guide.de.md
        de/guide.md
        =>
        de/guide.md alone: "de" looks like a language, but no other language of this file exists.
        guide.de.md alone: "de" looks like a language, but no other language of this file exists.
        """);
  }

  @Test
  void namesWithoutExtension() {
    check(
        """
        README
        README_de
        =>
        README -> README_de (und>de, name)
        """);
  }

  @Test
  void samePathTwiceCountsOnce() {
    check(
        """
        a.md
        a.md
        =>
        a.md alone: No other file is called a with a language in its name or folder.
        """);
  }

  @Test
  void nothingInNothingOut() {
    check("=>\n");
  }
}
