package dev.tallystick.prose;

import java.util.Map;
import java.util.Set;

/** What the elements of HTML and their attributes are to a translator. */
final class HtmlTags {
  /** Elements that no sentence crosses: those that HTML, 15.3, renders as blocks. */
  private static final Set<String> BLOCKS =
      words(
          "address article aside blockquote body caption center dd details dialog dir div dl dt"
              + " fieldset figcaption figure footer form frameset h1 h2 h3 h4 h5 h6 head header"
              + " hgroup hr html legend li listing main menu nav ol optgroup option p plaintext"
              + " pre search section select summary table tbody td textarea tfoot th thead"
              + " title tr ul xmp");

  private static final Set<String> VERBATIM = Set.of("pre", "listing", "xmp", "plaintext");

  /** Elements whose text is no prose of the page. */
  private static final Set<String> SILENT =
      words("iframe math noembed noframes script style svg template textarea");

  /** Elements whose text is copied as it stands, where a block has no other. */
  private static final Set<String> CODE = Set.of("code", "kbd", "samp", "tt", "var");

  private static final Map<String, Block.Kind> KINDS =
      Map.of(
          "li", Block.Kind.ITEM,
          "dt", Block.Kind.ITEM,
          "dd", Block.Kind.ITEM,
          "td", Block.Kind.CELL,
          "th", Block.Kind.CELL,
          "caption", Block.Kind.CELL,
          "blockquote", Block.Kind.QUOTATION);

  /** HTML, 3.2.6.3, and ARIA: attributes with text for the reader, on any element. */
  private static final Set<String> ATTRIBUTES =
      Set.of("title", "aria-label", "aria-description", "placeholder");

  private static final Set<String> LABELLED = Set.of("optgroup", "option", "track");
  private static final Set<String> BUTTONS = Set.of("button", "submit", "reset");
  private static final Set<String> META = Set.of("description", "keywords");

  private HtmlTags() {}

  private static Set<String> words(String names) {
    return Set.of(names.split(" "));
  }

  static boolean isBlock(String tag) {
    return BLOCKS.contains(tag);
  }

  static boolean isVerbatim(String tag) {
    return VERBATIM.contains(tag);
  }

  static boolean isSilent(String tag) {
    return SILENT.contains(tag);
  }

  static boolean isCode(String tag) {
    return CODE.contains(tag);
  }

  /** What an element within running text marks; {@code null} if nothing of interest. */
  static Inline.Kind inline(String tag) {
    return switch (tag) {
      case "em", "i", "cite", "dfn" -> Inline.Kind.EMPHASIS;
      case "strong", "b" -> Inline.Kind.STRONG;
      case "a" -> Inline.Kind.LINK;
      case "img" -> Inline.Kind.IMAGE;
      default -> isCode(tag) ? Inline.Kind.CODE : null;
    };
  }

  /** The kind of the blocks in an element; {@code null} if that is up to what it is in. */
  static Block.Kind kind(String tag) {
    return isHeading(tag) ? Block.Kind.HEADING : KINDS.get(tag);
  }

  static boolean isHeading(String tag) {
    return tag.length() == 2
        && tag.charAt(0) == 'h'
        && tag.charAt(1) >= '1'
        && tag.charAt(1) <= '6';
  }

  /**
   * Whether an attribute's value is prose.
   *
   * @param type value of the element's attribute {@code type}, in lower case
   * @param name value of its attribute {@code name}, in lower case
   */
  static boolean isProse(String tag, String attribute, String type, String name) {
    return ATTRIBUTES.contains(attribute)
        || switch (attribute) {
          case "alt" -> tag.equals("area") || tag.equals("input");
          case "label" -> LABELLED.contains(tag);
          case "value" -> tag.equals("input") && BUTTONS.contains(type);
          case "content" -> tag.equals("meta") && META.contains(name);
          default -> false;
        };
  }
}
