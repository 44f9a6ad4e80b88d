package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import java.util.List;

/** What the lines of JSON must look like, whatever they say. */
final class Fields {
  private Fields() {}

  /** Exactly these fields, in this order. */
  static void assertNames(JsonElement object, String... names) {
    assertEquals(List.of(names), List.copyOf(object.getAsJsonObject().keySet()));
  }

  /** A whole number from {@code least} on. */
  static int number(JsonObject object, String name, int least) {
    String written = object.get(name).toString();
    assertTrue(written.matches("\\d+"), name + ": " + written);
    int number = Integer.parseInt(written);
    assertTrue(number >= least, name + ": " + written);
    return number;
  }

  /** A string. */
  static String string(JsonObject object, String name) {
    JsonElement value = object.get(name);
    assertTrue(value.isJsonPrimitive() && value.getAsJsonPrimitive().isString(), name);
    return value.getAsString();
  }

  /** A share from 0 to 1 with a point and three digits, even where people write a comma. */
  static double share(JsonObject object, String name) {
    String written = object.get(name).toString();
    assertTrue(written.matches("0\\.\\d{3}|1\\.000"), name + ": " + written);
    return Double.parseDouble(written);
  }

  /** The text between the offsets of an object. */
  static String covered(JsonElement span, String text) {
    JsonObject object = span.getAsJsonObject();
    return text.substring(number(object, "start", 0), number(object, "end", 0));
  }
}
