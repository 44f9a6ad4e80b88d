package dev.tallystick.project;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import dev.tallystick.check.Code;
import dev.tallystick.text.Text;
import dev.tallystick.tidy.Repository;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** The schema that editors show says what the program reads. */
class SchemaTest {
  private final JsonObject schema = schema();
  private final JsonObject properties = schema.getAsJsonObject("properties");

  private static JsonObject schema() {
    try (Reader file =
        new InputStreamReader(
            ProjectFile.class.getResourceAsStream("tallystick.schema.json"),
            StandardCharsets.UTF_8)) {
      return JsonParser.parseReader(file).getAsJsonObject();
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }

  private static Values nowhere() {
    return new Values(new Tokens(""), new ArrayList<>());
  }

  @Test
  void keysAreThoseThatAreRead() {
    ProjectReader reader = new ProjectReader(nowhere());
    assertEquals(List.copyOf(reader.keys().keySet()), List.copyOf(properties.keySet()));
    JsonObject pair = properties.getAsJsonObject("pairs").getAsJsonObject("items");
    assertEquals(
        List.copyOf(new PairReader(nowhere()).keys().keySet()),
        List.copyOf(pair.getAsJsonObject("properties").keySet()));
  }

  @Test
  void codesAreThoseOfTheChecksAndTheirUsualLevelsAreTold() {
    JsonObject checks = properties.getAsJsonObject("checks").getAsJsonObject("properties");
    assertEquals(Stream.of(Code.values()).map(Code::word).toList(), List.copyOf(checks.keySet()));
    for (Code code : Code.values()) {
      String description = checks.getAsJsonObject(code.word()).get("description").getAsString();
      assertTrue(
          description
              .toLowerCase(Locale.ROOT)
              .contains(code.severity().word() + ", if nothing is set"),
          description);
    }
  }

  @Test
  void levelsAreThoseThatAreRead() {
    List<String> levels = new ArrayList<>();
    JsonObject level = schema.getAsJsonObject("definitions").getAsJsonObject("level");
    level.getAsJsonArray("enum").forEach(word -> levels.add(word.getAsString()));
    assertEquals(ProjectReader.LEVELS, levels);
  }

  @Test
  void everyObjectIsClosedAndEveryKeyIsExplained() {
    assertExplained(schema, "the file");
  }

  private static void assertExplained(JsonObject part, String where) {
    if (part.has("properties")) {
      assertFalse(part.get("additionalProperties").getAsBoolean(), where);
      for (Map.Entry<String, JsonElement> key : part.getAsJsonObject("properties").entrySet()) {
        JsonObject value = key.getValue().getAsJsonObject();
        assertTrue(value.has("description"), key.getKey());
        assertExplained(value, key.getKey());
      }
    }
    if (part.has("items")) {
      assertExplained(part.getAsJsonObject("items"), where);
    }
  }

  @Test
  void everyKeyAndEveryLevelIsInTheReadme() {
    String readme = Repository.read(Repository.root().resolve("README.md"));
    List<String> words = new ArrayList<>(ProjectReader.LEVELS);
    words.addAll(new ProjectReader(nowhere()).keys().keySet());
    words.addAll(new PairReader(nowhere()).keys().keySet());
    words.remove("$schema"); // for editors only
    words.removeIf(
        word -> readme.contains("`" + word + "`") || readme.contains("\"" + word + "\""));
    assertEquals(List.of(), words);
  }

  /** Each example of the README can be taken as it is. */
  @Test
  void examplesOfTheReadmeAreRight() {
    String readme = Repository.read(Repository.root().resolve("README.md"));
    Matcher example = Pattern.compile("```json\n(.*?)```", Pattern.DOTALL).matcher(readme);
    int examples = 0;
    while (example.find()) {
      ProjectFile file = ProjectFile.of(new Text(example.group(1)));
      assertEquals(List.of(), file.problems());
      assertFalse(file.project().equals(Project.NONE));
      examples++;
    }
    assertTrue(examples > 0);
  }
}
