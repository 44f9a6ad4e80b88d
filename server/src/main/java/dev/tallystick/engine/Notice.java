package dev.tallystick.engine;

import dev.tallystick.check.Code;
import dev.tallystick.check.Severity;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.Comparator;
import java.util.Map;
import java.util.Optional;

/**
 * A finding as one of the two files shows it, or a fault of the file itself.
 *
 * @param code the kind of the finding; none of a fault of the file
 * @param severity how loudly it is said
 * @param span where to show it, never empty, in UTF-16 offsets
 * @param message what to say there
 * @param related the place in the other file, if there is one to point at
 */
public record Notice(
    Optional<Code> code, Severity severity, Span span, String message, Optional<Related> related)
    implements Comparable<Notice> {
  private static final Comparator<Notice> ORDER =
      Comparator.comparing(Notice::span)
          .thenComparing(notice -> notice.code().map(Code::ordinal).orElse(-1))
          .thenComparing(Notice::message)
          .thenComparing(notice -> notice.related().map(Related::uri).orElse(""));

  /** A fault of the file itself. */
  static Notice of(Problem problem) {
    return new Notice(
        Optional.empty(), Severity.WARNING, problem.span(), problem.message(), Optional.empty());
  }

  /**
   * A place in the other file. Two are equal if they have the same line and columns in any
   * encoding, whatever else has changed in that file.
   *
   * @param uri that file, as the editor names it
   * @param text its text
   * @param span the place, never empty
   * @param message what is there
   */
  public record Related(String uri, Text text, Span span, String message) {
    @Override
    public boolean equals(Object other) {
      return other instanceof Related that
          && uri.equals(that.uri)
          && message.equals(that.message)
          && lineTo(span.start()).equals(that.lineTo(that.span.start()))
          && lineTo(span.end()).equals(that.lineTo(that.span.end()));
    }

    @Override
    public int hashCode() {
      return message.hashCode();
    }

    /** A line's number, and the line up to an offset. */
    private Map.Entry<Integer, String> lineTo(int offset) {
      int line = text.place(offset).line();
      return Map.entry(line, text.string().substring(text.lineStart(line), offset));
    }
  }

  @Override
  public int compareTo(Notice other) {
    return ORDER.compare(this, other);
  }
}
