package dev.tallystick.aid;

import dev.tallystick.prose.Block;
import dev.tallystick.text.Text;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** What lines begin with before their text: marks of lists, headings, quotations; indents. */
final class Marks {
  private static final Pattern FIRST =
      Pattern.compile(
          "[ \\t]*(?:(?:>[ \\t]?|[-+*][ \\t]+|\\d{1,9}[.)][ \\t]+|#{1,6}[ \\t]+"
              + "|\\[\\^[^\\[\\]\\s]+]:[ \\t]*|\\[[ xX]][ \\t]+"
              + "|[\\u2022\\u2023\\u25E6\\u25AA\\u30FB][ \\t\\u3000]*)[ \\t]*)*");

  private static final Pattern NEXT = Pattern.compile("[ \\t]*(?:>[ \\t]?)*[ \\t]*");

  private Marks() {}

  /** Those of the line that a block begins on. */
  static String first(Text text, Block block) {
    return of(FIRST, text, text.place(block.extent().start()).line());
  }

  /** Those of a line that goes on with a block. */
  static String next(Text text, int line) {
    return of(NEXT, text, line);
  }

  /** What a new line has to begin with to go on with a block. */
  static String next(Text text, Block block) {
    int line = text.place(block.extent().start()).line();
    if (line < text.place(block.extent().end()).line()) {
      return next(text, line + 1);
    }
    return first(text, block).replaceAll("[^ \\t>]", " ");
  }

  private static String of(Pattern marks, Text text, int line) {
    String words = text.string().substring(text.lineStart(line), text.lineEnd(line));
    Matcher matcher = marks.matcher(words);
    return matcher.lookingAt() ? matcher.group() : "";
  }
}
