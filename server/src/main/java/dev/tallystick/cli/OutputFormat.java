package dev.tallystick.cli;

import java.util.Locale;

/** How results are printed. */
enum OutputFormat {
  /** For people. */
  TEXT,
  /** A JSON object a line. */
  JSONL;

  @Override
  public String toString() {
    return name().toLowerCase(Locale.ROOT);
  }
}
