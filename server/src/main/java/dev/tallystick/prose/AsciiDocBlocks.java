package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;

/** Gathers the blocks of an AsciiDoc file; one of them may be open for further lines. */
final class AsciiDocBlocks {
  private final String file;
  private final List<Block> blocks = new ArrayList<>();
  private final List<Span> lines = new ArrayList<>();
  private Block.Kind kind;
  private int level;
  private int start;
  private int end;
  private boolean comment;

  AsciiDocBlocks(String file) {
    this.file = file;
  }

  List<Block> finished() {
    close();
    return List.copyOf(blocks);
  }

  /** Whether none is finished yet. */
  boolean hasNone() {
    return blocks.isEmpty();
  }

  boolean isOpen() {
    return !lines.isEmpty();
  }

  boolean isItem() {
    return isOpen() && kind == Block.Kind.ITEM;
  }

  boolean isQuotation() {
    return isOpen() && kind == Block.Kind.QUOTATION;
  }

  /** The line of an open paragraph that has no other; empty if there is none. */
  String onlyLine() {
    return lines.size() == 1 && kind == Block.Kind.PARAGRAPH ? lines.get(0).of(file) : "";
  }

  void open(Block.Kind wanted, int depth, int from, Span first) {
    close();
    kind = wanted;
    level = depth;
    start = from;
    append(first);
  }

  /** Opens a paragraph that is copied as it stands, or nothing at all if it is a comment. */
  void openVerbatim(Span first, boolean isComment) {
    open(Block.Kind.VERBATIM, 0, first.start(), first);
    comment = isComment;
  }

  void append(Span line) {
    lines.add(line);
    end = line.end();
  }

  /** Stretches the open block to its mark behind the prose. */
  void endAt(int offset) {
    end = Math.max(end, offset);
  }

  /** Makes the open line a title. */
  void underline(Span underline, int depth) {
    kind = Block.Kind.HEADING;
    level = depth;
    end = underline.end();
    close();
  }

  void close() {
    if (!isOpen()) {
      return;
    }
    Span extent = new Span(start, end);
    if (kind != Block.Kind.VERBATIM) {
      blocks.addAll(AsciiDocInlines.blocks(kind, level, extent, file, lines));
    } else if (!comment) {
      add(new Block(kind, 0, extent, List.of()));
    }
    comment = false;
    lines.clear();
  }

  void addVerbatim(int from, int to) {
    add(new Block(Block.Kind.VERBATIM, 0, new Span(from, to), List.of()));
  }

  void addMacro(Span line, List<Span> prose) {
    blocks.addAll(AsciiDocInlines.blocks(Block.Kind.PARAGRAPH, 0, line, file, prose));
  }

  /** Adds a block, unless it has no prose to have. */
  void add(Block block) {
    if (block.kind() == Block.Kind.VERBATIM || !block.pieces().isEmpty()) {
      blocks.add(block);
    }
  }
}
