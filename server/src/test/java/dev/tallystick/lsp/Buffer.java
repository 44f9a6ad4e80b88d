package dev.tallystick.lsp;

import dev.tallystick.text.Place;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.DefinitionParams;
import org.eclipse.lsp4j.DidChangeTextDocumentParams;
import org.eclipse.lsp4j.DidCloseTextDocumentParams;
import org.eclipse.lsp4j.DidOpenTextDocumentParams;
import org.eclipse.lsp4j.DocumentHighlight;
import org.eclipse.lsp4j.DocumentHighlightParams;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.HoverParams;
import org.eclipse.lsp4j.Location;
import org.eclipse.lsp4j.LocationLink;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.ReferenceContext;
import org.eclipse.lsp4j.ReferenceParams;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.TextDocumentItem;
import org.eclipse.lsp4j.VersionedTextDocumentIdentifier;
import org.eclipse.lsp4j.services.TextDocumentService;

/** A text in the client's editor. */
final class Buffer {
  final String uri;
  String text;
  int version = 1;
  private final Talk talk;

  /** Opens it. */
  Buffer(Talk talk, String uri, String text) {
    this.talk = talk;
    this.uri = uri;
    this.text = text;
    documents()
        .didOpen(
            new DidOpenTextDocumentParams(new TextDocumentItem(uri, "markdown", version, text)));
  }

  private TextDocumentService documents() {
    return talk.server.getTextDocumentService();
  }

  /** Replaces the first place where some words stand, and waits. */
  void replace(String old, String words) {
    type(old, words);
    talk.settle();
  }

  /** Replaces the first place where some words stand. */
  void type(String old, String words) {
    int start = text.indexOf(old);
    if (start < 0) {
      throw new AssertionError("no such words: " + old);
    }
    type(start, start + old.length(), words);
  }

  /** Replaces a stretch, in UTF-16 offsets that lie between characters. */
  void type(int start, int end, String words) {
    Range range = new Range(position(start), position(end));
    Text lines = new Text(text);
    // Inside a line end no editor can put a caret; the position says where it is.
    int from = offset(lines, range.getStart());
    int to = offset(lines, range.getEnd());
    text = text.substring(0, from) + words + text.substring(to);
    change(new TextDocumentContentChangeEvent(range, words));
  }

  /** Sends a change as it is; the text here stays. */
  void change(TextDocumentContentChangeEvent change) {
    version++;
    documents()
        .didChange(
            new DidChangeTextDocumentParams(
                new VersionedTextDocumentIdentifier(uri, version), List.of(change)));
  }

  /** Sends the whole text anew, and waits. */
  void whole(String now) {
    text = now;
    change(new TextDocumentContentChangeEvent(now));
    talk.settle();
  }

  /** Closes it, and waits. */
  void close() {
    closeNow();
    talk.settle();
  }

  void closeNow() {
    documents().didClose(new DidCloseTextDocumentParams(new TextDocumentIdentifier(uri)));
  }

  /** The position of an offset, counted in UTF-16 units. */
  Position position(int offset) {
    Place place = new Text(text).place(offset);
    return new Position(place.line(), place.column());
  }

  /** The words in a range. */
  String words(Range range) {
    return words(text, range);
  }

  static String words(String text, Range range) {
    Text lines = new Text(text);
    return text.substring(offset(lines, range.getStart()), offset(lines, range.getEnd()));
  }

  private static int offset(Text text, Position position) {
    return Encoding.UTF_16.offset(text, position);
  }

  private Position at(String words) {
    return position(text.indexOf(words));
  }

  LocationLink jump(String words) {
    return jump(at(words));
  }

  LocationLink jump(Position position) {
    List<? extends LocationLink> links = links(position);
    return links.isEmpty() ? null : links.get(0);
  }

  /** Where a position leads. */
  List<? extends LocationLink> links(Position position) {
    var found =
        Talk.answer(
            documents()
                .definition(new DefinitionParams(new TextDocumentIdentifier(uri), position)));
    return found.isRight() ? found.getRight() : List.of(); // an empty list may be of either kind
  }

  Hover hover(String words) {
    return Talk.answer(ask(words));
  }

  CompletableFuture<Hover> ask(String words) {
    return documents().hover(new HoverParams(new TextDocumentIdentifier(uri), at(words)));
  }

  /** Where a sentence stands in the other files. */
  List<? extends Location> references(String words) {
    return Talk.answer(
        documents()
            .references(
                new ReferenceParams(
                    new TextDocumentIdentifier(uri), at(words), new ReferenceContext(false))));
  }

  List<String> highlighted(String words) {
    return Talk.answer(
            documents()
                .documentHighlight(
                    new DocumentHighlightParams(new TextDocumentIdentifier(uri), at(words))))
        .stream()
        .map(DocumentHighlight::getRange)
        .map(this::words)
        .toList();
  }
}
