package dev.tallystick.prose;

import java.util.Locale;
import org.jsoup.nodes.Element;

/** Where the elements of HTML are in a page. */
final class HtmlNesting {
  private HtmlNesting() {}

  /** Inside an element that stands in a place. */
  static MarkupContext in(MarkupContext around, Element element) {
    String tag = element.normalName();
    MarkupContext inside =
        around.marked(
            HtmlTags.isSilent(tag),
            HtmlTags.isCode(tag)
                || tag.equals("a") && MarkupContext.showsItsAddress(element, "href"),
            isFixed(around, element));
    if (around.kind() == Block.Kind.VERBATIM || !HtmlTags.isBlock(tag)) {
      return inside;
    }
    Block.Kind own = HtmlTags.isVerbatim(tag) ? Block.Kind.VERBATIM : HtmlTags.kind(tag);
    return inside.block(element, own, own == Block.Kind.HEADING ? tag.charAt(1) - '0' : 0);
  }

  /** HTML, 3.2.6.3, the attribute translate. */
  private static boolean isFixed(MarkupContext around, Element element) {
    return switch (element.attr("translate").toLowerCase(Locale.ROOT)) {
      case "no" -> true;
      case "yes" -> false;
      case "" -> !element.hasAttr("translate") && around.fixed();
      default -> around.fixed();
    };
  }
}
