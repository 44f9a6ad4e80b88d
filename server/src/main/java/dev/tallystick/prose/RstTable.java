package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * A table of reStructuredText.
 *
 * @param cells those with text, in any order
 * @param behind index of the line behind it
 */
record RstTable(List<Cell> cells, int behind) {
  /** The lines of a cell, gathered from top to bottom. */
  static final class Cell {
    private final List<RstLine> lines = new ArrayList<>();
    private int last;

    /** Adds a part of a line with this index; where lines had none for it, a blank one. */
    void add(RstLine part, int index) {
      if (part.isBlank()) {
        return;
      }
      if (!lines.isEmpty() && index > last + 1) {
        lines.add(new RstLine(part.start(), part.start(), 0));
      }
      lines.add(part);
      last = index;
    }

    private int start() {
      return lines.get(0).start();
    }
  }

  /**
   * Adds the cells in the order in which they begin.
   *
   * @param depth how many bodies the cells are in
   */
  void addTo(RstBlocks blocks, int depth) {
    List<Cell> sorted = new ArrayList<>(cells);
    sorted.removeIf(cell -> cell.lines.isEmpty());
    sorted.sort(Comparator.comparing(Cell::start));
    List<List<Block>> read = new ArrayList<>();
    for (Cell cell : sorted) {
      RstBlocks inside = blocks.apart();
      int column = RstLines.column(cell.lines).orElse(0);
      new RstBody(inside, cell.lines, column, RstPlace.CELL, depth).read();
      if (!inside.all().isEmpty()) {
        read.add(inside.all());
      }
    }
    for (int i = 0; i < read.size(); i++) {
      boolean last = i + 1 == read.size();
      boolean alone = last || end(read.get(i)) <= read.get(i + 1).get(0).extent().start();
      blocks.all().addAll(alone ? read.get(i) : joined(blocks.file(), read.get(i)));
    }
  }

  private static int end(List<Block> blocks) {
    return blocks.stream().mapToInt(block -> block.extent().end()).max().orElse(0);
  }

  /** One block of all paragraphs of a cell, as others begin beside it before it ends. */
  private static List<Block> joined(String file, List<Block> blocks) {
    Pieces pieces = new Pieces(file);
    Span extent = null;
    for (Block block : blocks) {
      if (block.kind() == Block.Kind.VERBATIM) {
        continue;
      }
      if (extent != null) {
        pieces.addLineBreak(pieces.end(), block.pieces().get(0).start());
      }
      block.pieces().forEach(piece -> pieces.add(piece.start(), piece.end()));
      extent = extent == null ? block.extent() : extent.cover(block.extent());
    }
    return extent == null
        ? List.of()
        : List.of(new Block(Block.Kind.CELL, 0, extent, pieces.spans()));
  }
}
