package dev.tallystick.cli;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.function.Supplier;
import picocli.CommandLine;

/** The commands by name. */
final class Commands {
  private Commands() {}

  /**
   * The command line. Where the first argument names a command only that one is set up: reading the
   * options of all takes longer than many a check.
   */
  static CommandLine line(Console console, String... args) {
    Map<String, Supplier<Object>> commands = new LinkedHashMap<>();
    commands.put("serve", ServeCommand::new);
    commands.put("check", () -> new CheckCommand(console));
    commands.put("align", () -> new AlignCommand(console));
    commands.put("segments", () -> new SegmentsCommand(console));
    commands.put("pairs", () -> new PairsCommand(console));
    if (args.length > 0 && commands.containsKey(args[0])) {
      commands.keySet().retainAll(Set.of(args[0]));
    }
    CommandLine line = new CommandLine(new Tallystick());
    commands.forEach((name, command) -> line.addSubcommand(name, command.get()));
    return line;
  }
}
