package dev.tallystick.check;

import java.util.Locale;
import java.util.Optional;

/** The kinds of finding, by their names in MQM and ISO 5060 where those have one. */
public enum Code {
  /** Nothing in the translation stands for a source sentence. */
  OMISSION(Severity.WARNING),
  /** Nothing in the source stands for a sentence of the translation. */
  ADDITION(Severity.WARNING),
  /** The translation of a sentence is the source sentence itself. */
  UNTRANSLATED(Severity.WARNING),
  /** A translation is much shorter or longer than its source would suggest. */
  LENGTH(Severity.INFORMATION),
  /** A sentence stands at another place than in the source. */
  ORDER(Severity.INFORMATION);

  private final Severity severity;

  Code(Severity severity) {
    this.severity = severity;
  }

  /**
   * How loudly it is said where no project says otherwise. Never an error: that is the reviser's
   * verdict.
   */
  public Severity severity() {
    return severity;
  }

  /** The name in output and settings. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /** The code with this name. */
  public static Optional<Code> of(String word) {
    for (Code code : values()) {
      if (code.word().equals(word)) {
        return Optional.of(code);
      }
    }
    return Optional.empty();
  }
}
