package dev.tallystick.lsp;

import dev.tallystick.engine.Answer;
import dev.tallystick.engine.Known;
import dev.tallystick.engine.Loop;
import dev.tallystick.engine.Question;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.function.BiFunction;
import java.util.function.Function;
import org.eclipse.lsp4j.CodeAction;
import org.eclipse.lsp4j.CodeActionContext;
import org.eclipse.lsp4j.CodeActionKind;
import org.eclipse.lsp4j.CodeActionParams;
import org.eclipse.lsp4j.CodeLens;
import org.eclipse.lsp4j.CodeLensParams;
import org.eclipse.lsp4j.Command;
import org.eclipse.lsp4j.DefinitionParams;
import org.eclipse.lsp4j.DidChangeTextDocumentParams;
import org.eclipse.lsp4j.DidCloseTextDocumentParams;
import org.eclipse.lsp4j.DidOpenTextDocumentParams;
import org.eclipse.lsp4j.DidSaveTextDocumentParams;
import org.eclipse.lsp4j.DocumentDiagnosticParams;
import org.eclipse.lsp4j.DocumentDiagnosticReport;
import org.eclipse.lsp4j.DocumentHighlight;
import org.eclipse.lsp4j.DocumentHighlightParams;
import org.eclipse.lsp4j.DocumentSymbol;
import org.eclipse.lsp4j.DocumentSymbolParams;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.HoverParams;
import org.eclipse.lsp4j.InlayHint;
import org.eclipse.lsp4j.InlayHintParams;
import org.eclipse.lsp4j.Location;
import org.eclipse.lsp4j.LocationLink;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.ReferenceParams;
import org.eclipse.lsp4j.SelectionRange;
import org.eclipse.lsp4j.SelectionRangeParams;
import org.eclipse.lsp4j.SymbolInformation;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.TextDocumentPositionParams;
import org.eclipse.lsp4j.jsonrpc.messages.Either;
import org.eclipse.lsp4j.services.TextDocumentService;

/** What a client tells and asks about texts, those without a file among them. */
final class Documents implements TextDocumentService {
  private final Requests requests;
  private final Board board;
  private final Sync sync = new Sync();
  private Conversion conversion;
  private Views views;

  Documents(Requests requests, Board board) {
    this.requests = requests;
    this.board = board;
  }

  /** The session has begun. */
  void begin(Loop with, Conversion by, Views in) {
    sync.begin(with, by.client().encoding());
    conversion = by;
    views = in;
  }

  @Override
  public void didOpen(DidOpenTextDocumentParams params) {
    sync.opened(params);
  }

  @Override
  public void didChange(DidChangeTextDocumentParams params) {
    sync.changed(params);
  }

  @Override
  public void didSave(DidSaveTextDocumentParams params) {
    sync.saved(params);
  }

  @Override
  public void didClose(DidCloseTextDocumentParams params) {
    sync.closed(params);
  }

  @Override
  public CompletableFuture<Either<List<? extends Location>, List<? extends LocationLink>>>
      definition(DefinitionParams params) {
    return ask(params, answer -> conversion.definition(answer));
  }

  @Override
  public CompletableFuture<Hover> hover(HoverParams params) {
    return ask(params, answer -> conversion.hover(answer));
  }

  @Override
  public CompletableFuture<List<? extends DocumentHighlight>> documentHighlight(
      DocumentHighlightParams params) {
    return ask(params, answer -> conversion.highlights(answer));
  }

  /** What stands for a sentence, in each pair. */
  CompletableFuture<List<Placed>> counterpart(TextDocumentPositionParams params) {
    return ask(
        params,
        answer ->
            answer.all().stream()
                .map(at -> Placed.of(at, conversion.client().encoding()))
                .toList());
  }

  @Override
  public CompletableFuture<List<? extends Location>> references(ReferenceParams params) {
    boolean itself = params.getContext() != null && params.getContext().isIncludeDeclaration();
    return ask(
        params,
        Question.Reach.FAMILY,
        (known, offset) ->
            conversion.references(
                params.getTextDocument().getUri(), known.text(), known.references(offset), itself));
  }

