package dev.tallystick.prose;

import java.util.HashMap;
import java.util.Map;

/** What an element of an XML vocabulary is to a translator. */
enum XmlRole {
  /** A part of the document that may have a title. */
  SECTION,
  /** A title: a heading if it is that of a section, else a paragraph. */
  TITLE,
  /** A heading without a section. */
  HEADING,
  /** A paragraph or the like. */
  TEXT,
  /** What is in an item of a list. */
  ITEM,
  /** What is in a cell of a table. */
  CELL,
  /** What is in a quotation. */
  QUOTATION,
  /** What has blocks inside and no text of its own. */
  CONTAINER,
  /** Copied as it stands. */
  VERBATIM,
  /** Copied as it stands, where a block has no other text. */
  CODE,
  /** No prose: comments, index entries, drawings. */
  SILENT,
  /** A note that the sentence around it is read without. */
  ASIDE,
  /** A part of a sentence that has white space around it. */
  SPACED,
  /** A part of a sentence whose own parts are shown with something between them. */
  CHAIN,
  /** Nothing is known of it. */
  OTHER;

  /** Roles by element names. */
  static final class Table {
    private final Map<String, XmlRole> roles = new HashMap<>();

    /**
     * Adds elements.
     *
     * @param names parted by white space
     */
    Table with(XmlRole role, String names) {
      for (String name : names.split("\\s+")) {
        roles.put(name, role);
      }
      return this;
    }

    Map<String, XmlRole> roles() {
      return Map.copyOf(roles);
    }
  }

  /** The kind of the blocks in such an element; {@code null} if that is up to what it is in. */
  Block.Kind kind() {
    return switch (this) {
      case ITEM -> Block.Kind.ITEM;
      case CELL -> Block.Kind.CELL;
      case QUOTATION -> Block.Kind.QUOTATION;
      case VERBATIM -> Block.Kind.VERBATIM;
      case HEADING -> Block.Kind.HEADING;
      case ASIDE -> Block.Kind.PARAGRAPH;
      default -> null;
    };
  }

  /** Whether elements that nothing is known of are parts of sentences there. */
  boolean flows() {
    return switch (this) {
      case SECTION, CONTAINER, OTHER -> false;
      default -> true;
    };
  }
}
