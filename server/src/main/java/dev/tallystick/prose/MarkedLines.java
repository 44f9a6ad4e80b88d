package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Picks the prose out of the lines of one block, and what is marked in it. */
final class MarkedLines {
  private MarkedLines() {}

  /** Knows the marks of a format. */
  @FunctionalInterface
  interface Marker {
    /**
     * Which characters of the lines of a block are no prose.
     *
     * @param joined the lines, each with an LF at its end
     * @param inlines takes what is marked, with offsets into {@code joined}
     */
    boolean[] marks(String joined, List<Inline> inlines);
  }

  /**
   * A block with its prose; it has no pieces if there is none.
   *
   * @param lines its stretches of the file, one a line
   */
  static Block block(
      Block.Kind kind, int level, Span extent, String file, List<Span> lines, Marker marker) {
    return block(kind, level, extent, file, lines, marker, List.of());
  }

  /**
   * The same.
   *
   * @param apart stretches of the joined lines that are blocks of their own, in order; the marker
   *     may put them in. A line break in one is no white space of this block
   */
  static Block block(
      Block.Kind kind,
      int level,
      Span extent,
      String file,
      List<Span> lines,
      Marker marker,
      List<Span> apart) {
    StringBuilder joined = new StringBuilder();
    for (Span line : lines) {
      joined.append(file, line.start(), line.end()).append('\n');
    }
    List<Inline> inlines = new ArrayList<>();
    boolean[] marks = marker.marks(joined.toString(), inlines);
    Pieces pieces = new Pieces(file);
    int before = 0;
    int next = 0;
    for (Span line : lines) {
      while (next < apart.size() && apart.get(next).end() < before) {
        next++;
      }
      boolean inside = next < apart.size() && apart.get(next).start() < before;
      if (pieces.end() > 0 && !inside) {
        pieces.addLineBreak(pieces.end(), line.start());
      }
      for (int at = line.start(); at < line.end(); at++) {
        if (!marks[before + at - line.start()]) {
          pieces.add(at, at + 1);
        }
      }
      before += line.length() + 1;
    }
    Places places = new Places(lines);
    List<Inline> inFile =
        inlines.stream()
            .map(inline -> new Inline(inline.kind(), places.inFile(inline.span())))
            .toList();
    return new Block(kind, level, extent, pieces.spans()).with(inFile);
  }

  /** Where in the file stands what stands in lines put together. */
  static final class Places {
    private final List<Span> lines;
    private final int[] before;

    Places(List<Span> lines) {
      this.lines = lines;
      this.before = new int[lines.size()];
      for (int i = 1; i < before.length; i++) {
        before[i] = before[i - 1] + lines.get(i - 1).length() + 1;
      }
    }

    /** From the first to the last character of a stretch that is not empty. */
    Span inFile(Span joined) {
      return new Span(offset(joined.start()), offset(joined.end() - 1) + 1);
    }

    /** The parts of a stretch, one a line; those without a character are left out. */
    List<Span> lines(Span joined) {
      List<Span> parts = new ArrayList<>();
      for (int i = line(joined.start()); i < before.length && before[i] < joined.end(); i++) {
        int from = Math.max(joined.start() - before[i], 0);
        int to = Math.min(joined.end() - before[i], lines.get(i).length());
        if (from < to) {
          parts.add(new Span(lines.get(i).start() + from, lines.get(i).start() + to));
        }
      }
      return parts;
    }

    private int offset(int inJoined) {
      int line = line(inJoined);
      return lines.get(line).start() + inJoined - before[line];
    }

    private int line(int inJoined) {
      int found = Arrays.binarySearch(before, inJoined);
      return found >= 0 ? found : -found - 2;
    }
  }
}
