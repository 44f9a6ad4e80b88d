package dev.tallystick.prose;

import dev.tallystick.prose.XmlPlace.Edge;
import org.jsoup.nodes.Element;
import org.jsoup.nodes.Node;
import org.jsoup.nodes.TextNode;

/** Where the elements of an XML document are in it, by its vocabulary and by what ITS says. */
final class XmlNesting {
  private static final int DEEPEST_HEADING = 6;

  private final XmlVocabulary vocabulary;
  private final Its its;

  XmlNesting(XmlVocabulary vocabulary, Its its) {
    this.vocabulary = vocabulary;
    this.its = its;
  }

  /** Outside of all elements; what begins with words is a piece of a document, or of a sentence. */
  XmlPlace start(Element document) {
    MarkupContext context = MarkupContext.of(document);
    boolean words =
        document.childNodeSize() > 0
            && document.childNode(0) instanceof TextNode text
            && text.getWholeText().chars().anyMatch(Character::isLetterOrDigit);
    return new XmlPlace(context, Edge.BORDER, words, 0, false, its.start());
  }

  /** Inside an element that stands in a place. */
  XmlPlace in(XmlPlace around, Element element) {
    boolean ofIts = XmlNames.isIn(element, Its.NAMESPACE);
    boolean span = ofIts && element.tag().localName().equals("span");
    XmlRole role = ofIts && !span ? XmlRole.SILENT : vocabulary.role(element);
    Its.Said said = its.in(around.said(), element);
    Edge edge = span ? Edge.INLINE : edge(around, role, said, element);
    MarkupContext context =
        around
            .context()
            .marked(
                role == XmlRole.SILENT,
                role == XmlRole.CODE || showsItsAddress(element),
                isFixed(around, element, said));
    int sections = around.sections() + (role == XmlRole.SECTION ? 1 : 0);
    if (isBlock(edge)) {
      context = block(context, around, role, element);
    }
    boolean flows = !isBlock(edge) || flows(role, said, element);
    return new XmlPlace(context, edge, flows, sections, titled(around, role, element), said);
  }

  private Edge edge(XmlPlace around, XmlRole role, Its.Said said, Element element) {
    boolean whole = around.context().kind() == Block.Kind.VERBATIM;
    if (whole || role == XmlRole.SILENT) {
      return Edge.INLINE;
    }
    Its.Within within = said.within();
    if (within == null && role == XmlRole.OTHER && its.tellsWithin()) {
      within = vocabulary == XmlVocabulary.UNKNOWN ? Its.Within.NO : null;
    }
    if (within != null) {
      return switch (within) {
        case YES -> Edge.INLINE;
        case NO -> Edge.BORDER;
        case NESTED -> Edge.ASIDE;
      };
    }
    return switch (role) {
      case CODE, CHAIN, OTHER ->
          !around.flows() ? Edge.BORDER : isLink(element) ? Edge.PARTED : Edge.INLINE;
      case SPACED -> around.flows() ? Edge.SPACED : Edge.BORDER;
      case ASIDE -> around.flows() ? Edge.ASIDE : Edge.BORDER;
      default -> Edge.BORDER;
    };
  }

  private static boolean isBlock(Edge edge) {
    return edge == Edge.BORDER || edge == Edge.ASIDE;
  }

  /** Whether an element is a part of a chain, but the first. */
  private boolean isLink(Element element) {
    Element parent = element.parent();
    return parent != null
        && vocabulary.role(parent) == XmlRole.CHAIN
        && parent.firstElementChild() != element;
  }

  private static MarkupContext block(
      MarkupContext context, XmlPlace around, XmlRole role, Element element) {
    boolean heading = role == XmlRole.HEADING || role == XmlRole.TITLE && around.titled();
    int level = around.sections() + (role == XmlRole.HEADING ? 1 : 0);
    Block.Kind kind = heading ? Block.Kind.HEADING : role.kind();
    return context.block(element, kind, Math.max(1, Math.min(level, DEEPEST_HEADING)));
  }

  private boolean flows(XmlRole role, Its.Said said, Element element) {
    return role.flows() || said.within() != null || hasText(element);
  }

  /** Whether an element has text of its own, so that elements in it are parts of sentences. */
  private static boolean hasText(Element element) {
    for (Node node : element.childNodes()) {
      if (node instanceof TextNode text && !text.isBlank()) {
        return true;
      }
    }
    return false;
  }

  private static boolean titled(XmlPlace around, XmlRole role, Element element) {
    boolean data = role == XmlRole.CONTAINER && element.tag().localName().endsWith("info");
    return role == XmlRole.SECTION || data && around.titled();
  }

  private boolean isFixed(XmlPlace around, Element element, Its.Said said) {
    if (said.translate() != null) {
      return !said.translate();
    }
    return switch (vocabulary.hasTranslate() ? element.attr("translate") : "") {
      case "no" -> true;
      case "yes" -> false;
      default -> around.context().fixed();
    };
  }

  private static boolean showsItsAddress(Element element) {
    return switch (element.tag().localName()) {
      case "ulink" -> MarkupContext.showsItsAddress(element, "url");
      case "link" -> MarkupContext.showsItsAddress(element, "xlink:href");
      case "xref" -> MarkupContext.showsItsAddress(element, "href");
      default -> false;
    };
  }
}
