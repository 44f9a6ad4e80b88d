package dev.tallystick.lsp;

import dev.tallystick.engine.Known;
import dev.tallystick.text.Text;
import java.util.List;
import org.eclipse.lsp4j.InlayHint;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.jsonrpc.messages.Either;

/** Figures behind the lines. */
record Hints(Encoding encoding) {
  /** At the end of the first line and of each heading's, as far as they lie in a range. */
  List<InlayHint> within(Known known, Range range) {
    int first = range.getStart().getLine();
    int last = range.getEnd().getLine();
    return Figures.of(known).stream()
        .filter(figures -> first <= figures.line() && figures.line() <= last)
        .map(figures -> hint(known.text(), figures))
        .toList();
  }

  private InlayHint hint(Text text, Figures figures) {
    Position end = encoding.position(text, text.lineEnd(figures.line()));
    InlayHint hint = new InlayHint(end, Either.forLeft(figures.words()));
    hint.setPaddingLeft(true);
    return hint;
  }
}
