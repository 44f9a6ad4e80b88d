package dev.tallystick.check;

import dev.tallystick.align.Move;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/** Sentences of the translation that nothing in the source stands for; a run is one finding. */
final class Additions {
  private Additions() {}

  static List<Finding> find(Subject subject, Vigilance vigilance) {
    double[] extra = subject.alignment().targetNull();
    Set<Integer> moved =
        subject.alignment().moves().stream().map(Move::target).collect(Collectors.toSet());
    Slight slight = new Slight(subject, OnSide.TARGET);
    Neighbours neighbours = new Neighbours(subject, OnSide.TARGET);
    Wording wording = new Wording(subject.targetLanguage());
    List<Finding> findings = new ArrayList<>();
    for (Run run :
        Run.of(
            subject.target(),
            i -> extra[i] >= vigilance.least() && !moved.contains(i) && !slight.is(i))) {
      findings.add(
          new Finding(
              Code.ADDITION,
              OnSide.TARGET,
              run.span(subject.target()),
              neighbours.gap(run),
              Confidence.of(extra, run),
              wording.addition(run.sentences(subject.target())),
              ""));
    }
    return findings;
  }
}
