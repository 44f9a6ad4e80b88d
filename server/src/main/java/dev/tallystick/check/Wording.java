package dev.tallystick.check;

import com.ibm.icu.util.ULocale;
import dev.tallystick.text.Isolate;

/** The messages, in a translator's language: what, where, figures last. */
final class Wording {
  private static final int QUOTED = 40;
  private static final int QUOTED_WHOLE = 160;

  private final String language;

  /** For translations into a language, a BCP 47 tag. */
  Wording(String targetLanguage) {
    this.language = targetLanguage;
  }

  /** Said on the source, with the sentences around the gap. */
  String omission(int sentences, String before, String behind) {
    String what = sentences == 1 ? "this sentence" : "these " + sentences + " sentences";
    return "Not translated"
        + into()
        + ": nothing stands for "
        + what
        + between(before, behind)
        + ".";
  }

  private String into() {
    if (language.equals("und")) {
      return "";
    }
    return " into " + ULocale.forLanguageTag(language).getDisplayName(ULocale.ENGLISH);
  }

  private static String between(String before, String behind) {
    if (before.isEmpty()) {
      return behind.isEmpty() ? "" : " before " + start(behind);
    }
    return behind.isEmpty()
        ? " after " + start(before)
        : " between " + start(before) + " and " + start(behind);
  }

  /** Said on the target, at the gap. */
  String missingHere(String sentence, int sentences) {
    String more = sentences == 1 ? "" : " and " + (sentences - 1) + " more";
    return "Missing here: " + quote(sentence, QUOTED_WHOLE) + more;
  }

  String addition(int sentences) {
    return sentences == 1
        ? "Nothing in the source stands for this sentence."
        : "Nothing in the source stands for these " + sentences + " sentences.";
  }

  String addedNote(int sentences) {
    return addition(sentences) + " A note of the translator's?";
  }

  String order(int sentences) {
    return sentences == 1
        ? "This sentence stands at another place in the source."
        : "These " + sentences + " sentences stand at another place in the source.";
  }

  String untranslated(int sentences) {
    return sentences == 1
        ? "Still the same as the source."
        : "These " + sentences + " sentences are still the same as the source.";
  }

  String length(int source, int target, int low, int high) {
    String much = target < low ? "Much shorter" : "Much longer";
    return much
        + " than its source would suggest: "
        + target
        + " characters for "
        + source
        + " (usual for this pair: "
        + low
        + " to "
        + high
        + ").";
  }

  private static String start(String sentence) {
    return quote(sentence, QUOTED);
  }

  /** The start of a sentence, cut between words if it can be, in quotation marks and isolated. */
  static String quote(String sentence, int most) {
    String text = sentence.strip();
    if (text.codePointCount(0, text.length()) <= most) {
      return quoted(Isolate.balanced(text));
    }
    int end = text.offsetByCodePoints(0, most);
    int blank = text.lastIndexOf(' ', end);
    String start = text.substring(0, blank > end / 2 ? blank : end).strip();
    return quoted(Isolate.balanced(start) + " ...");
  }

  private static String quoted(String text) {
    return '"' + Isolate.of(text) + '"';
  }
}
