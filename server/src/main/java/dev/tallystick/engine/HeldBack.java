package dev.tallystick.engine;

import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Edit;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.Optional;

/**
 * Which findings are not shown yet: new ones about the sentence that is being written. Nobody wants
 * to be told that half a sentence is too short.
 */
final class HeldBack {
  private final PairResult result;
  private final OnSide side;
  private final Span edited;
  private final Span gapAround;

  /** For an edit that ended at an offset into the text of a side. */
  HeldBack(PairResult result, OnSide side, int offset) {
    this.result = result;
    this.side = side;
    List<Segment> segments = result.reading(side).segments();
    int index = new Sentences(result.reading(side)).at(offset);
    Span touched = index < 0 ? new Span(offset, offset) : segments.get(index).span();
    Span previous = index > 0 ? segments.get(index - 1).span() : new Span(0, 0);
    // Right before a sentence the one before it may just have been finished.
    this.edited = index > 0 && offset <= touched.start() ? previous.cover(touched) : touched;
    this.gapAround = new Span(Math.min(previous.end(), touched.start()), touched.end());
  }

  /**
   * Whether a finding is to wait.
   *
   * @param shown what is shown already
   */
  boolean holds(Finding finding, Shown shown) {
    return concerns(finding) && !shown.has(finding, result);
  }

  private boolean concerns(Finding finding) {
    if (finding.side() == side) {
      return finding.span().overlaps(edited);
    }
    Span counterpart = finding.counterpart();
    return counterpart.isEmpty()
        ? gapAround.touches(counterpart.start())
        : counterpart.overlaps(edited);
  }

  /**
   * Findings as they were shown, with the texts they were found in.
   *
   * @param findings the findings
   * @param in all that was found then
   */
  record Shown(List<Finding> findings, Optional<PairResult> in) {
    static final Shown NOTHING = new Shown(List.of(), Optional.empty());

    Shown(List<Finding> findings, PairResult in) {
      this(findings, Optional.of(in));
    }

    /** Whether it is these findings in these texts. */
    boolean is(List<Finding> others, PairResult inOthers) {
      return in.filter(result -> result == inOthers).isPresent() && findings.equals(others);
    }

    /** Whether a finding is one of these, whatever has been edited since. */
    boolean has(Finding finding, PairResult now) {
      Text before = in.map(result -> result.reading(finding.side()).text()).orElse(new Text(""));
      Edit since = Differences.between(before, now.reading(finding.side()).text());
      return findings.stream()
          .filter(old -> old.code() == finding.code() && old.side() == finding.side())
          .anyMatch(old -> touches(old.span(), since, finding.span()));
    }

    private static boolean touches(Span old, Edit since, Span span) {
      int start = since.map(old.start());
      return new Span(start, Math.max(start, since.map(old.end()))).overlaps(span);
    }
  }
}
