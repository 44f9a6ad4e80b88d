package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.Gson;
import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import com.google.gson.JsonPrimitive;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A session as lines: what the client sends, and what comes of it before it sends more.
 *
 * <pre>
 * > #1 method {key: value}    a request with its id; without one, a notification
 * >> {"any": "text"}          a message of exactly this; \xFF is a byte
 * >>> Content-Length: 2\r\n   bytes without a header of their own
 * < #1 result null            an answer; "..." stands for any more of it, so in all these
 * < #1 error -32601 words     a refusal
 * < shown DE 2 omission       findings published for a file, with its version or -
 * < said words                a message to the user
 * begin                       initialize and initialized, by a client that can do nothing special
 * open                        the German file in version 1, of which an omission comes
 * hold, release               workers wait from here to there
 * bytewise                    the next message is sent byte by byte
 * ends 0                      the session is over with this code
 * </pre>
 *
 * <p>In what is sent {@code $DE} and {@code $EN} are the files' names, {@code $GERMAN} the German
 * text without a sentence, {@code $AT} a position in it, {@code $HUGE} many megabytes of it.
 */
final class Protocol implements AutoCloseable {
  private static final Pattern SENT =
      Pattern.compile("(?:#(?<id>\\S+) )?(?<method>\\S+)(?: (?<params>.*))?");
  private static final Pattern ESCAPE = Pattern.compile("\\\\(r|n|x[0-9A-F]{2})");
  private static final int HUGE = 2_000_000;

  private final Telegraph telegraph = new Telegraph();
  private final Work work;
  private final List<String> expected = new ArrayList<>();
  private boolean bytewise;

  Protocol(Work work) {
    this.work = work;
  }

  /** Plays the lines; the messages that come must be those expected, no more and no fewer. */
  void play(List<String> lines) {
    boolean sent = false;
    for (String line : lines) {
      if (sent && !line.startsWith("<") && !expected.isEmpty()) {
        check();
      }
      if (line.startsWith("< ")) {
        expected.add(line.substring(2));
      } else {
        act(line);
      }
      sent = true;
    }
    check();
  }

  private void act(String line) {
    if (line.startsWith(">>> ")) {
      send(bytes(line.substring(4)));
    } else if (line.startsWith(">> ")) {
      send(Telegraph.frame(bytes(line.substring(3))));
    } else if (line.startsWith("> ")) {
      send(Telegraph.frame(message(line.substring(2)).getBytes(StandardCharsets.UTF_8)));
    } else {
      direct(line);
    }
  }

  private void direct(String line) {
    switch (line) {
      case "begin" -> begin();
      case "open" -> open();
      case "hold" -> telegraph.machine.hold();
      case "release" -> {
        telegraph.call();
        telegraph.machine.release();
      }
      case "bytewise" -> bytewise = true;
      case "hang up" -> telegraph.hangUp();
      default -> {
        int code = Integer.parseInt(line.replaceFirst("ends ", ""));
        assertEquals(code, telegraph.ended.orTimeout(60, TimeUnit.SECONDS).join());
      }
    }
  }

  private void begin() {
    act("> #begin initialize {rootUri: $ROOT, capabilities: {}}");
    expected.add("#begin result {\"capabilities\":...");
    act("> initialized {}");
    check();
  }

  private void open() {
    act(
        "> textDocument/didOpen {textDocument:"
            + " {uri: $DE, languageId: markdown, version: 1, text: $GERMAN}}");
    expected.add("shown DE 1 omission");
    expected.add("shown EN - omission");
    check();
  }

  private void send(byte[] bytes) {
    if (!bytewise) {
      telegraph.send(bytes);
      return;
    }
    for (byte b : bytes) {
      telegraph.send(new byte[] {b});
    }
    bytewise = false;
  }

