package dev.tallystick.check;

import dev.tallystick.align.Match;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Block;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;

/** Prints a result in the notation of {@link PairTable}. */
final class PairPrint {
  private final PairTable table;
  private final PairResult result;
  private final Pending pending;
  private final List<Finding> begun = new ArrayList<>();
  private final int shift;

  /**
   * @param table the table that the texts were made from
   * @param shift how many units stand before the table's text in the file
   */
  PairPrint(PairTable table, PairResult result, boolean draft, int shift) {
    this.table = table;
    this.result = result;
    this.shift = shift;
    this.pending =
        Pending.of(
            new Subject(
                result.source().segments(),
                result.target().segments(),
                result.target().language(),
                result.alignment(),
                draft));
  }

  String print() {
    StringBuilder print = new StringBuilder();
    for (Match match : result.alignment().matches()) {
      List<Segment> sources =
          result.source().segments().subList(match.sourceFrom(), match.sourceTo());
      List<Segment> targets =
          result.target().segments().subList(match.targetFrom(), match.targetTo());
      boolean opens = opens(sources, OnSide.SOURCE) || opens(targets, OnSide.TARGET);
      print
          .append(opens ? "¶ " : "")
          .append(cell(sources, OnSide.SOURCE))
          .append("\n    | ")
          .append(cell(targets, OnSide.TARGET))
          .append(marks(sources, targets))
          .append(isPending(match) ? " ~" : "")
          .append('\n');
    }
    return print.toString();
  }

  private boolean opens(List<Segment> segments, OnSide side) {
    return !segments.isEmpty() && table.marks(side).rows().contains(place(segments.get(0)));
  }

  /** The place of a sentence in the table's own text. */
  private int place(Segment segment) {
    return segment.span().start() - shift;
  }

  private String cell(List<Segment> segments, OnSide side) {
    List<String> parts = new ArrayList<>();
    for (Segment segment : segments) {
      PairTable.Marks marks = table.marks(side);
      boolean marked = marks.cells().contains(place(segment));
      marked |= !parts.isEmpty() && marks.rows().contains(place(segment));
      String mark = marked ? "¶ " : "";
      String marker = segment.opens() ? marker(segment.block()) : "";
      parts.add(mark + marker + shown(result.reading(side), segment));
    }
    return parts.isEmpty() ? "-" : String.join(" / ", parts);
  }

  private static String shown(Reading reading, Segment segment) {
    String text = segment.span().of(reading.text().string());
    return segment.verbatim() ? text.replaceAll("\\R", "") : text;
  }

  private static String marker(Block block) {
    return switch (block.kind()) {
      case HEADING -> "#".repeat(block.level()) + " ";
      case ITEM -> "- ";
      case QUOTATION -> "> ";
      default -> "";
    };
  }

  private String marks(List<Segment> sources, List<Segment> targets) {
    StringBuilder marks = new StringBuilder();
    for (Finding finding : result.findings()) {
      List<Segment> side = finding.side() == OnSide.SOURCE ? sources : targets;
      Span span = finding.span();
      if (side.stream().anyMatch(s -> !s.verbatim() && s.span().overlaps(span))) {
        marks.append(begun.contains(finding) ? " !..." : " !" + finding.code().word());
        begun.add(finding);
      }
    }
    return marks.toString();
  }

  private boolean isPending(Match match) {
    for (int i = match.sourceFrom(); i < match.sourceTo(); i++) {
      if (pending.source(i)) {
        return true;
      }
    }
    return false;
  }
}
