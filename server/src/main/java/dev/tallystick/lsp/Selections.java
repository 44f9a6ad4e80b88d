package dev.tallystick.lsp;

import dev.tallystick.engine.Known;
import dev.tallystick.text.Span;
import java.util.List;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.SelectionRange;

/** What a client selects as the translator selects more and more. */
record Selections(Encoding encoding) {
  /** The ranges around each position; null where nothing is known of the text. */
  List<SelectionRange> around(Known known, List<Position> positions) {
    return known
        .surrounding(positions.stream().map(at -> encoding.offset(known.text(), at)).toList())
        .map(all -> all.stream().map(spans -> nested(known, spans)).toList())
        .orElse(null);
  }

  private SelectionRange nested(Known known, List<Span> spans) {
    SelectionRange outer = null;
    for (int i = spans.size() - 1; i >= 0; i--) {
      outer = new SelectionRange(encoding.range(known.text(), spans.get(i)), outer);
    }
    return outer;
  }
}
