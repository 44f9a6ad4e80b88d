package dev.tallystick.engine;

import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;

/** What lies around a place: its sentence, its block, its section, its file. */
final class Surrounding {
  private final Reading reading;
  private final Sentences sentences;
  private final List<Section> sections;

  Surrounding(Reading reading) {
    this.reading = reading;
    this.sentences = new Sentences(reading);
    this.sections = Section.of(reading);
  }

  /**
   * The stretches around a UTF-16 offset, each inside the next and shorter than it, the whole text
   * last. Between sentences there is no sentence, before the first heading no section.
   */
  List<Span> at(int offset) {
    List<Span> spans = new ArrayList<>();
    int sentence = sentences.touched(offset);
    if (sentence >= 0) {
      Segment segment = reading.segments().get(sentence);
      grow(spans, segment.span(), offset);
      grow(spans, segment.block().extent(), offset);
    }
    section(offset, spans);
    grow(spans, new Span(0, reading.text().length()), offset);
    return spans;
  }

  /** The one of the last heading before. */
  private void section(int offset, List<Span> spans) {
    for (int i = sections.size() - 1; i >= 0; i--) {
      if (sections.get(i).span().start() <= offset) {
        grow(spans, sections.get(i).span(), offset);
        return;
      }
    }
  }

  private static void grow(List<Span> spans, Span next, int offset) {
    Span last = spans.isEmpty() ? new Span(offset, offset) : spans.get(spans.size() - 1);
    if (next.start() <= last.start() && last.end() <= next.end() && !next.equals(last)) {
      spans.add(next);
    }
  }
}
