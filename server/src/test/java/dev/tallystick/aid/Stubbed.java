package dev.tallystick.aid;

import dev.tallystick.align.Alignment;
import dev.tallystick.align.Match;
import dev.tallystick.check.Pending;
import dev.tallystick.check.Progress;
import dev.tallystick.check.Subject;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A pair whose matches are given, and its translation with what is missing put in. */
final class Stubbed {
  private Stubbed() {}

  /**
   * A pair.
   *
   * @param matches such as {@code "0-0 1- 2,3-1 -2"}: indices of segments
   */
  static PairResult pair(Format format, String source, String target, String matches) {
    Reading one = Reading.of(new Text(source), format, "en", Cancellation.NONE);
    Reading other = Reading.of(new Text(target), format, "de", Cancellation.NONE);
    double[] sourceNull = new double[one.segments().size()];
    double[] targetNull = new double[other.segments().size()];
    List<Match> chain = new ArrayList<>();
    int s = 0;
    int t = 0;
    for (String match : matches.isEmpty() ? new String[0] : matches.split(" ")) {
      int sources = count(match.substring(0, match.indexOf('-')));
      int targets = count(match.substring(match.indexOf('-') + 1));
      chain.add(new Match(s, s + sources, t, t + targets, 0.9));
      if (targets == 0) {
        sourceNull[s] = 1;
      } else if (sources == 0) {
        targetNull[t] = 1;
      }
      s += sources;
      t += targets;
    }
    if (s != sourceNull.length || t != targetNull.length) {
      throw new AssertionError(
          "not all matched: " + one.segments() + "\n" + other.segments() + "\n" + matches);
    }
    Alignment alignment = new Alignment(chain, sourceNull, targetNull, List.of(), null);
    Subject subject = new Subject(one.segments(), other.segments(), "de", alignment, true);
    return new PairResult(
        one,
        other,
        alignment,
        List.of(),
        Pending.of(subject),
        Progress.of(subject),
        Optional.empty());
  }

  private static int count(String indices) {
    return indices.isEmpty() ? 0 : indices.split(",").length;
  }

  /** The translation with all in it that nothing stands for. */
  static String in(Format format, String source, String target, String matches) {
    PairResult pair = pair(format, source, target, matches);
    List<Integer> missing = new ArrayList<>();
    for (Match match : pair.alignment().matches()) {
      for (int s = match.sourceFrom(); s < match.sourceTo() && !match.twoSided(); s++) {
        missing.add(s);
      }
    }
    return apply(target, Stub.edits(pair, format, missing));
  }

  static String apply(String text, List<LineEdit> edits) {
    Text lines = new Text(text);
    StringBuilder after = new StringBuilder(text);
    for (int i = edits.size() - 1; i >= 0; i--) {
      LineEdit edit = edits.get(i);
      after.replace(start(lines, edit.from()), start(lines, edit.to()), edit.replacement());
    }
    return after.toString();
  }

  private static int start(Text text, int line) {
    return line < text.lines() ? text.lineStart(line) : text.length();
  }
}
