package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.regex.Pattern;

/** Data about a document at its very start: YAML between {@code ---}, TOML between {@code +++}. */
final class FrontMatter {
  private static final Pattern YAML_KEY = Pattern.compile("[\\w\"'][^:]*:(?:\\s.*)?");

  private FrontMatter() {}

  /**
   * Offset of the first character behind a byte-order mark and front matter.
   *
   * <p>Two thematic breaks around prose look much the same as YAML: only with a key at the start of
   * the first line that is no comment is it front matter.
   */
  static int end(Text text) {
    int start = text.string().startsWith("\uFEFF") ? 1 : 0;
    String fence = text.string().substring(start, text.lineEnd(0)).stripTrailing();
    return switch (fence) {
      case "---" -> isYaml(text) ? behindFence(text, start, "---", "...") : start;
      case "+++" -> behindFence(text, start, "+++", "+++");
      default -> start;
    };
  }

  private static boolean isYaml(Text text) {
    for (int i = 1; i < text.lines(); i++) {
      String line = line(text, i);
      if (!line.startsWith("#")) {
        return YAML_KEY.matcher(line).matches();
      }
    }
    return false;
  }

  private static int behindFence(Text text, int start, String fence, String other) {
    for (int i = 1; i < text.lines(); i++) {
      String line = line(text, i);
      if (line.equals(fence) || line.equals(other)) {
        return i + 1 < text.lines() ? text.lineStart(i + 1) : text.length();
      }
    }
    return start;
  }

  private static String line(Text text, int number) {
    return text.string().substring(text.lineStart(number), text.lineEnd(number)).stripTrailing();
  }
}