  private String message(String line) {
    Matcher sent = SENT.matcher(line);
    if (!sent.matches()) {
      throw new IllegalArgumentException(line);
    }
    JsonObject message = new JsonObject();
    message.addProperty("jsonrpc", "2.0");
    if (sent.group("id") != null) {
      message.addProperty("id", sent.group("id"));
    }
    message.addProperty("method", sent.group("method"));
    if (sent.group("params") != null) {
      message.add("params", JsonParser.parseString(filled(sent.group("params"))));
    }
    return message.toString();
  }

  private String filled(String text) {
    return text.replace("$ROOT", quoted(work.folder().toUri().toString()))
        .replace("$DE", quoted(work.de().toUri().toString()))
        .replace("$EN", quoted(work.en().toUri().toString()))
        .replace("$GERMAN", quoted(Ferry.DE_WITHOUT_FOG))
        .replace("$HUGE", quoted(Ferry.DE_WITHOUT_FOG + "\n<!-- " + "ö".repeat(HUGE) + " -->\n"))
        .replace("$AT", "{line: 4, character: 3}");
  }

  private static String quoted(String text) {
    return new Gson().toJson(text);
  }

  /** A text in bytes; an escape for a byte stands for it. */
  private byte[] bytes(String escaped) {
    String text = filled(escaped);
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    Matcher escape = ESCAPE.matcher(text);
    int from = 0;
    while (escape.find()) {
      bytes.writeBytes(text.substring(from, escape.start()).getBytes(StandardCharsets.UTF_8));
      switch (escape.group(1)) {
        case "r" -> bytes.write('\r');
        case "n" -> bytes.write('\n');
        default -> bytes.write(Integer.parseInt(escape.group(1).substring(1), 16));
      }
      from = escape.end();
    }
    bytes.writeBytes(text.substring(from).getBytes(StandardCharsets.UTF_8));
    return bytes.toByteArray();
  }

  /** Compares what has come with what is expected, in any order. */
  private void check() {
    List<String> came = new ArrayList<>();
    telegraph.take().forEach(message -> came.add(told(message)));
    List<String> left = new ArrayList<>(came);
    List<String> missing = new ArrayList<>();
    for (String one : expected) {
      boolean found =
          left.stream().filter(told -> fits(one, told)).findFirst().map(left::remove).orElse(false);
      if (!found) {
        missing.add(one);
      }
    }
    if (!left.isEmpty() || !missing.isEmpty()) {
      assertEquals(String.join("\n", expected), String.join("\n", came));
    }
    expected.clear();
  }

  private static boolean fits(String expected, String told) {
    return expected.endsWith("...")
        ? told.startsWith(expected.substring(0, expected.length() - 3))
        : told.equals(expected);
  }

  private String told(JsonObject message) {
    if (!message.has("method")) {
      String id = "#" + message.get("id").toString().replace("\"", "");
      JsonObject error = message.getAsJsonObject("error");
      return error == null
          ? id + " result " + message.get("result")
          : id + " error " + error.get("code") + " " + error.get("message").getAsString();
    }
    JsonObject params = message.getAsJsonObject("params");
    return switch (message.get("method").getAsString()) {
      case "textDocument/publishDiagnostics" -> shown(params);
      case "window/showMessage" -> "said " + params.get("message").getAsString();
      case "window/logMessage" -> "logged " + params.get("message").getAsString();
      default -> message.get("method").getAsString() + " " + params;
    };
  }

  private String shown(JsonObject params) {
    String uri = params.get("uri").getAsString();
    String name = uri.endsWith("/de/ferry.md") ? "DE" : uri.endsWith("/en/ferry.md") ? "EN" : uri;
    JsonElement version = params.get("version");
    StringBuilder shown = new StringBuilder("shown " + name + " ");
    shown.append(version == null || version.isJsonNull() ? "-" : version.toString());
    JsonArray diagnostics = params.getAsJsonArray("diagnostics");
    for (JsonElement diagnostic : diagnostics) {
      JsonObject one = diagnostic.getAsJsonObject();
      assertTrue(
          one.get("message") instanceof JsonPrimitive, "a message that is no string: " + one);
      shown.append(' ').append(one.get("code").getAsString());
    }
    return shown.toString();
  }

  @Override
  public void close() {
    telegraph.close();
  }
}
