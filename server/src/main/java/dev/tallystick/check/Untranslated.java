package dev.tallystick.check;

import dev.tallystick.align.Alignment;
import dev.tallystick.align.Match;
import dev.tallystick.prose.Block;
import dev.tallystick.segment.Segment;
import dev.tallystick.segment.Words;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Sentences left as they are in the source; a run of them is one finding. Short ones are let pass:
 * names, titles and commands stay the same in many languages. So they do not end a run either, but
 * a heading does, and what is translated.
 */
public final class Untranslated {
  private static final int FEWEST_WORDS = 5;

  private final Subject subject;
  private final Pending pending;
  private final int[] sourceOf;
  private final double[] confidence;
  private final List<Finding> findings = new ArrayList<>();

  private Untranslated(Subject subject, Pending pending) {
    this.subject = subject;
    this.pending = pending;
    this.sourceOf = same(subject.source(), subject.target(), subject.alignment());
    this.confidence = new double[sourceOf.length];
    for (Match match : subject.alignment().matches()) {
      Arrays.fill(confidence, match.targetFrom(), match.targetTo(), match.confidence());
    }
  }

  static List<Finding> find(Subject subject, Pending pending) {
    Untranslated untranslated = new Untranslated(subject, pending);
    untranslated.find();
    return untranslated.findings;
  }

  private void find() {
    List<Integer> run = new ArrayList<>();
    for (int t = 0; t < sourceOf.length; t++) {
      Segment segment = subject.target().get(t);
      if (segment.verbatim()) {
        continue;
      }
      boolean same = sourceOf[t] >= 0 && !pending.source(sourceOf[t]);
      if (!same || segment.block().kind() == Block.Kind.HEADING) {
        report(run);
      }
      if (same && isProse(segment)) {
        run.add(t);
      }
    }
    report(run);
  }

  /** Reports the sentences of a run, if there are any, and empties it. */
  private void report(List<Integer> run) {
    if (run.isEmpty()) {
      return;
    }
    int first = run.get(0);
    int last = run.get(run.size() - 1);
    findings.add(
        new Finding(
            Code.UNTRANSLATED,
            OnSide.TARGET,
            new Run(first, last + 1).span(subject.target()),
            new Run(sourceOf[first], sourceOf[last] + 1).span(subject.source()),
            run.stream().mapToDouble(t -> confidence[t]).average().orElse(0),
            new Wording(subject.targetLanguage()).untranslated(run.size()),
            ""));
    run.clear();
  }

  /** For each target sentence the source sentence that it is a copy of, or -1; no short ones. */
  public static int[] copies(List<Segment> source, List<Segment> target, Alignment alignment) {
    int[] copyOf = same(source, target, alignment);
    for (int t = 0; t < copyOf.length; t++) {
      if (copyOf[t] >= 0 && !isProse(target.get(t))) {
        copyOf[t] = -1;
      }
    }
    return copyOf;
  }

  /** The same, and short ones as well. */
  private static int[] same(List<Segment> source, List<Segment> target, Alignment alignment) {
    int[] sourceOf = new int[target.size()];
    Arrays.fill(sourceOf, -1);
    for (Match match : alignment.matches()) {
      if (match.sources() == match.targets()) {
        for (int k = 0; k < match.targets(); k++) {
          int s = match.sourceFrom() + k;
          int t = match.targetFrom() + k;
          if (same(source.get(s).prose(), target.get(t).prose())) {
            sourceOf[t] = s;
          }
        }
      }
    }
    return sourceOf;
  }

  private static boolean same(String source, String target) {
    return !source.isEmpty() && collapsed(source).equals(collapsed(target));
  }

  private static String collapsed(String prose) {
    return prose.strip().replaceAll("\\s+", " ");
  }

  /**
   * Enough words of letters alone, or enough letters of a script without blanks, besides what is
   * copied in any language; and no list of single words, which are names and keywords.
   */
  private static boolean isProse(Segment segment) {
    String prose = segment.withoutCopied();
    long words =
        Words.of(prose).stream()
            .filter(word -> word.codePoints().allMatch(Character::isLetter))
            .filter(word -> word.length() > 1)
            .count();
    return words >= FEWEST_WORDS && !isList(prose) || WordCount.unspaced(prose) >= 2 * FEWEST_WORDS;
  }

  private static boolean isList(String prose) {
    return Arrays.stream(prose.split("[,;]")).allMatch(item -> item.strip().indexOf(' ') < 0);
  }
}
