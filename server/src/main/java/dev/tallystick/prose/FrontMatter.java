package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.List;
import java.util.regex.Pattern;

/** Data about a document at its very start: YAML between {@code ---}, TOML between {@code +++}. */
final class FrontMatter {
  private static final Pattern YAML_KEY = Pattern.compile("[\\w\"'][^:]*:(?:\\s.*)?");

  private final Text text;
  private final String fence;

  /** The line of the fence that closes it; 0 if there is no front matter. */
  private final int close;

  private FrontMatter(Text text) {
    this.text = text;
    this.fence = text.string().substring(start(), text.lineEnd(0)).stripTrailing();
    this.close =
        switch (fence) {
          case "---" -> isYaml() ? close("---", "...") : 0;
          case "+++" -> close("+++", "+++");
          default -> 0;
        };
  }

  /**
   * The front matter of a file, if it has any.
   *
   * <p>Two thematic breaks around prose look much the same as YAML: only with a key at the start of
   * the first line that is no comment is it front matter.
   */
  static FrontMatter of(Text text) {
    return new FrontMatter(text);
  }

  /** Offset of the first character behind a byte-order mark and front matter. */
  int end() {
    if (close == 0) {
      return start();
    }
    return close + 1 < text.lines() ? text.lineStart(close + 1) : text.length();
  }

  /** The values of some keys, each a block, or one for each of its paragraphs. */
  List<Block> blocks(FrontMatterKeys keys) {
    return close == 0 || keys.names().isEmpty()
        ? List.of()
        : new FrontMatterValues(text, close, fence.equals("+++"), keys).blocks();
  }

  private int start() {
    return text.string().startsWith("\uFEFF") ? 1 : 0;
  }

  private boolean isYaml() {
    for (int i = 1; i < text.lines(); i++) {
      String line = line(i);
      if (!line.startsWith("#")) {
        return YAML_KEY.matcher(line).matches();
      }
    }
    return false;
  }

  private int close(String mark, String other) {
    for (int i = 1; i < text.lines(); i++) {
      String line = line(i);
      if (line.equals(mark) || line.equals(other)) {
        return i;
      }
    }
    return 0;
  }

  private String line(int number) {
    return text.string().substring(text.lineStart(number), text.lineEnd(number)).stripTrailing();
  }
}
