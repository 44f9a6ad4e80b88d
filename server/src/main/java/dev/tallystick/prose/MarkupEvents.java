package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jsoup.nodes.Element;

/** What happens in a marked-up file from left to right, as far as it matters to the prose. */
final class MarkupEvents {
  private static final int NOTHING = -1;

  private final String file;
  private final List<Event> events = new ArrayList<>();

  MarkupEvents(String file) {
    this.file = file;
  }

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

  /**
   * What is known of a note beforehand.
   *
   * @param end index of its end among the events
   * @param next the first character behind it in the same block that is no white space; {@link
   *     #NOTHING} if there is none
   */
  private record Aside(int end, int next) {}

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
  List<Block> blocks(MarkupFlow flow) {
    Map<Integer, Aside> asides = asides();
    int end = 0;
    for (int i = 0; i < events.size(); i++) {
      Event event = events.get(i);
      Aside aside = asides.get(i);
      // A parser that repairs may put a copy of an element elsewhere, with its place in the file.
      boolean repeated = !event.value().isEmpty() && event.value().start() < end;
      if (aside != null && !mayPart(flow, event.context(), aside.next())) {
        i = aside.end();
      } else if (!repeated) {
        take(flow, event);
        end = Math.max(end, event.value().end());
      }
    }
    return flow.finish();
  }

  /** A note is a block of its own only at the end of a sentence: blocks do not overlap. */
  private static boolean mayPart(MarkupFlow flow, MarkupContext around, int next) {
    return next == NOTHING || Characters.isStop(next) || flow.isBetweenSentences(around);
  }

  private static void take(MarkupFlow flow, Event event) {
    MarkupContext context = event.context();
    switch (event.what()) {
      case BORDER, ASIDE -> flow.close();
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
      case ASIDE_END -> flow.resume();
    }
  }

  /** Looks from behind, so that no text is looked at twice. */
  private Map<Integer, Aside> asides() {
    Map<Integer, Aside> asides = new HashMap<>();
    Deque<Behind> open = new ArrayDeque<>();
    Behind behind = Behind.none(NOTHING);
    for (int i = events.size() - 1; i >= 0; i--) {
      Event event = events.get(i);
      switch (event.what()) {
        case BORDER -> behind = Behind.none(NOTHING);
        case IMAGE, TEXT, LITERAL -> behind = behind(event, behind);
        case ASIDE_END -> {
          open.push(new Behind(behind.next(), behind.block(), i));
          behind = Behind.none(NOTHING);
        }
        case ASIDE -> {
          behind = open.pop();
          boolean same = behind.block() == event.context().block();
          asides.put(i, new Aside(behind.end(), same ? behind.next() : NOTHING));
        }
        default -> {}
      }
    }
    return asides;
  }

  /**
   * What stands behind a place.
   *
   * @param block the block that the next character is in
   * @param end index of the end of a note that starts there
   */
  private record Behind(int next, Element block, int end) {
    static Behind none(int end) {
      return new Behind(NOTHING, null, end);
    }
  }

  private Behind behind(Event event, Behind otherwise) {
    for (int at = event.value().start(); at < event.value().end(); at++) {
      if (!Characters.isSpace(file.charAt(at))) {
        return new Behind(file.charAt(at), event.context().block(), NOTHING);
      }
    }
    return otherwise;
  }
}
