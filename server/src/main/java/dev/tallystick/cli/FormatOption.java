package dev.tallystick.cli;

import picocli.CommandLine.Option;

/** How results are printed. */
final class FormatOption {
  @Option(
      names = "--format",
      paramLabel = "FORMAT",
      defaultValue = "text",
      description = "text (the default) or jsonl.")
  private OutputFormat format;

  OutputFormat format() {
    return format;
  }

  /** Whether programs read the results: a JSON object a line. */
  boolean forPrograms() {
    return format == OutputFormat.JSONL;
  }
}
