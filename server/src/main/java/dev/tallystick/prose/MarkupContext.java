package dev.tallystick.prose;

import org.jsoup.nodes.Element;
import org.jsoup.nodes.TextNode;

/**
 * Where in a marked-up file a text stands.
 *
 * @param block the nearest element around it that no sentence crosses
 * @param kind what blocks in it are
 * @param level their level
 * @param items how many items of lists it is in
 * @param quotations how many quotations it is in
 * @param silent whether it is no prose of the file
 * @param code whether it is marked as code, or is an address that a link shows
 * @param fixed whether it is marked as not to be translated
 */
record MarkupContext(
    Element block,
    Block.Kind kind,
    int level,
    int items,
    int quotations,
    boolean silent,
    boolean code,
    boolean fixed) {

  /** Outside of all elements. */
  static MarkupContext of(Element document) {
    return new MarkupContext(document, Block.Kind.PARAGRAPH, 0, 0, 0, false, false, false);
  }

  /**
   * The same block, in an element of another sort.
   *
   * @param off whether it is marked as not to be translated
   */
  MarkupContext marked(boolean quiet, boolean copied, boolean off) {
    return new MarkupContext(
        block, kind, level, items, quotations, silent || quiet, code || copied, off);
  }

  /**
   * In an element that no sentence crosses.
   *
   * @param own what blocks in it are; {@code null} if that is up to what it is in
   * @param heading the level if it is a heading
   */
  MarkupContext block(Element element, Block.Kind own, int heading) {
    int inItems = items + (own == Block.Kind.ITEM ? 1 : 0);
    int inQuotations = quotations + (own == Block.Kind.QUOTATION ? 1 : 0);
    int depth =
        own == null
            ? level
            : switch (own) {
              case HEADING -> heading;
              case ITEM -> inItems;
              case QUOTATION -> inQuotations;
              default -> 0;
            };
    Block.Kind inside = own == null ? kind : own;
    return new MarkupContext(element, inside, depth, inItems, inQuotations, silent, code, fixed);
  }

  /** Whether the text of an element is the address in one of its attributes. */
  static boolean showsItsAddress(Element element, String attribute) {
    return element.childNodeSize() == 1
        && element.childNode(0) instanceof TextNode text
        && text.getWholeText().strip().equals(element.attr(attribute).strip());
  }
}