  @Override
  public CompletableFuture<List<SelectionRange>> selectionRange(SelectionRangeParams params) {
    return requests.ask(
        params.getTextDocument(),
        Optional.ofNullable(params.getPositions()),
        Question.Reach.PAIRS,
        known ->
            new Selections(conversion.client().encoding()).around(known, params.getPositions()));
  }

  @Override
  public CompletableFuture<List<Either<SymbolInformation, DocumentSymbol>>> documentSymbol(
      DocumentSymbolParams params) {
    TextDocumentIdentifier document = params.getTextDocument();
    return requests.ask(
        document,
        Optional.of(params),
        Question.Reach.PAIRS,
        known -> new Symbols(conversion.client(), document.getUri()).of(known));
  }

  @Override
  public CompletableFuture<List<Either<Command, CodeAction>>> codeAction(CodeActionParams params) {
    TextDocumentIdentifier document = params.getTextDocument();
    return requests.ask(
        document,
        Optional.ofNullable(params.getRange()),
        Question.Reach.PAIRS,
        known ->
            wantsFixes(params.getContext())
                ? stubs(document.getUri()).at(known, params.getRange()).stream()
                    .map(Either::<Command, CodeAction>forRight)
                    .toList()
                : List.of());
  }

  private Stubs stubs(String uri) {
    return new Stubs(conversion.client(), board, uri);
  }

  /** Whether a client that names the kinds of action that it wants names ours. */
  private static boolean wantsFixes(CodeActionContext context) {
    return context == null
        || context.getOnly() == null
        || context.getOnly().contains(CodeActionKind.QuickFix)
        || context.getOnly().contains(CodeActionKind.Empty);
  }

  @Override
  public CompletableFuture<CodeAction> resolveCodeAction(CodeAction action) {
    Optional<Stubs.Ticket> ticket = Stubs.Ticket.of(action.getData());
    return requests.ask(
        new TextDocumentIdentifier(ticket.map(Stubs.Ticket::uri).orElse("")),
        ticket,
        Question.Reach.PAIRS,
        known ->
            stubs(ticket.get().uri())
                .resolved(known, ticket.get())
                .orElseThrow(Requests::modified));
  }

  @Override
  public CompletableFuture<List<? extends CodeLens>> codeLens(CodeLensParams params) {
    return requests.ask(
        params.getTextDocument(),
        Optional.of(params),
        Question.Reach.PAIRS,
        known -> views.lenses().wanted() ? Lenses.of(known) : List.of());
  }

  @Override
  public CompletableFuture<List<InlayHint>> inlayHint(InlayHintParams params) {
    return requests.ask(
        params.getTextDocument(),
        Optional.ofNullable(params.getRange()),
        Question.Reach.PAIRS,
        known ->
            views.hints().wanted()
                ? new Hints(conversion.client().encoding()).within(known, params.getRange())
                : List.of());
  }

  @Override
  public CompletableFuture<DocumentDiagnosticReport> diagnostic(DocumentDiagnosticParams params) {
    TextDocumentIdentifier document = params.getTextDocument();
    boolean related = conversion != null && conversion.client().pullsRelated();
    return requests.askFindings(
        document,
        known ->
            board.report(
                document.getUri(),
                params.getPreviousResultId(),
                related ? known.others() : List.of()));
  }

  private <T> CompletableFuture<T> ask(
      TextDocumentPositionParams params, Function<Answer, T> convert) {
    return ask(params, Question.Reach.PAIRS, (known, offset) -> convert.apply(known.at(offset)));
  }

  private <T> CompletableFuture<T> ask(
      TextDocumentPositionParams params,
      Question.Reach reach,
      BiFunction<Known, Integer, T> convert) {
    Position position = params.getPosition();
    return requests.ask(
        params.getTextDocument(),
        Optional.ofNullable(position),
        reach,
        known -> convert.apply(known, offset(known, position)));
  }

  private int offset(Known known, Position position) {
    return conversion.client().encoding().offset(known.text(), position);
  }
}
