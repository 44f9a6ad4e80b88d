package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletionException;
import org.eclipse.lsp4j.CodeAction;
import org.eclipse.lsp4j.CodeActionCapabilities;
import org.eclipse.lsp4j.CodeActionContext;
import org.eclipse.lsp4j.CodeActionKindCapabilities;
import org.eclipse.lsp4j.CodeActionLiteralSupportCapabilities;
import org.eclipse.lsp4j.CodeActionParams;
import org.eclipse.lsp4j.CodeActionResolveSupportCapabilities;
import org.eclipse.lsp4j.Diagnostic;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;
import org.eclipse.lsp4j.TextDocumentEdit;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.TextEdit;
import org.eclipse.lsp4j.WorkspaceEdit;
import org.eclipse.lsp4j.WorkspaceEditCapabilities;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.messages.Either;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The action that puts a sentence into the translation, to be translated there. */
class StubSessionTest {
  private static final String MISSING =
      "Put the missing sentence into the translation, to be translated";

  @TempDir Path folder;
  private Work work;

  @BeforeEach
  void work() {
    work = Work.withoutFog(folder);
  }

  /** A client that takes actions, with their edits at once. */
  private static void takesActions(InitializeParams params) {
    CodeActionCapabilities actions =
        new CodeActionCapabilities(
            new CodeActionLiteralSupportCapabilities(
                new CodeActionKindCapabilities(List.of("quickfix"))),
            false);
    params.getCapabilities().getTextDocument().setCodeAction(actions);
  }

  /** One that asks for the edit later, and wants to know of which version it is. */
  private static void resolves(InitializeParams params) {
    takesActions(params);
    CodeActionCapabilities actions = params.getCapabilities().getTextDocument().getCodeAction();
    actions.setDataSupport(true);
    actions.setResolveSupport(new CodeActionResolveSupportCapabilities(List.of("edit")));
    WorkspaceEditCapabilities edits = new WorkspaceEditCapabilities();
    edits.setDocumentChanges(true);
    params.getCapabilities().getWorkspace().setWorkspaceEdit(edits);
  }

  private static List<CodeAction> ask(Talk talk, Buffer buffer, Range range, String... only) {
    // Clients send other diagnostics than they were sent, in other columns: they do not matter.
    Diagnostic wrong = new Diagnostic(new Range(new Position(9, 9), new Position(9, 9)), "?");
    CodeActionContext context = new CodeActionContext(List.of(wrong));
    if (only.length > 0) {
      context.setOnly(List.of(only));
    }
    return Talk.answer(
            talk.server
                .getTextDocumentService()
                .codeAction(
                    new CodeActionParams(new TextDocumentIdentifier(buffer.uri), range, context)))
        .stream()
        .map(Either::getRight)
        .toList();
  }

  private static Range caret(Buffer buffer, String words) {
    Position at = buffer.position(buffer.text.indexOf(words));
    return new Range(at, at);
  }

  private static List<CodeAction> at(Talk talk, Buffer buffer, String words) {
    return ask(talk, buffer, caret(buffer, words));
  }

  private static List<String> titles(List<CodeAction> actions) {
    return actions.stream().map(CodeAction::getTitle).toList();
  }

  /** The edits of one file, all of whole lines. */
  private static List<TextEdit> edits(WorkspaceEdit edit, String uri) {
    List<TextEdit> edits;
    if (edit.getDocumentChanges() == null) {
      assertEquals(List.of(uri), List.copyOf(edit.getChanges().keySet()));
      edits = edit.getChanges().get(uri);
    } else {
      TextDocumentEdit document = edit.getDocumentChanges().get(0).getLeft();
      assertEquals(uri, document.getTextDocument().getUri());
      edits = document.getEdits().stream().map(Either::getLeft).toList();
    }
    for (TextEdit one : edits) {
      assertEquals(0, one.getRange().getStart().getCharacter());
      assertEquals(0, one.getRange().getEnd().getCharacter());
    }
    return edits;
  }

