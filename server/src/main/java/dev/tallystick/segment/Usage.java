package dev.tallystick.segment;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;

/** What our own collection knows of how a language is written; nothing of most languages. */
final class Usage {
  /** Abbreviations before a name: no sentence ends there. */
  static final String TITLE = "title";

  /** Abbreviations that stand inside a sentence. */
  static final String NEVER = "never";

  /** Abbreviations before a number, and plain words elsewhere. */
  static final String NUMBER = "number";

  /** Abbreviations that may close a sentence as well. */
  static final String OPEN = "open";

  /** Words that open sentences and are no names. */
  static final String STARTERS = "starters";

  /** Those of them that open names too, and sentences only before a small letter. */
  static final String NAMES = "names";

  /** What stands behind a verb that opens a sentence, and so makes it open one. */
  static final String SECOND = "second";

  /** Words before an ordinal number. */
  static final String COUNTED = "counted";

  /** Months, where they have a capital letter. */
  static final String MONTHS = "months";

  /** How ordinal numbers before a capital letter are written with a stop: digits, roman. */
  static final String ORDINALS = "ordinals";

  /** What has a capital letter inside of sentences: nouns. */
  static final String CAPITALS = "capitals";

  /** What CLDR lists as abbreviations though it ends sentences far more often. */
  static final String ORDINARY = "ordinary";

  /** Words that close sentences in a language without stops. */
  static final String CLOSERS = "closers";

  /** Languages that are written like another one in this respect. */
  private static final Map<String, String> LIKE = Map.of("no", "nb", "nn", "nb");

  private final Map<String, Set<String>> entries = new HashMap<>();

  private Usage() {}

  /** What is known of a language, by its subtag. */
  static Usage of(String language) {
    Usage usage = new Usage();
    String name = LIKE.getOrDefault(language, language) + ".txt";
    try (InputStream file = Usage.class.getResourceAsStream(name)) {
      if (file != null) {
        usage.read(new BufferedReader(new InputStreamReader(file, StandardCharsets.UTF_8)));
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return usage;
  }

  /**
   * A key with a colon, then entries parted by blanks, over as many lines; {@code _} is a blank.
   */
  private void read(BufferedReader file) throws IOException {
    String key = "";
    for (String line = file.readLine(); line != null; line = file.readLine()) {
      if (line.startsWith("#")) {
        continue;
      }
      int colon = line.startsWith(" ") ? -1 : line.indexOf(':');
      key = colon < 0 ? key : line.substring(0, colon);
      String section = key;
      Stream.of(line.substring(colon + 1).split(" "))
          .filter(entry -> !entry.isEmpty())
          .forEach(entry -> add(section, entry.replace('_', ' ')));
    }
  }

  private void add(String key, String entry) {
    entries.computeIfAbsent(key, k -> new HashSet<>()).add(entry);
  }

  /** The entries under a key, in no order. */
  Set<String> get(String key) {
    return entries.getOrDefault(key, Set.of());
  }

  /** Whether there is an entry under a key. */
  boolean has(String key, String entry) {
    return get(key).contains(entry);
  }
}
