package dev.tallystick.lsp;

import dev.tallystick.check.OnSide;
import dev.tallystick.check.Severity;
import dev.tallystick.engine.Answer;
import dev.tallystick.engine.Counterpart;
import dev.tallystick.engine.Notice;
import dev.tallystick.engine.Publication;
import dev.tallystick.engine.References;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.DiagnosticRelatedInformation;
import org.eclipse.lsp4j.DiagnosticSeverity;
import org.eclipse.lsp4j.DocumentHighlight;
import org.eclipse.lsp4j.DocumentHighlightKind;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.Location;
import org.eclipse.lsp4j.LocationLink;
import org.eclipse.lsp4j.MarkupContent;
import org.eclipse.lsp4j.MarkupKind;
import org.eclipse.lsp4j.PublishDiagnosticsParams;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.jsonrpc.messages.Either;

/** From what the engine knows to what a client is told. */
record Conversion(Client client) {
  private static final String SOURCE = "tallystick";

  PublishDiagnosticsParams diagnostics(Publication publication) {
    List<Diagnostic> diagnostics = new ArrayList<>();
    for (Notice notice : publication.notices()) {
      diagnostics.add(diagnostic(publication, notice));
    }
    PublishDiagnosticsParams params = new PublishDiagnosticsParams(publication.uri(), diagnostics);
    publication.version().ifPresent(params::setVersion);
    return params;
  }

  private Diagnostic diagnostic(Publication publication, Notice notice) {
    Range range = client.encoding().range(publication.text(), notice.span());
    Diagnostic diagnostic =
        new Diagnostic(range, notice.message(), severity(notice.severity()), SOURCE);
    notice.code().ifPresent(code -> diagnostic.setCode(code.word()));
    if (client.related()) {
      notice.related().ifPresent(at -> diagnostic.setRelatedInformation(List.of(related(at))));
    }
    return diagnostic;
  }

  private DiagnosticRelatedInformation related(Notice.Related related) {
    Range range = client.encoding().range(related.text(), related.span());
    return new DiagnosticRelatedInformation(new Location(related.uri(), range), related.message());
  }

  private static DiagnosticSeverity severity(Severity severity) {
    return switch (severity) {
      case HINT -> DiagnosticSeverity.Hint;
      case INFORMATION -> DiagnosticSeverity.Information;
      case WARNING -> DiagnosticSeverity.Warning;
    };
  }

  /** Where to jump: to the counterpart in the preferred language. */
  Either<List<? extends Location>, List<? extends LocationLink>> definition(Answer answer) {
    if (client.links()) {
      return Either.forRight(answer.preferred().map(this::link).map(List::of).orElse(List.of()));
    }
    return Either.forLeft(answer.preferred().map(this::location).map(List::of).orElse(List.of()));
  }

  private LocationLink link(Answer.At at) {
    Range origin = client.encoding().range(at.counterpart().here(), at.counterpart().whole());
    return new LocationLink(at.uri(), target(at), target(at), origin);
  }

  private Location location(Answer.At at) {
    return location(at.uri(), at.counterpart().there(), at.counterpart().jump());
  }

  private Range target(Answer.At at) {
    return client.encoding().range(at.counterpart().there(), at.counterpart().jump());
  }

  /**
   * Where a sentence stands in all languages.
   *
   * @param uri its own file, as the client names it
   * @param itself whether its own place is wanted too
   */
  List<Location> references(String uri, Text text, References references, boolean itself) {
    List<Location> locations = new ArrayList<>();
    if (itself) {
      references.itself().ifPresent(span -> locations.add(location(uri, text, span)));
    }
    references.others().forEach(at -> locations.add(location(at.uri(), at.text(), at.span())));
    return locations;
  }

  private Location location(String uri, Text text, Span span) {
    return new Location(uri, client.encoding().range(text, span));
  }

  /** The match that the sentence belongs to, in its own file. */
  List<DocumentHighlight> highlights(Answer answer) {
    List<DocumentHighlight> highlights = new ArrayList<>();
    answer
        .preferred()
        .map(Answer.At::counterpart)
        .ifPresent(
            found ->
                found.match().stream()
                    .map(span -> client.encoding().range(found.here(), span))
                    .map(range -> new DocumentHighlight(range, DocumentHighlightKind.Text))
                    .forEach(highlights::add));
    return highlights;
  }

  /** The counterpart's words, or what there is to tell; null if there is neither. */
  Hover hover(Answer answer) {
    List<String> parts = new ArrayList<>();
    for (Answer.At at : answer.all()) {
      words(at.counterpart()).ifPresent(words -> parts.add(headed(answer, at, words)));
    }
    if (parts.isEmpty()) {
      return null;
    }
    Counterpart first = answer.all().get(0).counterpart();
    return new Hover(
        new MarkupContent(MarkupKind.PLAINTEXT, String.join("\n\n", parts)),
        client.encoding().range(first.here(), first.sentence()));
  }

  private static Optional<String> words(Counterpart found) {
    return found.prose().isEmpty()
        ? found.finding().map(finding -> finding.message())
        : Optional.of(found.prose());
  }

  /** With its language above it, where there are several. */
  private static String headed(Answer answer, Answer.At at, String words) {
    if (answer.all().size() == 1) {
      return words;
    }
    OnSide other = at.counterpart().side().other();
    return at.counterpart().files().language(other).name() + ":\n" + words;
  }
}
