package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.align.Aligner;
import dev.tallystick.align.Alignment;
import dev.tallystick.align.LengthModel;
import dev.tallystick.align.Match;
import dev.tallystick.align.Move;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.segment.Segment;
import dev.tallystick.segment.Segmenter;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** The checks on matches given by hand. */
class ChecksTest {
  private static final LengthModel LENGTHS =
      Aligner.ADAPTIVE.align(List.of(), List.of(), Cancellation.NONE).lengths();

  private static final String SECTIONS =
      """
      # One

      First sentence here. Second sentence here.

      ## Two

      Third sentence here. Fourth sentence here.

      ## Three

      Fifth sentence here.
      """;

  @Test
  void aMissingSectionIsPendingInADraftOnly() {
    Subject draft = missing(SECTIONS, true, 3, 6);
    assertEquals("...~~~..", pending(draft));
    assertEquals(List.of(), Checks.findings(draft));
    Subject finished = missing(SECTIONS, false, 3, 6);
    assertEquals("........", pending(finished));
    List<Finding> findings = Checks.findings(finished);
    assertEquals(1, findings.size());
    assertEquals(Code.OMISSION, findings.get(0).code());
    assertEquals(OnSide.SOURCE, findings.get(0).side());
    assertTrue(findings.get(0).message().contains("these 3 sentences"));
  }

  @Test
  void aMissingPartOfASectionIsAnOmissionInADraftToo() {
    assertEquals("........", pending(missing(SECTIONS, true, 4, 5)));
    assertEquals(1, Checks.findings(missing(SECTIONS, true, 4, 5)).size());
  }

  @Test
  void theWholeTextOfASectionBelowItsHeadingIsPending() {
    assertEquals("....~~..", pending(missing(SECTIONS, true, 4, 6)));
  }

  @Test
  void aLoneMissingHeadingIsAnOmissionInADraftToo() {
    assertEquals("........", pending(missing(SECTIONS, true, 3, 4)));
  }

  @Test
  void theEndIsPendingInADraft() {
    assertEquals(".......~", pending(missing(SECTIONS, true, 7, 8)));
    assertEquals("......~~", pending(missing(SECTIONS, true, 6, 8)));
  }

  @Test
  void eightSentencesAreASlipAndNineAreNot() {
    String text = "Start of it all. " + "Some words in here. ".repeat(12) + "The end of it.";
    assertEquals("..............", pending(missing(text, true, 2, 10)));
    assertEquals("..~~~~~~~~~...", pending(missing(text, true, 2, 11)));
  }

  @Test
  void verbatimBlocksBreakNoRunAndCountForNothing() {
    String text = "One is here.\n\n```\ncode\n```\n\nTwo is here.\n\nThree is here.\n";
    List<Finding> findings = Checks.findings(missing(text, false, 0, 3));
    assertEquals(1, findings.size());
    assertTrue(findings.get(0).message().contains("these 2 sentences"));
    assertEquals(new Span(0, text.indexOf("\n\nThree")), findings.get(0).span());
  }

  @Test
  void aGapLiesBehindTheSentenceBeforeIt() {
    Finding middle = Checks.findings(missing(SECTIONS, false, 4, 5)).get(0);
    int at = SECTIONS.indexOf("Two") + 3;
    assertEquals(new Span(at, at), middle.counterpart());
    assertEquals("Missing here: \"\u2068Third sentence here.\u2069\"", middle.counterMessage());
    Finding first = Checks.findings(missing(SECTIONS, false, 0, 1)).get(0);
    assertEquals(new Span(0, 0), first.counterpart());
    assertTrue(first.message().contains(" before "), first.message());
  }

  @Test
  void anAdditionLiesOnTheTarget() {
    List<Segment> one = segments("One is here. Two is here.");
    List<Segment> two = segments("One is here. Extra is here. Two is here.");
    List<Match> matches =
        List.of(new Match(0, 1, 0, 1, 1), new Match(1, 1, 1, 2, 0.9), new Match(1, 2, 2, 3, 1));
    Alignment alignment =
        new Alignment(matches, new double[2], new double[] {0, 0.9, 0}, List.of(), LENGTHS);
    Finding finding = Checks.findings(new Subject(one, two, "de", alignment, true)).get(0);
    assertEquals(Code.ADDITION, finding.code());
    assertEquals(OnSide.TARGET, finding.side());
    assertEquals(two.get(1).span(), finding.span());
    assertEquals(new Span(12, 12), finding.counterpart());
    assertEquals(0.9, finding.confidence(), 1e-9);
    assertEquals("", finding.counterMessage());
  }

  /** A moved sentence is neither missing nor added. */
  @Test
  void aMovedSentenceIsOneFindingOfOrder() {
    List<Segment> one = segments("One is here. Two is here. Three is here.");
    List<Segment> two = segments("Two is here. Three is here. One is here.");
    List<Match> matches =
        List.of(
            new Match(0, 1, 0, 0, 0.9),
            new Match(1, 2, 0, 1, 1),
            new Match(2, 3, 1, 2, 1),
            new Match(3, 3, 2, 3, 0.8));
    Alignment alignment =
        new Alignment(
            matches,
            new double[] {0.9, 0, 0},
            new double[] {0, 0, 0.8},
            List.of(new Move(0, 2)),
            LENGTHS);
    List<Finding> findings = Checks.findings(new Subject(one, two, "de", alignment, false));
    assertEquals(1, findings.size());
    assertEquals(Code.ORDER, findings.get(0).code());
    assertEquals(two.get(2).span(), findings.get(0).span());
    assertEquals(one.get(0).span(), findings.get(0).counterpart());
    assertEquals("This sentence stands at another place in the source.", findings.get(0).message());
  }

