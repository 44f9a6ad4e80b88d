package dev.tallystick.aid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.check.Code;
import dev.tallystick.check.OnSide;
import dev.tallystick.engine.Examiner;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.lsp.Ferry;
import dev.tallystick.run.Cancellation;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/**
 * Each sentence in turn is left out of a translation and put back in as a stub: then the blocks are
 * those of the source, sentence by sentence, and nothing is missing any more.
 */
class StubLawTest {
  private static final List<List<String>> EN = paragraphs(Ferry.EN);
  private static final List<List<String>> DE = paragraphs(Ferry.DE);

  /** Without the title. */
  private static List<List<String>> paragraphs(String text) {
    return Arrays.stream(text.split("\n\n"))
        .filter(paragraph -> !paragraph.startsWith("#"))
        .map(paragraph -> paragraph.strip().lines().toList())
        .toList();
  }

  private static List<List<String>> without(int left, List<List<String>> paragraphs) {
    List<List<String>> others = new ArrayList<>();
    int next = 0;
    for (List<String> paragraph : paragraphs) {
      List<String> kept = new ArrayList<>();
      for (String sentence : paragraph) {
        kept.add(next++ == left ? null : sentence);
      }
      others.add(kept);
    }
    return others;
  }

  private static PairResult examined(Layout layout, String source, String target) {
    return Examiner.ADAPTIVE.examine(
        Reading.of(new Text(source), layout.format, "en", Cancellation.NONE),
        Reading.of(new Text(target), layout.format, "de", Cancellation.NONE),
        true,
        Optional.empty(),
        Cancellation.NONE);
  }

  private static List<Wanted> missing(PairResult result) {
    Span all = new Span(0, result.source().text().length());
    return Wanted.at(result, OnSide.SOURCE, all).stream()
        .filter(wanted -> wanted.reason() == Wanted.Reason.MISSING)
        .toList();
  }

  private static List<String> shape(Reading reading) {
    return reading.segments().stream()
        .filter(Segment::opens)
        .map(segment -> segment.block().kind() + " " + segment.block().level())
        .toList();
  }

  private static String words(Segment segment) {
    return segment.prose().strip().replaceAll("\\s+", " ");
  }

  private static int check(Layout layout, String lineEnd, int left) {
    String source = layout.text(EN).replace("\n", lineEnd);
    String target = layout.text(without(left, DE)).replace("\n", lineEnd);
    PairResult before = examined(layout, source, target);
    List<Wanted> missing = missing(before);
    if (missing.size() != 1 || !missing.get(0).segments().equals(List.of(left))) {
      return 0; // not found, or not exactly: that is not what this is about
    }
    List<LineEdit> edits = Stub.edits(before, layout.format, missing.get(0).segments());
    if (edits.isEmpty()) {
      assertEquals("MARKDOWN_TABLE 0", layout + " " + left, "the head of a table");
      return 0;
    }
    String text = Stubbed.apply(target, edits);
    PairResult after = examined(layout, source, text);
    String told = layout + " without " + left + ":\n" + text;
    assertEquals(shape(after.source()), shape(after.target()), told);
    assertEquals(
        words(after.source().segments().get(left)),
        words(after.target().segments().get(left)),
        told);
    assertEquals(List.of(), missing(after), told);
    assertTrue(
        after.findings().stream().allMatch(finding -> finding.code() == Code.UNTRANSLATED), told);
    assertEquals(lineEnd.equals("\r\n"), text.contains("\r\n"), told);
    assertFalse(text.replace(lineEnd, "").matches("(?s).*[\r\n].*"), told);
    return 1;
  }

  @ParameterizedTest
  @EnumSource(Layout.class)
  void whatIsPutBackStandsWhereTheSourceHasIt(Layout layout) {
    int sentences = EN.stream().mapToInt(List::size).sum();
    for (String lineEnd : List.of("\n", "\r\n")) {
      int found = IntStream.range(0, sentences).map(left -> check(layout, lineEnd, left)).sum();
      assertTrue(found >= 9, layout + ": only " + found + " of " + sentences + " were found");
    }
  }
}
