package dev.tallystick.prose;

import java.util.Locale;
import org.jsoup.nodes.Element;
import org.jsoup.nodes.TextNode;

/**
 * Where in a page a text stands.
 *
 * @param block the nearest element around it that no sentence crosses
 * @param kind what blocks in it are
 * @param level their level
 * @param items how many items of lists it is in
 * @param quotations how many quotations it is in
 * @param silent whether it is no prose of the page
 * @param code whether it is marked as code, or is an address that a link shows
 * @param fixed whether it is marked as not to be translated
 */
record HtmlContext(
    Element block,
    Block.Kind kind,
    int level,
    int items,
    int quotations,
    boolean silent,
    boolean code,
    boolean fixed) {

  /** Outside of all elements. */
  static HtmlContext of(Element document) {
    return new HtmlContext(document, Block.Kind.PARAGRAPH, 0, 0, 0, false, false, false);
  }

  /** Inside an element that stands here. */
  HtmlContext in(Element element) {
    String tag = element.normalName();
    boolean quiet = silent || HtmlTags.isSilent(tag);
    boolean copied = code || HtmlTags.isCode(tag) || showsItsAddress(element);
    boolean off = isFixed(element);
    if (kind == Block.Kind.VERBATIM || !HtmlTags.isBlock(tag)) {
      return new HtmlContext(block, kind, level, items, quotations, quiet, copied, off);
    }
    Block.Kind own = HtmlTags.isVerbatim(tag) ? Block.Kind.VERBATIM : HtmlTags.kind(tag);
    int inItems = items + (own == Block.Kind.ITEM ? 1 : 0);
    int inQuotations = quotations + (own == Block.Kind.QUOTATION ? 1 : 0);
    int depth =
        own == null
            ? level
            : switch (own) {
              case HEADING -> tag.charAt(1) - '0';
              case ITEM -> inItems;
              case QUOTATION -> inQuotations;
              default -> 0;
            };
    Block.Kind inside = own == null ? kind : own;
    return new HtmlContext(element, inside, depth, inItems, inQuotations, quiet, copied, off);
  }

  /** Whether it is a link whose text is its address. */
  private static boolean showsItsAddress(Element element) {
    return element.normalName().equals("a")
        && element.childNodeSize() == 1
        && element.childNode(0) instanceof TextNode text
        && text.getWholeText().strip().equals(element.attr("href").strip());
  }

  /** HTML, 3.2.6.3, the attribute translate. */
  private boolean isFixed(Element element) {
    return switch (element.attr("translate").toLowerCase(Locale.ROOT)) {
      case "no" -> true;
      case "yes" -> false;
      case "" -> !element.hasAttr("translate") && fixed;
      default -> fixed;
    };
  }
}
