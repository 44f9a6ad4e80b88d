package dev.tallystick.check;

import dev.tallystick.align.Match;
import dev.tallystick.segment.Words;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Sentences left as they are in the source. Short ones are let pass: names, titles and commands
 * stay the same in many languages.
 */
final class Untranslated {
  private static final int FEWEST_WORDS = 5;

  private Untranslated() {}

  static List<Finding> find(Subject subject, Pending pending) {
    int[] copyOf = copies(subject);
    Wording wording = new Wording(subject.targetLanguage());
    List<Finding> findings = new ArrayList<>();
    for (Match match : subject.alignment().matches()) {
      for (int t = match.targetFrom(); t < match.targetTo(); t++) {
        if (copyOf[t] >= 0 && !pending.source(copyOf[t])) {
          findings.add(
              new Finding(
                  Code.UNTRANSLATED,
                  OnSide.TARGET,
                  subject.target().get(t).span(),
                  subject.source().get(copyOf[t]).span(),
                  match.confidence(),
                  wording.untranslated(),
                  ""));
        }
      }
    }
    return findings;
  }

  /** For each target sentence the source sentence that it copies, or -1. */
  static int[] copies(Subject subject) {
    int[] copyOf = new int[subject.target().size()];
    Arrays.fill(copyOf, -1);
    for (Match match : subject.alignment().matches()) {
      if (match.sources() == match.targets()) {
        for (int k = 0; k < match.targets(); k++) {
          int s = match.sourceFrom() + k;
          int t = match.targetFrom() + k;
          if (same(subject.source().get(s).prose(), subject.target().get(t).prose())) {
            copyOf[t] = s;
          }
        }
      }
    }
    return copyOf;
  }

  private static boolean same(String source, String target) {
    return !source.isEmpty() && collapsed(source).equals(collapsed(target)) && isProse(source);
  }

  private static String collapsed(String prose) {
    return prose.strip().replaceAll("\\s+", " ");
  }

  /** Enough words of letters alone, or enough letters of a script without blanks. */
  private static boolean isProse(String prose) {
    long words =
        Words.of(prose).stream()
            .filter(word -> word.codePoints().allMatch(Character::isLetter))
            .filter(word -> word.length() > 1)
            .count();
    return words >= FEWEST_WORDS || WordCount.unspaced(prose) >= 2 * FEWEST_WORDS;
  }
}
