package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.check.Code;
import dev.tallystick.tidy.Repository;
import java.io.PrintWriter;
import java.io.Writer;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import picocli.CommandLine;
import picocli.CommandLine.Model.OptionSpec;

/** README.md names what the program knows, and nothing that it does not know. */
class ReadmeTest {
  /** A command with its options, as README shows it: {@code java -jar ... check --draft}. */
  private static final Pattern INVOCATION = Pattern.compile("tallystick\\.jar +(\\w+)([^\n`]*)");

  private static final Pattern LONG_OPTION = Pattern.compile("(?<![\\w-])--[A-Za-z][\\w-]*");

  private final CommandLine program =
      Commands.line(
          new Console(
              new PrintWriter(Writer.nullWriter()), new PrintWriter(Writer.nullWriter()), false));
  private final String readme = Repository.read(Repository.root().resolve("README.md"));

  @Test
  void everyCommandIsNamed() {
    assertMissing(program.getSubcommands().keySet(), "(?<![\\w-])%s(?![\\w-])");
  }

  @Test
  void everyLongOptionIsNamed() {
    Set<String> names = new TreeSet<>(longNames(program));
    program.getSubcommands().values().forEach(command -> names.addAll(longNames(command)));
    assertMissing(names, "(?<![\\w-])%s(?![\\w-])");
  }

  @Test
  void everyCodeIsNamed() {
    Set<String> codes = new TreeSet<>();
    for (Code code : Code.values()) {
      codes.add(code.word());
    }
    assertMissing(codes, "`%s`");
  }

  @Test
  void everyCommandThatIsShownExists() {
    List<String> wrong = new ArrayList<>();
    Matcher shown = INVOCATION.matcher(readme);
    while (shown.find()) {
      CommandLine command = program.getSubcommands().get(shown.group(1));
      if (command == null) {
        wrong.add(shown.group(1));
        continue;
      }
      Matcher option = LONG_OPTION.matcher(shown.group(2));
      while (option.find()) {
        if (!longNames(command).contains(option.group())) {
          wrong.add(shown.group(1) + " " + option.group());
        }
      }
    }
    assertEquals(List.of(), wrong);
  }

  private void assertMissing(Set<String> names, String pattern) {
    List<String> missing =
        names.stream()
            .filter(
                name ->
                    !Pattern.compile(pattern.formatted(Pattern.quote(name))).matcher(readme).find())
            .toList();
    assertEquals(List.of(), missing);
  }

  private static List<String> longNames(CommandLine command) {
    return command.getCommandSpec().options().stream()
        .map(OptionSpec::longestName)
        .filter(name -> name.startsWith("--"))
        .toList();
  }
}
