package dev.tallystick.editors;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * All that passed between an editor and the server in a session. Tells which text each message is
 * about, by the versions of the documents and by the order of the editor's messages.
 */
final class Exchange {
  private static final String PUBLISH = "textDocument/publishDiagnostics";

  private final Map<String, String> open = new HashMap<>();
  private final Map<String, String> versions = new HashMap<>();
  private final Map<String, List<String>> everHeld;
  private final Map<String, Asked> asked = new HashMap<>();

  /** A request, and the open texts at its place. */
  private record Asked(String method, String uri, Map<String, String> open) {}

  /**
   * Follows what the editor sent.
   *
   * @param onDisk what the files held on the disk, at one time or another, by their URIs
   */
  Exchange(Wire toServer, Map<String, List<String>> onDisk) {
    everHeld = new HashMap<>();
    onDisk.forEach((uri, texts) -> everHeld.put(uri, new ArrayList<>(texts)));
    toServer.messages().forEach(this::follow);
  }

  private void follow(JsonObject message) {
    String method = Wire.text(message, "method");
    JsonObject params = Wire.object(message, "params");
    JsonObject document = Wire.object(params, "textDocument");
    String uri = Wire.text(document, "uri");
    switch (method) {
      case "textDocument/didOpen" -> take(document, Wire.text(document, "text"));
      case "textDocument/didChange" -> {
        String text = open.get(uri);
        for (JsonElement change : params.getAsJsonArray("contentChanges")) {
          text = changed(text, change.getAsJsonObject());
        }
        take(document, text);
      }
      case "textDocument/didClose" -> open.remove(uri);
      default -> {
        if (message.has("id") && !method.isEmpty()) {
          // An action that is to be completed names its file in what the server added to it.
          String about = uri + Wire.text(Wire.object(params, "data"), "uri");
          asked.put(Wire.text(message, "id"), new Asked(method, about, Map.copyOf(open)));
        }
      }
    }
  }

  private void take(JsonObject document, String text) {
    String uri = Wire.text(document, "uri");
    open.put(uri, text);
    versions.put(uri + " " + Wire.text(document, "version"), text);
    everHeld.computeIfAbsent(uri, any -> new ArrayList<>()).add(text);
  }

  private static String changed(String text, JsonObject change) {
    String words = Wire.text(change, "text");
    if (!change.has("range")) {
      return words;
    }
    JsonObject range = change.getAsJsonObject("range");
    int start = offset(text, range.getAsJsonObject("start"));
    int end = offset(text, range.getAsJsonObject("end"));
    return text.substring(0, start) + words + text.substring(end);
  }

  private static int offset(String text, JsonObject position) {
    int offset = 0;
    String rest = text;
    for (int line = position.get("line").getAsInt(); line > 0; line--) {
      int length = Places.lines(rest)[0].length();
      offset += length + (rest.startsWith("\r\n", length) ? 2 : rest.length() > length ? 1 : 0);
      rest = text.substring(offset);
    }
    return offset + Math.min(position.get("character").getAsInt(), Places.lines(rest)[0].length());
  }

  /** The texts that the editor showed in the end, by their URIs. */
  Map<String, String> open() {
    return open;
  }

  /** Looks at all positions that the server sent. */
  Places places(Wire toEditor) {
    Places places = new Places(this::possible);
    for (JsonObject message : toEditor.messages()) {
      String method = Wire.text(message, "method");
      Asked request = method.isEmpty() ? asked.get(Wire.text(message, "id")) : null;
      if (request != null) {
        places.look(request.method(), request.uri(), message);
      } else {
        places.look(method, "", message);
      }
    }
    return places;
  }

  /** One text where it is known which one is meant, else all that the file ever held. */
  private List<String> possible(String uri, JsonObject message) {
    if (Wire.text(message, "method").equals(PUBLISH)) {
      JsonObject params = message.getAsJsonObject("params");
      String text = versions.get(uri + " " + Wire.text(params, "version"));
      if (text != null && Wire.text(params, "uri").equals(uri)) {
        return List.of(text);
      }
    }
    Asked request = asked.get(Wire.text(message, "id"));
    if (request != null && !message.has("method") && request.open().containsKey(uri)) {
      return List.of(request.open().get(uri));
    }
    return everHeld.getOrDefault(uri, List.of());
  }

  /** What the server refused, or could not do. */
  static List<String> errors(Wire toEditor) {
    JsonArray errors = new JsonArray();
    toEditor.messages().stream()
        .map(message -> message.get("error"))
        .filter(error -> error != null && error.isJsonObject())
        .forEach(errors::add);
    return errors.asList().stream().map(JsonElement::toString).toList();
  }
}
