package dev.tallystick.segment;

import com.ibm.icu.util.ULocale;
import java.lang.Character.UnicodeScript;
import java.util.Locale;
import java.util.Set;
import java.util.regex.Pattern;

/** Full stops that end no sentence: behind abbreviations, initials and ordinal numbers. */
final class Stops {
  /** Roman numbers up to 39. Longer ones are rare, and look like other abbreviations. */
  private static final Pattern ROMAN = Pattern.compile("X{0,3}(IX|IV|V?I{1,3}|V)|X{1,3}");

  private final Usage usage;
  private final Abbreviations abbreviations;
  private final boolean nouns;

  /** Those of a language. */
  Stops(ULocale locale) {
    this.usage = Usage.of(locale.getLanguage());
    this.abbreviations = new Abbreviations(locale, usage);
    this.nouns = usage.has(Usage.CAPITALS, "nouns");
  }

  /** What is known of the language. */
  Usage usage() {
    return usage;
  }

  /**
   * Whether the sentence goes on.
   *
   * @param end the place behind the full stop
   * @param next where the next word or number starts
   */
  boolean goesOn(String prose, int end, int next) {
    Set<String> kinds = abbreviations.kinds(prose, end);
    if (kinds.isEmpty()) {
      return lettersWithStops(prose, end) && !starts(prose, next)
          || initial(prose, end, next)
          || ordinal(prose, end, next);
    }
    boolean unit = kinds.contains(Usage.OPEN) && numberBefore(prose, wordBefore(prose, end - 1));
    if (kinds.contains(Usage.TITLE) && !unit
        || kinds.contains(Usage.NUMBER) && isNumber(prose, next)) {
      return true;
    }
    boolean inside = kinds.contains(Usage.NEVER) || nouns && kinds.contains(Usage.OPEN);
    return inside ? !starts(prose, next) : initial(prose, end, next);
  }

  /** Letters with a stop each, as in U.S. or i.e.: an abbreviation in any language. */
  private static boolean lettersWithStops(String prose, int end) {
    int from = end;
    while (from >= 2
        && prose.charAt(from - 1) == '.'
        && Character.isLetter(prose.charAt(from - 2))) {
      from -= 2;
    }
    return end - from >= 4 && Abbreviations.startsWord(prose, from);
  }

  /**
   * A lone capital letter before a name in the same script or another initial. Not before a word
   * that opens sentences ("in C. Then"), not in a compound ("Alt-C."; but "J.-P."), and not behind
   * a number ("at 5 V. Voltage"). A lone small letter abbreviates before another lone letter ("z.
   * B.").
   */
  private boolean initial(String prose, int end, int next) {
    if (end < 2
        || !Character.isLetter(prose.charAt(end - 2))
        || !Abbreviations.startsWord(prose, end - 2)
        || end > 3 && prose.charAt(end - 3) == '-' && prose.charAt(end - 4) != '.'
        || numberBefore(prose, end - 2)) {
      return false;
    }
    boolean letterNext =
        next + 1 < prose.length()
            && Character.isLetter(prose.charAt(next))
            && prose.charAt(next + 1) == '.';
    if (!Character.isUpperCase(prose.charAt(end - 2))) {
      return letterNext;
    }
    char c = prose.charAt(next);
    boolean sameScript = UnicodeScript.of(c) == UnicodeScript.of(prose.charAt(end - 2));
    return c == '&'
        || Character.isUpperCase(c) && sameScript && (letterNext || !starts(prose, next));
  }

  /**
   * A number that counts off, in languages that write a stop behind it, before a capital letter: at
   * the start, before a month, or, as nouns have capitals, behind an article or the like. One of
   * more than two digits is rather an amount or a year.
   */
  private boolean ordinal(String prose, int end, int next) {
    int from = wordBefore(prose, end - 1);
    boolean digits = end - 1 - from <= 2 && isDigits(prose, from, end - 1);
    boolean roman = isRoman(prose, from, end - 1);
    boolean written =
        digits && usage.has(Usage.ORDINALS, "digits")
            || roman && usage.has(Usage.ORDINALS, "roman");
    if (!written
        || !Abbreviations.startsWord(prose, from)
        || !Character.isUpperCase(prose.charAt(next))
        || starts(prose, next)) {
      return false;
    }
    int last = skipBack(prose, from);
    return last == 0
        || !nouns
        || usage.has(Usage.MONTHS, word(prose, next))
        || usage.has(
            Usage.COUNTED, prose.substring(wordBefore(prose, last), last).toLowerCase(Locale.ROOT));
  }

  /** Whether a word stands at a place that opens sentences. */
  boolean starts(String prose, int at) {
    String word = word(prose, at);
    int next = at + word.length();
    while (next < prose.length() && Blank.is(prose.charAt(next))) {
      next++;
    }
    boolean smallNext = next < prose.length() && Character.isLowerCase(prose.charAt(next));
    return usage.has(Usage.STARTERS, word) && (smallNext || !usage.has(Usage.NAMES, word))
        || usage.has(Usage.SECOND, word(prose, next));
  }

  /** The word at a place, with an apostrophe if one ends it, as in "L'". */
  private static String word(String prose, int at) {
    int to = at;
    while (to < prose.length() && Character.isLetter(prose.charAt(to))) {
      to++;
    }
    boolean elided = to < prose.length() && "'’".indexOf(prose.charAt(to)) >= 0 && to - at <= 2;
    return elided ? prose.substring(at, to) + "'" : prose.substring(at, to);
  }

  /** Whether a number stands at a place, in digits or Roman. */
  private static boolean isNumber(String prose, int at) {
    int to = wordEnd(prose, at);
    return Character.isDigit(prose.charAt(at)) || isRoman(prose, at, to);
  }

  private static boolean numberBefore(String prose, int at) {
    int last = skipBack(prose, at);
    return last > 0 && last < at && Character.isDigit(prose.charAt(last - 1));
  }

  /** The place behind the last character before a place that is no white space. */
  private static int skipBack(String prose, int at) {
    int to = at;
    while (to > 0 && Blank.is(prose.charAt(to - 1))) {
      to--;
    }
    return to;
  }

  private static boolean isDigits(String prose, int from, int to) {
    int at = from;
    while (at < to && Character.isDigit(prose.charAt(at))) {
      at++;
    }
    return from < to && at == to;
  }

  private static boolean isRoman(String prose, int from, int to) {
    return from < to
        && "IVX".indexOf(prose.charAt(from)) >= 0
        && ROMAN.matcher(prose).region(from, to).matches();
  }

  /** Where the letters and digits before a place start. */
  private static int wordBefore(String prose, int to) {
    int from = to;
    while (from > 0 && Character.isLetterOrDigit(prose.charAt(from - 1))) {
      from--;
    }
    return from;
  }

  private static int wordEnd(String prose, int from) {
    int to = from;
    while (to < prose.length() && Character.isLetterOrDigit(prose.charAt(to))) {
      to++;
    }
    return to;
  }
}
