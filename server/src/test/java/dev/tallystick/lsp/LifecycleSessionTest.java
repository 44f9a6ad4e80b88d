package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.eclipse.lsp4j.GeneralClientCapabilities;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.LocationLink;
import org.eclipse.lsp4j.ServerCapabilities;
import org.eclipse.lsp4j.TextDocumentSyncKind;
import org.eclipse.lsp4j.TextDocumentSyncOptions;
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
}
