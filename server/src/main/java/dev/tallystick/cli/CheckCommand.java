package dev.tallystick.cli;

import dev.tallystick.check.Finding;
import dev.tallystick.engine.PairResult;
import dev.tallystick.pairing.Ambiguity;
import dev.tallystick.pairing.Pair;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Checks a folder, or one pair. */
@Command(
    name = "check",
    mixinStandardHelpOptions = true,
    description = "Checks a folder, or one source and one translation.",
    exitCodeListHeading = "Exit codes:%n",
    exitCodeList = {
      "0:nothing found at or above --fail-on",
      "1:something found",
      "2:bad usage or unreadable input; the rest is still checked",
      "3:a fault of the program"
    })
final class CheckCommand implements Callable<Integer> {
  private final Console console;

  @Mixin private LanguageOptions languages;
  @Mixin private ModelOption model;

  @Mixin private FormatOption format;

  @Option(
      names = "--draft",
      description =
          "The translation is still being written: what nobody has got to yet is not reported.")
  private boolean draft;

  @Option(
      names = "--fail-on",
      paramLabel = "LEVEL",
      defaultValue = "warning",
      converter = FailOn.Converter.class,
      description = "hint, information, warning (the default) or never, or codes parted by commas.")
  private FailOn failOn;

  @Parameters(
      arity = "1..*",
      paramLabel = "PATH",
      description = "A folder, or a source file and its translation.")
  private List<Path> paths;

  CheckCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() throws IOException {
    Job job = Job.of(console, paths, languages.rules());
    FindingPrinter printer = FindingPrinter.of(format.format(), console);
    Ticker ticker = new Ticker(console, job.pairs().pairs().size());
    boolean failed = false;
    int checked = 0;
    for (Pair pair : job.pairs().pairs()) {
      PairResult result = job.result(pair, model.aligner(), draft);
      if (result != null) {
        printer.print(pair, result);
        checked++;
        for (Finding finding : result.findings()) {
          failed |= failOn.fails(finding);
        }
      }
      ticker.tick();
    }
    if (checked > 0 || job.pairs().pairs().isEmpty()) {
      printer.end(checked);
    }
    for (Ambiguity ambiguity : job.pairs().ambiguities()) {
      console.err().println(Choice.message(ambiguity));
    }
    if (!job.complete() || !job.pairs().ambiguities().isEmpty()) {
      return Tallystick.UNUSABLE;
    }
    return failed ? Tallystick.FOUND : Tallystick.FINE;
  }
}
