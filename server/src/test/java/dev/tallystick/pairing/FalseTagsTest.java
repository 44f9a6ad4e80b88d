package dev.tallystick.pairing;

import static dev.tallystick.pairing.PairingTable.check;

import org.junit.jupiter.api.Test;

/** What looks like a language and is none, and files that could go two ways. */
class FalseTagsTest {

  @Test
  void tagWithoutSibling() {
    check(
        """
        to.do.txt
        notes.it.md
        id/list.md
        as/is/plan.md
        my/no/plan.md
        =>
        as/is/plan.md alone: "as" looks like a language, but no other language of this file exists.
        id/list.md alone: "id" looks like a language, but no other language of this file exists.
        my/no/plan.md alone: "my" looks like a language, but no other language of this file exists.
        notes.it.md alone: "it" looks like a language, but no other language of this file exists.
        to.do.txt alone: No other file is called to.do with a language in its name or folder.
        """);
  }

  @Test
  void nameThatIsNothingButATag() {
    check(
        """
        ps.md
        tr.md
        .de.md
        =>
        .de.md alone: No other file is called .de with a language in its name or folder.
        ps.md alone: No other file is called ps with a language in its name or folder.
        tr.md alone: No other file is called tr with a language in its name or folder.
        """);
  }

  @Test
  void folderOfATopicInsideFoldersOfLanguages() {
    check(
        """
        en/is/plan.md
        de/is/plan.md
        en/no/plan.md
        de/no/plan.md
        =>
        en/is/plan.md -> de/is/plan.md (en>de, folder)
        en/no/plan.md -> de/no/plan.md (en>de, folder)
        """);
  }

  @Test
  void foldersOfLanguagesInsideFolderOfATopic() {
    check(
        """
        id/en/plan.md
        id/de/plan.md
        id/plan.md
        source: en
        =>
        id/en/plan.md -> id/de/plan.md (en>de, folder)
        id/plan.md alone: Nothing tells its language, and id/en/plan.md is the source already.
        """);
  }

  @Test
  void outerFolderWinsATie() {
    check(
        """
        fr/is/plan.md
        de/is/plan.md
        fr/no/plan.md
        de/no/plan.md
        source: de
        =>
        de/is/plan.md -> fr/is/plan.md (de>fr, folder)
        de/no/plan.md -> fr/no/plan.md (de>fr, folder)
        """);
  }

  @Test
  void fileOfTwoGroupsJoinsTheOneWithMoreLanguages() {
    check(
        """
        en/guide.md
        de/guide.md
        de/guide.fr.md
        =>
        en/guide.md -> de/guide.md (en>de, folder)
        de/guide.fr.md alone: The files that it could belong to are already matched with others.
        """);
  }

  @Test
  void everydayWordsAreNoLanguages() {
    check(
        """
        README.md
        src/README.md
        bin/README.md
        README.bak.md
        in/README.md
        =>
        README.bak.md alone: No other file is called README.bak with a language in its name or folder.
        README.md alone: No other file is called README with a language in its name or folder.
        bin/README.md alone: No other file is called README with a language in its name or folder.
        in/README.md alone: No other file is called README with a language in its name or folder.
        src/README.md alone: No other file is called README with a language in its name or folder.
        """);
  }

  @Test
  void everydayWordThatTheSettingsNameIsALanguage() {
    check(
        """
        guide.md
        new/guide.md
        target: new
        =>
        guide.md -> new/guide.md (und>new, folder)
        """);
  }

  @Test
  void longCodesAreLanguages() {
    check(
        """
        speech.eng.txt
        speech.ger.txt
        speech.fil.txt
        =>
        speech.eng.txt -> speech.fil.txt (en>fil, name)
        speech.eng.txt -> speech.ger.txt (en>de, name)
        """);
  }
}
