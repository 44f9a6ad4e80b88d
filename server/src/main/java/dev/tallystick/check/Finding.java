package dev.tallystick.check;

import dev.tallystick.text.Span;

/**
 * Something to tell the translator. An editor may show it on both sides; it is one finding.
 *
 * @param code its kind
 * @param severity how loudly it is said
 * @param side the side that {@code span} lies on: the source for an omission, else the target
 * @param span the sentence or run of sentences, in UTF-16 offsets
 * @param counterpart the place on the other side; empty where nothing stands there
 * @param confidence posterior probability, from 0 to 1
 * @param message what is wrong, for the translator
 * @param counterMessage the same said at the counterpart; empty if nothing is to be shown there
 */
public record Finding(
    Code code,
    Severity severity,
    OnSide side,
    Span span,
    Span counterpart,
    double confidence,
    String message,
    String counterMessage)
    implements Comparable<Finding> {
  /** One that is said as loudly as its kind usually is. */
  public Finding(
      Code code,
      OnSide side,
      Span span,
      Span counterpart,
      double confidence,
      String message,
      String counterMessage) {
    this(code, code.severity(), side, span, counterpart, confidence, message, counterMessage);
  }

  /** The same, said as loudly as this. */
  Finding at(Severity loud) {
    return new Finding(code, loud, side, span, counterpart, confidence, message, counterMessage);
  }

  @Override
  public int compareTo(Finding other) {
    int bySide = side.compareTo(other.side);
    int bySpan = bySide != 0 ? bySide : span.compareTo(other.span);
    return bySpan != 0 ? bySpan : code.compareTo(other.code);
  }
}
