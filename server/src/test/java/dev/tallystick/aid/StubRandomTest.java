package dev.tallystick.aid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.check.OnSide;
import dev.tallystick.engine.Examiner;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Whatever the texts are: nothing of the translation is lost, and nothing fails. */
class StubRandomTest {
  private static final int ROUNDS = 400;
  private static final List<String> PIECES =
      List.of(
          "The ferry leaves at noon. ",
          "Nobody swims here at night, not even in July. ",
          "Das Boot liegt im Hafen. ",
          "**Stop now.** ",
          "[A bell](b.md) rings.",
          "語る。船が出る。",
          "🛶 ",
          "\n",
          "\n",
          "\n\n",
          "\n\n",
          "\r\n",
          "\r",
          "- ",
          "1. ",
          "> ",
          "  ",
          "## ",
          "===\n",
          "| One | Two |\n|---|---|\n| Three | Four |\n",
          "```\ncode\n```\n",
          "<div>\n",
          "<!-- note -->\n",
          "[^1]: ",
          "---\n",
          "\uFEFF",
          "\\",
          "`x`");

  /** Without these, texts of such a format would have hardly a sentence that could be put in. */
  private static final Map<Format, List<String>> MORE =
      Map.of(
          Format.SUBRIP,
          List.of(
              "\n\n00:01:00,000 --> 00:01:02,000\n", "\n\n7\n00:02:00,000 --> 00:02:02,000\n- "),
          Format.WEBVTT,
          List.of("\n\n00:01.000 --> 00:02.000\n", "\n\n00:02.000 --> 00:04.000 line:0\n- "),
          Format.HTML,
          List.of("\n<p>The gate is <b>shut</b>.</p>\n", "\n<p>Bring 2 ropes &amp; an oar.</p>\n"),
          Format.XML,
          List.of("<section>\n", "<para>", "</para>\n", "<para>Mind the <b>step</b>.</para>\n"),
          Format.LATEX,
          List.of("\\section{Ropes}\n\n", "Coil 3 \\emph{dry} ropes.\n\n", "Mind the step.\n\n"));

  private static String text(Random random, Format format) {
    List<String> more = MORE.getOrDefault(format, List.of());
    StringBuilder text = new StringBuilder();
    for (int i = random.nextInt(30); i > 0; i--) {
      boolean own = !more.isEmpty() && random.nextInt(2) == 0;
      List<String> pieces = own ? more : PIECES;
      text.append(pieces.get(random.nextInt(pieces.size())));
    }
    return text.toString();
  }

  private static Reading read(Random random, Format format, String language) {
    return Reading.of(new Text(text(random, format)), format, language, Cancellation.NONE);
  }

  @ParameterizedTest
  @EnumSource(Format.class)
  void nothingIsLostAndNothingFails(Format format) {
    Random random = new Random(7);
    int edited = 0;
    for (int round = 0; round < ROUNDS; round++) {
      PairResult pair =
          Examiner.ADAPTIVE.examine(
              read(random, format, "en"),
              read(random, format, "de"),
              true,
              Optional.empty(),
              Cancellation.NONE);
      Places places = new Places(pair);
      List<Integer> missing =
          IntStream.range(0, pair.source().segments().size())
              .filter(i -> !places.matched(i) && random.nextInt(8) > 0)
              .boxed()
              .toList();
      List<LineEdit> edits = Stub.edits(pair, format, missing);
      edited += edits.isEmpty() ? 0 : 1;
      check(pair.target().text(), edits);
      ask(pair, random);
    }
    assertTrue(edited > ROUNDS / 4, "edits in " + edited + " of " + ROUNDS);
  }

  private static void check(Text target, List<LineEdit> edits) {
    int next = 0;
    for (LineEdit edit : edits) {
      assertTrue(next <= edit.from() && edit.from() < edit.to(), edits::toString);
      assertTrue(edit.to() <= target.lines(), edits::toString);
      next = edit.to();
    }
    String before = target.string().replaceAll("[\\s>]+", "");
    String after = Stubbed.apply(target.string(), edits).replaceAll("[\\s>]+", "");
    int at = 0;
    for (int i = 0; i < after.length() && at < before.length(); i++) {
      at += after.charAt(i) == before.charAt(at) ? 1 : 0;
    }
    assertEquals(before.length(), at, () -> "lost: " + target.string() + "\n" + edits);
  }

  private static void ask(PairResult pair, Random random) {
    for (OnSide side : OnSide.values()) {
      int length = pair.reading(side).text().length();
      int start = random.nextInt(length + 1);
      int end = start + random.nextInt(length - start + 1);
      for (Wanted wanted : Wanted.at(pair, side, new Span(start, end))) {
        assertTrue(!wanted.segments().isEmpty());
      }
    }
  }
}
