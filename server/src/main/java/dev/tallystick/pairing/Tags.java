package dev.tallystick.pairing;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * Finds language tags in paths. Whether a tag is meant as one, only its siblings can tell.
 *
 * <p>A tag is the last part of the name before the extension, parted from a name by {@code .} or
 * {@code _}, or a whole folder name. Where {@code page_pt_BR.txt} reads as two tags, both are
 * offered, the longer one first. A file that is tagged twice with the same language ({@code
 * de/guide.de.md}) is offered with both tags taken out, too.
 */
final class Tags {
  /**
   * Language codes that are everyday names of folders and files; src is Sardinian, bak is Bashkir.
   * They are tags only if a setting names their language.
   */
  private static final Set<String> FILE_WORDS =
      Set.of(
          "alt", "bak", "bin", "ext", "geo", "in", "mac", "man", "mar", "may", "mon", "new", "ori",
          "per", "pro", "run", "sat", "see", "sms", "src", "sun");

  /** A tag has no more parts than language, script and region. */
  private static final int MOST_PARTS = 3;

  private final Rules rules;
  private final Map<String, Optional<Language>> seen = new HashMap<>();

  Tags(Rules rules) {
    this.rules = rules;
  }

  /** All readings of a path that have a tag: by name, then by folder from the outermost. */
  List<Tagged> of(String path) {
    List<Cut> cuts = new ArrayList<>();
    addNameCuts(path, cuts);
    addFolderCuts(path, cuts);
    if (cuts.isEmpty()) {
      return List.of();
    }
    List<Tagged> readings = new ArrayList<>();
    Map<Language, List<Cut>> byLanguage = new LinkedHashMap<>();
    for (Cut cut : cuts) {
      readings.add(read(path, List.of(cut)));
      byLanguage.computeIfAbsent(cut.language, language -> new ArrayList<>()).add(cut);
    }
    for (List<Cut> same : byLanguage.values()) {
      if (same.size() > 1) {
        readings.add(read(path, same));
      }
    }
    return readings;
  }

  /** The language that a path names by itself, in its name before its folders, innermost first. */
  static Language only(String path) {
    Tags tags = new Tags(Rules.NONE);
    List<Cut> cuts = new ArrayList<>();
    tags.addNameCuts(path, cuts);
    if (cuts.isEmpty()) {
      tags.addFolderCuts(path, cuts);
      Collections.reverse(cuts);
    }
    return cuts.isEmpty() ? Language.UNKNOWN : cuts.get(0).language;
  }

  private void addNameCuts(String path, List<Cut> cuts) {
    int name = path.lastIndexOf('/') + 1;
    int dot = path.lastIndexOf('.');
    int end = dot < name ? path.length() : dot;
    int first = cuts.size();
    int parts = 0;
    for (int at = end - 1; at > name && parts < MOST_PARTS; at--) {
      char unit = path.charAt(at);
      if (unit == '.' || unit == '_') {
        parts++;
        add(path, at, end, path.substring(at + 1, end), Why.NAME, cuts);
        if (unit == '.') {
          break;
        }
      }
    }
    Collections.reverse(cuts.subList(first, cuts.size()));
  }

  private void addFolderCuts(String path, List<Cut> cuts) {
    int start = 0;
    for (int slash = path.indexOf('/'); slash >= 0; slash = path.indexOf('/', start)) {
      add(path, start, slash + 1, path.substring(start, slash), Why.FOLDER, cuts);
      start = slash + 1;
    }
  }

  private void add(String path, int start, int end, String written, Why why, List<Cut> cuts) {
    language(written).ifPresent(found -> cuts.add(new Cut(start, end, written, found, why)));
  }

  /** The language that a tag means; empty for an everyday word whose language nobody has set. */
  Optional<Language> language(String written) {
    return seen.computeIfAbsent(
        written,
        word -> Language.of(word).filter(found -> !isFileWord(word) || isInSettings(found)));
  }

  private static boolean isFileWord(String word) {
    return FILE_WORDS.contains(word.toLowerCase(Locale.ROOT));
  }

  private boolean isInSettings(Language language) {
    return rules.sourceLanguage().filter(language::equals).isPresent()
        || rules.targetLanguage().filter(language::equals).isPresent();
  }

  private static Tagged read(String path, List<Cut> cuts) {
    List<Cut> inOrder = new ArrayList<>(cuts);
    inOrder.sort((a, b) -> Integer.compare(a.start, b.start));
    StringBuilder stem = new StringBuilder();
    StringBuilder layout = new StringBuilder();
    int from = 0;
    for (Cut cut : inOrder) {
      if (cut.start < from) {
        continue;
      }
      stem.append(path, from, cut.start);
      // A slash cannot stand twice in a row in a path, hence no path is mistaken for a layout.
      layout.append(path, from, cut.start).append("//");
      from = cut.end;
    }
    stem.append(path, from, path.length());
    layout.append(path, from, path.length());
    Cut first = cuts.get(0);
    return new Tagged(
        path,
        stem.toString(),
        first.language,
        first.written,
        layout.toString(),
        inOrder.get(0).start,
        first.why);
  }

  /** A tag and what goes with it when it is taken out: from {@code start} to {@code end}. */
  private record Cut(int start, int end, String written, Language language, Why why) {}
}
