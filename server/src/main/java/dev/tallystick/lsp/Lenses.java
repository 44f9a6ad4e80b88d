package dev.tallystick.lsp;

import dev.tallystick.engine.Known;
import java.util.List;
import org.eclipse.lsp4j.CodeLens;
import org.eclipse.lsp4j.Command;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;

/** Figures above the lines. A client shows no lens without a command; this one does nothing. */
final class Lenses {
  private Lenses() {}

  /** At the top of the file, and at each heading. */
  static List<CodeLens> of(Known known) {
    return Figures.of(known).stream().map(Lenses::lens).toList();
  }

  private static CodeLens lens(Figures figures) {
    Position start = new Position(figures.line(), 0);
    return new CodeLens(new Range(start, start), new Command(figures.words(), ""), null);
  }
}
