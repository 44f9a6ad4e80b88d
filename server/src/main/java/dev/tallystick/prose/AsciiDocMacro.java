package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The text in the brackets of a macro. */
final class AsciiDocMacro {
  private static final Pattern NAMED = Pattern.compile("[ \\t]*+(\\w[\\w-]*+)[ \\t]*+=");
  private static final Pattern ALT = Pattern.compile("\\balt=(?:\"([^\"]*+)\"|([^,\\]]*+))");
  private static final Pattern QUOTED = Pattern.compile("[ \\t]*+\"([^\"]*+)\"[ \\t]*+(?:,|$)");

  private AsciiDocMacro() {}

  /** The first attribute without a name, or the one called {@code alt}: what an image shows. */
  static Span positional(String file, Span brackets) {
    Matcher quoted = QUOTED.matcher(file).region(brackets.start(), brackets.end());
    if (quoted.lookingAt()) {
      return new Span(quoted.start(1), quoted.end(1));
    }
    if (NAMED.matcher(file).region(brackets.start(), brackets.end()).lookingAt()) {
      Matcher alt = ALT.matcher(file).region(brackets.start(), brackets.end());
      if (!alt.find()) {
        return new Span(brackets.end(), brackets.end());
      }
      int group = alt.group(1) != null ? 1 : 2;
      return new Span(alt.start(group), alt.end(group));
    }
    int comma = brackets.start();
    while (comma < brackets.end() && file.charAt(comma) != ',') {
      comma++;
    }
    return new Span(brackets.start(), comma);
  }

  /** The text of a link: all of it, or what stands before attributes with a name. */
  static Span linkText(String file, Span brackets) {
    int at = brackets.start();
    boolean attributes = false;
    while (at < brackets.end() && !attributes) {
      attributes =
          file.charAt(at) == ',' && NAMED.matcher(file).region(at + 1, brackets.end()).lookingAt();
      at++;
    }
    if (attributes || file.startsWith("\"", brackets.start())) {
      Matcher quoted = QUOTED.matcher(file).region(brackets.start(), brackets.end());
      if (quoted.lookingAt()) {
        return new Span(quoted.start(1), quoted.end(1));
      }
    }
    int end = attributes ? at - 1 : brackets.end();
    boolean window = end > brackets.start() && file.charAt(end - 1) == '^';
    return new Span(brackets.start(), window ? end - 1 : end);
  }
}
