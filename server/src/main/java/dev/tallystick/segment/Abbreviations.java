package dev.tallystick.segment;

import com.ibm.icu.impl.ICUData;
import com.ibm.icu.util.ULocale;
import com.ibm.icu.util.UResourceBundle;
import java.util.Collections;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.MissingResourceException;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * Abbreviations with a stop, from CLDR and from our own collection, matched from the start of a
 * word. (ICU's own filter matches word endings: in German it lets "Es war." not end, because of
 * "ar.".)
 */
final class Abbreviations {
  /** Before these a word is a part of a name, such as of a file or an option. */
  private static final String INSIDE_NAMES = "./\\_=@+~#";

  /** The kinds that each abbreviation is of. */
  private final Map<String, Set<String>> kinds = new HashMap<>();

  /** What comes behind each part that ends in a stop of those with blanks. */
  private final Map<String, Set<String>> heads = new HashMap<>();

  /** The letters before the last stop of each, so that most words need no longer look. */
  private final Set<String> lastWords = new HashSet<>();

  private final int longest;

  /** Those of a language. */
  Abbreviations(ULocale locale, Usage usage) {
    Set<String> listed = cldr(locale);
    listed.removeAll(usage.get(Usage.ORDINARY));
    List.of(Usage.TITLE, Usage.NUMBER, Usage.OPEN)
        .forEach(kind -> listed.removeAll(usage.get(kind)));
    // A lone letter is taken for an initial wherever it can be one, listed or not.
    listed.removeIf(entry -> entry.length() == 2);
    add(Usage.NEVER, listed);
    List.of(Usage.TITLE, Usage.NEVER, Usage.NUMBER, Usage.OPEN)
        .forEach(kind -> add(kind, usage.get(kind)));
    longest = kinds.keySet().stream().mapToInt(String::length).max().orElse(0);
  }

  private void add(String kind, Set<String> entries) {
    for (String entry : entries) {
      kinds.computeIfAbsent(entry, k -> new HashSet<>()).add(kind);
      lastWords.add(lastWord(entry, entry.length()));
      for (int at = entry.indexOf(". "); at >= 0; at = entry.indexOf(". ", at + 1)) {
        String head = entry.substring(0, at + 1);
        lastWords.add(lastWord(head, head.length()));
        heads.computeIfAbsent(head, k -> new HashSet<>()).add(entry.substring(at + 1));
      }
    }
  }

  private static Set<String> cldr(ULocale locale) {
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
      // CLDR has no list for this language.
    }
    return listed;
  }

  /** The first parts of those with blanks inside, with what comes behind each. */
  Map<String, Set<String>> heads() {
    return Collections.unmodifiableMap(heads);
  }

  /** All of a kind, in no order. */
  Set<String> of(String kind) {
    return kinds.entrySet().stream()
        .filter(entry -> entry.getValue().contains(kind))
        .map(Map.Entry::getKey)
        .collect(Collectors.toSet());
  }

  /**
   * Of what kinds the abbreviation is that ends at {@code end}, or that has a stop there and goes
   * on behind it; none if there is no such.
   */
  Set<String> kinds(String prose, int end) {
    if (!lastWords.contains(lastWord(prose, end))) {
      return Set.of();
    }
    int earliest = Math.max(0, end - longest);
    String before = plain(prose, earliest, end);
    String behind = plain(prose, end, Math.min(end + longest, prose.length()));
    for (int from = earliest; from < end - 1; from++) {
      if (startsWord(prose, from)) {
        String word = before.substring(from - earliest);
        Set<String> found = kinds(word);
        if (!found.isEmpty()) {
          return found;
        }
        if (heads.getOrDefault(word, Set.of()).stream().anyMatch(behind::startsWith)) {
          return Set.of(Usage.TITLE);
        }
      }
    }
    return Set.of();
  }

  private static String lastWord(String text, int end) {
    int from = end - 1;
    while (from > 0 && Character.isLetterOrDigit(text.charAt(from - 1))) {
      from--;
    }
    return text.substring(from, end - 1).toLowerCase(Locale.ROOT);
  }

  /** A stretch with all white space as plain blanks. */
  private static String plain(String prose, int from, int to) {
    StringBuilder stretch = new StringBuilder(prose.substring(from, to));
    for (int i = 0; i < stretch.length(); i++) {
      if (Blank.is(stretch.charAt(i))) {
        stretch.setCharAt(i, ' ');
      }
    }
    return stretch.toString();
  }

  /** At the start of a sentence the first letter may be a capital. */
  private Set<String> kinds(String word) {
    Set<String> found = kinds.get(word);
    if (found == null && Character.isUpperCase(word.charAt(0))) {
      found = kinds.get(Character.toLowerCase(word.charAt(0)) + word.substring(1));
    }
    return found == null ? Set.of() : found;
  }

  /**
   * Whether a word starts here that may be an abbreviation: not in the midst of a word, of the name
   * of a file ({@code main.cf}), of an option ({@code -L}) or of a compound ({@code glibc-doc}).
   */
  static boolean startsWord(String prose, int at) {
    if (at == 0) {
      return true;
    }
    char before = prose.charAt(at - 1);
    if (before == '-') {
      boolean compound = at > 1 && !Blank.is(prose.charAt(at - 2));
      return compound && Character.isUpperCase(prose.charAt(at));
    }
    return !Character.isLetterOrDigit(before) && INSIDE_NAMES.indexOf(before) < 0;
  }
}
