package dev.tallystick.lsp;

import com.google.gson.Gson;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import dev.tallystick.check.Vigilance;
import dev.tallystick.engine.Settings;
import dev.tallystick.pairing.Language;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Reads the section {@code tallystick} of the client's settings. What is wrong in it is told, and
 * counts as not set; unknown keys may be meant for others.
 */
final class SettingsReader {
  private static final String REST = "restMillis";
  private static final String SCOPE = "scope";
  private static final String SOURCE_LANGUAGE = "sourceLanguage";
  private static final String VIGILANCE = "vigilance";
  private static final String LENS = "lens";
  private static final String INLAY = "inlay";
  private static final String PROGRESS = "progress";

  /** What a user can set; the rest is between client and server. */
  static final List<String> KEYS = List.of(REST, SOURCE_LANGUAGE, SCOPE, VIGILANCE, LENS, INLAY);

  private static final long LONGEST_REST = 600_000;

  private final List<String> problems = new ArrayList<>();

  /**
   * Settings, and what is wrong with them.
   *
   * @param settings those that are right, the rest by default
   * @param lens whether figures are to be shown above the lines
   * @param inlay whether figures are to be shown behind the lines
   * @param problems each a sentence for the user
   */
  record Read(Settings settings, boolean lens, boolean inlay, List<String> problems) {}

  private SettingsReader() {}

  /**
   * Reads the section, which is an object if all is well; null means that nothing is set.
   *
   * @param options what the client sent at the start; it counts where the section says nothing
   */
  static Read read(Object options, Object section) {
    SettingsReader reader = new SettingsReader();
    JsonObject all = new JsonObject();
    reader.add(all, options);
    reader.add(all, section);
    return reader.of(all);
  }

  private void add(JsonObject all, Object section) {
    JsonElement json = new Gson().toJsonTree(section);
    if (json instanceof JsonObject object) {
      object.entrySet().stream()
          .filter(entry -> !entry.getValue().isJsonNull())
          .forEach(entry -> all.add(entry.getKey(), entry.getValue()));
    } else if (!json.isJsonNull()) {
      problems.add("The settings under tallystick must be an object with keys and values.");
    }
  }

  private Read of(JsonObject object) {
    Settings settings =
        new Settings(
            rest(object.get(REST)),
            language(object.get(SOURCE_LANGUAGE)),
            folders(object.get(SCOPE)),
            vigilance(object.get(VIGILANCE)));
    boolean lens = yes(LENS, object.get(LENS));
    boolean inlay = yes(INLAY, object.get(INLAY));
    yes(PROGRESS, object.get(PROGRESS)); // read at the start, told here if it is wrong
    return new Read(settings, lens, inlay, List.copyOf(problems));
  }

  private boolean yes(String key, JsonElement value) {
    if (value == null) {
      return false;
    }
    if (value instanceof JsonPrimitive said && said.isBoolean()) {
      return said.getAsBoolean();
    }
    problems.add(
        "The setting tallystick." + key + " must be true or false. Until then it counts as false.");
    return false;
  }

  private long rest(JsonElement value) {
    if (value == null) {
      return Settings.DEFAULT.restMillis();
    }
    if (value instanceof JsonPrimitive number && number.isNumber()) {
      double millis = number.getAsDouble();
      if (millis >= 0 && millis <= LONGEST_REST) {
        return Math.round(millis);
      }
    }
    problems.add(
        "The setting tallystick.restMillis must be a number of milliseconds from 0 to "
            + LONGEST_REST
            + ". Until then it counts as "
            + Settings.DEFAULT.restMillis()
            + ".");
    return Settings.DEFAULT.restMillis();
  }

  private boolean folders(JsonElement value) {
    if (value == null) {
      return Settings.DEFAULT.folders();
    }
    String word = value instanceof JsonPrimitive one && one.isString() ? one.getAsString() : "";
    if (!word.equals("open") && !word.equals("folder")) {
      problems.add(
          "The setting tallystick.scope must be open (the pairs with an open file) or folder (all"
              + " pairs of the folder). Until then it counts as open.");
    }
    return word.equals("folder");
  }

  private Vigilance vigilance(JsonElement value) {
    if (value == null) {
      return Vigilance.BALANCED;
    }
    String word = value instanceof JsonPrimitive one && one.isString() ? one.getAsString() : "";
    Optional<Vigilance> vigilance = Vigilance.of(word);
    if (vigilance.isEmpty()) {
      problems.add(
          "The setting tallystick.vigilance must be quiet, balanced or thorough. Until then it"
              + " counts as balanced.");
    }
    return vigilance.orElse(Vigilance.BALANCED);
  }

  private Optional<Language> language(JsonElement value) {
    if (value == null) {
      return Optional.empty();
    }
    if (value instanceof JsonPrimitive tag && tag.isString()) {
      Optional<Language> language = Language.of(tag.getAsString());
      if (language.isPresent() || tag.getAsString().isEmpty()) {
        return language;
      }
    }
    problems.add(
        "The setting tallystick.sourceLanguage must be a language tag such as en, de or pt-BR."
            + " Until then the language of the sources is told by the names of the files.");
    return Optional.empty();
  }
}
