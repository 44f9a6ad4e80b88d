package dev.tallystick.prose;

import org.jsoup.nodes.Element;
import org.jsoup.parser.Parser;

/** The names of XML, as the parser has them. */
final class XmlNames {
  private XmlNames() {}

  static boolean isIn(Element element, String namespace) {
    return element.tag().namespace().equals(namespace);
  }

  /** Whether an element is in no namespace. */
  static boolean isInNone(Element element) {
    String namespace = element.tag().namespace();
    return namespace.isEmpty() || namespace.equals(Parser.NamespaceXml);
  }
}
