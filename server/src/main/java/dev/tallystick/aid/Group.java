package dev.tallystick.aid;

import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Block;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;

/**
 * Wanted sentences of one block of the source, or of one row of a table.
 *
 * @param source where they stand
 * @param segments their indices, sorted
 */
record Group(Reading source, List<Integer> segments) {
  private static final String TIMES = "-->";

  /** Parts wanted sentences by their blocks. */
  static List<Group> of(Reading source, List<Integer> segments) {
    List<Group> groups = new ArrayList<>();
    List<Integer> open = new ArrayList<>();
    for (int index : segments) {
      if (!open.isEmpty() && !together(source, open.get(0), index)) {
        groups.add(new Group(source, List.copyOf(open)));
        open.clear();
      }
      open.add(index);
    }
    if (!open.isEmpty()) {
      groups.add(new Group(source, List.copyOf(open)));
    }
    return groups;
  }

  private static boolean together(Reading source, int one, int other) {
    Block first = source.segments().get(one).block();
    Block second = source.segments().get(other).block();
    boolean cells = first.kind() == Block.Kind.CELL && second.kind() == Block.Kind.CELL;
    return first.equals(second) || cells && line(source, first) == line(source, second);
  }

  private static int line(Reading source, Block block) {
    return source.text().place(block.extent().start()).line();
  }

  /** The block of the first. */
  Block block() {
    return source.segments().get(first()).block();
  }

  Block.Kind kind() {
    return block().kind();
  }

  int first() {
    return segments.get(0);
  }

  int last() {
    return segments.get(segments.size() - 1);
  }

  /** Whether the block, or the row, has no other sentences. */
  boolean isWhole() {
    return segments.size() == last() - first() + 1
        && (first() == 0 || !together(source, first() - 1, first()))
        && (last() + 1 == source.segments().size() || !together(source, last(), last() + 1));
  }

  /** Whether the block lies inside of the one before it. */
  boolean isInside() {
    int before = first() - 1;
    while (before >= 0 && hasInBlock(before)) {
      before--;
    }
    Span extent = block().extent();
    return kind() == Block.Kind.NOTE
        && before >= 0
        && source.segments().get(before).block().extent().end() >= extent.end();
  }

  /** Whether its lines are those of cues, from their times to the blank line behind them. */
  boolean hasWholeCues() {
    Text text = source.text();
    int from = line(source, block());
    int to = Chunk.lastLine(source, last());
    boolean times = line(text, from).contains(TIMES) || line(text, from + 1).contains(TIMES);
    return isWhole() && times && line(text, from - 1).isBlank() && line(text, to + 1).isBlank();
  }

  /** Whether it stands, without a cue's border, behind the sentence before it. */
  boolean isInCueBefore() {
    if (first() == 0) {
      return false;
    }
    int from = source.segments().get(first() - 1).span().end();
    int to = source.segments().get(last()).span().end();
    String text = source.text().string().substring(Math.min(from, to), to);
    return !text.contains(TIMES) && !text.strip().replaceAll("\\r\\n?", "\n").contains("\n\n");
  }

  private static String line(Text text, int number) {
    return number < 0 || number >= text.lines()
        ? ""
        : text.string().substring(text.lineStart(number), text.lineEnd(number));
  }

  /** Whether a segment of the source stands in the block of the first sentence. */
  boolean hasInBlock(int index) {
    List<Segment> all = source.segments();
    return index >= 0 && index < all.size() && all.get(index).block().equals(block());
  }
}
