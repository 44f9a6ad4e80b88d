package dev.tallystick.project;

import dev.tallystick.pairing.Glob;
import dev.tallystick.prose.Format;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** What names of files mean, and which of them no file that is read can have. */
public final class Names {
  private static final Pattern VARIABLE = Pattern.compile("\\{[^{}/]*\\}|[{}]");
  private static final Pattern DRIVE = Pattern.compile("[A-Za-z]:.*", Pattern.DOTALL);
  private static final String FROM_HERE =
      " Write it as seen from the folder of " + ProjectFile.NAME + ", such as en/guide.md.";

  private Names() {}

  /** What is wrong with a glob. */
  static Optional<String> faultOfGlob(String written) {
    String folder = written.endsWith("/") ? written.substring(0, written.length() - 1) : written;
    Optional<String> fault = faultOfPath(folder);
    return fault.isPresent() || Glob.of(written).isPresent()
        ? fault
        : Optional.of("A [ or { is not closed here, or a } closes nothing.");
  }

  /** What is wrong with the name or pattern of a side of a pair. */
  static Optional<String> faultOfPattern(String written) {
    return faultOfPath(written)
        .or(() -> faultOfVariables(written))
        .or(() -> hidden(written))
        .or(() -> faultOfExtension(written));
  }

  /** What is wrong with the name of a file of rules for sentence borders. */
  static Optional<String> faultOfRules(String written) {
    return faultOfPath(written)
        .or(() -> hidden(written))
        .or(
            () ->
                isRules(written)
                    ? Optional.empty()
                    : Optional.of("Rules for sentence borders are in a file that ends in .srx."));
  }

  /** Whether a file of this name has rules for sentence borders. */
  public static boolean isRules(String name) {
    return name.endsWith(".srx");
  }

  private static Optional<String> faultOfPath(String written) {
    if (written.isEmpty()) {
      return Optional.of("The name is empty." + FROM_HERE);
    }
    if (written.indexOf('\\') >= 0) {
      return Optional.of("Between folders write /, on every system.");
    }
    if (written.startsWith("/") || DRIVE.matcher(written).matches()) {
      return Optional.of("The name starts at the root of the disk." + FROM_HERE);
    }
    for (String part : written.split("/", -1)) {
      if (part.equals("..")) {
        return Optional.of("\"..\" leads out of the folder, or back." + FROM_HERE);
      }
      if (part.isEmpty() || part.equals(".")) {
        return Optional.of("\"" + part + "/\" names no folder. Leave it out.");
      }
    }
    return Optional.empty();
  }

  private static Optional<String> faultOfVariables(String written) {
    Matcher variable = VARIABLE.matcher(written);
    while (variable.find()) {
      if (!variable.group().equals("{path}") && !variable.group().equals("{tag}")) {
        return Optional.of(
            Values.quote(variable.group()) + " means nothing here. Allowed are: {path}, {tag}.");
      }
    }
    return written.indexOf('*') < 0 && written.indexOf('?') < 0
        ? Optional.empty()
        : Optional.of("* and ? mean nothing here. {path} stands for what source and target share.");
  }

  /** Whether files of this name, and those in a folder of this name, are passed over. */
  public static boolean hides(String name) {
    return name.startsWith(".") || name.equals("node_modules");
  }

  private static Optional<String> hidden(String written) {
    for (String part : written.split("/")) {
      if (hides(part)) {
        return Optional.of(
            "No file can match: names that start with a dot are passed over, and node_modules.");
      }
    }
    return Optional.empty();
  }

  /** A name that ends in a variable may end in anything. */
  private static Optional<String> faultOfExtension(String written) {
    if (written.endsWith("}") || Format.ofName(written).isPresent()) {
      return Optional.empty();
    }
    String read =
        Stream.of(Format.values())
            .flatMap(format -> format.extensions().stream())
            .map(extension -> "." + extension)
            .collect(Collectors.joining(", "));
    return Optional.of("No file can match: only files that end in " + read + " are read.");
  }
}
