package dev.tallystick.pairing;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The name of a file, relative and with {@code /}, in which two variables may stand: {@code {path}}
 * for one character or more, across folders, and {@code {tag}} for a language tag. A variable that
 * stands twice means the same both times.
 */
public final class PathPattern {
  /** What stands for the part of the path that source and translation share. */
  public static final String PATH = "{path}";

  /** What stands for a language tag. */
  public static final String TAG = "{tag}";

  private static final Pattern VARIABLE = Pattern.compile("\\{(?:path|tag)\\}");

  /** Language, script and region: no tag is longer. */
  private static final int LONGEST_TAG = "yue-Hant-419".length();

  private final String written;
  private final List<String> parts = new ArrayList<>();

  private PathPattern(String written) {
    this.written = written;
    Matcher variable = VARIABLE.matcher(written);
    int from = 0;
    while (variable.find()) {
      parts.add(written.substring(from, variable.start()));
      parts.add(variable.group());
      from = variable.end();
    }
    parts.add(written.substring(from));
  }

  /** Reads a pattern. Whatever is none of the variables stands for itself. */
  public static PathPattern of(String written) {
    return new PathPattern(written);
  }

  /** Whether it names one file. */
  public boolean isLiteral() {
    return parts.size() == 1;
  }

  /** Whether a variable stands in it. */
  public boolean has(String variable) {
    return parts.contains(variable);
  }

  /**
   * What the variables stand for in a file's name; null for one that is not in the pattern.
   *
   * @param path what {@link #PATH} stands for
   * @param tag what {@link #TAG} stands for
   */
  record Values(String path, String tag) {
    static final Values NONE = new Values(null, null);

    private String of(String part) {
      return switch (part) {
        case PATH -> path;
        case TAG -> tag;
        default -> part;
      };
    }

    private Values with(String variable, String value) {
      return variable.equals(PATH) ? new Values(value, tag) : new Values(path, value);
    }
  }

  /** All ways to read a name by this pattern, those with a longer tag first. */
  List<Values> read(String name) {
    List<Values> found = new ArrayList<>();
    if (!name.startsWith(parts.get(0)) || !name.endsWith(parts.get(parts.size() - 1))) {
      return found;
    }
    read(name, 0, 0, Values.NONE, found::add);
    if (has(TAG)) {
      found.sort((a, b) -> Integer.compare(b.tag().length(), a.tag().length()));
    }
    return found;
  }

  private void read(String name, int from, int first, Values known, Consumer<Values> found) {
    int at = from;
    for (int i = first; i < parts.size(); i++) {
      String part = known.of(parts.get(i));
      if (part == null) {
        readVariable(name, at, i, known, found);
        return;
      }
      if (!name.startsWith(part, at)) {
        return;
      }
      at += part.length();
    }
    if (at == name.length()) {
      found.accept(known);
    }
  }

  private void readVariable(String name, int at, int part, Values known, Consumer<Values> found) {
    String variable = parts.get(part);
    String next = parts.get(part + 1); // a literal, if an empty one
    boolean last = part + 2 == parts.size();
    int longest = variable.equals(TAG) ? LONGEST_TAG : name.length();
    int first = last ? Math.max(at + 1, name.length() - next.length()) : at + 1;
    for (int end = first; end <= Math.min(name.length(), at + longest); end++) {
      if (name.startsWith(next, end)) {
        read(name, end, part + 1, known.with(variable, name.substring(at, end)), found);
      }
    }
  }

  /** The name with the values in place of the variables; a variable without one stays. */
  String with(Values values) {
    StringBuilder name = new StringBuilder();
    for (String part : parts) {
      String value = values.of(part);
      name.append(value == null ? part : value);
    }
    return name.toString();
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof PathPattern pattern && pattern.written.equals(written);
  }

  @Override
  public int hashCode() {
    return written.hashCode();
  }

  /** The pattern as it was written. */
  @Override
  public String toString() {
    return written;
  }
}
