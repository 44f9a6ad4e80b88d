package dev.tallystick.check;

import dev.tallystick.align.Match;
import dev.tallystick.prose.Block;
import dev.tallystick.segment.Segment;
import java.util.Arrays;
import java.util.List;

/**
 * Which source sentences nobody has got to yet. In a draft these are the ones behind the last
 * translated sentence, and runs that fill a section or are long, be they missing or untouched
 * copies: translators do not work from top to bottom. In a finished translation nothing is pending.
 */
public final class Pending {
  /** A longer missing run is no slip. */
  private static final int LONGEST_SLIP = 8;

  /** A match less probable than this does not end a run of missing sentences in their midst. */
  private static final double DOUBTFUL = 0.8;

  private final boolean[] source;

  private Pending(boolean[] source) {
    this.source = source;
  }

  /** The pending sentences of a pair; none if it is no draft. */
  public static Pending of(Subject subject) {
    boolean[] pending = new boolean[subject.source().size()];
    if (subject.draft()) {
      boolean[] open = open(subject);
      for (Run run : Run.of(subject.source(), i -> open[i])) {
        if (waits(subject.source(), run)) {
          Arrays.fill(pending, run.from(), run.to(), true);
        }
      }
    }
    return new Pending(pending);
  }

  /** Whether a source sentence, by its index, waits for its translation. */
  public boolean source(int index) {
    return source[index];
  }

  /** Source sentences that are missing or copied. */
  private static boolean[] open(Subject subject) {
    boolean[] open = new boolean[subject.source().size()];
    Arrays.fill(open, true);
    int[] copyOf = Untranslated.copies(subject.source(), subject.target(), subject.alignment());
    double[] missing = subject.alignment().sourceNull();
    List<Match> matches = subject.alignment().matches();
    for (int i = 0; i < matches.size(); i++) {
      Match match = matches.get(i);
      if (match.twoSided() && !isStray(matches, i)) {
        for (int source = match.sourceFrom(); source < match.sourceTo(); source++) {
          open[source] = missing[source] >= Omissions.LEAST;
        }
        for (int t = match.targetFrom(); t < match.targetTo(); t++) {
          if (copyOf[t] >= 0) {
            open[copyOf[t]] = true;
          }
        }
      }
    }
    return open;
  }

  /** Whether a match is doubtful and the sentences on both sides of it are missing. */
  private static boolean isStray(List<Match> matches, int index) {
    return matches.get(index).confidence() < DOUBTFUL
        && index > 0
        && index + 1 < matches.size()
        && matches.get(index - 1).targets() == 0
        && matches.get(index + 1).targets() == 0;
  }

  private static boolean waits(List<Segment> source, Run run) {
    return run.sentences(source) > LONGEST_SLIP
        || isLast(source, run)
        || startsSection(source, run) && endsSection(source, run);
  }

  private static boolean isLast(List<Segment> source, Run run) {
    return source.subList(run.to(), source.size()).stream().allMatch(Segment::verbatim);
  }

  /** Whether a heading, or the start of the text, opens the run or stands right before it. */
  private static boolean startsSection(List<Segment> source, Run run) {
    int before = run.from() - 1;
    while (before >= 0 && source.get(before).verbatim()) {
      before--;
    }
    return before < 0 || isHeading(source, run.from()) || isHeading(source, before);
  }

  private static boolean endsSection(List<Segment> source, Run run) {
    int behind = run.to();
    while (source.get(behind).verbatim()) {
      behind++; // a sentence comes, for the run is not the last
    }
    return isHeading(source, behind)
        && source.subList(run.from(), run.to()).stream()
            .anyMatch(segment -> segment.block().kind() != Block.Kind.HEADING);
  }

  private static boolean isHeading(List<Segment> source, int index) {
    return source.get(index).block().kind() == Block.Kind.HEADING;
  }
}
