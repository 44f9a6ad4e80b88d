package dev.tallystick.check;

import dev.tallystick.align.Move;
import dev.tallystick.prose.Block;
import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * Sentences of the translation that nothing in the source stands for; a run is one finding. A
 * footnote is more quietly told: translators add notes of their own.
 */
final class Additions {
  private final Subject subject;
  private final Vigilance vigilance;
  private final double[] extra;
  private final Set<Integer> moved;
  private final Slight slight;

  private Additions(Subject subject, Vigilance vigilance) {
    this.subject = subject;
    this.vigilance = vigilance;
    this.extra = subject.alignment().targetNull();
    this.moved = subject.alignment().moves().stream().map(Move::target).collect(Collectors.toSet());
    this.slight = new Slight(subject, OnSide.TARGET);
  }

  static List<Finding> find(Subject subject, Vigilance vigilance) {
    Additions additions = new Additions(subject, vigilance);
    Neighbours neighbours = new Neighbours(subject, OnSide.TARGET);
    Wording wording = new Wording(subject.targetLanguage());
    List<Finding> findings = new ArrayList<>();
    for (Run run : additions.runs(false)) {
      String message = wording.addition(run.sentences(subject.target()));
      findings.add(additions.finding(run, neighbours.gap(run), message));
    }
    for (Run run : additions.runs(true)) {
      String message = wording.addedNote(run.sentences(subject.target()));
      findings.add(additions.finding(run, neighbours.gap(run), message).at(Severity.INFORMATION));
    }
    return findings;
  }

  private List<Run> runs(boolean footnotes) {
    return Run.of(
        subject.target(),
        i ->
            extra[i] >= vigilance.least()
                && !moved.contains(i)
                && !slight.is(i)
                && isFootnote(i) == footnotes);
  }

  private boolean isFootnote(int index) {
    return subject.target().get(index).block().kind() == Block.Kind.NOTE;
  }

  private Finding finding(Run run, Span gap, String message) {
    return new Finding(
        Code.ADDITION,
        OnSide.TARGET,
        run.span(subject.target()),
        gap,
        Confidence.of(extra, run),
        message,
        "");
  }
}
