package dev.tallystick.lsp;

import dev.tallystick.engine.Heading;
import dev.tallystick.engine.Known;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import org.eclipse.lsp4j.DocumentSymbol;
import org.eclipse.lsp4j.Location;
import org.eclipse.lsp4j.SymbolInformation;
import org.eclipse.lsp4j.SymbolKind;
import org.eclipse.lsp4j.jsonrpc.messages.Either;

/**
 * The outline of a file.
 *
 * @param client who is told: some take a tree, some a list only
 * @param uri the file, as the client names it
 */
@SuppressWarnings("deprecation") // older clients take the list only
record Symbols(Client client, String uri) {
  /** The headings. */
  List<Either<SymbolInformation, DocumentSymbol>> of(Known known) {
    List<Either<SymbolInformation, DocumentSymbol>> symbols = new ArrayList<>();
    if (client.outlines()) {
      known.outline().forEach(top -> symbols.add(Either.forRight(tree(known.text(), top))));
    } else {
      addFlat(symbols, known.text(), known.outline(), null);
    }
    return symbols;
  }

  private DocumentSymbol tree(Text text, Heading heading) {
    return new DocumentSymbol(
        heading.title(),
        SymbolKind.String,
        client.encoding().range(text, heading.section()),
        client.encoding().range(text, heading.span()),
        Figures.words(heading.counts()),
        heading.inside().stream().map(inner -> tree(text, inner)).toList());
  }

  private void addFlat(
      List<Either<SymbolInformation, DocumentSymbol>> symbols,
      Text text,
      List<Heading> headings,
      String around) {
    for (Heading heading : headings) {
      Location section = new Location(uri, client.encoding().range(text, heading.section()));
      symbols.add(
          Either.forLeft(
              new SymbolInformation(heading.title(), SymbolKind.String, section, around)));
      addFlat(symbols, text, heading.inside(), heading.title());
    }
  }
}
