package dev.tallystick.prose;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import org.jsoup.nodes.Attribute;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.Element;
import org.jsoup.nodes.Node;

/**
 * What a document says of itself by the W3C's Internationalization Tag Set 2.0: which parts are not
 * to be translated (8.1), and which elements are parts of sentences (8.7). Rules count that stand
 * in the document itself; nothing outside is read.
 */
final class Its {
  static final String NAMESPACE = "http://www.w3.org/2005/11/its";

  /** So many paths of selectors count, and no more. */
  private static final int MOST_PATHS = 100;

  /** Below this depth rules select nothing, as no document of people goes so deep. */
  private static final int DEEPEST = 1_000;

  private final List<Rule> rules = new ArrayList<>();
  private int tried;
  private boolean tellsWithin;

  private Its() {}

  /** What an element is in the text around it: 8.7, Elements Within Text. */
  enum Within {
    YES,
    NO,
    NESTED
  }

  /**
   * A path of a global rule.
   *
   * @param translate whether what it selects is to be translated; {@code null} if it does not say
   * @param within what the elements are; {@code null} if it does not say
   */
  private record Rule(ItsPath path, Boolean translate, Within within) {}

  /**
   * What is known in an element.
   *
   * @param reached how far the path of each rule has come
   * @param depth how many elements it is in
   * @param translate whether it is said of the element that it is to be translated; {@code null} if
   *     nothing is said
   * @param within likewise
   */
  record Said(List<ItsPath.Reached> reached, int depth, Boolean translate, Within within) {}

  /** The rules of a document. */
  static Its of(Document document, String file) {
    Its its = new Its();
    if (file.contains(NAMESPACE)) {
      document.traverse((node, depth) -> its.read(node));
    }
    return its;
  }

  private void read(Node node) {
    if (node instanceof Element element
        && XmlNames.isIn(element, NAMESPACE)
        && element.parent() != null
        && element.parent().tag().localName().equals("rules")
        && !element.parent().attr("queryLanguage").equals("css")) {
      switch (element.tag().localName()) {
        case "translateRule" -> add(element, translate(element.attr("translate")), null);
        case "withinTextRule" -> add(element, null, within(element.attr("withinText")));
        default -> {}
      }
    }
  }

  private void add(Element rule, Boolean translate, Within within) {
    tried++;
    if (tried > MOST_PATHS || translate == null && within == null) {
      return;
    }
    tellsWithin |= within != null;
    ItsPathReader.read(rule.attr("selector"), prefix -> bound(rule, prefix)).stream()
        .limit(MOST_PATHS - rules.size())
        .forEach(path -> rules.add(new Rule(path, translate, within)));
  }

  private static String bound(Element rule, String prefix) {
    for (Element at = rule; at != null; at = at.parent()) {
      if (at.hasAttr("xmlns:" + prefix)) {
        return at.attr("xmlns:" + prefix);
      }
    }
    return prefix.equals("xml") ? org.jsoup.parser.Parser.NamespaceXml : null;
  }

  private static Boolean translate(String value) {
    return switch (value.strip()) {
      case "yes" -> Boolean.TRUE;
      case "no" -> Boolean.FALSE;
      default -> null;
    };
  }

  private static Within within(String value) {
    return Arrays.stream(Within.values())
        .filter(within -> within.name().toLowerCase(java.util.Locale.ROOT).equals(value.strip()))
        .findFirst()
        .orElse(null);
  }

  /** Whether rules tell which elements are parts of sentences, so that all others are none. */
  boolean tellsWithin() {
    return tellsWithin;
  }

  /** What is known outside of all elements. */
  Said start() {
    return new Said(rules.stream().map(rule -> ItsPath.Reached.START).toList(), 0, null, null);
  }

  /**
   * What is known in an element: what stands in its tag beats the rules, of which the last counts.
   */
  Said in(Said around, Element element) {
    List<ItsPath.Reached> reached = reached(around, element);
    Boolean translate = null;
    Within within = null;
    for (int i = 0; i < reached.size(); i++) {
      Rule rule = rules.get(i);
      if (rule.path().selects(reached.get(i))) {
        translate = rule.translate() == null ? translate : rule.translate();
        within = rule.within() == null ? within : rule.within();
      }
    }
    Boolean ownTranslate = own(element, "translate", Its::translate);
    Within ownWithin = own(element, "withinText", Its::within);
    return new Said(
        reached,
        around.depth() + 1,
        ownTranslate == null ? translate : ownTranslate,
        ownWithin == null ? within : ownWithin);
  }

  private List<ItsPath.Reached> reached(Said around, Element element) {
    if (rules.isEmpty() || around.depth() >= DEEPEST) {
      return List.of();
    }
    List<ItsPath.Reached> reached = new ArrayList<>(rules.size());
    for (int i = 0; i < rules.size(); i++) {
      reached.add(rules.get(i).path().in(around.reached().get(i), element));
    }
    return reached;
  }

  /** What the tag itself says: with the prefix of the namespace, on its own elements without. */
  private static <T> T own(Element element, String name, Function<String, T> reader) {
    if (XmlNames.isIn(element, NAMESPACE)) {
      return reader.apply(element.attr(name));
    }
    for (Attribute attribute : element.attributes()) {
      if (attribute.localName().equals(name) && attribute.namespace().equals(NAMESPACE)) {
        return reader.apply(attribute.getValue());
      }
    }
    return null;
  }

  /** Whether rules make the value of an attribute a text to be translated. */
  boolean isProse(Said said, Attribute attribute) {
    boolean prose = false;
    for (int i = 0; i < said.reached().size(); i++) {
      Rule rule = rules.get(i);
      if (rule.translate() != null && rule.path().selects(said.reached().get(i), attribute)) {
        prose = rule.translate();
      }
    }
    return prose;
  }
}