  private static String applied(String text, List<TextEdit> edits) {
    assertEquals(1, edits.size());
    Text lines = new Text(text);
    Range range = edits.get(0).getRange();
    int from = Encoding.UTF_16.offset(lines, range.getStart());
    int to = Encoding.UTF_16.offset(lines, range.getEnd());
    return text.substring(0, from) + edits.get(0).getNewText() + text.substring(to);
  }

  @Test
  void atTheMissingSentenceAndAtTheGapTheSameIsOffered() {
    try (Talk talk = Talk.in(folder, StubSessionTest::takesActions)) {
      var provider = talk.initialized.getCapabilities().getCodeActionProvider().getRight();
      assertEquals(List.of("quickfix"), provider.getCodeActionKinds());
      Buffer english = talk.open(work.en(), Ferry.EN);
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      String cart = "Karren kosten 2 Marken.\n";
      Range line =
          new Range(
              german.position(german.text.indexOf(cart)),
              german.position(german.text.indexOf(cart) + cart.length()));
      for (Buffer side : List.of(english, german)) {
        List<CodeAction> actions = at(talk, side, side == english ? "bell is rung" : "Marken.\n");
        assertEquals(List.of(MISSING), titles(actions));
        CodeAction action = actions.get(0);
        assertEquals("quickfix", action.getKind());
        assertEquals(talk.shown(side.uri), action.getDiagnostics());
        TextEdit edit = edits(action.getEdit(), german.uri).get(0);
        assertEquals(line, edit.getRange());
        assertEquals(cart + Ferry.FOG_EN + "\n", edit.getNewText());
      }
    }
  }

  /** The name of a buffer says nothing of its format. */
  @Test
  void marksComeAlongIntoABufferWithoutAFile() {
    String text = Ferry.EN.replace("In thick fog", "In **thick** fog");
    Path notes = work.write("notes.md", text);
    try (Talk talk = Talk.in(folder, StubSessionTest::takesActions)) {
      Buffer english = talk.open(notes, text);
      Buffer scratch = talk.open("untitled:Untitled-1", Ferry.DE_WITHOUT_FOG);
      talk.command("tallystick.pair", Map.of("source", english.uri, "target", scratch.uri));
      CodeAction action = at(talk, english, "fog the bell").get(0);
      String now = applied(scratch.text, edits(action.getEdit(), scratch.uri));
      assertTrue(now.contains("\nIn **thick** fog the bell"), now);
    }
  }

  @Test
  void afterTheEditTheSentenceIsUntranslatedAndNotMissing() {
    try (Talk talk = Talk.in(folder, StubSessionTest::takesActions)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      CodeAction action = at(talk, english, "thick fog").get(0);
      german.whole(applied(german.text, edits(action.getEdit(), german.uri)));
      talk.pass(2000);

      assertEquals(Ferry.DE.replace(Ferry.FOG_DE, Ferry.FOG_EN), german.text);
      assertEquals(List.of(), talk.codes(work.en()));
      assertEquals(List.of("untranslated"), talk.codes(work.de()));
      assertEquals(List.of(), at(talk, english, "thick fog"));
    }
  }

  @Test
  void theEditComesWhenItIsAskedForIfTheClientAsks() {
    try (Talk talk = Talk.in(folder, StubSessionTest::resolves)) {
      assertTrue(
          talk.initialized
              .getCapabilities()
              .getCodeActionProvider()
              .getRight()
              .getResolveProvider());
      Buffer english = talk.open(work.en(), Ferry.EN);
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      german.replace("ächzt", "stöhnt");
      CodeAction action = at(talk, english, "thick fog").get(0);
      assertNull(action.getEdit());
      CodeAction resolved =
          Talk.answer(talk.server.getTextDocumentService().resolveCodeAction(action));

      assertEquals(MISSING, resolved.getTitle());
      assertEquals(
          2,
          resolved.getEdit().getDocumentChanges().get(0).getLeft().getTextDocument().getVersion());
      assertTrue(
          applied(german.text, edits(resolved.getEdit(), german.uri))
              .contains("2 Marken.\n" + Ferry.FOG_EN + "\nKlemmt"));
    }
  }

