package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.tidy.Repository;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** What clients can ask for by name is named in the README, and in the client for VS Code. */
class DocumentedNamesTest {
  private static List<String> unnamed(String file, Stream<String> names) {
    String text = Repository.read(Repository.root().resolve(file));
    return names.filter(name -> !text.contains(name)).toList();
  }

  @Test
  void everyCommandIsNamedInTheReadme() {
    assertEquals(
        List.of(), unnamed("README.md", Commands.NAMES.stream().map(name -> "`" + name + "`")));
  }

  @Test
  void everySettingIsNamedInTheReadmeAndOfferedInVsCode() {
    assertEquals(
        List.of(),
        unnamed("README.md", SettingsReader.KEYS.stream().map(key -> "| `" + key + "` |")));
    assertEquals(
        List.of(),
        unnamed(
            "client-vscode/package.json",
            SettingsReader.KEYS.stream().map(key -> "\"tallystick." + key + "\"")));
  }
}
