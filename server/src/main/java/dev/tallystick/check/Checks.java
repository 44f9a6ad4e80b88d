package dev.tallystick.check;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** All checks. A pure function of the subject. */
public final class Checks {
  private Checks() {}

  /** The findings of a pair: those on the source first, each side in the order of its text. */
  public static List<Finding> findings(Subject subject) {
    return findings(subject, Pending.of(subject), Vigilance.BALANCED);
  }

  /** The same, where it is known which sentences are pending, and how sure findings must be. */
  public static List<Finding> findings(Subject subject, Pending pending, Vigilance vigilance) {
    List<Finding> findings = new ArrayList<>();
    findings.addAll(Omissions.find(subject, pending, vigilance));
    findings.addAll(Additions.find(subject, vigilance));
    findings.addAll(Untranslated.find(subject, pending));
    findings.addAll(Lengths.find(subject, pending, vigilance));
    findings.addAll(Orders.find(subject));
    Collections.sort(findings);
    return List.copyOf(findings);
  }
}
