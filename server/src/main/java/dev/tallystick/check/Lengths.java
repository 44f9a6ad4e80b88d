package dev.tallystick.check;

import dev.tallystick.align.Alignment;
import dev.tallystick.align.Match;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Translations much shorter or longer than their source would suggest: a sentence cut short, a
 * clause lost. Judged by the log of the length ratio on a robust scale (median and median absolute
 * deviation over the pair's own matches), after dividing by the spread that the fitted model gives
 * to a source of that length: short sentences vary more.
 */
final class Lengths {
  /** No verdict on a shorter source: too much varies there (characters). */
  private static final int SHORTEST = 40;

  /**
   * Robust deviations above the usual ratio before it is worth a word. More than below it:
   * translators explain more often than they drop a clause.
   */
  private static final double LONG = 9;

  /** So many deviations around the median are called usual. */
  private static final double USUAL = 2;

  /** So many ordinary matches are mixed in, so that a handful of sentences cannot look exact. */
  private static final int PRIOR = 20;

  private final Subject subject;
  private final Pending pending;
  private final Vigilance vigilance;
  private final Alignment alignment;
  private double median;
  private double scale;

  private Lengths(Subject subject, Pending pending, Vigilance vigilance) {
    this.subject = subject;
    this.pending = pending;
    this.vigilance = vigilance;
    this.alignment = subject.alignment();
  }

  static List<Finding> find(Subject subject, Pending pending, Vigilance vigilance) {
    return new Lengths(subject, pending, vigilance).find();
  }

  private List<Finding> find() {
    List<Match> judged =
        alignment.matches().stream()
            .filter(match -> match.twoSided() && match.confidence() > 0.5)
            .filter(match -> weight(subject.source(), match.sourceFrom(), match.sourceTo()) > 0)
            .filter(match -> !isCopy(match))
            .toList();
    median = median(judged.stream().mapToDouble(this::logRatio).toArray());
    double[] off =
        judged.stream()
            .mapToDouble(match -> Math.abs(logRatio(match) - median) / spread(match))
            .toArray();
    double mad = 1.4826 * median(off);
    scale = Math.max(1, (mad * off.length + PRIOR) / (off.length + PRIOR));
    List<Finding> findings = new ArrayList<>();
    for (Match match : judged) {
      double z = (logRatio(match) - median) / spread(match) / scale;
      boolean implausible = z <= -vigilance.shortfall() && !isUnfinished(match) || z >= LONG;
      if (implausible && sourceLength(match) >= SHORTEST) {
        findings.add(finding(match));
      }
    }
    return findings;
  }

  private Finding finding(Match match) {
    int l1 = characters(subject.source(), match.sourceFrom(), match.sourceTo());
    int l2 = characters(subject.target(), match.targetFrom(), match.targetTo());
    double usual = sourceLength(match) * Math.exp(median) * l2 / Math.max(1, targetLength(match));
    double slack = USUAL * spread(match) * scale;
    int low = (int) Math.round(usual * Math.exp(-slack));
    int high = (int) Math.round(usual * Math.exp(slack));
    String message = new Wording(subject.targetLanguage()).length(l1, l2, low, high);
    return new Finding(
        Code.LENGTH,
        OnSide.TARGET,
        span(subject.target(), match.targetFrom(), match.targetTo()),
        span(subject.source(), match.sourceFrom(), match.sourceTo()),
        match.confidence(),
        message,
        "");
  }

  /** Whether somebody is still at it: the sentence behind it waits for its translation. */
  private boolean isUnfinished(Match match) {
    return match.sourceTo() < subject.source().size() && pending.source(match.sourceTo());
  }

  private boolean isCopy(Match match) {
    return match.sources() == 1
        && match.targets() == 1
        && subject
            .source()
            .get(match.sourceFrom())
            .prose()
            .equals(subject.target().get(match.targetFrom()).prose());
  }

  /** Standard deviation of the log ratio that the fitted model gives to this source length. */
  private double spread(Match match) {
    double expected = alignment.lengths().expected(sourceLength(match));
    return alignment.lengths().deviation(sourceLength(match)) / Math.max(1, expected);
  }

  private double logRatio(Match match) {
    return Math.log((double) Math.max(1, targetLength(match)) / sourceLength(match));
  }

  private int sourceLength(Match match) {
    return weight(subject.source(), match.sourceFrom(), match.sourceTo());
  }

  private int targetLength(Match match) {
    return weight(subject.target(), match.targetFrom(), match.targetTo());
  }

  private static int weight(List<Segment> segments, int from, int to) {
    return segments.subList(from, to).stream().mapToInt(Segment::weight).sum();
  }

  private static int characters(List<Segment> segments, int from, int to) {
    return segments.subList(from, to).stream().mapToInt(Segment::length).sum();
  }

  private static Span span(List<Segment> segments, int from, int to) {
    return segments.get(from).span().cover(segments.get(to - 1).span());
  }

  private static double median(double[] values) {
    if (values.length == 0) {
      return 0;
    }
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    int middle = sorted.length / 2;
    return sorted.length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
  }
}
