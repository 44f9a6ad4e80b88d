package dev.tallystick.prose;

/**
 * What a body of reStructuredText stands in.
 *
 * @param kind of its paragraphs
 * @param items how many lists are around it
 * @param quotations how many quotations are around it
 */
record RstPlace(Block.Kind kind, int items, int quotations) {
  static final RstPlace DOCUMENT = new RstPlace(Block.Kind.PARAGRAPH, 0, 0);
  static final RstPlace CELL = new RstPlace(Block.Kind.CELL, 0, 0);

  RstPlace item() {
    return isCell() ? this : new RstPlace(Block.Kind.ITEM, items + 1, quotations);
  }

  RstPlace quotation() {
    return isCell() ? this : new RstPlace(Block.Kind.QUOTATION, items, quotations + 1);
  }

  boolean isCell() {
    return kind == Block.Kind.CELL;
  }

  int level() {
    return switch (kind) {
      case ITEM -> items;
      case QUOTATION -> quotations;
      default -> 0;
    };
  }
}
