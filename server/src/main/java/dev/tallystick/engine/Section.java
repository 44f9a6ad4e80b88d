package dev.tallystick.engine;

import dev.tallystick.prose.Block;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.stream.Collectors;

/**
 * A heading and what stands below it, up to the next heading of the same or a higher level.
 *
 * @param heading the block of the heading
 * @param title the heading's prose
 * @param span from the heading to the next one that ends the section, or to the end of the text
 * @param from index of the heading's first segment
 * @param to index behind the section's last segment
 */
record Section(Block heading, String title, Span span, int from, int to) {
  /** The sections of a text in order, those inside others included. */
  static List<Section> of(Reading reading) {
    List<Segment> segments = reading.segments();
    List<Section> closed = new ArrayList<>();
    Deque<Integer> open = new ArrayDeque<>();
    for (int i = 0; i < segments.size(); i++) {
      Block block = segments.get(i).block();
      if (block.kind() == Block.Kind.HEADING && segments.get(i).opens()) {
        while (!open.isEmpty() && segments.get(open.peek()).block().level() >= block.level()) {
          closed.add(section(segments, open.pop(), i, block.extent().start()));
        }
        open.push(i);
      }
    }
    while (!open.isEmpty()) {
      closed.add(section(segments, open.pop(), segments.size(), reading.text().length()));
    }
    closed.sort((one, other) -> Integer.compare(one.from(), other.from()));
    return closed;
  }

  private static Section section(List<Segment> segments, int from, int to, int end) {
    Block heading = segments.get(from).block();
    String title =
        segments.subList(from, to).stream()
            .takeWhile(segment -> segment.block() == heading)
            .map(Segment::prose)
            .collect(Collectors.joining(" "))
            .strip();
    return new Section(heading, title, new Span(heading.extent().start(), end), from, to);
  }
}