  @Test
  void findingsAreSortedBySideThenPlaceThenCode() {
    Finding late = finding(Code.ADDITION, OnSide.TARGET, 9);
    Finding early = finding(Code.LENGTH, OnSide.TARGET, 2);
    Finding same = finding(Code.ADDITION, OnSide.TARGET, 2);
    Finding source = finding(Code.OMISSION, OnSide.SOURCE, 50);
    List<Finding> sorted = List.of(late, early, same, source).stream().sorted().toList();
    assertEquals(List.of(source, same, early, late), sorted);
  }

  private static Finding finding(Code code, OnSide side, int start) {
    return new Finding(code, side, new Span(start, start + 1), new Span(0, 0), 1, "", "");
  }

  @Test
  void codesAndSidesHaveNames() {
    for (Code code : Code.values()) {
      assertEquals(Optional.of(code), Code.of(code.word()));
    }
    assertEquals(Optional.empty(), Code.of("OMISSION"));
    assertEquals("omission", Code.OMISSION.word());
    assertEquals("information", Code.LENGTH.severity().word());
    assertEquals(Severity.WARNING, finding(Code.UNTRANSLATED, OnSide.TARGET, 0).severity());
    assertEquals("target", OnSide.SOURCE.other().word());
    assertEquals(OnSide.SOURCE, OnSide.TARGET.other());
  }

  @Test
  void theMoreVigilantHearsOfMore() {
    Subject subject = missing(SECTIONS, false, 4, 5); // with a posterior of 0.8
    assertEquals(0, told(subject, Vigilance.QUIET));
    assertEquals(1, told(subject, Vigilance.BALANCED));
    double[] doubt = new double[subject.source().size()];
    doubt[2] = 0.3;
    List<Match> matches = new ArrayList<>();
    for (int i = 0; i < doubt.length; i++) {
      matches.add(new Match(i, i + 1, i, i + 1, 1 - doubt[i]));
    }
    Alignment doubtful =
        new Alignment(matches, doubt, new double[doubt.length], List.of(), LENGTHS);
    Subject whole = new Subject(subject.source(), subject.source(), "de", doubtful, false);
    assertEquals(0, told(whole, Vigilance.BALANCED));
    assertEquals(1, told(whole, Vigilance.THOROUGH));
    assertEquals(Optional.of(Vigilance.QUIET), Vigilance.of("quiet"));
    assertEquals(Optional.empty(), Vigilance.of("deaf"));
  }

  private static int told(Subject subject, Vigilance vigilance) {
    return Checks.findings(subject, Pending.of(subject), vigilance).size();
  }

  @Test
  void theSentenceBeforePendingTextIsNotTooShortYet() {
    String stop = " and again".repeat(12) + ".";
    String whole = "He knocks" + stop + " He rings" + stop + " He calls" + stop;
    List<Segment> source = segments(whole + " He sings" + stop + " She waits" + stop);
    List<Segment> target = segments(whole.replace("He", "Er") + " Er singt und.");
    List<Match> matches = new ArrayList<>();
    for (int i = 0; i < 4; i++) {
      matches.add(new Match(i, i + 1, i, i + 1, 1));
    }
    matches.add(new Match(4, 5, 4, 4, 1));
    double[] last = {0, 0, 0, 0, 1};
    Alignment alignment = new Alignment(matches, last, new double[4], List.of(), LENGTHS);
    assertEquals(List.of(), Checks.findings(new Subject(source, target, "de", alignment, true)));
    List<Finding> finished = Checks.findings(new Subject(source, target, "de", alignment, false));
    assertEquals(
        List.of(Code.OMISSION, Code.LENGTH), finished.stream().map(Finding::code).toList());
  }

  /** A text of short sentences, which may stay as they are, against itself with some left out. */
  private static Subject missing(String text, boolean draft, int from, int to) {
    List<Segment> source = segments(text);
    List<Segment> target = new ArrayList<>(segments(text));
    List<Match> matches = new ArrayList<>();
    double[] gone = new double[source.size()];
    for (int i = 0; i < source.size(); i++) {
      if (i < from) {
        matches.add(new Match(i, i + 1, i, i + 1, 1));
      } else if (i < to) {
        gone[i] = 0.8;
        matches.add(new Match(i, i + 1, from, from, 0.8));
      } else {
        matches.add(new Match(i, i + 1, i - to + from, i + 1 - to + from, 1));
      }
    }
    target.subList(from, to).clear();
    double[] none = new double[target.size()];
    return new Subject(
        source, target, "de", new Alignment(matches, gone, none, List.of(), LENGTHS), draft);
  }

  private static String pending(Subject subject) {
    Pending pending = Pending.of(subject);
    StringBuilder shown = new StringBuilder();
    for (int i = 0; i < subject.source().size(); i++) {
      shown.append(pending.source(i) ? '~' : '.');
    }
    return shown.toString();
  }

  private static List<Segment> segments(String markdown) {
    Text text = new Text(markdown);
    return Segmenter.of("en").segments(text, Format.MARKDOWN.blocks(text), Cancellation.NONE);
  }
}
