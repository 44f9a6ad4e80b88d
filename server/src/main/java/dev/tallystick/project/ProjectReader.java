package dev.tallystick.project;

import dev.tallystick.check.Code;
import dev.tallystick.check.Levels;
import dev.tallystick.check.Severity;
import dev.tallystick.pairing.Glob;
import dev.tallystick.pairing.Language;
import dev.tallystick.prose.FrontMatterKeys;
import dev.tallystick.text.Span;
import java.io.IOException;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** Reads the facts of a project, key by key. What is read stays read if a later part is broken. */
final class ProjectReader {
  /** Every level by its name. */
  static final List<String> LEVELS =
      Stream.concat(Stream.of(Levels.OFF), Stream.of(Severity.values()).map(Severity::word))
          .toList();

  private final Values values;
  private final PairReader pairs;
  private final Map<Code, Optional<Severity>> levels = new EnumMap<>(Code.class);
  private final List<Glob> ignored = new ArrayList<>();
  private Optional<Language> sourceLanguage = Optional.empty();
  private Optional<Tokens.Word> segmentation = Optional.empty();
  private Optional<List<String>> frontMatter = Optional.empty();

  ProjectReader(Values values) {
    this.values = values;
    this.pairs = new PairReader(values);
  }

  /** The keys of the file, each with its reader. */
  Map<String, Values.Value> keys() {
    Map<String, Values.Value> keys = new LinkedHashMap<>();
    keys.put("$schema", name -> values.skip()); // where an editor finds the schema
    keys.put("sourceLanguage", name -> sourceLanguage = values.language(name));
    keys.put("pairs", name -> values.elements(name, "A pair", pairs::read));
    keys.put("checks", name -> values.members(name, checks()));
    keys.put("segmentation", this::readSegmentation);
    keys.put("frontMatter", this::readFrontMatter);
    keys.put("ignore", name -> values.elements(name, "A name to ignore", this::readIgnored));
    return keys;
  }

  void read() throws IOException {
    values.members("The file", keys());
    values.end();
  }

  /**
   * What was read.
   *
   * @param whole whether that is all there is
   */
  Project project(boolean whole) {
    return new Project(
        sourceLanguage,
        pairs.rules(sourceLanguage.isPresent() || !whole),
        new Levels(levels),
        ignored,
        segmentation.map(Tokens.Word::value),
        frontMatter.map(FrontMatterKeys::of).orElse(FrontMatterKeys.USUAL));
  }

  /** Where the file with rules for sentence borders is named. */
  Optional<Span> segmentation() {
    return segmentation.map(Tokens.Word::span);
  }

  private void readSegmentation(String name) throws IOException {
    Optional<Tokens.Word> word = values.string(name);
    Optional<String> fault = word.flatMap(file -> Names.faultOfRules(file.value()));
    fault.ifPresent(message -> values.problem(word.get().span(), message));
    segmentation = fault.isPresent() ? Optional.empty() : word;
  }

  private void readFrontMatter(String name) throws IOException {
    List<String> keys = new ArrayList<>();
    boolean list =
        values.elements(
            name,
            "A key of front matter",
            element -> values.string(element).map(Tokens.Word::value).ifPresent(keys::add));
    frontMatter = list ? Optional.of(keys) : Optional.empty();
  }

  private Map<String, Values.Value> checks() {
    return Stream.of(Code.values())
        .collect(
            Collectors.toMap(
                Code::word,
                code -> name -> readLevel(code, name),
                (a, b) -> a,
                LinkedHashMap::new));
  }

  private void readLevel(Code code, String name) throws IOException {
    Optional<Tokens.Word> word = values.string(name);
    if (word.isEmpty()) {
      return;
    }
    String level = word.get().value();
    if (LEVELS.contains(level)) {
      levels.put(code, Severity.of(level));
    } else {
      String allowed = " is no level. Allowed are: " + String.join(", ", LEVELS) + ".";
      values.problem(word.get().span(), Values.quote(level) + allowed);
    }
  }

  private void readIgnored(String name) throws IOException {
    Optional<Tokens.Word> word = values.string(name);
    if (word.isPresent()) {
      String glob = word.get().value();
      Names.faultOfGlob(glob)
          .ifPresentOrElse(
              fault -> values.problem(word.get().span(), fault),
              () -> Glob.of(glob).ifPresent(ignored::add));
    }
  }
}
