package dev.tallystick.opendata;

import com.ibm.icu.util.ULocale;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/**
 * One translation of the declaration.
 *
 * @param file its name in the package, without the ending
 * @param language its language as a BCP 47 tag; the script is the one that the tag implies (CLDR,
 *     likely subtags)
 */
record Translation(String file, String language) {
  /**
   * Complete translations, one a language: into the official languages of the European Union, and
   * into official and widely spoken ones elsewhere, in many scripts. How well they are aligned
   * played no part: Hausa, the worst, is the one that the package names first. Left out is what
   * lacks paragraphs or has them under wrong articles: Amharic, Tigrinya, Kyrgyz, both Punjabi.
   */
  static final List<Translation> ALL =
      listed(
          """
          deu_1996 de, fra fr, spa es, ita it, por_PT pt-PT, nld nl, swe sv, dan da, fin fi,
          est et, lav lv, lit lt, pol pl, ces cs, slk sk, slv sl, hrv hr, hun hu, ron_2006 ro,
          gle ga, mlt mt, nob nb, isl is, eus eu, cat ca, cym cy, als sq, tur tr, azj_latn az,
          ind id, vie vi, tgl fil, swh sw, som so, yor yo, ibo ig, hau_3 ha, zul zu, xho xh,
          bul bg, rus ru, ukr uk, bel be, mkd mk, srp_cyrl sr, kaz kk, khk mn, tgk tg, tat tt,
          ell_monotonic el, hye hy, kat ka, heb he, ydd yi,
          arb ar, pes_1 fa, urd ur, pbu ps, uig_arab ug, div dv,
          hin hi, mar mr, nep ne, mai mai, ben bn, guj gu, tam ta, tel te, kan kn, mal ml, sin si,
          tha th, lao lo, khm km, mya my, mnw mnw, shn shn, bod bo, dzo dz,
          kor ko, cmn_hans zh-Hans, cmn_hant zh-Hant, jpn ja, iii ii, chr_cased chr
          """);

  private static List<Translation> listed(String table) {
    List<Translation> translations = new ArrayList<>();
    for (String entry : table.strip().split(",\\s+")) {
      String[] parts = entry.split(" ");
      translations.add(new Translation(parts[0], parts[1]));
    }
    return List.copyOf(translations);
  }

  /** ISO 15924 code of the script. */
  String script() {
    return ULocale.addLikelySubtags(ULocale.forLanguageTag(language)).getScript();
  }

  /** The text without these articles. */
  Declaration without(Set<Integer> articles) {
    return Declaration.of(file, language, articles);
  }
}
