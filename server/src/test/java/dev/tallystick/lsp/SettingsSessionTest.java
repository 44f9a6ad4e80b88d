package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.DidChangeConfigurationParams;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.TextDocumentPositionParams;
import org.eclipse.lsp4j.WorkspaceFolder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What the user sets, and what the user is asked. */
class SettingsSessionTest {
  @TempDir Path folder;

  private static void pulls(InitializeParams params) {
    params.getCapabilities().getWorkspace().setConfiguration(true);
  }

  static void push(Talk talk, Object settings) {
    talk.server
        .getWorkspaceService()
        .didChangeConfiguration(new DidChangeConfigurationParams(settings));
    talk.settle();
  }

  @Test
  void settingsArePulledFromAClientThatCanBeAsked() {
    Work work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN);
    try (Talk talk = Talk.in(folder, SettingsSessionTest::pulls)) {
      talk.settle();
      talk.settings = Map.of("restMillis", 200, "colour", "green");
      push(talk, Map.of());
      Buffer german = talk.open(work.de(), Ferry.DE);
      german.replace(Ferry.FOG_DE + "\n", "");
      assertEquals(List.of(), talk.codes(work.en()));

      talk.pass(200);
      assertEquals(List.of("omission"), talk.codes(work.en()));
      assertTrue(talk.said.isEmpty());
    }
  }

  @Test
  void settingsAreTakenFromAClientThatPushesThem() {
    Work work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      push(talk, Map.of("tallystick", Map.of("restMillis", 0)));
      Buffer german = talk.open(work.de(), Ferry.DE);
      german.replace(Ferry.FOG_DE + "\n", "");
      talk.pass(0);

      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void theSourceLanguageTurnsAPairAround() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(work.en()));

      push(talk, Map.of("sourceLanguage", "de"));
      assertEquals(List.of("addition"), talk.codes(work.en()));
      assertEquals(List.of(), talk.codes(work.de()));
    }
  }

  private static List<String> languages(Talk talk, Buffer buffer, String words) {
    return Talk.answer(
            talk.server.counterpart(
                new TextDocumentPositionParams(
                    new TextDocumentIdentifier(buffer.uri),
                    buffer.position(buffer.text.indexOf(words)))))
        .stream()
        .map(Placed::language)
        .toList();
  }

  /** A tag in a name would count before all this. */
  @Test
  void whatATextSaysOfItsLanguageBeatsTheSettingButNotTheProject() {
    Work work = new Work(folder);
    Path english = work.write("ferry.md", Ferry.EN);
    Path german = work.write("ferry.de.md", Ferry.DE);
    try (Talk talk = Talk.in(folder)) {
      push(talk, Map.of("sourceLanguage", "en-GB"));
      Buffer target = talk.open(german, Ferry.DE);
      Buffer source = talk.open(english, Ferry.EN);
      talk.settle();
      assertEquals(List.of("en-GB"), languages(talk, target, "410 Gliedern"));

      source.whole("---\nlang: en_IE\n---\n" + Ferry.EN);
      talk.pass(1500);
      assertEquals(List.of("en-IE"), languages(talk, target, "410 Gliedern"));
      assertEquals(List.of("de"), languages(talk, source, "410 links"));

      push(talk, Map.of("sourceLanguage", "en-ZA"));
      assertEquals(List.of("en-IE"), languages(talk, target, "410 Gliedern"));
      source.replace("lang: en_IE", "lang: none");
      talk.pass(1500);
      assertEquals(List.of("en-ZA"), languages(talk, target, "410 Gliedern"));
      push(talk, Map.of("sourceLanguage", "en-AU"));
      assertEquals(List.of("en-AU"), languages(talk, target, "410 Gliedern"));

      source.replace("lang: none", "lang: en_IE");
      talk.open(work.file("tallystick.json"), "{ \"sourceLanguage\": \"en-US\" }");
      talk.pass(1500);
      assertEquals(List.of("en-US"), languages(talk, target, "410 Gliedern"));
    }
  }

  @Test
  void aWrongSettingIsToldOnceAndCountsAsNotSet() {
    try (Talk talk = Talk.in(folder)) {
      push(talk, Map.of("restMillis", "soon"));
      push(talk, Map.of("restMillis", "soon"));
      assertEquals(1, talk.said.size());
      assertTrue(talk.said.get(0).contains("restMillis"));

      push(talk, Map.of("sourceLanguage", "xx-nowhere"));
      assertEquals(2, talk.said.size());
      assertTrue(talk.said.get(1).contains("sourceLanguage"));
    }
  }

  /** Sets them in the way that a client has: by being asked, or by sending them. */
  private static void set(Talk talk, boolean pulled, Object settings) {
    talk.settings = settings;
    push(talk, pulled ? Map.of() : settings);
  }

  private Talk client(boolean pulled) {
    return Talk.in(
        folder, params -> params.getCapabilities().getWorkspace().setConfiguration(pulled));
  }

  @ParameterizedTest
  @ValueSource(booleans = {false, true})
  void whatIsWrongIsSaidInWordsThatHelp(boolean pulled) {
    try (Talk talk = client(pulled)) {
      set(talk, pulled, Map.of("lens", "yes", "inlay", 1, "restMillis", 200));
      assertEquals(
          List.of(
              "The setting tallystick.lens must be true or false. Until then it counts as false.",
              "The setting tallystick.inlay must be true or false. Until then it counts as false."),
          talk.said);
      set(talk, pulled, List.of("lens"));
      assertEquals(3, talk.said.size());
      assertTrue(talk.said.get(2).contains("must be an object"), talk.said.get(2));
    }
  }

  @ParameterizedTest
  @ValueSource(booleans = {false, true})
  void figuresAreSwitchedOnAndOff(boolean pulled) {
    Work work = Work.withoutFog(folder);
    try (Talk talk = client(pulled)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      set(talk, pulled, Map.of("lens", true, "inlay", true));
      assertEquals(1, ViewsSessionTest.lenses(talk, english).size());
      assertEquals(1, ViewsSessionTest.hints(talk, english, ViewsSessionTest.ALL).size());

      set(talk, pulled, Map.of("lens", "no", "inlay", false));
      assertEquals(0, ViewsSessionTest.lenses(talk, english).size());
      assertEquals(0, ViewsSessionTest.hints(talk, english, ViewsSessionTest.ALL).size());
      assertEquals(1, talk.said.size());
    }
  }

  @Test
  void settingsThatComeAtTheStartCountUntilOthersCome() {
    Work work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN);
    for (boolean pulled : List.of(false, true)) {
      try (Talk talk =
          Talk.in(
              folder,
              params -> {
                params.setInitializationOptions(Map.of("restMillis", 200, "progress", "often"));
                params.getCapabilities().getWorkspace().setConfiguration(pulled);
              })) {
        Buffer german = talk.open(work.de(), Ferry.DE);
        german.replace(Ferry.FOG_DE + "\n", "");
        talk.pass(200);
        assertEquals(List.of("omission"), talk.codes(work.en()));
        assertEquals(1, talk.said.size());
        assertTrue(talk.said.get(0).contains("tallystick.progress"), talk.said.get(0));

        talk.settings = Map.of("restMillis", 900);
        push(talk, pulled ? Map.of() : talk.settings);
        german.replace(Ferry.line(Ferry.DE, "Die Winde zieht") + "\n", "");
        talk.pass(200);
        assertEquals(List.of("omission"), talk.codes(work.en()));
        talk.pass(700);
        assertEquals(List.of("omission", "omission"), talk.codes(work.en()));
      }
    }
  }

  /** Found by trying each sentence: one that is missed when quiet, one that only the last finds. */
  @ParameterizedTest
  @CsvSource({"Der Wärter am Tor fegt, 0, 1, 1", "Klemmt die Kette, 0, 0, 1"})
  void whoIsMoreVigilantHearsOfMore(String missing, int quiet, int balanced, int thorough) {
    Work work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE.replace(Ferry.line(Ferry.DE, missing) + "\n", "\n"));
      talk.settle();
      assertEquals(balanced, talk.codes(work.en()).size());
      push(talk, Map.of("vigilance", "quiet"));
      assertEquals(quiet, talk.codes(work.en()).size());
      push(talk, Map.of("vigilance", "thorough"));
      assertEquals(thorough, talk.codes(work.en()).size());

      push(talk, Map.of("vigilance", "paranoid"));
      assertEquals(balanced, talk.codes(work.en()).size());
      assertEquals(1, talk.said.size());
      assertTrue(talk.said.get(0).contains("quiet, balanced or thorough"), talk.said.get(0));
    }
  }

  @Test
  void whereTheSourceCannotBeToldTheUserIsAskedOnce() {
    Work work = new Work(folder);
    Path german = work.write("ferry.de.md", Ferry.DE);
    Path french = work.write("ferry.fr.md", Ferry.FR_WITHOUT_FOG);
    work.write("lamp.de.md", Ferry.DE);
    Path lamp = work.write("lamp.fr.md", Ferry.FR);
    try (Talk talk = Talk.in(folder)) {
      talk.settle();
      assertEquals(List.of(), talk.said);
      talk.open(german, Ferry.DE);
      talk.open(lamp, Ferry.FR);
      talk.settle();
      assertEquals(1, talk.said.size());
      assertTrue(talk.said.get(0).contains("sourceLanguage to one of: de, fr."), talk.said.get(0));

      push(talk, Map.of("sourceLanguage", "de"));
      assertEquals(List.of("omission"), talk.codes(german));
      assertEquals(List.of("omission"), talk.codes(french));
      assertEquals(1, talk.said.size());
    }
  }

  @Test
  void settingsThatAnswerTheQuestionComeBeforeIt() {
    Work work = new Work(folder);
    Path german = work.write("ferry.de.md", Ferry.DE);
    work.write("ferry.fr.md", Ferry.FR);
    try (Talk talk = Talk.silent()) {
      talk.settings = Map.of("sourceLanguage", "de");
      InitializeParams params = Talk.params();
      pulls(params);
      params.setWorkspaceFolders(List.of(new WorkspaceFolder(folder.toUri().toString(), "work")));
      talk.begin(params);
      Buffer buffer = talk.open(german, Ferry.DE);
      talk.settle();

      assertEquals(
          Ferry.line(Ferry.FR, "Le treuil"),
          buffer.hover("410 Gliedern").getContents().getRight().getValue());
      assertTrue(talk.said.isEmpty());
    }
  }

  @Test
  void aClientThatNeverTellsItsSettingsIsServedByTheDefaults() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.silent()) {
      beginWithoutAnswer(talk);
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();

      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void withoutAnAnswerTheUserIsAskedAfterOneRest() {
    Path german = twoTranslations();
    try (Talk talk = Talk.silent()) {
      beginWithoutAnswer(talk);
      talk.open(german, Ferry.DE);
      talk.pass(1499);
      assertEquals(List.of(), talk.said);

      talk.pass(1);
      assertEquals(1, talk.said.size());
    }
  }

  @Test
  void settingsThatComeLateCountAsSoonAsTheyCome() {
    Path german = twoTranslations();
    try (Talk talk = Talk.silent()) {
      CompletableFuture<List<Object>> answer = beginWithoutAnswer(talk);
      talk.open(german, Ferry.DE);
      talk.pass(1400);
      answer.complete(List.of(Map.of("sourceLanguage", "de")));
      talk.settle();
      assertEquals(List.of("omission"), talk.codes(german));

      talk.pass(5000);
      assertEquals(List.of("omission"), talk.codes(german));
      assertEquals(List.of(), talk.said);
    }
  }

  @Test
  void aRestThatIsMadeLongerEndsAllTheSame() {
    Work work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      german.replace(Ferry.FOG_DE + "\n", "");
      push(talk, Map.of("restMillis", 4000));
      talk.pass(1500);
      talk.pass(2499);
      assertEquals(List.of(), talk.codes(work.en()));

      talk.pass(1);
      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  @Test
  void aRestThatIsMadeShorterEndsSooner() {
    Work work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      german.replace(Ferry.FOG_DE + "\n", "");
      push(talk, Map.of("restMillis", 100));
      talk.pass(100);

      assertEquals(List.of("omission"), talk.codes(work.en()));
    }
  }

  private Path twoTranslations() {
    Work work = new Work(folder);
    work.write("ferry.fr.md", Ferry.FR_WITHOUT_FOG);
    return work.write("ferry.de.md", Ferry.DE);
  }

  private CompletableFuture<List<Object>> beginWithoutAnswer(Talk talk) {
    CompletableFuture<List<Object>> answer = new CompletableFuture<>();
    talk.answer = Optional.of(answer);
    InitializeParams params = Talk.params();
    pulls(params);
    params.setWorkspaceFolders(List.of(new WorkspaceFolder(folder.toUri().toString(), "work")));
    talk.begin(params);
    return answer;
  }
}