  @Test
  void whatIsAskedForAfterAnEditIsRefused() {
    try (Talk talk = Talk.in(folder, StubSessionTest::resolves)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      CodeAction action = at(talk, english, "thick fog").get(0);
      german.replace("ächzt", "stöhnt");
      assertRefused(talk, action, ResponseErrorCode.ContentModified);

      action.setData(List.of("of another server"));
      assertRefused(talk, action, ResponseErrorCode.InvalidParams);
      action.setData(null);
      assertRefused(talk, action, ResponseErrorCode.InvalidParams);
    }
  }

  private static void assertRefused(Talk talk, CodeAction action, ResponseErrorCode code) {
    CompletionException failure =
        assertThrows(
            CompletionException.class,
            () -> Talk.answer(talk.server.getTextDocumentService().resolveCodeAction(action)));
    ResponseErrorException error = (ResponseErrorException) failure.getCause();
    assertEquals(code.getValue(), error.getResponseError().getCode());
  }

  @Test
  void aTranslationThatIsNotOpenIsNamedWithoutAVersion() {
    try (Talk talk = Talk.in(folder, StubSessionTest::resolves)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      CodeAction action = at(talk, english, "thick fog").get(0);
      CodeAction resolved =
          Talk.answer(talk.server.getTextDocumentService().resolveCodeAction(action));
      TextDocumentEdit edit = resolved.getEdit().getDocumentChanges().get(0).getLeft();

      assertEquals(work.de().toUri().toString(), edit.getTextDocument().getUri());
      assertNull(edit.getTextDocument().getVersion());
    }
  }

  @Test
  void aTranslationThatIsOnNoDiskYetIsEditedAllTheSame() {
    work.delete("de/ferry.md");
    try (Talk talk = Talk.in(folder, StubSessionTest::takesActions)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      Buffer german = talk.open(work.de(), "");
      List<CodeAction> actions = at(talk, english, "The chain ferry\n");

      assertEquals(
          List.of("Put this sentence into the translation, to be translated"), titles(actions));
      assertEquals("# The chain ferry\n", applied("", edits(actions.get(0).getEdit(), german.uri)));
    }
  }

  @Test
  void whatIsStillToComeCanBePutInFromBothSides() {
    String text = Ferry.DE.substring(0, Ferry.DE.indexOf("\nAm Ende des"));
    try (Talk talk = Talk.in(folder, StubSessionTest::takesActions)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      Buffer german = talk.open(work.de(), text);
      String end = "At the end of the day";
      int last = Ferry.EN.indexOf("In winter");
      Range three = new Range(english.position(Ferry.EN.indexOf(end)), english.position(last + 3));

      CodeAction many = ask(talk, english, three).get(0);
      assertEquals("Put these 3 sentences into the translation, to be translated", many.getTitle());
      assertNull(many.getDiagnostics());
      assertEquals(
          text + "\n" + Ferry.line(Ferry.EN, end) + "\n",
          applied(text, edits(at(talk, english, end).get(0).getEdit(), german.uri)));

      Position behind = german.position(text.length());
      CodeAction next = ask(talk, german, new Range(behind, behind)).get(0);
      assertEquals("Put the next sentence into the translation, to be translated", next.getTitle());
      german.whole(applied(text, edits(next.getEdit(), german.uri)));
      assertEquals(text + "\n" + Ferry.line(Ferry.EN, end) + "\n", german.text);
      talk.pass(2000);
      assertEquals(List.of(), talk.codes(work.de()), "pending, as it was");
      CodeAction after = at(talk, german, "water.").get(0);
      assertEquals(
          german.text + Ferry.line(Ferry.EN, "The last keeper") + "\n",
          applied(german.text, edits(after.getEdit(), german.uri)));
    }
  }

  @Test
  void severalLanguagesAreNamed() {
    work.write("fr/ferry.md", Ferry.FR_WITHOUT_FOG);
    try (Talk talk = Talk.in(folder, StubSessionTest::takesActions)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      assertEquals(
          List.of(
              "Put the missing sentence into the German translation, to be translated",
              "Put the missing sentence into the French translation, to be translated"),
          titles(at(talk, english, "thick fog")));
    }
  }

