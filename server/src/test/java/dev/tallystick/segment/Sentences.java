package dev.tallystick.segment;

import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Text;
import java.util.List;

/** Shows how a text is parted into sentences. */
final class Sentences {
  private Sentences() {}

  static List<Segment> segments(String language, Format format, String text) {
    Text whole = new Text(text);
    return Segmenter.of(language).segments(whole, format.blocks(whole), Cancellation.NONE);
  }

  /** The prose of each sentence of a plain text. */
  static List<String> of(String language, String text) {
    return segments(language, Format.PLAIN, text).stream().map(Segment::prose).toList();
  }

  /** The stretch of the file that each sentence of a Markdown text covers. */
  static List<String> inFile(String language, String text) {
    return segments(language, Format.MARKDOWN, text).stream()
        .map(segment -> segment.span().of(text))
        .toList();
  }
}
