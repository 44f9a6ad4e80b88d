package dev.tallystick.prose;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;

/** Lines of a plain text between blank lines, about to become blocks. */
final class PlainGroup {
  private static final int LONGEST_CAPITALS = 60;

  private final String file;
  private final List<Line> lines;
  private final Wrapping wrapping;
  private final Deque<Integer> itemIndents = new ArrayDeque<>();

  /**
   * Reads lines as one group.
   *
   * @param lines all with prose and in the same quotation, at least one
   * @param wrapping how these lines were broken
   */
  PlainGroup(String file, List<Line> lines, Wrapping wrapping) {
    this.file = file;
    this.lines = lines;
    this.wrapping = wrapping;
  }

  void addTo(List<Block> blocks) {
    PlainBlock open = start(0);
    for (int i = 1; i < lines.size(); i++) {
      if (isStart(i, open)) {
        blocks.add(open.build());
        open = start(i);
      } else {
        open.append(lines.get(i).start(), lines.get(i).end());
      }
    }
    blocks.add(open.build());
  }

  private PlainBlock start(int i) {
    Line line = lines.get(i);
    PlainBlock block = new PlainBlock(file, kind(i), level(i), line.mark());
    block.append(line.text(), line.end());
    return block;
  }

  private Block.Kind kind(int i) {
    if (lines.get(i).isItem()) {
      return Block.Kind.ITEM;
    }
    if (lines.get(i).quotes() > 0) {
      return Block.Kind.QUOTATION;
    }
    return i == 0 && isCapitalHeading() ? Block.Kind.HEADING : Block.Kind.PARAGRAPH;
  }

  private int level(int i) {
    return switch (kind(i)) {
      case ITEM -> itemLevel(lines.get(i).indent());
      case HEADING -> 1;
      case QUOTATION -> lines.get(i).quotes();
      default -> 0;
    };
  }

  private int itemLevel(int indent) {
    while (!itemIndents.isEmpty() && itemIndents.peek() >= indent) {
      itemIndents.pop();
    }
    itemIndents.push(indent);
    return itemIndents.size();
  }

  private boolean isCapitalHeading() {
    Line line = lines.get(0);
    return line.capitals()
        && line.width() <= LONGEST_CAPITALS
        && file.charAt(line.end() - 1) != '.'
        && (lines.size() == 1 || !lines.get(1).capitals());
  }

  private boolean isStart(int i, PlainBlock open) {
    Line line = lines.get(i);
    if (line.isItem() || open.is(Block.Kind.HEADING)) {
      return true;
    }
    boolean insideItem = open.is(Block.Kind.ITEM) && line.indent() > itemIndents.element();
    return !insideItem && (!wrapping.isWrapped() || isNewParagraph(i));
  }

  /** In wrapped lines: a first-line indent, or a line that stopped long before the margin. */
  private boolean isNewParagraph(int i) {
    Line line = lines.get(i);
    Line before = lines.get(i - 1);
    boolean indented = line.indent() > before.indent();
    return before.stops(file) && (indented || wrapping.isShort(file, before, line));
  }
}
