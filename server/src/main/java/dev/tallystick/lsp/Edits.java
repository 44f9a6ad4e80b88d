package dev.tallystick.lsp;

import dev.tallystick.aid.LineEdit;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.SnippetTextEdit;
import org.eclipse.lsp4j.TextDocumentEdit;
import org.eclipse.lsp4j.TextEdit;
import org.eclipse.lsp4j.VersionedTextDocumentIdentifier;
import org.eclipse.lsp4j.WorkspaceEdit;
import org.eclipse.lsp4j.jsonrpc.messages.Either;

/** Edits of whole lines, as a client takes them. */
record Edits(Client client) {
  /**
   * Edits of one file.
   *
   * @param version of the text that the edits are for; none if the client does not show it
   */
  WorkspaceEdit of(String uri, OptionalInt version, List<LineEdit> lines) {
    List<TextEdit> edits = lines.stream().map(Edits::edit).toList();
    if (!client.takesVersions()) {
      return new WorkspaceEdit(Map.of(uri, edits));
    }
    Integer number = version.isPresent() ? version.getAsInt() : null;
    VersionedTextDocumentIdentifier document = new VersionedTextDocumentIdentifier(uri, number);
    List<Either<TextEdit, SnippetTextEdit>> plain = new ArrayList<>();
    edits.forEach(edit -> plain.add(Either.forLeft(edit)));
    return new WorkspaceEdit(List.of(Either.forLeft(new TextDocumentEdit(document, plain))));
  }

  private static TextEdit edit(LineEdit lines) {
    Range range = new Range(new Position(lines.from(), 0), new Position(lines.to(), 0));
    return new TextEdit(range, lines.replacement());
  }
}
