package dev.tallystick.segment;

import com.ibm.icu.util.ULocale;
import java.util.Collection;
import java.util.Comparator;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * Our own rules for a language in the form of SRX 2.0 (from memory), as far as it can say them: the
 * abbreviations, initials, numbers and stops. What looks at the whole paragraph, such as which of
 * two like quotation marks closes, it cannot.
 */
public final class SrxExport {
  private static final String CLOSERS = "[\\p{Pe}\\p{Pf}\"'“]*";
  private static final String WORD_START = "(?<![\\p{L}\\p{N}./\\\\_=@+~#-])";
  private static final String BLANK = "\\s+";

  private static final Pattern MARK = Pattern.compile("[^\\p{L}\\p{M}\\p{N} ]");

  private final StringBuilder xml = new StringBuilder();
  private final Usage usage;
  private final Abbreviations abbreviations;

  private SrxExport(ULocale locale) {
    this.usage = Usage.of(locale.getLanguage());
    this.abbreviations = new Abbreviations(locale, usage);
  }

  /** The text of an SRX file for a language, a BCP 47 tag. */
  public static String of(String language) {
    ULocale locale = ULocale.forLanguageTag(language);
    return new SrxExport(locale).file(locale.getLanguage(), language.equals("und"));
  }

  private String file(String language, boolean any) {
    xml.append("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n")
        .append("<srx xmlns=\"http://www.lisa.org/srx20\" version=\"2.0\">\n")
        .append("  <header segmentsubflows=\"yes\" cascade=\"no\"/>\n  <body>\n")
        .append("    <languagerules>\n      <languagerule languagerulename=\"rules\">\n");
    abbreviations();
    numbers();
    stops();
    xml.append("      </languagerule>\n    </languagerules>\n    <maprules>\n")
        .append("      <languagemap languagepattern=\"")
        .append(any ? ".*" : language + "(-.*)?")
        .append("\" languagerulename=\"rules\"/>\n    </maprules>\n  </body>\n</srx>\n");
    return xml.toString();
  }

  private void abbreviations() {
    String starts = oneOf(usage.get(Usage.STARTERS));
    String inside = starts.isEmpty() ? BLANK : BLANK + "(?!(?:" + starts + ")(?!\\p{L}))";
    exceptions(Usage.TITLE, BLANK);
    exceptions(Usage.NUMBER, BLANK + "(?:\\p{N}|[IVX]+\\b)");
    exceptions(Usage.NEVER, inside);
    if (usage.has(Usage.CAPITALS, "nouns")) {
      exceptions(Usage.OPEN, inside);
    }
    new TreeMap<>(abbreviations.heads())
        .forEach(
            (head, rests) -> rule(false, WORD_START + pattern(head), "(?:" + oneOf(rests) + ")"));
    rule(false, WORD_START + "\\p{Ll}\\.", BLANK + "\\p{L}\\.");
    rule(false, WORD_START + "(?:\\p{L}\\.){2,}", inside);
    rule(false, WORD_START + "\\p{Lu}\\.", inside + "\\p{Lu}");
  }

  private void exceptions(String kind, String after) {
    String entries = oneOf(abbreviations.of(kind));
    if (!entries.isEmpty()) {
      rule(false, WORD_START + "(?:" + entries + ")", after);
    }
  }

  /** Longest first, else sorted, so that the file is always the same. */
  private static String oneOf(Collection<String> entries) {
    TreeSet<String> sorted =
        new TreeSet<>(
            Comparator.comparing(String::length).reversed().thenComparing(entry -> entry));
    sorted.addAll(entries);
    return sorted.stream().map(SrxExport::pattern).collect(Collectors.joining("|"));
  }

  /** An entry; its first letter may be a capital, as at the start of a sentence. */
  private static String pattern(String entry) {
    String plain = MARK.matcher(entry).replaceAll("\\\\$0").replace(" ", "\\s");
    char first = entry.charAt(0);
    return Character.isLowerCase(first)
        ? "[" + first + Character.toUpperCase(first) + "]" + plain.substring(1)
        : plain;
  }

  private void numbers() {
    String months = oneOf(usage.get(Usage.MONTHS));
    if (!months.isEmpty()) {
      rule(false, "\\b\\p{N}{1,2}\\.", BLANK + "(?:" + months + ")(?!\\p{L})");
    }
    String counted = oneOf(usage.get(Usage.COUNTED));
    if (!counted.isEmpty()) {
      rule(false, "\\b(?i:" + counted + ")\\s(?:\\p{N}{1,2}|[IVX]{1,5})\\.", BLANK + "\\p{Lu}");
    }
  }

  private void stops() {
    rule(false, "[!?]" + "[\\p{Pe}\\p{Pf}\"'“]+", BLANK + "\\p{Ll}");
    rule(true, "[.!?؟۔।॥։።។။…]" + CLOSERS, BLANK + "[^\\p{Ll}\\s]");
    rule(true, "[!?]", BLANK);
    rule(true, "[。．｡！？]+[\\p{Pe}\\p{Pf}]*", "[^\\p{Pe}\\p{Pf}、，：；]");
  }

  private void rule(boolean breaks, String before, String after) {
    xml.append("        <rule break=\"").append(breaks ? "yes" : "no").append("\">\n");
    pattern("beforebreak", before);
    pattern("afterbreak", after);
    xml.append("        </rule>\n");
  }

  private void pattern(String element, String pattern) {
    String escaped = pattern.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
    xml.append("          <").append(element).append('>').append(escaped);
    xml.append("</").append(element).append(">\n");
  }
}
