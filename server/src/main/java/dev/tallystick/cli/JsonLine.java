package dev.tallystick.cli;

import com.google.gson.stream.JsonWriter;
import dev.tallystick.text.Span;
import java.io.IOException;
import java.io.PrintWriter;

/** One line of JSON, printed field by field in the order they are put. */
final class JsonLine {
  private final PrintWriter out;
  private final JsonWriter json;

  JsonLine(PrintWriter out) throws IOException {
    this.out = out;
    this.json = new JsonWriter(out);
    json.setHtmlSafe(false);
    json.setSerializeNulls(true);
    json.beginObject();
  }

  JsonLine put(String name, String value) throws IOException {
    json.name(name).value(value);
    return this;
  }

  JsonLine put(String name, long value) throws IOException {
    json.name(name).value(value);
    return this;
  }

  /** A share with three digits. */
  JsonLine share(String name, double value) throws IOException {
    long thousandths = Math.round(value * 1000);
    String digits = String.valueOf(1000 + thousandths % 1000).substring(1);
    json.name(name).jsonValue(thousandths / 1000 + "." + digits);
    return this;
  }

  /** A span as an object, or null. */
  JsonLine span(String name, Span span) throws IOException {
    if (span == null) {
      json.name(name).nullValue();
      return this;
    }
    return open(name).put("start", span.start()).put("end", span.end()).close();
  }

  JsonLine open(String name) throws IOException {
    json.name(name).beginObject();
    return this;
  }

  JsonLine close() throws IOException {
    json.endObject();
    return this;
  }

  void end() throws IOException {
    json.endObject();
    out.println();
  }
}
