package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletionException;
import org.eclipse.lsp4j.GeneralClientCapabilities;
import org.eclipse.lsp4j.HoverParams;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.LocationLink;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.ServerCapabilities;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.TextDocumentSyncKind;
import org.eclipse.lsp4j.TextDocumentSyncOptions;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Beginning and end of a session. */
class LifecycleSessionTest {
  @TempDir Path folder;

  @Test
  void theServerSaysWhatItIsAndCan() {
    try (Talk talk = Talk.in(folder)) {
      assertEquals("Tallystick", talk.initialized.getServerInfo().getName());
      assertEquals("0.0-test", talk.initialized.getServerInfo().getVersion());
      ServerCapabilities can = talk.initialized.getCapabilities();
      TextDocumentSyncOptions sync = can.getTextDocumentSync().getRight();
      assertEquals(TextDocumentSyncKind.Incremental, sync.getChange());
      assertTrue(sync.getOpenClose());
      assertTrue(can.getDefinitionProvider().getLeft());
      assertTrue(can.getHoverProvider().getLeft());
      assertTrue(can.getDocumentHighlightProvider().getLeft());
      assertNull(can.getPositionEncoding());
      assertNull(can.getDiagnosticProvider());
    }
  }

  @Test
  void theEncodingIsUtf16WhereTheClientLetsUsChoose() {
    assertEquals("utf-16", encoding("utf-32", "utf-8", "utf-16"));
    assertEquals("utf-8", encoding("utf-8"));
    assertEquals("utf-16", encoding("utf-32"));
  }

  private String encoding(String... offered) {
    try (Talk talk = Talk.in(folder, params -> offer(params, offered))) {
      return talk.initialized.getCapabilities().getPositionEncoding();
    }
  }

  static void offer(InitializeParams params, String... offered) {
    GeneralClientCapabilities general = new GeneralClientCapabilities();
    general.setPositionEncodings(List.of(offered));
    params.getCapabilities().setGeneral(general);
  }

  @Test
  void aClientThatCountsBytesGetsBytes() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder, params -> offer(params, "utf-8"))) {
      LocationLink there = talk.open(work.en(), Ferry.EN).jump("Two keepers");
      assertEquals(
          Ferry.line(Ferry.DE, "An Bord").getBytes(StandardCharsets.UTF_8).length,
          there.getTargetRange().getEnd().getCharacter());
    }
  }

  @Test
  void exitAfterShutdownIsFine() {
    Talk talk = Talk.in(folder);
    assertNull(Talk.answer(talk.server.shutdown()));
    talk.server.exit();
    assertEquals(0, Talk.answer(talk.ended));
  }

  @Test
  void exitWithoutShutdownIsNot() {
    Talk talk = Talk.in(folder);
    talk.server.exit();
    assertEquals(1, Talk.answer(talk.ended));
  }

  @Test
  void endOfInputAfterShutdownIsFine() throws IOException {
    Talk talk = Talk.in(folder);
    assertNull(Talk.answer(talk.server.shutdown()));
    talk.hangUp();
    assertEquals(0, Talk.answer(talk.ended));
  }

  @Test
  void endOfInputWithoutShutdownIsNot() throws IOException {
    Talk talk = Talk.in(folder);
    talk.hangUp();
    assertEquals(1, Talk.answer(talk.ended));
  }

  @Test
  void endOfInputBeforeAnythingIsNot() throws IOException {
    Talk talk = Talk.silent();
    talk.hangUp();
    assertEquals(1, Talk.answer(talk.ended));
  }

  @Test
  void aRequestBeforeTheSessionHasBegunIsRefused() {
    try (Talk talk = Talk.silent()) {
      assertEquals(ResponseErrorCode.ServerNotInitialized.getValue(), refusal(talk));
      talk.begin(Talk.params());
      talk.settle();
    }
  }

  @Test
  void aRequestAfterShutdownIsRefused() {
    try (Talk talk = Talk.in(folder)) {
      Talk.answer(talk.server.shutdown());
      assertEquals(ResponseErrorCode.InvalidRequest.getValue(), refusal(talk));
    }
  }

  private static int refusal(Talk talk) {
    HoverParams params =
        new HoverParams(new TextDocumentIdentifier("file:///x.md"), new Position(0, 0));
    CompletionException refused =
        assertThrows(
            CompletionException.class,
            () -> Talk.answer(talk.server.getTextDocumentService().hover(params)));
    return ((ResponseErrorException) refused.getCause()).getResponseError().getCode();
  }

  @Test
  void aRequestThatNamesNoPlaceIsRefused() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      Talk.answer(
          talk.raw("textDocument/hover", Map.of("textDocument", Map.of("uri", german.uri)))
              .handle((answer, refusal) -> answer));
      assertEquals(
          ResponseErrorCode.InvalidParams.getValue(),
          talk.responses.get(talk.responses.size() - 1).getError().getCode());
    }
  }

  @Test
  void messagesThatMakeNoSenseAreLetPass() {
    Work work = Work.withoutFog(folder);
    try (Talk talk = Talk.in(folder)) {
      talk.tellRaw("textDocument/didOpen", Map.of("textDocument", Map.of("uri", "file:///x.md")));
      talk.tellRaw("textDocument/didChange", Map.of());
      talk.tellRaw("workspace/didChangeWorkspaceFolders", Map.of("event", Map.of()));
      talk.tellRaw("workspace/didChangeConfiguration", Map.of("settings", 7));
      talk.tellRaw("$/unheardOf", Map.of());
      talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();

      assertEquals(List.of("omission"), talk.codes(work.de()));
    }
  }
}
