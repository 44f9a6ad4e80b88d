package dev.tallystick.segment;

import java.util.List;
import java.util.regex.Pattern;

/**
 * Rules for sentence borders as an SRX 2.0 file states them (its meaning is told here from memory).
 * For a language those of the first pattern that fits its tag count, or with a cascade those of all
 * that fit, one after the other. At each place the first rule that tells of it decides; no sentence
 * ends where none does.
 */
public final class Srx {
  /** No rules for any language. */
  public static final Srx NONE = new Srx(false, List.of());

  private final boolean cascade;
  private final List<Mapped> maps;

  /** The rules for the languages whose tags match a pattern. */
  record Mapped(Pattern language, List<SrxRule> rules) {}

  Srx(boolean cascade, List<Mapped> maps) {
    this.cascade = cascade;
    this.maps = List.copyOf(maps);
  }

  /** The rules for a language, a BCP 47 tag, in their order. */
  List<SrxRule> rules(String language) {
    StepLimit tag = SrxRule.limited(language);
    return maps.stream()
        .filter(mapped -> fits(mapped.language(), tag))
        .limit(cascade ? Long.MAX_VALUE : 1)
        .flatMap(mapped -> mapped.rules().stream())
        .toList();
  }

  private static boolean fits(Pattern pattern, StepLimit tag) {
    try {
      return pattern.matcher(tag).matches();
    } catch (StepLimit.Exceeded | StackOverflowError e) {
      return false;
    }
  }
}
