package dev.tallystick.cli;

import dev.tallystick.align.Aligner;
import picocli.CommandLine.Option;

/** Which model aligns. */
final class ModelOption {
  @Option(
      names = "--model",
      paramLabel = "MODEL",
      defaultValue = "adaptive",
      description =
          "adaptive (fitted to the pair, the default) or published (Gale and Church 1993,"
              + " for comparison).")
  private Aligner model;

  Aligner aligner() {
    return model;
  }
}
