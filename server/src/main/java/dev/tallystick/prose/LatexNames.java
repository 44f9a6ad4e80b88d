package dev.tallystick.prose;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;

/** What our own collection knows of the commands and environments of LaTeX. */
final class LatexNames {
  static final String SILENT = "silent";
  static final String DEFINE = "define";
  static final String BORDER = "border";
  static final String BLANK = "blank";
  static final String SPACE = "space";
  static final String LINE = "line";
  static final String ACCENT = "accent";
  static final String LETTER = "letter";
  static final String CODE = "code";
  static final String VERBATIM = "verbatim";
  static final String HIDDEN = "hidden";
  static final String MATHS = "maths";
  static final String CELLS = "cells";
  static final String LIST = "list";
  static final String QUOTATION = "quotation";
  static final String HEADING = "heading";
  static final String TITLED = "titled";
  static final String BARE = "bare";

  private static final Set<String> WORDS =
      Set.of(SILENT, DEFINE, BORDER, BLANK, SPACE, LINE, ACCENT, LETTER, CODE);
  private static final Set<String> ENVIRONMENTS =
      Set.of(VERBATIM, HIDDEN, MATHS, CELLS, LIST, QUOTATION, HEADING, TITLED, BARE);
  private static final LatexNames ALL = new LatexNames();

  private final Map<String, String> commands = new HashMap<>();
  private final Map<String, Set<String>> environments = new HashMap<>();

  private LatexNames() {
    try (BufferedReader lines =
        new BufferedReader(
            new InputStreamReader(
                LatexNames.class.getResourceAsStream("latex.txt"), StandardCharsets.UTF_8))) {
      lines.lines().filter(line -> !line.isBlank() && !line.startsWith("#")).forEach(this::add);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private void add(String line) {
    int colon = line.indexOf(':');
    String key = line.substring(0, colon);
    String[] names = line.substring(colon + 1).strip().split(" ");
    if (ENVIRONMENTS.contains(key)) {
      environments.put(key, new HashSet<>(Set.of(names)));
      return;
    }
    for (String name : names) {
      commands.put(name, key);
    }
  }

  /**
   * What a command is: one of the words above, or the arguments that it takes, each by a character
   * as the collection says; empty for an unknown one.
   */
  static String command(String name) {
    return ALL.commands.getOrDefault(name, "");
  }

  /** Whether what {@link #command} tells is a list of arguments. */
  static boolean isArguments(String key) {
    return !key.isEmpty() && !WORDS.contains(key);
  }

  /** Whether an environment is one of those under a key. */
  static boolean isEnvironment(String key, String name) {
    return ALL.environments.get(key).contains(name);
  }
}
