package dev.tallystick.lsp;

import dev.tallystick.engine.Change;
import dev.tallystick.engine.Event;
import dev.tallystick.engine.Loop;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Function;
import org.eclipse.lsp4j.DidChangeTextDocumentParams;
import org.eclipse.lsp4j.DidCloseTextDocumentParams;
import org.eclipse.lsp4j.DidOpenTextDocumentParams;
import org.eclipse.lsp4j.DidSaveTextDocumentParams;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;
import org.eclipse.lsp4j.TextDocumentItem;
import org.eclipse.lsp4j.VersionedTextDocumentIdentifier;

/** What a client tells of the texts that it shows, those without a file among them. */
final class Sync {
  /** An edit that does not say what came: from now on the text is not known. */
  private static final Change UNKNOWN = new Change.Part(text -> Optional.empty(), "");

  private Loop loop;
  private Encoding encoding;

  /** The session has begun. */
  void begin(Loop with, Encoding by) {
    loop = with;
    encoding = by;
  }

  void opened(DidOpenTextDocumentParams params) {
    TextDocumentItem item = params.getTextDocument();
    tell(
        item.getUri(),
        file ->
            new Event.Opened(
                file,
                item.getUri(),
                item.getVersion(),
                Objects.requireNonNullElse(item.getLanguageId(), ""),
                new Text(item.getText())));
  }

  void changed(DidChangeTextDocumentParams params) {
    VersionedTextDocumentIdentifier document = params.getTextDocument();
    int version = document.getVersion() == null ? 0 : document.getVersion();
    List<Change> changes = changes(params.getContentChanges());
    tell(document.getUri(), file -> new Event.Edited(file, document.getUri(), version, changes));
  }

  void saved(DidSaveTextDocumentParams params) {
    tell(params.getTextDocument().getUri(), Event.Saved::new);
  }

  void closed(DidCloseTextDocumentParams params) {
    tell(params.getTextDocument().getUri(), Event.Closed::new);
  }

  private void tell(String uri, Function<Path, Event> event) {
    if (loop != null) {
      Uris.text(uri).map(event).ifPresent(loop::post);
    }
  }

  private List<Change> changes(List<TextDocumentContentChangeEvent> events) {
    return events == null ? List.of(UNKNOWN) : events.stream().map(this::change).toList();
  }

  private Change change(TextDocumentContentChangeEvent event) {
    if (event == null || event.getText() == null) {
      return UNKNOWN;
    }
    Range range = event.getRange();
    return range == null
        ? new Change.Whole(new Text(event.getText()))
        : new Change.Part(text -> span(text, range), event.getText());
  }

  /** Where a range lies; nowhere if it starts behind its end or behind the text. */
  private Optional<Span> span(Text text, Range range) {
    int start = encoding.offset(text, range.getStart());
    int end = encoding.offset(text, range.getEnd());
    int line = range.getStart().getLine();
    boolean fits = line >= 0 && line <= text.lines() && start <= end;
    return fits ? Optional.of(new Span(start, end)) : Optional.empty();
  }
}
