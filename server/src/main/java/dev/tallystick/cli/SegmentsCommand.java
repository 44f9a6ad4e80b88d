package dev.tallystick.cli;

import dev.tallystick.engine.Disk;
import dev.tallystick.engine.Intake;
import dev.tallystick.engine.Reading;
import dev.tallystick.engine.Unreadable;
import dev.tallystick.pairing.Language;
import dev.tallystick.run.Cancellation;
import dev.tallystick.segment.Segment;
import dev.tallystick.segment.SrxExport;
import dev.tallystick.text.Decoded;
import java.nio.file.Path;
import java.util.Locale;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Prints the sentences of a file. */
@Command(
    name = "segments",
    mixinStandardHelpOptions = true,
    description = "Prints the sentences of one file.")
final class SegmentsCommand implements Callable<Integer> {
  private final Console console;

  @Spec private CommandSpec command;

  private Language language = Language.UNKNOWN;

  @Option(
      names = "--language",
      paramLabel = "TAG",
      description = "Language of the file as a BCP 47 tag.")
  void setLanguage(String tag) {
    language = LanguageOptions.language(command, tag);
  }

  @Mixin private FormatOption format;

  @Option(
      names = "--rules",
      description = "Prints the rules for the language in the form of SRX 2.0 instead; no file.")
  private boolean rules;

  @Parameters(index = "0", arity = "0..1", paramLabel = "FILE", description = "The file.")
  private Path file;

  SegmentsCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() throws Exception {
    if (rules == (file != null)) {
      throw new ParameterException(
          command.commandLine(), "Name a file, or ask for --rules, but not both.");
    }
    if (rules) {
      console.out().print(SrxExport.of(language.tag()));
      return Tallystick.FINE;
    }
    Decoded decoded = load();
    boolean malformed = Malformed.tell(console, file, decoded);
    for (Segment segment : read(decoded).segments()) {
      if (segment.verbatim()) {
        continue;
      }
      String block = segment.block().kind().name().toLowerCase(Locale.ROOT);
      if (format.forPrograms()) {
        new JsonLine(console.out())
            .put("start", segment.span().start())
            .put("end", segment.span().end())
            .put("block", block)
            .end();
      } else {
        console.out().println(console.paint(block, "2") + "\t" + segment.prose());
      }
    }
    return malformed ? Tallystick.UNUSABLE : Tallystick.FINE;
  }

  private Reading read(Decoded decoded) {
    return Reading.of(decoded.text(), Intake.format(file), language.tag(), Cancellation.NONE);
  }

  private Decoded load() {
    try {
      return Intake.load(Disk.REAL, file);
    } catch (Unreadable e) {
      throw new Refused(e.getMessage());
    }
  }
}
