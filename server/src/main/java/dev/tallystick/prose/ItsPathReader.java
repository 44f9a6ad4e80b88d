package dev.tallystick.prose;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.function.Predicate;
import java.util.function.UnaryOperator;
import org.jsoup.nodes.Attribute;
import org.jsoup.nodes.Element;

/**
 * Reads the part of XPath 1.0 that rules are written in: absolute paths of names and {@code *},
 * with conditions on attributes and names, parted by bars. Anything else is no path.
 */
final class ItsPathReader {
  private static final int LONGEST = 1_000;

  private final String text;
  private final UnaryOperator<String> namespaces;
  private int at;

  private ItsPathReader(String text, UnaryOperator<String> namespaces) {
    this.text = text;
    this.namespaces = namespaces;
  }

  /** Says that a text is no path that is known here. */
  private static final class Unknown extends Exception {
    private static final long serialVersionUID = 1L;

    Unknown() {
      super(null, null, false, false);
    }
  }

  /**
   * The paths of a selector; none if it is beyond what is known.
   *
   * @param namespaces gives the namespace of a prefix, {@code null} if it has none
   */
  static List<ItsPath> read(String selector, UnaryOperator<String> namespaces) {
    if (selector.length() > LONGEST) {
      return List.of();
    }
    List<ItsPath> paths = new ArrayList<>();
    ItsPathReader reader = new ItsPathReader(selector, namespaces);
    try {
      do {
        paths.add(reader.path());
      } while (reader.takes("|"));
      return reader.at == selector.length() ? paths : List.of();
    } catch (Unknown e) {
      return List.of();
    }
  }

  private ItsPath path() throws Unknown {
    List<ItsPath.Step> steps = new ArrayList<>();
    Predicate<Attribute> attributes = null;
    boolean anywhere = false;
    while (attributes == null && takes("/")) {
      anywhere = takes("/");
      if (takes("@") || takes("attribute::")) {
        attributes = attribute();
      } else {
        boolean below = takes("descendant::");
        boolean named = below || takes("child::");
        steps.add(step(anywhere || below, named));
        anywhere = false;
      }
    }
    if (steps.size() > ItsPath.MOST_STEPS || steps.isEmpty() && attributes == null) {
      throw new Unknown();
    }
    return new ItsPath(List.copyOf(steps), attributes, anywhere);
  }

  private ItsPath.Step step(boolean anywhere, boolean named) throws Unknown {
    Predicate<Element> test = element(named);
    while (takes("[")) {
      test = test.and(condition(0));
      need("]");
    }
    return new ItsPath.Step(anywhere, test);
  }

  private Predicate<Element> element(boolean named) throws Unknown {
    if (takes("*")) {
      return element -> true;
    }
    String name = name();
    if (!named && text.startsWith("::", at)) {
      throw new Unknown();
    }
    int colon = name.indexOf(':');
    if (colon < 0) {
      return element -> XmlNames.isInNone(element) && element.tag().localName().equals(name);
    }
    String namespace = namespace(name.substring(0, colon));
    String local = name.substring(colon + 1);
    return element ->
        XmlNames.isIn(element, namespace)
            && (local.isEmpty() || element.tag().localName().equals(local));
  }

  private Predicate<Attribute> attribute() throws Unknown {
    if (takes("*")) {
      return attribute -> !attribute.getKey().startsWith("xmlns");
    }
    String name = name();
    int colon = name.indexOf(':');
    String namespace = colon < 0 ? "" : namespace(name.substring(0, colon));
    String local = name.substring(colon + 1);
    return attribute ->
        attribute.namespace().equals(namespace)
            && (local.isEmpty() || attribute.localName().equals(local));
  }

  private String namespace(String prefix) throws Unknown {
    String namespace = namespaces.apply(prefix);
    if (namespace == null) {
      throw new Unknown();
    }
    return namespace;
  }

  /** {@code a or b}, where {@code and} binds closer. */
  private Predicate<Element> condition(int depth) throws Unknown {
    Predicate<Element> any = all(depth);
    while (takesWord("or")) {
      any = any.or(all(depth));
    }
    return any;
  }

  private Predicate<Element> all(int depth) throws Unknown {
    Predicate<Element> all = single(depth);
    while (takesWord("and")) {
      all = all.and(single(depth));
    }
    return all;
  }

  private Predicate<Element> single(int depth) throws Unknown {
    if (depth > ItsPath.MOST_STEPS) {
      throw new Unknown();
    }
    boolean not = takesWord("not");
    if (not || takes("(")) {
      if (not) {
        need("(");
      }
      Predicate<Element> inside = condition(depth + 1);
      need(")");
      return not ? inside.negate() : inside;
    }
    if (takes("self::")) {
      return element(true);
    }
    if (takes("local-name()")) {
      return compared(element -> element.tag().localName());
    }
    if (takes("name()")) {
      return compared(Element::tagName);
    }
    need("@");
    Predicate<Attribute> wanted = attribute();
    return compared(element -> value(element, wanted));
  }

  private static String value(Element element, Predicate<Attribute> wanted) {
    return element.attributes().asList().stream()
        .filter(wanted)
        .map(Attribute::getValue)
        .findFirst()
        .orElse(null);
  }

  /** A value and what it must or must not be; that it is there, if nothing follows. */
  private Predicate<Element> compared(java.util.function.Function<Element, String> value)
      throws Unknown {
    boolean unequal = takes("!=");
    if (!unequal && !takes("=")) {
      return element -> value.apply(element) != null;
    }
    String literal = literal();
    return unequal
        ? element -> !Objects.requireNonNullElse(value.apply(element), literal).equals(literal)
        : element -> literal.equals(value.apply(element));
  }

  private String literal() throws Unknown {
    skip();
    char quote = at < text.length() ? text.charAt(at) : ' ';
    int end = quote == '"' || quote == '\'' ? text.indexOf(quote, at + 1) : -1;
    if (end < 0) {
      throw new Unknown();
    }
    String literal = text.substring(at + 1, end);
    at = end + 1;
    return literal;
  }

  /** A name, with its prefix if it has one; with a prefix only before {@code *}. */
  private String name() throws Unknown {
    skip();
    int start = at;
    while (at < text.length() && isOfName(at)) {
      at++;
    }
    if (at == start) {
      throw new Unknown();
    }
    String name = text.substring(start, at);
    if (name.endsWith(":")) {
      need("*");
    }
    return name;
  }

  private boolean isOfName(int index) {
    char c = text.charAt(index);
    boolean prefix = c == ':' && !text.startsWith("::", index) && text.charAt(index - 1) != ':';
    return Character.isLetterOrDigit(c) || c == '-' || c == '_' || c == '.' || prefix;
  }

  private void need(String token) throws Unknown {
    if (!takes(token)) {
      throw new Unknown();
    }
  }

  private boolean takes(String token) {
    skip();
    boolean there = text.startsWith(token, at);
    at += there ? token.length() : 0;
    skip();
    return there;
  }

  /** A word that no name goes on behind. */
  private boolean takesWord(String word) {
    skip();
    int end = at + word.length();
    boolean there =
        text.startsWith(word, at)
            && (end == text.length() || " \t\n\r(@".indexOf(text.charAt(end)) >= 0);
    at += there ? word.length() : 0;
    return there;
  }

  private void skip() {
    while (at < text.length() && Characters.isSpace(text.charAt(at))) {
      at++;
    }
  }
}
