package dev.tallystick.check;

import dev.tallystick.align.Aligner;
import dev.tallystick.align.Match;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Two subtitle files beside each other. A row has a cue of either side, parted by {@code |}: its
 * begin and end in seconds, then its text, lines parted by {@code /}. {@code -} stands for no cue;
 * a cue may have no text. {@code !code} at the end of a row is a finding about it. Cues in one row
 * have to be matched.
 */
final class CueTable {
  private static final Pattern CUE = Pattern.compile("(-?[\\d.]+)-(-?[\\d.]+) *(.*)");

  private final List<Row> rows = new ArrayList<>();

  private record Row(String source, String target, String marks) {
    static Row of(String line) {
      int bar = line.indexOf(" | ");
      String right = line.substring(bar + 3).strip();
      int mark = right.indexOf(" !");
      return new Row(
          line.substring(0, bar).strip(),
          (mark < 0 ? right : right.substring(0, mark)).strip(),
          mark < 0 ? "" : right.substring(mark));
    }
  }

  /** How the times of the translation differ from those of the table. */
  record Timing(double scale, double offset) {
    static final Timing PLAIN = new Timing(1, 0);
  }

  CueTable(String table) {
    table.lines().filter(line -> !line.isBlank()).map(Row::of).forEach(rows::add);
  }

  /** The table as it stands: what {@link #print} should give. */
  String expected() {
    StringBuilder print = new StringBuilder();
    rows.forEach(row -> print(print, row, row.marks));
    return print.toString();
  }

  /** The table with the findings that come out, and a mark where a row is no match. */
  String print(Timing timing) {
    List<Span> sources = new ArrayList<>();
    List<Span> targets = new ArrayList<>();
    String source = file(Row::source, Timing.PLAIN, sources);
    PairResult result = result(source, file(Row::target, timing, targets));
    StringBuilder print = new StringBuilder();
    for (int i = 0; i < rows.size(); i++) {
      StringBuilder marks = new StringBuilder();
      for (Finding finding : result.findings()) {
        Span row = finding.side() == OnSide.SOURCE ? sources.get(i) : targets.get(i);
        marks.append(finding.span().overlaps(row) ? " !" + finding.code().word() : "");
        marks.append(isCut(finding.span(), row) ? " (in part)" : "");
      }
      boolean both = !sources.get(i).isEmpty() && !targets.get(i).isEmpty();
      if (both && !matched(result, sources.get(i), targets.get(i))) {
        marks.append(" (no match)");
      }
      print(print, rows.get(i), marks.toString());
    }
    return print.toString();
  }

  /** Whether a finding begins or ends inside a row, but for the dash of a speaker. */
  private static boolean isCut(Span finding, Span row) {
    return finding.overlaps(row)
        && (finding.start() > row.start() + 2 || finding.end() < row.end());
  }

  private static void print(StringBuilder print, Row row, String marks) {
    print.append(row.source).append(" | ").append(row.target).append(marks).append('\n');
  }

  private static PairResult result(String source, String target) {
    return PairResult.of(
        Reading.of(new Text(source), Format.SUBRIP, "en", Cancellation.NONE),
        Reading.of(new Text(target), Format.SUBRIP, "de", Cancellation.NONE),
        Aligner.ADAPTIVE,
        false,
        Cancellation.NONE);
  }

  private static boolean matched(PairResult result, Span source, Span target) {
    for (Match match : result.alignment().matches()) {
      if (touches(result.source().segments(), match.sourceFrom(), match.sourceTo(), source)
          && touches(result.target().segments(), match.targetFrom(), match.targetTo(), target)) {
        return true;
      }
    }
    return false;
  }

  private static boolean touches(List<Segment> segments, int from, int to, Span span) {
    return segments.subList(from, to).stream().anyMatch(segment -> segment.span().overlaps(span));
  }

  /** Writes a side as SubRip; where the text of each row stands. */
  private String file(Function<Row, String> side, Timing timing, List<Span> spans) {
    StringBuilder file = new StringBuilder();
    for (Row row : rows) {
      Matcher cue = CUE.matcher(side.apply(row));
      int start = file.length();
      int end = start;
      if (cue.matches()) {
        file.append(spans.size() + 1).append('\n').append(time(cue.group(1), timing));
        file.append(" --> ").append(time(cue.group(2), timing)).append('\n');
        start = file.length();
        file.append(cue.group(3).replace(" / ", "\n"));
        end = file.length();
        file.append("\n\n");
      }
      spans.add(new Span(start, end));
    }
    return file.toString();
  }

  private static String time(String seconds, Timing timing) {
    long millis = Math.round(1000 * (timing.scale * Double.parseDouble(seconds) + timing.offset));
    long all = Math.abs(millis);
    return String.format(
        Locale.ROOT,
        "%s%02d:%02d:%02d,%03d",
        millis < 0 ? "-" : "",
        all / 3_600_000,
        all / 60_000 % 60,
        all / 1000 % 60,
        all % 1000);
  }
}
