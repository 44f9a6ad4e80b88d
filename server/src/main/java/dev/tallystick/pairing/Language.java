package dev.tallystick.pairing;

import com.ibm.icu.text.DisplayContext;
import com.ibm.icu.text.LocaleDisplayNames;
import com.ibm.icu.util.ULocale;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;

/**
 * A language that CLDR knows, possibly with script and region.
 *
 * @param tag its BCP 47 tag in canonical form and case: {@code de}, {@code pt-BR}, {@code zh-Hant};
 *     {@code und} when nothing is known
 */
public record Language(String tag) implements Comparable<Language> {
  /** The language of a file that says nothing about it. */
  public static final Language UNKNOWN = new Language("und");

  /**
   * Language, script, region. Variants and extensions are not taken: no file is told apart by them,
   * and ICU reads variants wrongly where the machine is set to Turkish.
   */
  private static final Pattern SHAPE =
      Pattern.compile("[A-Za-z]{2,3}(-[A-Za-z]{4})?(-([A-Za-z]{2}|[0-9]{3}))?");

  /** CLDR has names for all of these; looking them up would be slow at the start. */
  private static final Set<String> TWO_LETTERS = Set.of(Locale.getISOLanguages());

  /** CLDR has names for these, but nobody writes in them. */
  private static final Set<String> NO_LANGUAGE = Set.of("und", "mul", "zxx");

  /**
   * Reads a tag in any case, with {@code -} or {@code _} between its parts; outdated and overlong
   * codes become current ones ({@code iw} is {@code he}, {@code deu} is {@code de}).
   *
   * @return empty if the tag is ill-formed, or if CLDR has no name for the language, script or
   *     region in it; {@code und} is no language either
   */
  public static Optional<Language> of(String tag) {
    String hyphenated = tag.replace('_', '-');
    // The shape keeps nearly all names of files and folders away from ICU, which is slow to start.
    if (!SHAPE.matcher(hyphenated).matches()) {
      return Optional.empty();
    }
    ULocale locale = ULocale.forLanguageTag(hyphenated.toLowerCase(Locale.ROOT));
    if (!known(locale)) {
      return Optional.empty();
    }
    ULocale canonical =
        hyphenated.length() == 2 ? locale : ULocale.createCanonical(locale.getName());
    return Optional.of(new Language(canonical.toLanguageTag()));
  }

  /** The name in English, as the translator reads it: "German", "Portuguese (Brazil)". */
  public String name() {
    return Names.ENGLISH.localeDisplayName(ULocale.forLanguageTag(tag));
  }

  /** The tag's first part: the language without script and region. */
  public String primary() {
    int hyphen = tag.indexOf('-');
    return hyphen < 0 ? tag : tag.substring(0, hyphen);
  }

  /**
   * Whether {@code other} is this language or says it more narrowly: de and de-AT. A script that is
   * not written is the likeliest one by CLDR: zh-Hant covers zh-TW.
   */
  public boolean covers(Language other) {
    if (other.tag.equals(tag) || other.tag.startsWith(tag + "-")) {
      return true;
    }
    if (!other.primary().equals(primary())) {
      return false;
    }
    ULocale own = ULocale.forLanguageTag(tag);
    boolean anywhere = own.getCountry().isEmpty();
    return (anywhere || own.getCountry().equals(ULocale.forLanguageTag(other.tag).getCountry()))
        && (own.getScript().isEmpty() || own.getScript().equals(other.script()));
  }

  /** Whether {@code other} is the same language in the same script: zh-TW and zh-Hant-HK. */
  boolean isWrittenLike(Language other) {
    return primary().equals(other.primary()) && script().equals(other.script());
  }

  private String script() {
    return ULocale.addLikelySubtags(ULocale.forLanguageTag(tag)).getScript();
  }

  @Override
  public int compareTo(Language other) {
    return tag.compareTo(other.tag);
  }

  private static boolean known(ULocale locale) {
    String language = locale.getLanguage();
    return !NO_LANGUAGE.contains(language)
        && (TWO_LETTERS.contains(language) || Names.ENGLISH.languageDisplayName(language) != null)
        && knownScript(locale.getScript())
        && knownRegion(locale.getCountry());
  }

  private static boolean knownScript(String script) {
    return script.isEmpty()
        || !script.equals("Zzzz") && Names.ENGLISH.scriptDisplayName(script) != null;
  }

  private static boolean knownRegion(String region) {
    return region.isEmpty()
        || !region.equals("ZZ") && Names.ENGLISH.regionDisplayName(region) != null;
  }

  /** Holds CLDR's names; loaded with the first tag that has the shape of one. */
  private static final class Names {
    static final LocaleDisplayNames ENGLISH =
        LocaleDisplayNames.getInstance(ULocale.ENGLISH, DisplayContext.NO_SUBSTITUTE);
  }
}
