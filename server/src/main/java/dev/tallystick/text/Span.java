package dev.tallystick.text;

/**
 * A stretch of a text.
 *
 * @param start UTF-16 offset of its first unit
 * @param end UTF-16 offset behind its last unit, never before {@code start}
 */
public record Span(int start, int end) implements Comparable<Span> {
  /** Checks that the span is in order. */
  public Span {
    if (start < 0 || end < start) {
      throw new IllegalArgumentException("span " + start + ".." + end);
    }
  }

  /** Length in UTF-16 units. */
  public int length() {
    return end - start;
  }

  /** Whether the span has no length. */
  public boolean isEmpty() {
    return start == end;
  }

  /** Whether the unit at {@code offset} lies inside. */
  public boolean contains(int offset) {
    return start <= offset && offset < end;
  }

  /** Whether {@code offset} lies inside or directly behind: where a caret still touches it. */
  public boolean touches(int offset) {
    return start <= offset && offset <= end;
  }

  /** Whether the two share at least one unit. */
  public boolean overlaps(Span other) {
    return start < other.end && other.start < end;
  }

  /** The smallest span that holds both. */
  public Span cover(Span other) {
    return new Span(Math.min(start, other.start), Math.max(end, other.end));
  }

  /** The units of {@code text} in this span. */
  public String of(CharSequence text) {
    return text.subSequence(start, end).toString();
  }

  @Override
  public int compareTo(Span other) {
    return start != other.start
        ? Integer.compare(start, other.start)
        : Integer.compare(end, other.end);
  }
}
