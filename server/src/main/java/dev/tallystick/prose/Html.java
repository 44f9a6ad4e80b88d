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
import java.util.Locale;
import java.util.Set;
import org.jsoup.nodes.Attribute;
import org.jsoup.nodes.CDataNode;
import org.jsoup.nodes.Document;
import org.jsoup.nodes.Element;
import org.jsoup.nodes.Node;
import org.jsoup.nodes.Range;
import org.jsoup.nodes.TextNode;
import org.jsoup.parser.Parser;
import org.jsoup.select.NodeVisitor;

/**
 * HTML, read as browsers read it. The tree says what a text is in, its place in the file says where
 * it stands: a browser moves misplaced text about, a translator has it where it was written.
 */
final class Html implements NodeVisitor {
  private final MarkupEvents events = new MarkupEvents();
  private final List<Inline> inlines = new ArrayList<>();
  private final Set<Element> parents = Collections.newSetFromMap(new IdentityHashMap<>());
  private final Deque<MarkupContext> contexts = new ArrayDeque<>();

  private Html(Document document) {
    contexts.push(MarkupContext.of(document));
  }

  static List<Block> blocks(Text text) {
    Document document = Parser.htmlParser().setTrackPosition(true).parseInput(text.string(), "");
    Html html = new Html(document);
    document.traverse(html);
    html.events.sort();
    List<Block> blocks =
        html.events.blocks(() -> new MarkupFlow(text.string(), html.parents, null));
    return Inline.spread(blocks, html.inlines);
  }

  @Override
  public void head(Node node, int depth) {
    if (node instanceof Element element) {
      enter(element);
    } else if (node instanceof TextNode && !(node instanceof CDataNode)) {
      if (!contexts.element().silent()) {
        Span span = span(node.sourceRange());
        events.add(What.TEXT, span.start(), span, contexts.element());
      }
    }
  }

  @Override
  public void tail(Node node, int depth) {
    if (node instanceof Element) {
      contexts.pop();
    }
  }

  private void enter(Element element) {
    MarkupContext around = contexts.element();
    MarkupContext inside = HtmlNesting.in(around, element);
    contexts.push(inside);
    Span tag = span(element.sourceRange());
    if (around.silent()) {
      return;
    }
    if (inside.block() == element) {
      parents.add(around.block());
      events.add(What.BORDER, tag.start(), inside);
    } else if (element.normalName().equals("br")) {
      events.add(What.LINE_END, tag.start(), inside);
    } else if (!tag.isEmpty()) {
      addInline(element, tag, inside.fixed() && !around.fixed());
    }
    if (!inside.fixed() && !tag.isEmpty()) {
      element.attributes().forEach(attribute -> read(attribute, element, tag, inside));
    }
  }

  /**
   * Takes in an element within running text.
   *
   * @param fixed whether it is the first around its text that is not to be translated
   */
  private void addInline(Element element, Span tag, boolean fixed) {
    Inline.Kind kind = fixed ? Inline.Kind.CODE : HtmlTags.inline(element.normalName());
    if (kind != null) {
      int end = Math.max(tag.end(), span(element.endSourceRange()).end());
      inlines.add(new Inline(kind, new Span(tag.start(), end)));
    }
  }

  private void read(Attribute attribute, Element element, Span tag, MarkupContext context) {
    String name = attribute.getKey().toLowerCase(Locale.ROOT);
    boolean image = name.equals("alt") && element.normalName().equals("img");
    if (image || isProse(element, name)) {
      Span value = span(element.attributes().sourceRange(attribute.getKey()).valueRange());
      int mark = image ? tag.start() : value.start();
      if (!value.isEmpty()) {
        events.add(image ? What.IMAGE : What.ATTRIBUTE, mark, value, context);
      }
    }
  }

  private static boolean isProse(Element element, String attribute) {
    String type = element.attr("type").toLowerCase(Locale.ROOT);
    String name = element.attr("name").toLowerCase(Locale.ROOT);
    return HtmlTags.isProse(element.normalName(), attribute, type, name);
  }

  /** The place of something in the file; empty if it is not in it. */
  static Span span(Range range) {
    return range.isTracked() ? new Span(range.startPos(), range.endPos()) : new Span(0, 0);
  }
}
