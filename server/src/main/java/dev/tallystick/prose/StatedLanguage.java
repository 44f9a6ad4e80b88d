package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jsoup.nodes.Element;
import org.jsoup.parser.Parser;

/** The language that a document gives for itself, at its start. */
final class StatedLanguage {
  /** What stands farther down, in UTF-16 units, is not looked at. */
  private static final int HEAD = 16_384;

  private static final Pattern YAML =
      Pattern.compile("(?:lang|language)[ \\t]*:[ \\t]+[\"']?([\\w-]++)[\"']?[ \\t]*(?:#.*)?");
  private static final Pattern TOML =
      Pattern.compile("(?:lang|language)[ \\t]*=[ \\t]*[\"']([\\w-]++)[\"'][ \\t]*(?:#.*)?");
  private static final Pattern ATTRIBUTE = Pattern.compile(":lang:[ \\t]+([\\w-]++)[ \\t]*");

  private StatedLanguage() {}

  /** The attribute of the root of an XML document. */
  static Optional<String> inXml(Text text) {
    return ofTag(Parser.xmlParser().parseInput(head(text), "").firstElementChild());
  }

  /** The attribute of a page. */
  static Optional<String> inHtml(Text text) {
    return ofTag(Parser.htmlParser().parseInput(head(text), "").firstElementChild());
  }

  private static Optional<String> ofTag(Element root) {
    return Optional.ofNullable(root)
        .map(tag -> tag.hasAttr("xml:lang") ? tag.attr("xml:lang") : tag.attr("lang"))
        .map(String::strip)
        .filter(Predicate.not(String::isEmpty));
  }

  private static String head(Text text) {
    return text.string().substring(0, Math.min(text.length(), HEAD));
  }

  /** {@code lang} or {@code language} in front matter, as YAML or TOML have it, on its own line. */
  static Optional<String> inFrontMatter(Text text) {
    int end = Math.min(FrontMatter.of(text).end(), HEAD);
    for (int line = 1; line < text.lines() && text.lineStart(line) < end; line++) {
      String words = line(text, line);
      if (words.startsWith("[")) {
        return Optional.empty();
      }
      for (Pattern pattern : new Pattern[] {YAML, TOML}) {
        Matcher matcher = pattern.matcher(words);
        if (matcher.matches()) {
          return Optional.of(matcher.group(1));
        }
      }
    }
    return Optional.empty();
  }

  /** The attribute {@code lang} in the header, which ends with the first blank line behind it. */
  static Optional<String> inAsciiDoc(Text text) {
    boolean begun = false;
    int first = text.place(FrontMatter.of(text).end()).line();
    for (int line = first; line < text.lines() && text.lineStart(line) < HEAD; line++) {
      String words = line(text, line);
      Matcher matcher = ATTRIBUTE.matcher(words);
      if (matcher.matches()) {
        return Optional.of(matcher.group(1));
      }
      if (begun && words.isEmpty()) {
        return Optional.empty();
      }
      begun |= !words.isEmpty() && !words.startsWith("//");
    }
    return Optional.empty();
  }

  private static String line(Text text, int line) {
    int start = text.lineStart(line);
    String words = text.string().substring(start, text.lineEnd(line)).stripTrailing();
    return start == 0 && words.startsWith("\uFEFF") ? words.substring(1) : words;
  }
}
