package dev.tallystick.check;

import dev.tallystick.align.Move;
import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/** Source sentences that nothing stands for; a run of them is one finding. */
final class Omissions {
  /** From this posterior on a sentence counts as missing, whatever is told. */
  static final double LEAST = 0.5;

  private Omissions() {}

  static List<Finding> find(Subject subject, Pending pending, Vigilance vigilance) {
    double[] missing = subject.alignment().sourceNull();
    Set<Integer> moved =
        subject.alignment().moves().stream().map(Move::source).collect(Collectors.toSet());
    Slight slight = new Slight(subject, OnSide.SOURCE);
    Neighbours neighbours = new Neighbours(subject, OnSide.SOURCE);
    Wording wording = new Wording(subject.targetLanguage());
    List<Finding> findings = new ArrayList<>();
    for (Run run :
        Run.of(
            subject.source(),
            i ->
                missing[i] >= vigilance.least()
                    && !moved.contains(i)
                    && !pending.source(i)
                    && !slight.is(i))) {
      Span span = run.span(subject.source());
      int sentences = run.sentences(subject.source());
      String message =
          wording.omission(sentences, neighbours.proseBefore(run), neighbours.proseBehind(run));
      String there = wording.missingHere(subject.source().get(run.from()).prose(), sentences);
      findings.add(
          new Finding(
              Code.OMISSION,
              OnSide.SOURCE,
              span,
              neighbours.gap(run),
              Confidence.of(missing, run),
              message,
              there));
    }
    return findings;
  }
}
