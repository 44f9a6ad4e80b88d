package dev.tallystick.editors;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * The messages that passed in one direction between an editor and the server.
 *
 * @param messages in their order
 */
record Wire(List<JsonObject> messages) {
  private static final String HEADERS_END = "\r\n\r\n";
  private static final String LENGTH = "Content-Length: ";

  /** Reads what was kept. The last message may be cut: an editor that ends does not wait for it. */
  static Wire of(byte[] kept) {
    List<JsonObject> messages = new ArrayList<>();
    String bytes = new String(kept, StandardCharsets.ISO_8859_1);
    int at = 0;
    int headersEnd = bytes.indexOf(HEADERS_END);
    while (headersEnd >= 0) {
      int from = headersEnd + HEADERS_END.length();
      int to = from + length(bytes.substring(at, headersEnd));
      if (to > kept.length) {
        break;
      }
      String message = new String(kept, from, to - from, StandardCharsets.UTF_8);
      messages.add(JsonParser.parseString(message).getAsJsonObject());
      at = to;
      headersEnd = bytes.indexOf(HEADERS_END, at);
    }
    return new Wire(messages);
  }

  private static int length(String headers) {
    String line =
        headers.lines().filter(header -> header.startsWith(LENGTH)).findFirst().orElseThrow();
    return Integer.parseInt(line.substring(LENGTH.length()).strip());
  }

  /** A member that is text or a number; empty if there is none. */
  static String text(JsonObject object, String name) {
    JsonElement member = object.get(name);
    return member == null || !member.isJsonPrimitive() ? "" : member.getAsString();
  }

  /** A member that is an object; an empty one if there is none. */
  static JsonObject object(JsonObject object, String name) {
    return object.get(name) instanceof JsonObject member ? member : new JsonObject();
  }
}
