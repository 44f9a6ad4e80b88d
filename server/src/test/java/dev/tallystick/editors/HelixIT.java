package dev.tallystick.editors;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The set-up for Helix is TOML, read here by Python 3.11 or newer. */
class HelixIT {
  private static final String TO_JSON =
      "import json, sys, tomllib; print(json.dumps(tomllib.load(sys.stdin.buffer)))";

  private static final Pattern QUOTED = Pattern.compile("\"([^\"]*)\"");

  @TempDir Path folder;

  @Test
  void theSetUpNamesAServerThatIsStartedAsInNeovim() throws Exception {
    JsonObject set = parsed(Desk.readme("toml"));
    JsonObject language = set.getAsJsonArray("language").get(0).getAsJsonObject();
    String name = language.getAsJsonArray("language-servers").get(0).getAsString();
    JsonObject server = set.getAsJsonObject("language-server").getAsJsonObject(name);

    List<String> command = new ArrayList<>();
    command.add(server.get("command").getAsString());
    command.addAll(strings(server.getAsJsonArray("args")));
    assertEquals("markdown", language.get("name").getAsString());
    assertEquals(command(Desk.readme("lua")), command);
    assertEquals(command(Desk.readme("elisp")), command);
  }

  /** What starts the server in a set-up. */
  private static List<String> command(String snippet) {
    int from = snippet.indexOf("\"java\"");
    Matcher matcher = QUOTED.matcher(snippet).region(from, snippet.indexOf("\"serve\"") + 7);
    return matcher.results().map(found -> found.group(1)).toList();
  }

  private static List<String> strings(JsonArray array) {
    return array.asList().stream().map(JsonElement::getAsString).toList();
  }

  private JsonObject parsed(String toml) throws Exception {
    Process python =
        new ProcessBuilder("python3", "-c", TO_JSON)
            .redirectError(folder.resolve("python.log").toFile())
            .start();
    python.getOutputStream().write(toml.getBytes(StandardCharsets.UTF_8));
    python.getOutputStream().close();
    String json = new String(python.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertEquals(0, python.waitFor());
    return JsonParser.parseString(json).getAsJsonObject();
  }
}
