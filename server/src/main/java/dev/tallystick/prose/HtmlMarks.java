package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jsoup.parser.Parser;

/** How whole the tags of a page are. */
final class HtmlMarks {
  private static final int MOST_FAULTS = 10_000;
  private static final Pattern TAG = Pattern.compile("<(/?)([A-Za-z][\\w:-]*)[^<>]*>");

  /** Elements that need no end. */
  private static final Set<String> OPEN =
      Set.of(
          "p", "li", "dt", "dd", "tr", "td", "th", "option", "br", "hr", "img", "input", "meta",
          "link", "wbr", "col", "source");

  private HtmlMarks() {}

  /** By its name, how many more tags open an element than close it; and the parser's faults. */
  static Map<String, Integer> of(Text text) {
    Map<String, Integer> marks = new TreeMap<>();
    Matcher tag = TAG.matcher(text.string());
    while (tag.find()) {
      String name = tag.group(2).toLowerCase(Locale.ROOT);
      if (!OPEN.contains(name) && !tag.group().endsWith("/>")) {
        marks.merge(name, tag.group(1).isEmpty() ? 1 : -1, Integer::sum);
      }
    }
    marks.values().removeIf(count -> count == 0);
    Parser parser = Parser.htmlParser().setTrackErrors(MOST_FAULTS);
    parser.parseInput(text.string(), "");
    marks.put("", parser.getErrors().size());
    return marks;
  }
}
