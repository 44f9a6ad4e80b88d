package dev.tallystick.engine;

import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.List;

/** Finds the sentence, or the verbatim block, that a place belongs to. */
final class Sentences {
  private final Text text;
  private final List<Segment> segments;

  Sentences(Reading reading) {
    this.text = reading.text();
    this.segments = reading.segments();
  }

  /**
   * The index of the sentence at an offset. Between sentences it is the nearest one on the same
   * line, else the last one before, else the first of all; -1 if there are no sentences.
   */
  int at(int offset) {
    int touched = touched(offset);
    if (touched >= 0) {
      return touched;
    }
    int near = nearestOnLine(offset);
    return near >= 0 ? near : lastBefore(offset);
  }

  /**
   * The shortest one around the offset, else the last one that ends there; or -1: none is touched.
   */
  int touched(int offset) {
    int found = -1;
    int ending = -1;
    for (int i = 0; i < segments.size(); i++) {
      Span span = span(i);
      if (span.contains(offset) && (found < 0 || span.length() < span(found).length())) {
        found = i;
      } else if (span.end() == offset) {
        ending = i;
      }
    }
    return found >= 0 ? found : ending;
  }

  private int nearestOnLine(int offset) {
    int line = text.place(Math.min(offset, text.length())).line();
    Span whole = new Span(text.lineStart(line), text.lineEnd(line));
    int found = -1;
    for (int i = 0; i < segments.size(); i++) {
      boolean nearer = found < 0 || distance(i, offset) < distance(found, offset);
      if (span(i).overlaps(whole) && nearer) {
        found = i;
      }
    }
    return found;
  }

  private int distance(int index, int offset) {
    Span span = span(index);
    return offset < span.start() ? span.start() - offset : offset - span.end();
  }

  private int lastBefore(int offset) {
    int found = segments.isEmpty() ? -1 : 0;
    for (int i = 0; i < segments.size(); i++) {
      found = span(i).end() <= offset ? i : found;
    }
    return found;
  }

  private Span span(int index) {
    return segments.get(index).span();
  }
}
