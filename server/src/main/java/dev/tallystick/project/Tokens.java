package dev.tallystick.project;

import com.google.gson.Strictness;
import com.google.gson.stream.JsonReader;
import com.google.gson.stream.JsonToken;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Span;
import java.io.IOException;
import java.io.Reader;

/**
 * JSON, token by token, each with its place. The parser is gson's, by RFC 8259 to the letter: what
 * it let pass would be read otherwise by the editor that edits the file. It tells no places, but is
 * handed one character at a time and takes none before it needs it; so the number of characters
 * handed out is the place behind a string or a bracket. The start of a token is found from the end
 * of the one before, as nothing but blanks and one separator lies between.
 */
final class Tokens {
  private final String json;
  private final JsonReader reader;
  private int handed;
  private int end;
  private int quoted = -1;

  /** A string, or the key of a member, with its quotation marks. */
  record Word(String value, Span span) {}

  Tokens(String json) {
    this.json = json;
    this.reader = new JsonReader(new OneByOne());
    reader.setStrictness(Strictness.STRICT);
  }

  /** Hands out one character at a time. */
  private final class OneByOne extends Reader {
    @Override
    public int read(char[] into, int from, int length) {
      if (handed == json.length()) {
        return -1;
      }
      into[from] = json.charAt(handed++);
      return 1;
    }

    @Override
    public void close() {}
  }

  JsonToken peek() throws IOException {
    return reader.peek();
  }

  /** Whether the object or the list has more in it. */
  boolean more() throws IOException {
    return reader.hasNext();
  }

  /** Enters an object or a list; where it starts. */
  int open() throws IOException {
    boolean object = peek() == JsonToken.BEGIN_OBJECT;
    int start = start();
    if (object) {
      reader.beginObject();
    } else {
      reader.beginArray();
    }
    end = handed;
    return start;
  }

  /** Leaves it; the place behind it. */
  int close() throws IOException {
    if (peek() == JsonToken.END_OBJECT) {
      reader.endObject();
    } else {
      reader.endArray();
    }
    end = handed;
    return end;
  }

  /** The key of the next member. */
  Word name() throws IOException {
    peek();
    quoted = start();
    return word(reader.nextName());
  }

  /** The next value, which is a string. */
  Word string() throws IOException {
    peek();
    quoted = start();
    return word(reader.nextString());
  }

  private Word word(String value) {
    end = handed;
    Span span = new Span(quoted, end);
    quoted = -1;
    return new Word(value, span);
  }

  /** Passes over the next value, whatever it is; where it stands. */
  Span skip() throws IOException {
    JsonToken token = peek();
    int start = start();
    if (token == JsonToken.STRING) {
      return string().span();
    }
    reader.skipValue();
    boolean bracket = token == JsonToken.BEGIN_OBJECT || token == JsonToken.BEGIN_ARRAY;
    end = bracket ? handed : wordEnd(start);
    return new Span(start, end);
  }

  /** Where the token at hand starts. */
  private int start() {
    int at = end;
    while (at < json.length() && " \t\r\n,:\uFEFF".indexOf(json.charAt(at)) >= 0) {
      at++;
    }
    return at;
  }

  /** What is wrong at the place that the parser did not get past. */
  Problem fault(IOException e) {
    return new Fault(json, handed, quoted).problem(e);
  }

  private int wordEnd(int from) {
    return Fault.wordEnd(json, from);
  }
}
