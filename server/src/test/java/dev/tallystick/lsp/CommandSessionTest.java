package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonParser;
import dev.tallystick.engine.Examiner;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletionException;
import java.util.concurrent.atomic.AtomicInteger;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.WorkspaceFolder;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What the user can have done: pairing two files, and saying that a translation is finished. */
class CommandSessionTest {
  private static final String PAIR = "tallystick.pair";
  private static final String FINISHED = "tallystick.finished";
  private static final String DRAFT = "tallystick.draft";

  /** The German as far as the translator has come: the rest is pending. */
  private static final String BEGUN = Ferry.DE.substring(0, Ferry.DE.indexOf("Am Ende des Tages"));

  @TempDir Path folder;

  private static String uri(Path file) {
    return file.toUri().toString();
  }

  @Test
  void filesThatNoNameBringsTogetherArePairedByHand() {
    Work work = new Work(folder);
    Path english = work.write("from-the-client.md", Ferry.EN);
    Path german = work.write("mine.md", Ferry.DE_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder)) {
      talk.open(german, Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of(), talk.codes(english));

      assertNull(
          talk.command(
              PAIR, Map.of("source", uri(english), "target", uri(german), "targetLanguage", "de")));
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(english));
      assertTrue(
          talk.shown(english).get(0).getMessage().getLeft().contains("German"),
          talk.shown(english).toString());
    }
  }

  @Test
  void aPairMadeByHandCountsBeforeWhatNamesTell() {
    Work work = Work.withoutFog(folder);
    Path older = work.write("en/old/ferry.md", Ferry.EN.replace(Ferry.FOG_EN + "\n", ""));
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));

      talk.command(PAIR, Map.of("source", uri(older), "target", uri(work.de())));
      talk.settle();
      assertEquals(List.of(), talk.codes(work.en()));
      assertEquals(List.of(), talk.codes(older));
    }
  }

  @Test
  void aSourceThatIsTakenForTwoLanguagesComesToRestAllTheSame() {
    Work work = Work.withoutFog(folder);
    Path notes = work.write("notes.md", Ferry.DE);
    try (Talk talk = Talk.in(folder)) {
      AtomicInteger runs = new AtomicInteger();
      talk.machine.examiner =
          (source, target, draft, known, cancellation) -> {
            runs.incrementAndGet();
            return Examiner.ADAPTIVE.examine(source, target, draft, known, cancellation);
          };
      talk.open(work.en(), Ferry.EN);
      talk.settle();
      talk.command(
          PAIR, Map.of("source", uri(work.en()), "target", uri(notes), "sourceLanguage", "en-GB"));
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.de()));
      assertEquals(List.of(), talk.codes(notes));
      assertEquals(2, runs.get());
    }
  }

  @Test
  void aPairMadeByHandIsAmongAllPairsOfTheFolder() {
    Work work = new Work(folder);
    Path english = work.write("from-the-client.md", Ferry.EN);
    Path german = work.write("mine.md", Ferry.DE_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder)) {
      Buffer mine = talk.open(german, Ferry.DE_WITHOUT_FOG);
      talk.command(PAIR, Map.of("source", uri(english), "target", uri(german)));
      talk.settle();
      mine.close();
      assertEquals(List.of(), talk.codes(english));

      talk.command("tallystick.checkFolder");
      talk.settle();
      assertEquals(List.of("1 pair checked: 1 finding."), talk.said);
      assertEquals(List.of("omission"), talk.codes(english));
    }
  }

  @Test
  void aPairCanBeTurnedAround() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.command(PAIR, Map.of("source", uri(work.de()), "target", uri(work.en())));
      talk.settle();
      assertEquals(List.of("addition"), talk.codes(work.en()));
      assertEquals(List.of(), talk.codes(work.de()));
    }
  }

  @Test
  void aBufferWithoutAFileIsPairedByHand() {
    Work work = new Work(folder);
    Path english = work.write("ferry.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      Buffer scratch = talk.open("untitled:Untitled-1", Ferry.DE);
      talk.command(PAIR, Map.of("source", uri(english), "target", scratch.uri));
      scratch.replace(Ferry.FOG_DE + "\n", "");
      talk.pass(1500);
      assertEquals(List.of("omission"), talk.codes(english));
      assertEquals(1, talk.shown(scratch.uri).size());
      assertEquals(uri(english), scratch.jump("410 Gliedern").getTargetUri());

      scratch.close();
      assertEquals(List.of(), talk.codes(english));
      talk.open("untitled:Untitled-1", "Something else.");
      talk.settle();
      assertEquals(List.of(), talk.codes(english));
    }
  }

  /** The name of a buffer says nothing of its format: what the editor takes it for does. */
  @Test
  void aBufferIsReadAsWhatTheEditorTakesItFor() {
    Work work = new Work(folder);
    Path english = work.write("ferry.md", "# Fares\n\nCarts cross for 2 tokens.\n");
    try (Talk talk = Talk.in(folder)) {
      Buffer scratch = talk.open("untitled:Untitled-1", "# Preise\n\nKarren kosten 2 Marken.\n");
      talk.command(PAIR, Map.of("source", uri(english), "target", scratch.uri));
      talk.settle();
      assertEquals(List.of("Preise"), scratch.highlighted("Preise"));
    }
  }

  @Test
  void aFileThatIsNotThereCannotBePaired() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      Path nowhere = folder.resolve("nowhere.md");
      talk.command(PAIR, Map.of("source", uri(nowhere), "target", uri(work.de())));
      talk.settle();
      assertEquals(1, talk.said.size());
      assertTrue(talk.said.get(0).startsWith("nowhere.md: "), talk.said.get(0));
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void inAFinishedTranslationNothingIsPending() {
    Work work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), BEGUN);
      talk.settle();
      assertEquals(List.of(), talk.codes(work.en()));

      talk.command(FINISHED, uri(work.de()));
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));

      german.close();
      talk.open(work.en(), Ferry.EN);
      talk.settle();
      assertEquals(List.of(), talk.codes(work.en()), "the German is not on the disk");

      talk.open(work.de(), BEGUN);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()), "the mark outlasts the window");

      talk.command(DRAFT, uri(work.de()));
      talk.settle();
      assertEquals(List.of(), talk.codes(work.en()));
    }
  }

  @Test
  void aSourceIsFinishedInAllLanguages() {
    Work work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN);
    work.write("de/ferry.md", BEGUN);
    work.write("fr/ferry.md", Ferry.FR.substring(0, Ferry.FR.indexOf("À la fin")));
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.en(), Ferry.EN);
      talk.command(FINISHED, uri(work.en()));
      talk.settle();
      assertEquals(List.of("omission", "omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aMarkWaitsUntilTheFilesOfTheFolderAreKnown() {
    Work work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN);
    try (Talk talk = Talk.silent()) {
      talk.machine.holdListing();
      InitializeParams params = Talk.params();
      params.setWorkspaceFolders(List.of(new WorkspaceFolder(uri(folder), "work")));
      talk.begin(params);
      talk.open(work.de(), BEGUN);
      talk.command(FINISHED, uri(work.de()));
      talk.machine.release();
      talk.settle();
      assertEquals(List.of(), talk.said);
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aFileInNoPairCannotBeFinished() {
    Work work = new Work(folder);
    Path notes = work.write("notes.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      talk.open(notes, Ferry.EN);
      talk.command(FINISHED, uri(notes));
      talk.settle();
      assertEquals(1, talk.said.size());
      assertTrue(talk.said.get(0).startsWith("notes.md: "), talk.said.get(0));
    }
  }

  /** Each is told what is wrong; quotes stand for those of JSON. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          tallystick.nothing     |                                        | Unknown command
          tallystick.pair        |                                        | takes an object
          tallystick.pair        | {'source': 'file:///a.md'}             | by its URI
          tallystick.pair        | {'source': 7, 'target': 'file:///a.md'} | by its URI
          tallystick.pair        | {'source': 'file:///a', 'target': 'file:///a'} | its own translation
          tallystick.pair        | {'source': 'file:///a', 'target': 'file:///b', 'sourceLanguage': 'xx'} | no language tag
          tallystick.finished    |                                        | by its URI
          tallystick.draft       | 'here'                                 | by its URI
          tallystick.checkFolder | 12                                     | URI of a folder
          tallystick.checkFolder | 'untitled:one'                         | URI of a folder
          """,
      quoteCharacter = '"')
  void aCommandThatCannotBeDoneSaysWhy(String name, String argument, String why) {
    try (Talk talk = Talk.in(folder)) {
      Object[] arguments =
          argument == null
              ? new Object[0]
              : new Object[] {JsonParser.parseString(argument.replace('\'', '"'))};
      CompletionException refused =
          assertThrows(CompletionException.class, () -> talk.command(name, arguments));
      String message = ((ResponseErrorException) refused.getCause()).getMessage();
      assertTrue(message.contains(why), message);
    }
  }
}
