package dev.tallystick.cli;

import java.io.BufferedWriter;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.Map;

/**
 * Where a command prints.
 *
 * @param out results, UTF-8 whatever the machine's own encoding
 * @param err messages and progress
 * @param coloured whether a person looks at the results on a terminal that shows colours
 */
record Console(PrintWriter out, PrintWriter err, boolean coloured) {
  /** The console of this process. */
  static Console ofMachine() {
    return new Console(
        writer(FileDescriptor.out, false),
        writer(FileDescriptor.err, true),
        colours(System.console() != null, System.getenv()));
  }

  /** Colours only on a terminal, and not where NO_COLOR or a dumb terminal asks for none. */
  static boolean colours(boolean terminal, Map<String, String> environment) {
    boolean refused = !environment.getOrDefault("NO_COLOR", "").isEmpty();
    return terminal && !refused && !"dumb".equals(environment.get("TERM"));
  }

  private static PrintWriter writer(FileDescriptor descriptor, boolean prompt) {
    FileOutputStream stream = new FileOutputStream(descriptor);
    return new PrintWriter(
        new BufferedWriter(new OutputStreamWriter(stream, StandardCharsets.UTF_8)), prompt);
  }

  void flush() {
    out.flush();
    err.flush();
  }

  /** A text in a colour by its ANSI code, or as it is. */
  String paint(String text, String code) {
    return coloured ? "\u001b[" + code + "m" + text + "\u001b[0m" : text;
  }
}