  @Test
  void severalGapsInOneStretchAreToldApart() {
    String text = Ferry.DE_WITHOUT_FOG.replace(JumpSessionTest.WINCH_DE + "\n", "");
    try (Talk talk = Talk.in(folder, StubSessionTest::resolves)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      Buffer german = talk.open(work.de(), text);
      Range all = new Range(new Position(0, 0), new Position(99, 0));
      List<CodeAction> actions = ask(talk, english, all);
      assertEquals(List.of(MISSING, MISSING), titles(actions));
      List<String> put =
          actions.stream()
              .map(
                  action ->
                      Talk.answer(talk.server.getTextDocumentService().resolveCodeAction(action)))
              .map(action -> applied(text, edits(action.getEdit(), german.uri)))
              .toList();
      assertTrue(put.get(0).contains(JumpSessionTest.WINCH_EN));
      assertTrue(put.get(1).contains(Ferry.FOG_EN));
    }
  }

  @Test
  void linesEndAsTheDocumentHasThemAndTheLastNeedsNoEnd() {
    String text =
        Ferry.DE.replace(Ferry.line(Ferry.DE, "Eine Laterne"), "").strip().replace("\n", "\r\n")
            + "\r\nHier endet der Text.";
    work.write("en/ferry.md", Ferry.EN + "Here ends the text.\n");
    try (Talk talk = Talk.in(folder, StubSessionTest::takesActions)) {
      Buffer german = talk.open(work.de(), text);
      Buffer english = talk.open(work.en(), Ferry.EN + "Here ends the text.\n");
      String after =
          applied(text, edits(at(talk, english, "A lantern").get(0).getEdit(), german.uri));

      assertTrue(
          after.endsWith(
              "bedeckt.\r\n" + Ferry.line(Ferry.EN, "A lantern") + "\r\nHier endet der Text."),
          after);
      assertTrue(after.replace("\r\n", "").indexOf('\n') < 0);
    }
  }

  @Test
  void aClientThatCountsBytesIsUnderstood() {
    String text = Ferry.EN.replace("In thick fog", "🌫 In thick fog");
    work.write("en/ferry.md", text);
    try (Talk talk =
        Talk.in(
            folder,
            params -> {
              takesActions(params);
              LifecycleSessionTest.offer(params, "utf-8");
            })) {
      Buffer english = talk.open(work.en(), text);
      int line = english.position(text.indexOf("🌫")).getLine();
      for (int column = 0; column <= 4; column++) {
        Position at = new Position(line, column);
        List<CodeAction> actions = ask(talk, english, new Range(at, at));
        assertEquals(List.of(MISSING), titles(actions));
        assertTrue(
            edits(actions.get(0).getEdit(), work.de().toUri().toString())
                .get(0)
                .getNewText()
                .contains("\n🌫 In thick fog"));
      }
    }
  }

  @Test
  void whoAsksForOtherKindsGetsNone() {
    try (Talk talk = Talk.in(folder, StubSessionTest::takesActions)) {
      Buffer english = talk.open(work.en(), Ferry.EN);
      Range fog = caret(english, "thick fog");
      assertEquals(List.of(), ask(talk, english, fog, "refactor", "source"));
      assertEquals(1, ask(talk, english, fog, "refactor", "quickfix").size());
      assertEquals(1, ask(talk, english, fog, "").size());
    }
  }

  @Test
  void whereNothingIsMissingNothingIsOffered() {
    Path notes = work.write("notes.md", Ferry.EN);
    try (Talk talk = Talk.in(folder, StubSessionTest::takesActions)) {
      assertEquals(List.of(), at(talk, talk.open(work.en(), Ferry.EN), "Two keepers"));
      assertEquals(List.of(), at(talk, talk.open(work.de(), Ferry.DE_WITHOUT_FOG), "An Bord"));
      assertEquals(List.of(), at(talk, talk.open(notes, Ferry.EN), "thick fog"));
    }
  }

  @Test
  void aClientThatKnowsNoActionsIsOfferedNone() {
    try (Talk talk = Talk.in(folder)) {
      assertNull(talk.initialized.getCapabilities().getCodeActionProvider());
      assertNotNull(talk.initialized.getCapabilities().getDefinitionProvider());
    }
  }
}
