package dev.tallystick.cli;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/**
 * What a command left behind.
 *
 * @param exit its exit code
 * @param out what it printed on standard output
 * @param err what it printed on standard error
 */
record Outcome(int exit, String out, String err) {
  /** Runs a command line whose console is no terminal; arguments may be paths. */
  static Outcome of(Object... arguments) {
    return on(false, arguments);
  }

  /** Runs a command line. */
  static Outcome on(boolean coloured, Object... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    Console console = new Console(new PrintWriter(out), new PrintWriter(err), coloured);
    String[] words = Stream.of(arguments).map(Object::toString).toArray(String[]::new);
    int exit = Tallystick.run(console, words);
    return new Outcome(exit, out.toString(), err.toString());
  }

  /** The lines of standard output. */
  List<String> lines() {
    return out.lines().toList();
  }

  /** The lines of standard output, each a JSON object. */
  List<JsonObject> json() {
    return out.lines().map(line -> JsonParser.parseString(line).getAsJsonObject()).toList();
  }

  /** The codes of the findings that {@code check --format jsonl} printed, in order. */
  List<String> codes() {
    return json().stream().map(finding -> finding.get("code").getAsString()).toList();
  }

  /** A path as the program prints it. */
  static String shown(Path path) {
    return path.toString().replace('\\', '/');
  }
}
