package dev.tallystick.prose;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashMap;
import java.util.Map;

/** Which environments of LaTeX are open, and what text is in them. */
final class LatexPlaces {
  private final Deque<Place> places = new ArrayDeque<>();
  private final Map<String, Integer> open = new HashMap<>();
  private int lists;
  private int quotations;

  private record Place(String environment, Block.Kind kind) {}

  void open(String environment) {
    Block.Kind kind = kind();
    if (LatexNames.isEnvironment(LatexNames.CELLS, environment)) {
      kind = Block.Kind.CELL;
    } else if (LatexNames.isEnvironment(LatexNames.LIST, environment)) {
      kind = Block.Kind.ITEM;
      lists++;
    } else if (LatexNames.isEnvironment(LatexNames.QUOTATION, environment)) {
      kind = Block.Kind.QUOTATION;
      quotations++;
    }
    places.push(new Place(environment, kind));
    open.merge(environment, 1, Integer::sum);
  }

  /** Closes an environment and all inside that were left open; nothing if it is not open. */
  void close(String environment) {
    if (open.getOrDefault(environment, 0) == 0) {
      return;
    }
    String closed;
    do {
      closed = places.pop().environment();
      open.merge(closed, -1, Integer::sum);
      lists -= LatexNames.isEnvironment(LatexNames.LIST, closed) ? 1 : 0;
      quotations -= LatexNames.isEnvironment(LatexNames.QUOTATION, closed) ? 1 : 0;
    } while (!closed.equals(environment));
  }

  /** What a block of text is here. */
  Block.Kind kind() {
    return places.isEmpty() ? Block.Kind.PARAGRAPH : places.element().kind();
  }

  /** The level of a block of a kind. */
  int level(Block.Kind kind) {
    return switch (kind) {
      case ITEM -> Math.max(lists, 1);
      case QUOTATION -> Math.max(quotations, 1);
      default -> 0;
    };
  }
}
