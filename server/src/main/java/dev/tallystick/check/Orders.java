package dev.tallystick.check;

import dev.tallystick.align.Match;
import dev.tallystick.align.Move;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Sentences that stand at another place than in the source; a run of them is one finding. */
final class Orders {
  private Orders() {}

  static List<Finding> find(Subject subject) {
    Map<Integer, Integer> sourceOf = new HashMap<>();
    for (Move move : subject.alignment().moves()) {
      sourceOf.put(move.target(), move.source());
    }
    double[] likely = likely(subject);
    Wording wording = new Wording(subject.targetLanguage());
    List<Finding> findings = new ArrayList<>();
    for (Run run : Run.of(subject.target(), sourceOf::containsKey)) {
      int first = sourceOf.get(run.from());
      int last = sourceOf.get(run.to() - 1);
      Run source = new Run(Math.min(first, last), Math.max(first, last) + 1);
      findings.add(
          new Finding(
              Code.ORDER,
              OnSide.TARGET,
              run.span(subject.target()),
              source.span(subject.source()),
              Confidence.of(likely, run),
              wording.order(run.sentences(subject.target())),
              ""));
    }
    return findings;
  }

  /** That of having no counterpart in its place; of a sentence that has one, that of the match. */
  private static double[] likely(Subject subject) {
    double[] likely = subject.alignment().targetNull().clone();
    for (Match match : subject.alignment().matches()) {
      if (match.twoSided()) {
        Arrays.fill(likely, match.targetFrom(), match.targetTo(), match.confidence());
      }
    }
    return likely;
  }
}
