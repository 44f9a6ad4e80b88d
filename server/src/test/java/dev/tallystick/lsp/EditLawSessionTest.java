package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.align.Aligner;
import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.Position;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Whatever is edited in whatever order: at rest the editor shows what a fresh check finds. */
class EditLawSessionTest {
  private static final List<String> TYPED =
      List.of(
          "x", " ", ".", "\n", "\n\n", "🛶", "Der Fluss ist breit. ", "# ", "ü", "\r\n", "`", "- ");

  @TempDir Path folder;

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6})
  void atRestTheFindingsAreThoseOfAFreshCheck(long seed) {
    Random random = new Random(seed);
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      for (int round = 0; round < 6; round++) {
        for (int edits = random.nextInt(6); edits >= 0; edits--) {
          edit(random.nextInt(4) == 0 ? english : german, random);
        }
        if (random.nextBoolean()) {
          talk.settle();
        }
      }
      talk.pass(1500);

      PairResult fresh = fresh(english.text, german.text);
      assertEquals(shown(fresh, OnSide.SOURCE), shown(talk, work.en()));
      assertEquals(shown(fresh, OnSide.TARGET), shown(talk, work.de()));
      for (Buffer buffer : List.of(english, german)) {
        var all = talk.all(buffer.uri);
        assertEquals(buffer.version, all.get(all.size() - 1).getVersion());
      }
    }
  }

  /** Replaces some stretch by something, between characters. */
  private static void edit(Buffer buffer, Random random) {
    Text text = new Text(buffer.text);
    int start = text.outsidePair(random.nextInt(text.length() + 1));
    int longest = random.nextInt(5) == 0 ? 200 : 3;
    int end = text.outsidePair(Math.min(text.length(), start + random.nextInt(longest)));
    buffer.type(start, Math.max(start, end), TYPED.get(random.nextInt(TYPED.size())));
  }

  private static PairResult fresh(String source, String target) {
    return PairResult.of(
        Reading.of(new Text(source), Format.MARKDOWN, "en", Cancellation.NONE),
        Reading.of(new Text(target), Format.MARKDOWN, "de", Cancellation.NONE),
        Aligner.ADAPTIVE,
        true,
        Cancellation.NONE);
  }

  private static List<String> shown(PairResult result, OnSide side) {
    List<String> shown = new ArrayList<>();
    for (Finding finding : result.findings()) {
      if (finding.side() == side) {
        Position at = Encoding.UTF_16.position(result.reading(side).text(), finding.span().start());
        shown.add(at.getLine() + ":" + at.getCharacter() + " " + finding.message());
      }
    }
    return shown;
  }

  private static List<String> shown(Talk talk, Path file) {
    List<String> shown = new ArrayList<>();
    for (Diagnostic diagnostic : talk.shown(file)) {
      Position at = diagnostic.getRange().getStart();
      String message = diagnostic.getMessage().getLeft();
      if (!message.startsWith("Missing here")) {
        shown.add(at.getLine() + ":" + at.getCharacter() + " " + message);
      }
    }
    return shown;
  }
}
