package dev.tallystick.cli;

import dev.tallystick.align.Aligner;
import dev.tallystick.check.Code;
import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import dev.tallystick.engine.PairResult;
import dev.tallystick.pairing.Alone;
import dev.tallystick.pairing.Ambiguity;
import dev.tallystick.pairing.Pair;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** Says which files belong together. */
@Command(
    name = "pairs",
    mixinStandardHelpOptions = true,
    description =
        "Prints which files belong together and why, which stand alone and why, and the progress"
            + " of each pair.")
final class PairsCommand implements Callable<Integer> {
  private final Console console;

  @Mixin private LanguageOptions languages;

  @Mixin private FormatOption format;

  @Parameters(arity = "1", paramLabel = "PATH", description = "A folder.")
  private Path path;

  PairsCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() throws IOException {
    if (!Files.isDirectory(path)) {
      throw new Refused(path + ": this is no folder. Name the folder whose files to look at.");
    }
    Job job = Job.ofFolders(console, List.of(path), languages.rules());
    for (Pair pair : job.pairs().pairs()) {
      PairResult result = job.result(pair, Aligner.ADAPTIVE, true);
      if (result != null) {
        print(pair, result);
      }
    }
    if (!format.forPrograms()) {
      for (Alone alone : job.pairs().alone()) {
        console.out().println(alone.file() + ": alone. " + alone.reason());
      }
    }
    for (Ambiguity ambiguity : job.pairs().ambiguities()) {
      console.err().println(Choice.message(ambiguity));
    }
    boolean usable = job.complete() && job.pairs().ambiguities().isEmpty();
    return usable ? Tallystick.FINE : Tallystick.UNUSABLE;
  }

  private void print(Pair pair, PairResult result) throws IOException {
    if (format.forPrograms()) {
      printForPrograms(pair, result);
    } else {
      printForPeople(pair, result);
    }
  }

  private void printForPeople(Pair pair, PairResult result) {
    int done = result.progress().done();
    int pending = result.progress().pending();
    long share = done + pending == 0 ? 100 : 100L * done / (done + pending);
    String files = pair.source() + " -> " + pair.target();
    String languages = language(result, OnSide.SOURCE) + " to " + language(result, OnSide.TARGET);
    String progress =
        String.format(Locale.ROOT, "%d words done, %d pending (%d %%)", done, pending, share);
    int findings = result.findings().size();
    console
        .out()
        .println(
            String.join(
                ", ",
                files + ": " + languages,
                "paired by " + pair.why().word(),
                progress,
                findings + (findings == 1 ? " finding" : " findings")));
  }

  private void printForPrograms(Pair pair, PairResult result) throws IOException {
    JsonLine line =
        new JsonLine(console.out())
            .put("source", pair.source())
            .put("target", pair.target())
            .put("sourceLanguage", language(result, OnSide.SOURCE))
            .put("targetLanguage", language(result, OnSide.TARGET))
            .put("why", pair.why().word())
            .put("done", result.progress().done())
            .put("pending", result.progress().pending())
            .open("findings");
    for (Map.Entry<Code, Integer> count : counts(result).entrySet()) {
      line.put(count.getKey().word(), count.getValue());
    }
    line.close().end();
  }

  private static String language(PairResult result, OnSide side) {
    return result.language(side).tag();
  }

  private static Map<Code, Integer> counts(PairResult result) {
    Map<Code, Integer> counts = new EnumMap<>(Code.class);
    for (Finding finding : result.findings()) {
      counts.merge(finding.code(), 1, Integer::sum);
    }
    return counts;
  }
}
