package dev.tallystick.cli;

import dev.tallystick.check.Code;
import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import dev.tallystick.check.Severity;
import dev.tallystick.engine.PairResult;
import dev.tallystick.pairing.Pair;
import java.io.IOException;
import java.util.EnumMap;
import java.util.Map;
import java.util.stream.Collectors;

/** Prints findings, for people or for programs. */
abstract class FindingPrinter {
  static FindingPrinter of(OutputFormat format, Console console) {
    return switch (format) {
      case TEXT -> new ForPeople(console);
      case JSONL -> new ForPrograms(console);
    };
  }

  abstract void print(Pair pair, PairResult result) throws IOException;

  /** Ends the list. {@code checked} is the number of pairs that could be read. */
  abstract void end(int checked);

  private static String file(Pair pair, OnSide side) {
    return side == OnSide.SOURCE ? pair.source() : pair.target();
  }

  /** A heading for each pair with findings, and a line for each finding. */
  private static final class ForPeople extends FindingPrinter {
    private static final String WARNING = "33";
    private static final String QUIET = "36";

    private final Console console;
    private final Map<Code, Integer> counts = new EnumMap<>(Code.class);
    private int withFindings;

    ForPeople(Console console) {
      this.console = console;
    }

    @Override
    void print(Pair pair, PairResult result) throws IOException {
      if (result.findings().isEmpty()) {
        return;
      }
      if (withFindings++ > 0) {
        console.out().println();
      }
      console.out().println(console.paint(pair.source() + " -> " + pair.target(), "1"));
      for (Finding finding : result.findings()) {
        counts.merge(finding.code(), 1, Integer::sum);
        Location at = Location.of(result.reading(finding.side()).text(), finding.span().start());
        boolean loud = finding.severity() == Severity.WARNING;
        console
            .out()
            .println(
                file(pair, finding.side())
                    + ":"
                    + at
                    + ": "
                    + console.paint(finding.code().word(), loud ? WARNING : QUIET)
                    + ": "
                    + finding.message());
      }
    }

    @Override
    void end(int checked) {
      if (checked == 0) {
        console.out().println("No pairs found. `pairs` says which files stand alone, and why.");
        return;
      }
      String what =
          counts.isEmpty()
              ? "no findings"
              : counts.entrySet().stream()
                  .map(entry -> entry.getValue() + " " + entry.getKey().word())
                  .collect(Collectors.joining(", "));
      if (!counts.isEmpty()) {
        console.out().println();
      }
      console.out().println(checked + (checked == 1 ? " pair: " : " pairs: ") + what + ".");
      if (counts.isEmpty()) {
        console
            .out()
            .println("This says nothing about meaning: revision by a second person comes first.");
      }
    }
  }

  /** A JSON object for each finding. */
  private static final class ForPrograms extends FindingPrinter {
    private final Console console;

    ForPrograms(Console console) {
      this.console = console;
    }

    @Override
    void print(Pair pair, PairResult result) throws IOException {
      for (Finding finding : result.findings()) {
        Location at = Location.of(result.reading(finding.side()).text(), finding.span().start());
        new JsonLine(console.out())
            .put("code", finding.code().word())
            .put("severity", finding.severity().word())
            .put("side", finding.side().word())
            .put("file", file(pair, finding.side()))
            .put("start", finding.span().start())
            .put("end", finding.span().end())
            .put("line", at.line())
            .put("column", at.column())
            .put("language", result.language(OnSide.TARGET).tag())
            .open("counterpart")
            .put("file", file(pair, finding.side().other()))
            .put("start", finding.counterpart().start())
            .put("end", finding.counterpart().end())
            .close()
            .share("confidence", finding.confidence())
            .put("message", finding.message())
            .end();
      }
    }

    @Override
    void end(int checked) {
      // Programs count for themselves.
    }
  }
}
