package dev.tallystick.project;

import com.google.gson.stream.JsonToken;
import dev.tallystick.pairing.Language;
import dev.tallystick.text.Isolate;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Span;
import java.io.IOException;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;

/** Values of the kind that is wanted; what is of another kind is told and passed over. */
final class Values {
  private static final int LONGEST_QUOTE = 40;

  private final Tokens json;
  private final List<Problem> problems;

  /**
   * Reads values.
   *
   * @param problems takes what is wrong
   */
  Values(Tokens json, List<Problem> problems) {
    this.json = json;
    this.problems = problems;
  }

  /** Reads a value, all of it. */
  @FunctionalInterface
  interface Value {
    /** Reads it; {@code name} is what messages call it. */
    void read(String name) throws IOException;
  }

  /**
   * Reads an object, each member by its key.
   *
   * @return where it stands; empty if it is no object
   */
  Optional<Span> members(String name, Map<String, Value> known) throws IOException {
    if (json.peek() != JsonToken.BEGIN_OBJECT) {
      problem(json.skip(), name + " must be an object between { and }.");
      return Optional.empty();
    }
    int start = json.open();
    Set<String> seen = new HashSet<>();
    while (json.more()) {
      Tokens.Word key = json.name();
      String quoted = quote(key.value());
      if (!known.containsKey(key.value())) {
        problem(key.span(), quoted + " means nothing here. Allowed are: " + list(known) + ".");
        json.skip();
      } else if (!seen.add(key.value())) {
        problem(key.span(), quoted + " stands here for the second time. The first one counts.");
        json.skip();
      } else {
        known.get(key.value()).read(quoted);
      }
    }
    return Optional.of(new Span(start, json.close()));
  }

  /** The keys, but for those that are for editors. */
  private static String list(Map<String, Value> known) {
    return known.keySet().stream()
        .filter(key -> !key.startsWith("$"))
        .collect(Collectors.joining(", "));
  }

  /** Reads a list, each element in the same way; whether it is one. */
  boolean elements(String name, String element, Value value) throws IOException {
    if (json.peek() != JsonToken.BEGIN_ARRAY) {
      problem(json.skip(), name + " must be a list between [ and ].");
      return false;
    }
    json.open();
    while (json.more()) {
      value.read(element);
    }
    json.close();
    return true;
  }

  /** Reads a string; empty if it is none. */
  Optional<Tokens.Word> string(String name) throws IOException {
    if (json.peek() == JsonToken.STRING) {
      return Optional.of(json.string());
    }
    problem(json.skip(), name + " must be a text between quotation marks.");
    return Optional.empty();
  }

  /** Reads a language tag; empty if it is none. */
  Optional<Language> language(String name) throws IOException {
    Optional<Tokens.Word> word = string(name);
    Optional<Language> language = word.flatMap(tag -> Language.of(tag.value()));
    if (word.isPresent() && language.isEmpty()) {
      problem(
          word.get().span(),
          quote(word.get().value())
              + " is no language tag that is known."
              + " Use one such as en, de, pt-BR or zh-Hant.");
    }
    return language;
  }

  /** A text as messages show it: the start of a long one will do. */
  static String quote(String text) {
    boolean longer = text.codePointCount(0, text.length()) > LONGEST_QUOTE;
    int end = longer ? text.offsetByCodePoints(0, LONGEST_QUOTE) : text.length();
    String shown = Isolate.balanced(text.substring(0, end)) + (longer ? "..." : "");
    return '"' + Isolate.of(shown) + '"';
  }

  /** Passes over a value. */
  void skip() throws IOException {
    json.skip();
  }

  /** Makes sure that nothing more comes. */
  void end() throws IOException {
    json.peek();
  }

  /** Something is wrong. */
  void problem(Span span, String message) {
    problems.add(new Problem(span, message));
  }
}
