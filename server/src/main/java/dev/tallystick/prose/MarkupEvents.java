package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.Supplier;

/** What happens in a marked-up file from left to right, as far as it matters to the prose. */
final class MarkupEvents {
  private final List<Event> events = new ArrayList<>();

  /** What can happen at a place of the file; of several at the same place the first here. */
  enum What {
    /** A block starts. */
    BORDER,
    /** A line ends, as by a mark. */
    LINE_END,
    /** Words are parted, as by a mark. */
    BLANK,
    /** A text for the reader in a tag, which is a block of its own. */
    ATTRIBUTE,
    /** A text for the reader in a tag, which is read where the tag stands. */
    IMAGE,
    /** Running text. */
    TEXT,
    /** Running text in which an ampersand is one. */
    LITERAL,
    /** A note starts that the sentence around it is read without. */
    ASIDE,
    /** A note ends. */
    ASIDE_END
  }

  /**
   * Something that matters to the prose.
   *
   * @param mark offset where it starts in the file
   * @param value its text, if it has one
   * @param context where the text stands; of a note, where that stands
   */
  private record Event(What what, int mark, Span value, MarkupContext context) {}

  /** Adds something with a text. */
  void add(What what, int mark, Span value, MarkupContext context) {
    events.add(new Event(what, mark, value, context));
  }

  /** Adds something that has no text. */
  void add(What what, int mark, MarkupContext context) {
    add(what, mark, new Span(mark, mark), context);
  }

  /** Puts them in the order of the file, where a parser has moved texts about. */
  void sort() {
    events.sort(Comparator.comparingInt(Event::mark).thenComparing(Event::what));
  }

  /** The blocks that come of them. */
  List<Block> blocks(Supplier<MarkupFlow> flows) {
    return blocks(flows, 0, events.size(), false);
  }

  private List<Block> blocks(Supplier<MarkupFlow> flows, int from, int to, boolean inNote) {
    MarkupFlow flow = flows.get();
    int end = 0;
    for (int i = from; i < to; i++) {
      Event event = events.get(i);
      // A parser that repairs may put a copy of an element elsewhere, with its place in the file.
      boolean repeated = !event.value().isEmpty() && event.value().start() < end;
      if (event.what() == What.ASIDE) {
        int behind = behindAside(i);
        if (!inNote) {
          flow.addNotes(blocks(flows, i + 1, behind, true), event.context());
        }
        i = behind;
      } else if (!repeated) {
        take(flow, event);
        end = Math.max(end, event.value().end());
      }
    }
    return flow.finish();
  }

  /** The index of the end of a note that starts at an index. */
  private int behindAside(int index) {
    int depth = 1;
    int at = index;
    while (depth > 0) {
      at++;
      depth += events.get(at).what() == What.ASIDE ? 1 : 0;
      depth -= events.get(at).what() == What.ASIDE_END ? 1 : 0;
    }
    return at;
  }

  private static void take(MarkupFlow flow, Event event) {
    MarkupContext context = event.context();
    switch (event.what()) {
      case BORDER -> flow.close();
      case LINE_END -> flow.addLineEnd(event.mark());
      case BLANK -> flow.addBlank(event.mark(), false);
      case ATTRIBUTE -> flow.attribute(event.value());
      case IMAGE -> {
        flow.addBlank(event.mark(), false);
        flow.text(event.value(), context, MarkupFlow.As.ATTRIBUTE);
        flow.addBlank(event.value().end(), false);
      }
      case TEXT -> flow.text(event.value(), context, MarkupFlow.As.TEXT);
      case LITERAL -> flow.text(event.value(), context, MarkupFlow.As.LITERAL);
      case ASIDE, ASIDE_END -> {}
    }
  }
}
