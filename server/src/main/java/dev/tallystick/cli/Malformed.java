package dev.tallystick.cli;

import dev.tallystick.text.Decoded;
import dev.tallystick.text.Problem;

/** Says where bytes of a file are no text. The rest of the file is worked on all the same. */
final class Malformed {
  private Malformed() {}

  /** Prints each place on the error console, and says whether there were any. */
  static boolean tell(Console console, Object file, Decoded decoded) {
    for (Problem problem : decoded.problems()) {
      Location at = Location.of(decoded.text(), problem.span().start());
      console.err().println(file + ":" + at + ": " + problem.message());
    }
    return !decoded.problems().isEmpty();
  }
}
