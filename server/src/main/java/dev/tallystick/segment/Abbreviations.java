package dev.tallystick.segment;

import com.ibm.icu.impl.ICUData;
import com.ibm.icu.util.ULocale;
import com.ibm.icu.util.UResourceBundle;
import java.util.HashSet;
import java.util.MissingResourceException;
import java.util.Set;

/**
 * The abbreviations behind which no sentence ends, from CLDR, matched from the start of a word.
 * (ICU's own filter matches word endings: in German it lets "Es war." not end, because of "ar.".)
 */
final class Abbreviations {
  /** CLDR lists these too, but they end sentences far more often than they abbreviate. */
  private static final Set<String> ORDINARY =
      Set.of(
          "Act.", "All.", "As.", "By.", "Do.", "Go.", "Hat.", "In.", "Is.", "Job.", "Link.",
          "Long.", "On.", "Or.", "PIN.", "Pro.", "Test.", "To.", "Up.", "am.");

  private final Set<String> listed;
  private final int longest;

  private Abbreviations(Set<String> listed) {
    this.listed = listed;
    this.longest = listed.stream().mapToInt(String::length).max().orElse(0);
  }

  static Abbreviations of(ULocale locale) {
    Set<String> listed = new HashSet<>();
    try {
      UResourceBundle list =
          UResourceBundle.getBundleInstance(ICUData.ICU_BRKITR_BASE_NAME, locale.getLanguage())
              .get("exceptions")
              .get("SentenceBreak");
      for (int i = 0; i < list.getSize(); i++) {
        listed.add(list.getString(i));
      }
    } catch (MissingResourceException e) {
      // CLDR has no list for this language: every full stop counts.
    }
    listed.removeAll(ORDINARY);
    return new Abbreviations(listed);
  }

  /** Whether the prose up to {@code end}, white space left out, ends in an abbreviation. */
  boolean endAt(String prose, int end) {
    int to = end;
    while (to > 0 && Blank.is(prose.charAt(to - 1))) {
      to--;
    }
    int earliest = Math.max(0, to - longest);
    for (int from = to - 1; from >= earliest; from--) {
      boolean wordStart = from == 0 || !Character.isLetterOrDigit(prose.charAt(from - 1));
      if (wordStart && listed.contains(prose.substring(from, to))) {
        return true;
      }
    }
    return false;
  }
}
