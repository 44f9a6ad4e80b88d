package dev.tallystick.cli;

import dev.tallystick.text.Decoded;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.util.List;

/** Says where something is wrong in a file. The rest of the file counts all the same. */
final class Malformed {
  private Malformed() {}

  /** Prints each place whose bytes are no text, and says whether there were any. */
  static boolean tell(Console console, Object file, Decoded decoded) {
    return tell(console, file, decoded.text(), decoded.problems());
  }

  /** Prints each place on the error console, and says whether there were any. */
  static boolean tell(Console console, Object file, Text text, List<Problem> problems) {
    for (Problem problem : problems) {
      Location at = Location.of(text, problem.span().start());
      console.err().println(file + ":" + at + ": " + problem.message());
    }
    return !problems.isEmpty();
  }
}
