package dev.tallystick.lsp;

import com.google.gson.Gson;
import com.google.gson.JsonElement;
import com.google.gson.JsonParseException;
import dev.tallystick.aid.LineEdit;
import dev.tallystick.aid.Stub;
import dev.tallystick.aid.Wanted;
import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import dev.tallystick.engine.Known;
import dev.tallystick.engine.Settled;
import dev.tallystick.text.Span;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.eclipse.lsp4j.CodeAction;
import org.eclipse.lsp4j.CodeActionKind;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.Range;

/**
 * Offers to put sentences of the source into the translation, to be translated there.
 *
 * @param client what it can take
 * @param board what it shows
 * @param uri the file that is asked about
 */
record Stubs(Client client, Board board, String uri) {
  /**
   * What an action that is worked out later needs for it.
   *
   * @param uri the file that was asked about
   * @param range the place
   * @param title tells it from the others there
   * @param first likewise: the index of its first sentence
   * @param texts tells whether the texts are still the same
   */
  record Ticket(String uri, Range range, String title, int first, String texts) {
    /** What a client sent back; empty if it is none of ours. */
    static Optional<Ticket> of(Object data) {
      try {
        return Optional.ofNullable(new Gson().fromJson((JsonElement) data, Ticket.class))
            .filter(ticket -> ticket.uri() != null && ticket.range() != null)
            .filter(ticket -> ticket.title() != null && ticket.texts() != null);
      } catch (JsonParseException | ClassCastException e) {
        return Optional.empty();
      }
    }
  }

  /** An action with the edit that it makes. */
  private record Offer(CodeAction action, Path target, int first, List<LineEdit> edits) {
    boolean is(Ticket ticket) {
      return action.getTitle().equals(ticket.title()) && first == ticket.first();
    }
  }

  /** What can be done at a place; without the edits where the client asks for them later. */
  List<CodeAction> at(Known known, Range range) {
    List<CodeAction> actions = new ArrayList<>();
    for (Offer offer : offers(known, range)) {
      if (client.resolvesEdits()) {
        String title = offer.action().getTitle();
        offer.action().setData(new Ticket(uri, range, title, offer.first(), texts(known)));
      } else {
        addEdit(known, offer);
      }
      actions.add(offer.action());
    }
    return actions;
  }

  /** The same action with its edit; empty if the texts have changed since. */
  Optional<CodeAction> resolved(Known known, Ticket ticket) {
    return offers(known, ticket.range()).stream()
        .filter(offer -> offer.is(ticket))
        .filter(offer -> texts(known).equals(ticket.texts()))
        .findFirst()
        .map(offer -> addEdit(known, offer));
  }

  private CodeAction addEdit(Known known, Offer offer) {
    offer
        .action()
        .setEdit(
            new Edits(client)
                .of(known.uri(offer.target()), known.version(offer.target()), offer.edits()));
    return offer.action();
  }

  private static String texts(Known known) {
    StringBuilder texts = new StringBuilder();
    for (Settled pair : known.own()) {
      texts.append(pair.result().source().text().hashCode()).append(' ');
      texts.append(pair.result().target().text().hashCode()).append(' ');
    }
    return texts.toString();
  }

  private List<Offer> offers(Known known, Range range) {
    int start = client.encoding().offset(known.text(), range.getStart());
    int end = client.encoding().offset(known.text(), range.getEnd());
    Span stretch = new Span(start, Math.max(start, end));
    List<Offer> offers = new ArrayList<>();
    for (Settled pair : known.own()) {
      OnSide side = known.side(pair);
      for (Wanted wanted : Wanted.at(pair.result(), side, stretch)) {
        List<LineEdit> edits =
            Stub.edits(pair.result(), pair.result().target().format(), wanted.segments());
        if (!edits.isEmpty()) {
          CodeAction action = action(known, pair, wanted);
          offers.add(new Offer(action, pair.files().target(), wanted.segments().get(0), edits));
        }
      }
    }
    return offers;
  }

  private CodeAction action(Known known, Settled pair, Wanted wanted) {
    CodeAction action = new CodeAction(title(known, pair, wanted));
    action.setKind(CodeActionKind.QuickFix);
    OnSide side = known.side(pair);
    wanted.finding().ifPresent(finding -> action.setDiagnostics(shown(finding, side)));
    return action;
  }

  /** The marks in this file that the finding is shown by. */
  private List<Diagnostic> shown(Finding finding, OnSide side) {
    String message = finding.side() == side ? finding.message() : finding.counterMessage();
    return board.posted(uri).diagnostics().stream()
        .filter(shown -> shown.getMessage().isLeft())
        .filter(shown -> shown.getMessage().getLeft().equals(message))
        .toList();
  }

  private static String title(Known known, Settled pair, Wanted wanted) {
    List<Integer> segments = wanted.segments();
    long number =
        segments.stream().filter(i -> !pair.result().source().segments().get(i).verbatim()).count();
    String what =
        switch (wanted.reason()) {
          case MISSING ->
              number == 1 ? "the missing sentence" : "the " + number + " missing sentences";
          case PENDING -> number == 1 ? "this sentence" : "these " + number + " sentences";
          case NEXT -> "the next sentence";
        };
    String language = known.own().size() == 1 ? "" : pair.spoken().targetLanguage().name() + " ";
    return "Put " + what + " into the " + language + "translation, to be translated";
  }
}
