package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.Gson;
import dev.tallystick.check.WordCount;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.eclipse.lsp4j.FileChangeType;
import org.eclipse.lsp4j.InitializeParams;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** How far each pair has come, told to a client that wants to know. */
class ProgressSessionTest {
  private static final int ALL = WordCount.of(Ferry.EN);

  @TempDir Path folder;
  private Work work;

  @BeforeEach
  void work() {
    work = Work.withoutFog(folder);
  }

  private static void wantsProgress(InitializeParams params) {
    params.setInitializationOptions(Map.of("progress", true));
  }

  private static PairProgress last(Talk talk) {
    return talk.progress.get(talk.progress.size() - 1);
  }

  private PairProgress german(Integer done, Integer pending, Map<String, Integer> findings) {
    String source = work.en().toUri().toString();
    String target = work.de().toUri().toString();
    return new PairProgress(source, target, "en", "de", "folder", done, pending, findings);
  }

  @Test
  void aPairThatHasSettledIsToldOnce() {
    try (Talk talk = Talk.in(folder, ProgressSessionTest::wantsProgress)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.open(work.en(), Ferry.EN);
      talk.pass(2000);

      assertEquals(List.of(german(ALL, 0, Map.of("omission", 1))), talk.progress);
    }
  }

  @Test
  void figuresAreToldWhenTheyChange() {
    String half = Ferry.DE.substring(0, Ferry.DE.indexOf("Der letzte Wärter"));
    int rest = WordCount.of(Ferry.EN.substring(Ferry.EN.indexOf("The last keeper")));
    try (Talk talk = Talk.in(folder, ProgressSessionTest::wantsProgress)) {
      Buffer german = talk.open(work.de(), half);
      talk.settle();
      assertEquals(german(ALL - rest, rest, Map.of()), last(talk));

      german.replace("ächzt", "stöhnt");
      assertEquals(1, talk.progress.size(), "the same figures");
      String more = Ferry.DE.substring(half.length(), Ferry.DE.indexOf("Eine Laterne"));
      german.type(half.length(), half.length(), more);
      talk.pass(1500);
      int lantern = WordCount.of(Ferry.line(Ferry.EN, "A lantern"));
      assertEquals(german(ALL - lantern, lantern, Map.of()), last(talk));
    }
  }

  @Test
  void whatIsHeldBackDoesNotCountYet() {
    try (Talk talk = Talk.in(folder, ProgressSessionTest::wantsProgress)) {
      Buffer german = talk.open(work.de(), Ferry.DE);
      talk.settle();
      german.replace(Ferry.FOG_DE + "\n", "");
      assertEquals(Map.of(), last(talk).findings());

      talk.pass(1500);
      assertEquals(Map.of("omission", 1), last(talk).findings());
    }
  }

  @Test
  void aPairThatIsOneNoLongerHasNoFigures() {
    try (Talk talk = Talk.in(folder, ProgressSessionTest::wantsProgress)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      german.close();
      assertEquals(german(null, null, Map.of()), last(talk));

      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(german(ALL, 0, Map.of("omission", 1)), last(talk));
      work.delete("en/ferry.md");
      talk.wrote(FileChangeType.Deleted, work.en());
      assertEquals(german(null, null, Map.of()), last(talk));
      assertEquals(4, talk.progress.size());
    }
  }

  @Test
  void theAbsenceOfFiguresIsWrittenOut() {
    String json = new Gson().toJson(german(null, null, Map.of()));
    assertTrue(json.contains("\"done\":null,\"pending\":null,\"findings\":{}"), json);
    assertNull(new Gson().fromJson(json, PairProgress.class).done());
    assertTrue(new Gson().toJson(german(4, 0, Map.of())).contains("\"done\":4,\"pending\":0"));
  }

  @Test
  void eachLanguageIsToldByItself() {
    work.write("fr/ferry.md", Ferry.FR);
    try (Talk talk = Talk.in(folder, ProgressSessionTest::wantsProgress)) {
      talk.open(work.en(), Ferry.EN);
      talk.settle();

      assertEquals(
          Map.of("de", Map.of("omission", 1), "fr", Map.of()),
          Map.of(
              talk.progress.get(0).targetLanguage(), talk.progress.get(0).findings(),
              talk.progress.get(1).targetLanguage(), talk.progress.get(1).findings()));
    }
  }

  @Test
  void whoDoesNotWantToKnowIsNotTold() {
    try (Talk talk = Talk.in(folder)) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of(), talk.progress);
    }
    try (Talk talk =
        Talk.in(folder, params -> params.setInitializationOptions(Map.of("progress", 1)))) {
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      assertEquals(List.of(), talk.progress);
    }
  }
}
