package dev.tallystick.cli;

import dev.tallystick.run.Fault;
import dev.tallystick.segment.Segmenter;
import java.util.concurrent.CompletableFuture;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The program. */
@Command(
    name = "tallystick",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    synopsisSubcommandLabel = "COMMAND",
    description =
        "Keeps a translation and its source aligned sentence by sentence, and marks sentences"
            + " without a plausible counterpart.",
    footer = {
      "",
      "A clean result says nothing about meaning: revision by a qualified second person comes"
          + " first."
    })
public final class Tallystick implements Runnable {
  /** Nothing to report. */
  static final int FINE = 0;

  /** Findings at or above the level asked for. */
  static final int FOUND = 1;

  /** Bad usage, or input that cannot be read. */
  static final int UNUSABLE = 2;

  /** A fault of the program. */
  static final int FAULT = 3;

  @Spec private CommandSpec spec;

  /** Runs the program and ends the virtual machine with its exit code. */
  public static void main(String[] args) {
    CompletableFuture.runAsync(Segmenter::prepare);
    int code = run(Console.ofMachine(), args);
    System.exit(code);
  }

  /** Runs the program on a console and gives its exit code. */
  static int run(Console console, String... args) {
    CommandLine line = Commands.line(console, args);
    line.setCaseInsensitiveEnumValuesAllowed(true);
    line.setOut(console.out());
    line.setErr(console.err());
    line.setColorScheme(
        CommandLine.Help.defaultColorScheme(
            console.coloured() ? CommandLine.Help.Ansi.ON : CommandLine.Help.Ansi.OFF));
    line.setExecutionExceptionHandler((e, command, parsed) -> fault(console, e));
    int code = execute(line, console, args);
    console.flush();
    if (console.out().checkError()) {
      console.err().println("The results could not be written. Is the disk full?");
      return FAULT;
    }
    return code;
  }

  /** Out of memory, for one, is no exception, and must not look like a finding. */
  private static int execute(CommandLine line, Console console, String... args) {
    try {
      return line.execute(args);
    } catch (Error e) {
      return fault(console, e);
    }
  }

  private static int fault(Console console, Throwable e) {
    if (e instanceof Refused refused) {
      console.err().println(refused.getMessage());
      return UNUSABLE;
    }
    console.err().println("This is a fault of Tallystick itself: " + Fault.where(e) + ".");
    console.err().println("Your files are as they were. Please report it with the line above.");
    return FAULT;
  }

  @Override
  public void run() {
    throw new ParameterException(spec.commandLine(), "Which command? For instance: check FOLDER");
  }
}
