package dev.tallystick.segment;

import dev.tallystick.text.Problem;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.io.StringReader;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import java.util.regex.PatternSyntaxException;
import javax.xml.stream.Location;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

/** Reads an SRX file element by element. Elements that it does not know are passed over. */
final class SrxReader {
  static final String ENDLESS =
      "This rule takes too many steps over some texts. It does not count there. Make its patterns"
          + " simpler: no repetition inside a repetition.";
  private static final int LONGEST = 5_000_000;
  private static final int MOST_PROBLEMS = 100;

  private final Text text;
  private final List<Problem> problems = new ArrayList<>();
  private final Map<String, List<SrxRule>> rules = new HashMap<>();
  private final List<Srx.Mapped> maps = new ArrayList<>();
  private List<SrxRule> current = new ArrayList<>();
  private boolean cascade;
  private int last;

  // The rule at hand.
  private Span span = new Span(0, 0);
  private boolean breaks;
  private Element before;
  private Element after;

  /** The text of an element, and where it stands. */
  private record Element(String value, Span span) {}

  SrxReader(Text text) {
    this.text = text;
  }

  SrxFile read() {
    if (text.length() > LONGEST) {
      problem(firstLine(), "The file is too long to be read: more than five million characters.");
    } else {
      try {
        parse();
      } catch (XMLStreamException e) {
        int at = e.getLocation() == null ? last : offset(e.getLocation());
        int start = text.outsidePair(Math.max(0, Math.min(at, text.length()) - 1));
        problem(
            new Span(start, Math.max(start, Math.min(at, text.length()))),
            "The XML is broken here, or before. What stands behind this place does not count.");
      }
    }
    problems.sort(Comparator.comparing(Problem::span));
    int told = Math.min(problems.size(), MOST_PROBLEMS);
    return new SrxFile(new Srx(cascade, maps), problems.subList(0, told));
  }

  /** No document type is read, so nothing outside is opened and no entity can grow. */
  private static XMLInputFactory factory() {
    XMLInputFactory factory = XMLInputFactory.newDefaultFactory();
    factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
    factory.setProperty(XMLInputFactory.IS_SUPPORTING_EXTERNAL_ENTITIES, false);
    factory.setProperty(XMLInputFactory.IS_COALESCING, true);
    return factory;
  }

  private void parse() throws XMLStreamException {
    String xml = text.string();
    int skipped = xml.startsWith("\uFEFF") ? 1 : 0;
    XMLStreamReader reader =
        factory().createXMLStreamReader(new StringReader(xml.substring(skipped)));
    boolean root = true;
    while (reader.hasNext()) {
      int event = reader.next();
      int end = offset(reader.getLocation());
      if (event == XMLStreamConstants.DTD) {
        problem(new Span(last, end), "A document type is not read. Take it out.");
      } else if (event == XMLStreamConstants.START_ELEMENT) {
        if (root && !reader.getLocalName().equals("srx")) {
          problem(tag(end), "This is no SRX file: it must start with <srx>.");
          return;
        }
        root = false;
        start(reader, tag(end));
      } else if (event == XMLStreamConstants.END_ELEMENT && reader.getLocalName().equals("rule")) {
        endRule();
      }
      last = offset(reader.getLocation());
    }
    if (maps.isEmpty() && problems.isEmpty()) {
      problem(firstLine(), "No <languagemap> says for which languages the rules are.");
    }
  }

  private void start(XMLStreamReader reader, Span tag) throws XMLStreamException {
    switch (reader.getLocalName()) {
      case "header" -> cascade = yes(reader, "cascade", false, tag);
      case "languagerule" -> {
        current = new ArrayList<>();
        String name = reader.getAttributeValue(null, "languagerulename");
        if (rules.putIfAbsent(String.valueOf(name), current) != null) {
          problem(tag, "A <languagerule> of this name stands above. Only that one counts.");
        }
      }
      case "rule" -> {
        span = tag;
        breaks = yes(reader, "break", true, tag);
        before = null;
        after = null;
      }
      case "beforebreak" -> before = element(reader, tag);
      case "afterbreak" -> after = element(reader, tag);
      case "languagemap" -> addMap(reader, tag);
      default -> {}
    }
  }

  /** The text of an element without others in it. */
  private Element element(XMLStreamReader reader, Span tag) throws XMLStreamException {
    String value = reader.getElementText();
    int end = offset(reader.getLocation());
    int close = text.string().lastIndexOf('<', Math.max(0, end - 1));
    return new Element(value, new Span(tag.end(), Math.max(tag.end(), close)));
  }

  private void endRule() {
    boolean right = fits(before) & fits(after);
    if (right) {
      String left = before == null ? "" : before.value();
      String behind = after == null ? "" : after.value();
      SrxRule rule = SrxRule.of(breaks, left, behind, span);
      if (rule.ends()) {
        current.add(rule);
      } else {
        problem(span, ENDLESS.replace(" there", ""));
      }
    }
  }

  private boolean fits(Element pattern) {
    if (pattern == null) {
      return true;
    }
    try {
      SrxRule.of(true, pattern.value(), "", span);
      return true;
    } catch (PatternSyntaxException e) {
      Span shown = pattern.span().isEmpty() ? span : pattern.span();
      problem(
          shown,
          "This is no regular expression (" + e.getDescription() + "). The rule does not count.");
      return false;
    } catch (StackOverflowError e) {
      problem(span, "This pattern is nested too deep. The rule does not count.");
      return false;
    }
  }

  private void addMap(XMLStreamReader reader, Span tag) {
    String name = reader.getAttributeValue(null, "languagerulename");
    String pattern = reader.getAttributeValue(null, "languagepattern");
    if (name == null || pattern == null) {
      problem(tag, "A <languagemap> needs languagepattern and languagerulename.");
    } else if (!rules.containsKey(name)) {
      problem(tag, "No <languagerule> above has the name \"" + name + "\".");
    } else {
      language(pattern, tag)
          .ifPresent(language -> maps.add(new Srx.Mapped(language, rules.get(name))));
    }
  }

  private Optional<Pattern> language(String pattern, Span tag) {
    try {
      return Optional.of(Pattern.compile(pattern, Pattern.CASE_INSENSITIVE));
    } catch (PatternSyntaxException e) {
      problem(tag, "\"" + pattern + "\" is no regular expression (" + e.getDescription() + ").");
    } catch (StackOverflowError e) {
      problem(tag, "This pattern is nested too deep.");
    }
    return Optional.empty();
  }

  private boolean yes(XMLStreamReader reader, String name, boolean usual, Span tag) {
    String value = reader.getAttributeValue(null, name);
    if (value != null && !value.equals("yes") && !value.equals("no")) {
      problem(tag, name + " must be \"yes\" or \"no\".");
    }
    return value == null ? usual : value.equals("yes");
  }

  /** The tag that ends at a place. */
  private Span tag(int end) {
    int start = text.string().lastIndexOf('<', Math.max(0, end - 1));
    return new Span(Math.max(0, start), Math.max(end, Math.max(0, start)));
  }

  /** The parser's own offsets go wrong in long files; its lines and columns do not. */
  private int offset(Location location) {
    int line = Math.max(0, Math.min(location.getLineNumber() - 1, text.lines() - 1));
    int bom = line == 0 && text.string().startsWith("\uFEFF") ? 1 : 0;
    int at = text.lineStart(line) + Math.max(0, location.getColumnNumber() - 1) + bom;
    return Math.min(at, text.length());
  }

  private Span firstLine() {
    return new Span(0, text.lineEnd(0));
  }

  private void problem(Span where, String message) {
    problems.add(new Problem(where, message));
  }
}
