package dev.tallystick.check;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * Which findings are told, and how loudly. Never as an error: that is the reviser's verdict.
 *
 * @param changed the codes whose level is another than usual; empty for one that is off. A fact of
 *     the project
 * @param vigilance how sure a finding must be. The taste of the user
 */
public record Levels(Map<Code, Optional<Severity>> changed, Vigilance vigilance) {
  /** Each code at its own level. */
  public static final Levels USUAL = new Levels(Map.of());

  /** The word for a code of which nothing is said. */
  public static final String OFF = "off";

  /** Takes a copy. */
  public Levels {
    changed = Map.copyOf(changed);
  }

  /** Those of a project, for a user who has said nothing. */
  public Levels(Map<Code, Optional<Severity>> changed) {
    this(changed, Vigilance.BALANCED);
  }

  /** The same for a user of this taste. */
  public Levels at(Vigilance taste) {
    return taste == vigilance ? this : new Levels(changed, taste);
  }

  /** How loudly findings of this code are said; empty if they are not. */
  public Optional<Severity> of(Code code) {
    return changed.getOrDefault(code, Optional.of(code.severity()));
  }

  /** The findings that are said, each at its level, in the order given. */
  public List<Finding> apply(List<Finding> findings) {
    return changed.isEmpty() ? findings : findings.stream().flatMap(this::apply).toList();
  }

  /** A finding of a code that nothing is set for stays as it is. */
  private Stream<Finding> apply(Finding finding) {
    return changed.containsKey(finding.code())
        ? of(finding.code()).map(finding::at).stream()
        : Stream.of(finding);
  }
}
