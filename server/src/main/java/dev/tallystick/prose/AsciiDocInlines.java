package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Picks the prose out of the lines of one block of AsciiDoc, and the notes that stand in it. */
final class AsciiDocInlines {
  private final String file;
  private final List<Span> lines;

  /** Where each line begins in the lines put together. */
  private final int[] before;

  private AsciiDocInlines(String file, List<Span> lines) {
    this.file = file;
    this.lines = lines;
    this.before = new int[lines.size()];
    for (int i = 1; i < before.length; i++) {
      before[i] = before[i - 1] + lines.get(i - 1).length() + 1;
    }
  }

  /**
   * A block with its prose, and behind it one for each of its footnotes, which lie in its extent.
   * Those without prose are left out.
   *
   * @param lines the stretches of the file that the block has, one a line
   */
  static List<Block> blocks(
      Block.Kind kind, int level, Span extent, String file, List<Span> lines) {
    AsciiDocInlines inlines = new AsciiDocInlines(file, lines);
    List<AsciiDocNote> notes = new ArrayList<>();
    List<Block> blocks = new ArrayList<>();
    add(blocks, new Block(kind, level, extent, inlines.read(notes)));
    for (AsciiDocNote note : notes) {
      Span whole = inlines.inFile(note.whole());
      AsciiDocInlines text = new AsciiDocInlines(file, inlines.lines(note.text()));
      // A note in a note has no place where it could be shown.
      add(blocks, new Block(Block.Kind.NOTE, 0, whole, text.read(new ArrayList<>())));
    }
    return blocks;
  }

  private static void add(List<Block> blocks, Block block) {
    if (!block.pieces().isEmpty()) {
      blocks.add(block);
    }
  }

  /**
   * The prose of the lines.
   *
   * @param notes takes the footnotes, by their places in the lines put together
   */
  private List<Span> read(List<AsciiDocNote> notes) {
    StringBuilder joined = new StringBuilder();
    for (Span line : lines) {
      joined.append(file, line.start(), line.end()).append('\n');
    }
    boolean[] marks = AsciiDocMarks.of(joined.toString(), notes);
    Pieces pieces = new Pieces(file);
    int note = 0;
    for (int i = 0; i < before.length; i++) {
      Span line = lines.get(i);
      while (note < notes.size() && notes.get(note).whole().end() < before[i]) {
        note++;
      }
      boolean inNote = note < notes.size() && notes.get(note).whole().start() < before[i];
      if (pieces.end() > 0 && !inNote) {
        pieces.addLineBreak(pieces.end(), line.start());
      }
      for (int at = line.start(); at < line.end(); at++) {
        if (!marks[before[i] + at - line.start()]) {
          pieces.add(at, at + 1);
        }
      }
    }
    return pieces.spans();
  }

  private Span inFile(Span joined) {
    List<Span> parts = lines(joined);
    return parts.get(0).cover(parts.get(parts.size() - 1));
  }

  /** The stretches of the lines that a stretch of the lines put together stands for. */
  private List<Span> lines(Span joined) {
    List<Span> parts = new ArrayList<>();
    int found = Arrays.binarySearch(before, joined.start());
    for (int i = found >= 0 ? found : -found - 2; i < before.length; i++) {
      Span line = lines.get(i);
      if (before[i] >= joined.end()) {
        break;
      }
      int from = Math.max(joined.start() - before[i], 0);
      int to = Math.min(joined.end() - before[i], line.length());
      if (from < to) {
        parts.add(new Span(line.start() + from, line.start() + to));
      }
    }
    return parts;
  }
}
