package dev.tallystick.project;

import dev.tallystick.pairing.Language;
import dev.tallystick.pairing.PairRule;
import dev.tallystick.pairing.PathPattern;
import dev.tallystick.text.Span;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Reads the pairs that a project states. One that is not right in all its parts does not count. */
final class PairReader {
  private static final String NEEDS_LANGUAGE =
      "With {tag} in the source it must be told which language is the source's."
          + " Set \"sourceLanguage\" beside it, or for the whole file.";

  private final Values values;
  private final List<Stated> stated = new ArrayList<>();
  private final Set<String> targets = new HashSet<>();

  /** A pair, and where its source is named. */
  private record Stated(PairRule rule, Span source) {}

  PairReader(Values values) {
    this.values = values;
  }

  /** One pair, as far as it was read. */
  private static final class Entry {
    private Optional<Tokens.Word> source = Optional.empty();
    private Optional<Tokens.Word> target = Optional.empty();
    private Optional<Language> sourceLanguage = Optional.empty();
    private Optional<Language> targetLanguage = Optional.empty();
    private boolean sourceGiven;
    private boolean targetGiven;
  }

  /** The keys of a pair, each with its reader. */
  Map<String, Values.Value> keys() {
    return keys(new Entry());
  }

  private Map<String, Values.Value> keys(Entry entry) {
    Map<String, Values.Value> keys = new LinkedHashMap<>();
    keys.put(
        "source",
        name -> {
          entry.sourceGiven = true;
          entry.source = readName(name);
        });
    keys.put(
        "target",
        name -> {
          entry.targetGiven = true;
          entry.target = readName(name);
        });
    keys.put("sourceLanguage", name -> entry.sourceLanguage = values.language(name));
    keys.put("targetLanguage", name -> entry.targetLanguage = values.language(name));
    return keys;
  }

  private Optional<Tokens.Word> readName(String name) throws IOException {
    Optional<Tokens.Word> word = values.string(name);
    Optional<String> fault = word.flatMap(file -> Names.faultOfPattern(file.value()));
    fault.ifPresent(message -> values.problem(word.get().span(), message));
    return fault.isPresent() ? Optional.empty() : word;
  }

  /** Reads a pair. */
  void read(String name) throws IOException {
    Entry entry = new Entry();
    Optional<Span> whole = values.members(name, keys(entry));
    if (whole.isPresent() && !(entry.sourceGiven && entry.targetGiven)) {
      String missing = entry.sourceGiven ? "\"target\"" : "\"source\"";
      values.problem(whole.get(), missing + " is missing: a pair names both files.");
    } else if (entry.source.isPresent() && entry.target.isPresent()) {
      add(entry, entry.source.get(), entry.target.get());
    }
  }

  private void add(Entry entry, Tokens.Word sourceName, Tokens.Word targetName) {
    PathPattern source = PathPattern.of(sourceName.value());
    PathPattern target = PathPattern.of(targetName.value());
    boolean pathInSource = source.has(PathPattern.PATH);
    if (pathInSource != target.has(PathPattern.PATH)) {
      values.problem(
          pathInSource ? sourceName.span() : targetName.span(),
          "{path} must stand in the source and in the target, or in neither.");
    } else if (source.equals(target) && !source.has(PathPattern.TAG)) {
      values.problem(targetName.span(), "This is the source itself.");
    } else if (target.isLiteral() && !targets.add(targetName.value())) {
      values.problem(
          targetName.span(), "A pair above has this target already. Only that one counts.");
    } else {
      PairRule rule = new PairRule(source, target, entry.sourceLanguage, entry.targetLanguage);
      stated.add(new Stated(rule, sourceName.span()));
    }
  }

  /**
   * The pairs that count.
   *
   * @param language whether the language of the sources is set for all of them, or may be set in a
   *     part that could not be read
   */
  List<PairRule> rules(boolean language) {
    List<PairRule> rules = new ArrayList<>();
    for (Stated one : stated) {
      boolean told = language || one.rule().sourceLanguage().isPresent();
      if (one.rule().source().has(PathPattern.TAG) && !told) {
        values.problem(one.source(), NEEDS_LANGUAGE);
      } else {
        rules.add(one.rule());
      }
    }
    return rules;
  }
}
