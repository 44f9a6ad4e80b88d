package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;

/** Gathers the blocks of a file in reStructuredText, or of one cell in it. */
final class RstBlocks {
  private static final int NONE = -1;

  private final String file;
  private final List<Block> blocks = new ArrayList<>();

  /** Keys of the marks of titles in the order of their first use, which makes their levels. */
  private final List<String> titles;

  private int mark = NONE;

  RstBlocks(String file) {
    this(file, new ArrayList<>());
  }

  private RstBlocks(String file, List<String> titles) {
    this.file = file;
    this.titles = titles;
  }

  /** For a part whose blocks are looked at before they are added. */
  RstBlocks apart() {
    return new RstBlocks(file, titles);
  }

  String file() {
    return file;
  }

  List<Block> all() {
    return blocks;
  }

  /** The next block begins with a mark at an offset, unless it began already. */
  void beginAt(int offset) {
    mark = mark == NONE ? offset : mark;
  }

  /** What a mark has begun is over. */
  void end() {
    mark = NONE;
  }

  /**
   * Adds a block, unless it has no prose.
   *
   * @param lines where its prose is, one stretch a line
   * @param extent the whole of it, but for a mark that it has begun with
   */
  void add(RstPlace place, List<Span> lines, Span extent) {
    add(place.kind(), place.level(), lines, extent);
  }

  private void add(Block.Kind kind, int level, List<Span> lines, Span extent) {
    Block block = MarkedLines.block(kind, level, extent, file, lines, RstMarks::of);
    if (!block.pieces().isEmpty()) {
      Span whole = fromMark(extent);
      blocks.add(new Block(kind, level, whole, block.pieces()).with(block.inlines()));
    }
  }

  /** Adds a title; in a cell it is a paragraph like others. */
  void addTitle(RstPlace place, String style, Span words, Span extent) {
    if (place.isCell()) {
      add(place, List.of(words), extent);
      return;
    }
    if (!titles.contains(style)) {
      titles.add(style);
    }
    int level = Math.min(titles.indexOf(style) + 1, 6);
    add(Block.Kind.HEADING, level, List.of(words), extent);
  }

  void addVerbatim(Span extent) {
    blocks.add(new Block(Block.Kind.VERBATIM, 0, fromMark(extent), List.of()));
  }

  private Span fromMark(Span extent) {
    int start = mark == NONE ? extent.start() : mark;
    mark = NONE;
    return new Span(start, extent.end());
  }
}
