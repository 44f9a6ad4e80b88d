package dev.tallystick.lsp;

import com.google.gson.Gson;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
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
  private static final long LONGEST_REST = 600_000;

  private final List<String> problems = new ArrayList<>();

  /**
   * Settings, and what is wrong with them.
   *
   * @param settings those that are right, the rest by default
   * @param problems each a sentence for the user
   */
  record Read(Settings settings, List<String> problems) {}

  private SettingsReader() {}

  /** Reads the section, which is an object if all is well; null means that nothing is set. */
  static Read read(Object section) {
    return new SettingsReader().of(new Gson().toJsonTree(section));
  }

  private Read of(JsonElement section) {
    Settings settings = Settings.DEFAULT;
    if (section instanceof JsonObject object) {
      settings =
          new Settings(
              rest(object.get(REST)),
              language(object.get(SOURCE_LANGUAGE)),
              folders(object.get(SCOPE)));
    } else if (!section.isJsonNull()) {
      problems.add("The settings under tallystick must be an object with keys and values.");
    }
    return new Read(settings, List.copyOf(problems));
  }

  private long rest(JsonElement value) {
    if (value == null || value.isJsonNull()) {
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
    if (value == null || value.isJsonNull()) {
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

  private Optional<Language> language(JsonElement value) {
    if (value == null || value.isJsonNull()) {
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
