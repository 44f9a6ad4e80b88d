package dev.tallystick.lsp;

import dev.tallystick.engine.Answer;
import dev.tallystick.engine.Counterpart;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.List;
import org.eclipse.lsp4j.Range;

/**
 * The answer to {@code tallystick/counterpart} in one pair, as clients read it.
 *
 * @param uri the other file
 * @param language the other file's language as a BCP 47 tag
 * @param state how it stands with the sentence: the word for its {@link
 *     dev.tallystick.engine.State}
 * @param spans the sentences of the match in the file that was asked about; none in a file without
 *     sentences
 * @param counterpart those in the other file; if nothing stands there, the nearest place, empty
 */
record Placed(
    String uri, String language, String state, List<Range> spans, List<Range> counterpart) {
  /** The counterpart in one pair, in a client's columns. */
  static Placed of(Answer.At at, Encoding encoding) {
    Counterpart found = at.counterpart();
    List<Span> there = found.counterpart().isEmpty() ? List.of(found.jump()) : found.counterpart();
    return new Placed(
        at.uri(),
        found.files().language(found.side().other()).tag(),
        found.state().word(),
        ranges(encoding, found.here(), found.match()),
        ranges(encoding, found.there(), there));
  }

  private static List<Range> ranges(Encoding encoding, Text text, List<Span> spans) {
    return spans.stream().map(span -> encoding.range(text, span)).toList();
  }
}
