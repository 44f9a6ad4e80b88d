package dev.tallystick.prose;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads the values of front matter line by line, as YAML 1.2 and TOML 1.0 write texts (from
 * memory). What is no text, such as a list or an anchor, has no prose.
 */
final class FrontMatterValues {
  private static final Pattern YAML_KEY =
      Pattern.compile("(?:- +)*+(?:\"([^\"]++)\"|'([^']++)'|([\\w.-]++))[ \\t]*+:(?:[ \\t]++|$)");
  private static final Pattern YAML_BLOCK = Pattern.compile("[|>][-+\\d]*+(?:[ \\t]++#.*+)?+");
  private static final Pattern TOML_KEY =
      Pattern.compile("(?:[\\w-]++\\.)*+(?:\"([^\"]++)\"|'([^']++)'|([\\w-]++))[ \\t]*+=[ \\t]*+");

  /** With these no text begins in YAML that stands without quotation marks. */
  private static final String YAML_MARKS = "[]{}&*!|>%@`#,";

  private final String file;
  private final Text text;
  private final List<Span> lines;
  private final int end;
  private final boolean toml;
  private final FrontMatterKeys keys;
  private final List<Block> blocks = new ArrayList<>();

  /**
   * Takes front matter.
   *
   * @param end index of the line that closes it; the first line opens it
   */
  FrontMatterValues(Text text, int end, boolean toml, FrontMatterKeys keys) {
    this.file = text.string();
    this.text = text;
    this.lines = TrimmedLines.of(text);
    this.end = end;
    this.toml = toml;
    this.keys = keys;
  }

  List<Block> blocks() {
    int at = 1;
    while (at < end) {
      Span line = lines.get(at);
      Matcher key = (toml ? TOML_KEY : YAML_KEY).matcher(file).region(line.start(), line.end());
      at = !key.lookingAt() ? at + 1 : toml ? readToml(at, key) : readYaml(at, key);
    }
    return blocks;
  }

  /** Reads the value of a key; the index behind its last line. */
  private int readYaml(int at, Matcher key) {
    int group = group(key);
    int quote = group == 3 ? 0 : 1;
    int behind = behindDeeper(at, key.start(group) - quote);
    int value = key.end();
    int lineEnd = lines.get(at).end();
    if (YAML_BLOCK.matcher(file).region(value, lineEnd).matches()) {
      read(key, at + 1, lines.get(at + 1).start(), behind, "");
      return behind;
    }
    char first = value == lineEnd ? '#' : file.charAt(value);
    if (first == '"' || first == '\'') {
      read(key, at, value + 1, behind, String.valueOf(first));
      return behind;
    }
    if (YAML_MARKS.indexOf(first) >= 0) {
      return at + 1;
    }
    read(key, at, value, behind, null);
    return behind;
  }

  /** The index of the first line that is not indented deeper than a key. */
  private int behindDeeper(int at, int key) {
    int depth = key - text.lineStart(at);
    int behind = at + 1;
    int next = at + 1;
    while (next < end
        && (lines.get(next).isEmpty() || lines.get(next).start() - text.lineStart(next) > depth)) {
      next++;
      behind = lines.get(next - 1).isEmpty() ? behind : next;
    }
    return behind;
  }

  private int readToml(int at, Matcher key) {
    int value = key.end();
    int lineEnd = lines.get(at).end();
    for (String quote : List.of("\"\"\"", "'''")) {
      if (file.startsWith(quote, value) && value + 3 <= lineEnd) {
        int behind = behindQuote(at, value + 3, quote);
        read(key, at, value + 3, behind, quote);
        return behind;
      }
    }
    char first = value == lineEnd ? ' ' : file.charAt(value);
    if (first == '"' || first == '\'') {
      read(key, at, value + 1, at + 1, String.valueOf(first));
    }
    return at + 1;
  }

  /** The index behind the line on which a quotation ends. */
  private int behindQuote(int at, int from, String quote) {
    int line = at;
    int close = file.indexOf(quote, from);
    while (line + 1 < end && (close < 0 || text.lineEnd(line) < close)) {
      line++;
    }
    return line + 1;
  }

  private static int group(Matcher key) {
    return key.group(1) != null ? 1 : key.group(2) != null ? 2 : 3;
  }

  /**
   * Reads a value if its key is wanted.
   *
   * @param line index of its first line
   * @param from offset of its first character
   * @param behind index behind its last line
   * @param quote what it ends with; empty if nothing but the lines end it, null for YAML without
   *     quotation marks
   */
  private void read(Matcher key, int line, int from, int behind, String quote) {
    if (!keys.names().contains(key.group(group(key)))) {
      return;
    }
    FrontMatterText value = new FrontMatterText(file, quote, key.start());
    boolean open = true;
    for (int i = line; i < behind && open; i++) {
      Span words = i == line ? new Span(from, lines.get(i).end()) : lines.get(i);
      if (words.isEmpty()) {
        value.finish(blocks);
      } else {
        open = value.append(words);
      }
    }
    value.finish(blocks);
  }
}
