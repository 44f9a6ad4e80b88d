package dev.tallystick.prose;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.DocumentType;
import org.jsoup.nodes.Element;
import org.jsoup.nodes.Node;

/** The vocabularies of XML whose elements we know, and all others. */
enum XmlVocabulary {
  /** DocBook 4 and 5. */
  DOCBOOK(DocBook.ROLES, DocBook.ATTRIBUTES),
  /** DITA topics and maps. */
  DITA(Dita.ROLES, Dita.ATTRIBUTES),
  /** HTML in the syntax of XML. */
  XHTML(Map.of(), Set.of()),
  /** Anything else. */
  UNKNOWN(Map.of(), Set.of());

  private static final String IN_DOCBOOK = "http://docbook.org/ns/docbook";
  private static final String IN_XHTML = "http://www.w3.org/1999/xhtml";

  private final Map<String, XmlRole> roles;
  private final Set<String> attributes;

  XmlVocabulary(Map<String, XmlRole> roles, Set<String> attributes) {
    this.roles = roles;
    this.attributes = attributes;
  }

  /** That of a document: told by the namespace of its root, its document type, its root's name. */
  static XmlVocabulary of(Document document) {
    Element root = document.firstElementChild();
    if (root == null) {
      return UNKNOWN;
    }
    String type = publicId(document);
    String name = root.tag().localName();
    if (XmlNames.isIn(root, IN_DOCBOOK) || type.contains("DocBook")) {
      return DOCBOOK;
    }
    if (type.contains("DITA") || isDita(root)) {
      return DITA;
    }
    if (XmlNames.isIn(root, IN_XHTML) || type.contains("XHTML")) {
      return XHTML;
    }
    if (!XmlNames.isInNone(root) || !type.isEmpty()) {
      return UNKNOWN;
    }
    return ofRoot(root, name);
  }

  private static XmlVocabulary ofRoot(Element root, String name) {
    boolean both =
        name.equals("reference") && root.children().stream().anyMatch(XmlVocabulary::isRefEntry);
    if (Dita.ROOTS.contains(name) && !both) {
      return DITA;
    }
    if (DocBook.ROOTS.contains(name)) {
      return DOCBOOK;
    }
    return name.equals("html") ? XHTML : UNKNOWN;
  }

  private static boolean isRefEntry(Element element) {
    return element.tag().localName().equals("refentry");
  }

  /** Whether a root has what the document types of DITA give it. */
  private static boolean isDita(Element root) {
    return root.attributes().asList().stream()
            .anyMatch(attribute -> attribute.localName().equals("DITAArchVersion"))
        || root.attr("class").matches("[-+] [a-z]+/\\S.*");
  }

  private static String publicId(Document document) {
    for (Node node : document.childNodes()) {
      if (node instanceof DocumentType type) {
        return type.publicId();
      }
    }
    return "";
  }

  /** What an element is. */
  XmlRole role(Element element) {
    XmlRole role = roles.get(element.tag().localName());
    if (role == null && this == DITA) {
      role = general(element.attr("class"));
    }
    return role == null ? XmlRole.OTHER : role;
  }

  /** The role of the nearest known element that one is a specialization of: DITA 1.3, 2.5.3. */
  private XmlRole general(String ancestry) {
    List<String> names = Arrays.asList(ancestry.split("\\s+"));
    Collections.reverse(names);
    for (String name : names) {
      XmlRole role = roles.get(name.substring(name.indexOf('/') + 1));
      if (role != null) {
        return role;
      }
    }
    return null;
  }

  /** Whether an attribute has text for the reader. */
  boolean isProse(String attribute) {
    return attributes.contains(attribute);
  }

  /** Whether the attribute {@code translate} says what is to be translated. */
  boolean hasTranslate() {
    return this == DITA || this == DOCBOOK;
  }
}
