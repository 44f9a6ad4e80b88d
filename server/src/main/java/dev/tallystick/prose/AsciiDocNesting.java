package dev.tallystick.prose;

import java.util.ArrayDeque;
import java.util.Deque;

/** Which lists and delimited blocks of AsciiDoc are open, and what the next block belongs to. */
final class AsciiDocNesting {
  /** Deeper nesting than any writer uses is not kept. */
  private static final int DEEPEST = 100;

  private final Deque<Frame> frames = new ArrayDeque<>();
  private AsciiDocList list = new AsciiDocList(0);

  /** Level of the item that the next block belongs to; 0 if to none. */
  private int attached;

  /** A delimited block, the item that it is part of, and the list to be gone on with behind it. */
  private record Frame(String delimiter, boolean quotes, int item, AsciiDocList outer) {}

  /** Opens a delimited block; one that is too deep is passed over. */
  void open(String delimiter, boolean quotes) {
    int item = takeItem();
    if (frames.size() < DEEPEST) {
      frames.push(new Frame(delimiter, quotes, item, list));
      list = new AsciiDocList(item);
    }
  }

  /** Whether a block with this delimiter is open. */
  boolean isOpen(String delimiter) {
    return frames.stream().anyMatch(frame -> frame.delimiter().equals(delimiter));
  }

  /** Closes the block with this delimiter, and all inside that were left open. */
  void close(String delimiter) {
    Frame frame = frames.pop();
    while (!frame.delimiter().equals(delimiter)) {
      frame = frames.pop();
    }
    list = frame.outer();
    attached = 0;
  }

  /** Enters the list with this marker; the level of its items. */
  int enterList(String marker) {
    attached = 0;
    return list.enter(marker);
  }

  boolean isInList() {
    return !list.isEmpty();
  }

  /** Hands the next block to the current item, or to one so many lists further out. */
  void attach(int listsOut) {
    list.leave(listsOut);
    attached = list.level();
  }

  /** The next block has come and belongs where the list stands, which goes on. */
  void keepList() {
    attached = 0;
  }

  /**
   * Level of the item that the block which has come belongs to; 0 if to none. One that is not
   * attached to an item ends the list.
   */
  int takeItem() {
    int item = attached;
    attached = 0;
    if (item == 0) {
      list.clear();
    }
    return item > 0 || frames.isEmpty() ? item : frames.element().item();
  }

  /** How many quotations are open. */
  int quotations() {
    return (int) frames.stream().filter(Frame::quotes).count();
  }
}
