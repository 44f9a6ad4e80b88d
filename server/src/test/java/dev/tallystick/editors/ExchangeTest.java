package dev.tallystick.editors;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** What passed is read as it was sent, and each answer is held against the text it is about. */
class ExchangeTest {
  private static final String OPENED =
      """
      {"method": "textDocument/didOpen", "params":
        {"textDocument": {"uri": "file:///a.md", "version": 1, "text": "🪁 up\\r\\nand\\r\\n"}}}
      """;

  private static final String CHANGED =
      """
      {"method": "textDocument/didChange", "params":
        {"textDocument": {"uri": "file:///a.md", "version": 2}, "contentChanges": [
          {"range": {"start": {"line": 1, "character": 3}, "end": {"line": 2, "character": 0}},
            "text": "!"},
          {"range": {"start": {"line": 0, "character": 0}, "end": {"line": 0, "character": 2}},
            "text": "🪁🪁"}]}}
      """;

  private static final String ASKED =
      """
      {"id": 7, "method": "hover", "params": {"textDocument": {"uri": "file:///a.md"}}}
      """;

  private static final String ANSWERED =
      """
      {"id": 7, "result": {"line": 0, "character": 2}}
      """;

  @Test
  void editsAreFollowed() {
    Exchange exchange = new Exchange(wire(OPENED, CHANGED), Map.of());
    assertEquals(Map.of("file:///a.md", "🪁🪁 up\r\nand!"), exchange.open());
  }

  @Test
  void anAnswerIsAboutTheTextAtItsPlace() {
    assertEquals(0, wrong(ANSWERED, OPENED, ASKED, CHANGED));
    assertEquals(0, wrong(ANSWERED, OPENED, CHANGED, ASKED));
    String later = ANSWERED.replace("2}", "7}");
    assertEquals(1, wrong(later, OPENED, ASKED, CHANGED));
    assertEquals(0, wrong(later, OPENED, CHANGED, ASKED));
  }

  @Test
  void diagnosticsAreAboutTheirVersion() {
    String published =
        """
        {"method": "textDocument/publishDiagnostics",
          "params": {"uri": "file:///a.md", "version": %d, "at": {"line": 0, "character": 7}}}
        """;
    assertEquals(1, wrong(published.formatted(1), OPENED, CHANGED));
    assertEquals(0, wrong(published.formatted(2), OPENED, CHANGED));
  }

  private static int wrong(String sent, String... toServer) {
    return new Exchange(wire(toServer), Map.of()).places(wire(sent)).wrong().size();
  }

  @Test
  void theLastMessageMayBeCut() {
    String framed = framed(OPENED) + framed(ASKED);
    byte[] bytes = framed.getBytes(StandardCharsets.UTF_8);
    assertEquals(2, Wire.of(bytes).messages().size());
    assertEquals(1, Wire.of(Arrays.copyOf(bytes, bytes.length - 1)).messages().size());
  }

  private static Wire wire(String... messages) {
    String all = String.join("", List.of(messages).stream().map(ExchangeTest::framed).toList());
    return Wire.of(all.getBytes(StandardCharsets.UTF_8));
  }

  private static String framed(String message) {
    int length = message.getBytes(StandardCharsets.UTF_8).length;
    return "Content-Length: " + length + "\r\n\r\n" + message;
  }
}
