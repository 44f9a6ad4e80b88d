package dev.tallystick.editors;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.BiFunction;

/**
 * Looks at each position in what a server sent: it must lie in a line of the text, not behind its
 * end, and not between the halves of a surrogate pair.
 */
final class Places {
  private final List<String> wrong = new ArrayList<>();
  private final Map<String, Integer> telling = new TreeMap<>();
  private final BiFunction<String, JsonObject, List<String>> texts;

  /**
   * A look at positions.
   *
   * @param texts what a file, named by its URI, may have held when a message was sent; the message
   *     itself is given too
   */
  Places(BiFunction<String, JsonObject, List<String>> texts) {
    this.texts = texts;
  }

  /** Positions that are wrong, and where they came from. */
  List<String> wrong() {
    return wrong;
  }

  /**
   * How many positions, by method, lie behind a surrogate pair of their line: a server that counts
   * in another unit would have them wrong.
   */
  Map<String, Integer> telling() {
    return telling;
  }

  /** Looks at a message. */
  void look(String method, String uri, JsonObject message) {
    telling.putIfAbsent(method, 0);
    walk(method, uri, message, message);
  }

  private void walk(String method, String around, JsonObject message, JsonElement element) {
    if (element.isJsonArray()) {
      element.getAsJsonArray().forEach(inner -> walk(method, around, message, inner));
    } else if (element.isJsonObject()) {
      JsonObject object = element.getAsJsonObject();
      if (object.has("line") && object.has("character")) {
        position(method, around, message, object);
      }
      String uri = own(object, around);
      object
          .entrySet()
          .forEach(
              entry -> {
                String inside = inside(object, entry.getKey(), around, uri);
                walk(method, inside, message, entry.getValue());
              });
    }
  }

  /** The file that ranges in an object lie in. */
  private static String own(JsonObject object, String around) {
    String document = Wire.text(Wire.object(object, "textDocument"), "uri");
    String uri = Wire.text(object, "uri") + Wire.text(object, "targetUri") + document;
    return uri.isEmpty() ? around : uri;
  }

  /** A link has ranges in two files; a list of changes names the files by its members. */
  private static String inside(JsonObject object, String member, String around, String own) {
    if (member.equals("originSelectionRange")) {
      return around;
    }
    return member.startsWith("file:") ? member : own;
  }

  private void position(String method, String uri, JsonObject message, JsonObject position) {
    int line = position.get("line").getAsInt();
    int column = position.get("character").getAsInt();
    List<String> possible = texts.apply(uri, message);
    List<String> fitting = possible.stream().filter(text -> fits(text, line, column)).toList();
    if (fitting.isEmpty()) {
      wrong.add(method + " " + uri + " " + position + " in " + possible);
    } else if (fitting.stream().anyMatch(text -> isBehindPair(text, line, column))) {
      telling.merge(method, 1, Integer::sum);
    }
  }

  private static boolean fits(String text, int line, int column) {
    String[] lines = lines(text);
    return line >= 0
        && line < lines.length
        && column >= 0
        && column <= lines[line].length()
        && !isInsidePair(lines[line], column);
  }

  private static boolean isInsidePair(String line, int column) {
    return column > 0
        && column < line.length()
        && Character.isSurrogatePair(line.charAt(column - 1), line.charAt(column));
  }

  private static boolean isBehindPair(String text, int line, int column) {
    return lines(text)[line].substring(0, column).chars().anyMatch(c -> c >= 0xD800 && c < 0xE000);
  }

  /** The lines of a text, the last one too if it is empty. */
  static String[] lines(String text) {
    return text.split("\r\n|\n|\r", -1);
  }
}
