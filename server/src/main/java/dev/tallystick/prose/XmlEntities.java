package dev.tallystick.prose;

import java.util.HashSet;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.DocumentType;
import org.jsoup.nodes.Node;

/** The entities that an XML document declares by itself. None is ever expanded. */
final class XmlEntities {
  /** XML 1.0, 4.2: a name, then a value in quotation marks or where it is found. */
  private static final Pattern DECLARATION =
      Pattern.compile("<!ENTITY\\s+([^\\s%\"'<>]++)\\s+(?:\"([^\"]*+)\"|'([^']*+)'|[SP])");

  private static final Pattern CHARACTER = Pattern.compile("&#?\\w++;|.", Pattern.DOTALL);

  private XmlEntities() {}

  /** The names of those that stand for more than a character. */
  static Set<String> of(Document document, String file) {
    Set<String> names = new HashSet<>();
    for (Node node : document.childNodes()) {
      if (node instanceof DocumentType type) {
        Matcher declared = DECLARATION.matcher(Html.span(type.sourceRange()).of(file));
        while (declared.find()) {
          String value = declared.group(2) == null ? declared.group(3) : declared.group(2);
          if (value == null || !CHARACTER.matcher(value).matches()) {
            names.add(declared.group(1));
          }
        }
      }
    }
    return names;
  }
}
