package dev.tallystick.prose;

import dev.tallystick.prose.MarkupEvents.What;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Deque;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Set;
import org.jsoup.nodes.Attribute;
import org.jsoup.nodes.CDataNode;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.Element;
import org.jsoup.nodes.Node;
import org.jsoup.nodes.TextNode;
import org.jsoup.parser.Parser;
import org.jsoup.select.NodeVisitor;

/**
 * XML: DocBook, DITA, and others by what ITS says, else by where text stands in them. The parser
 * expands no entities and reads no other file, and takes what is not well-formed as it comes.
 */
final class Xml implements NodeVisitor {
  private static final String CDATA = "<![CDATA[";
  private static final String CDATA_END = "]]>";

  private final String file;
  private final XmlVocabulary vocabulary;
  private final Its its;
  private final XmlNesting nesting;
  private final MarkupEvents events = new MarkupEvents();
  private final List<Inline> inlines = new ArrayList<>();
  private final Set<Element> parents = Collections.newSetFromMap(new IdentityHashMap<>());
  private final Deque<XmlPlace> places = new ArrayDeque<>();

  private Xml(String file, XmlVocabulary vocabulary, Document document) {
    this.file = file;
    this.vocabulary = vocabulary;
    this.its = Its.of(document, file);
    this.nesting = new XmlNesting(vocabulary, its);
    places.push(nesting.start(document));
  }

  static List<Block> blocks(Text text) {
    String file = text.string();
    Document document = Parser.xmlParser().setTrackPosition(true).parseInput(file, "");
    XmlVocabulary vocabulary = XmlVocabulary.of(document);
    if (vocabulary == XmlVocabulary.XHTML) {
      return Html.blocks(text);
    }
    Xml xml = new Xml(file, vocabulary, document);
    document.traverse(xml);
    Set<String> entities = XmlEntities.of(document, file);
    List<Block> blocks = xml.events.blocks(() -> new MarkupFlow(file, xml.parents, entities));
    return Inline.spread(blocks, xml.inlines);
  }

  @Override
  public void head(Node node, int depth) {
    if (node instanceof Element element) {
      enter(element);
    } else if (node instanceof TextNode text && !places.element().context().silent()) {
      read(text);
    }
  }

  private void read(TextNode text) {
    Span span = Html.span(text.sourceRange());
    MarkupContext context = places.element().context();
    if (text instanceof CDataNode) {
      int start = Math.min(span.start() + CDATA.length(), span.end());
      boolean closed = span.of(file).endsWith(CDATA_END) && span.end() - start >= 3;
      Span data = new Span(start, closed ? span.end() - CDATA_END.length() : span.end());
      events.add(What.LITERAL, data.start(), data, context);
    } else {
      events.add(What.TEXT, span.start(), span, context);
    }
  }

  @Override
  public void tail(Node node, int depth) {
    if (node instanceof Element element) {
      XmlPlace inside = places.pop();
      MarkupContext around = places.isEmpty() ? inside.context() : places.element().context();
      if (around.silent() || inside.context().silent()) {
        return;
      }
      int end = element.endSourceRange().startPos();
      switch (inside.edge()) {
        case ASIDE -> events.add(What.ASIDE_END, end, around);
        case SPACED -> events.add(What.BLANK, end, around);
        default -> {}
      }
    }
  }

  private void enter(Element element) {
    XmlPlace around = places.element();
    if (element instanceof Document) {
      places.push(around);
      return;
    }
    XmlPlace inside = nesting.in(around, element);
    places.push(inside);
    if (inside.context().silent()) {
      return;
    }
    Span tag = Html.span(element.sourceRange());
    switch (inside.edge()) {
      case BORDER -> {
        parents.add(around.context().block());
        events.add(What.BORDER, tag.start(), inside.context());
      }
      case ASIDE -> events.add(What.ASIDE, tag.start(), around.context());
      case SPACED, PARTED -> events.add(What.BLANK, tag.start(), around.context());
      case INLINE -> {
        MarkupContext context = inside.context();
        boolean copied = context.code() && !around.context().code();
        boolean fixed = context.fixed() && !around.context().fixed();
        if ((copied || fixed) && !tag.isEmpty()) {
          int end = Math.max(tag.end(), Html.span(element.endSourceRange()).end());
          inlines.add(new Inline(Inline.Kind.CODE, new Span(tag.start(), end)));
        }
      }
    }
    if (!inside.context().fixed() && !tag.isEmpty()) {
      element.attributes().forEach(attribute -> read(attribute, element, inside));
    }
  }

  private void read(Attribute attribute, Element element, XmlPlace place) {
    if (vocabulary.isProse(attribute.getKey()) || its.isProse(place.said(), attribute)) {
      Span value = Html.span(element.attributes().sourceRange(attribute.getKey()).valueRange());
      if (!value.isEmpty()) {
        events.add(What.ATTRIBUTE, value.start(), value, place.context());
      }
    }
  }
}
