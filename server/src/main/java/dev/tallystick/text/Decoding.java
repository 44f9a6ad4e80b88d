package dev.tallystick.text;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.Charset;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * Turns a file's bytes into text: UTF-8, or UTF-16 where a byte-order mark says so. Malformed bytes
 * become U+FFFD and a {@link Problem} each run; the rest of the file is read as if nothing were.
 */
public final class Decoding {
  private static final int MOST_PROBLEMS = 100;
  private static final int LOOKED_AT_FOR_BINARY = 8192;

  private Decoding() {}

  /** Decodes the bytes of a file; empty if they are no text at all (a picture, a program). */
  public static Optional<Decoded> decode(byte[] bytes) {
    if (starts(bytes, 0xFE, 0xFF)) {
      return Optional.of(decode(bytes, 2, StandardCharsets.UTF_16BE));
    }
    if (starts(bytes, 0xFF, 0xFE)) {
      return Optional.of(decode(bytes, 2, StandardCharsets.UTF_16LE));
    }
    if (looksBinary(bytes)) {
      return Optional.empty();
    }
    int mark = starts(bytes, 0xEF, 0xBB, 0xBF) ? 3 : 0;
    String sound = new String(bytes, mark, bytes.length - mark, StandardCharsets.UTF_8);
    return Optional.of(
        sound.indexOf('\uFFFD') < 0
            ? new Decoded(new Text(sound), List.of())
            : decode(bytes, mark, StandardCharsets.UTF_8));
  }

  private static boolean starts(byte[] bytes, int... mark) {
    if (bytes.length < mark.length) {
      return false;
    }
    for (int i = 0; i < mark.length; i++) {
      if ((bytes[i] & 0xFF) != mark[i]) {
        return false;
      }
    }
    return true;
  }

  /** A zero byte near the start: no text in UTF-8 has one. */
  private static boolean looksBinary(byte[] bytes) {
    int end = Math.min(bytes.length, LOOKED_AT_FOR_BINARY);
    for (int i = 0; i < end; i++) {
      if (bytes[i] == 0) {
        return true;
      }
    }
    return false;
  }

  private static Decoded decode(byte[] bytes, int from, Charset charset) {
    CharsetDecoder decoder = charset.newDecoder();
    ByteBuffer in = ByteBuffer.wrap(bytes, from, bytes.length - from);
    CharBuffer out = CharBuffer.allocate(in.remaining() + 2);
    List<Problem> problems = new ArrayList<>();
    CoderResult result = decoder.decode(in, out, true);
    while (result.isError()) {
      int length = malformed(result, charset);
      note(problems, bytes, in.position(), length, out.position());
      in.position(in.position() + length);
      out.put('\uFFFD');
      result = decoder.decode(in, out, true);
    }
    return new Decoded(new Text(out.flip().toString()), List.copyOf(problems));
  }

  /** Of half a pair in UTF-16 Java's decoder takes the sound character behind it for broken too. */
  private static int malformed(CoderResult result, Charset charset) {
    return charset == StandardCharsets.UTF_8 ? result.length() : Math.min(2, result.length());
  }

  private static void note(List<Problem> problems, byte[] bytes, int at, int length, int offset) {
    int last = problems.size() - 1;
    if (last >= 0 && problems.get(last).span().end() == offset) {
      Problem before = problems.get(last);
      Span grown = new Span(before.span().start(), offset + 1);
      problems.set(last, new Problem(grown, before.message()));
    } else if (problems.size() < MOST_PROBLEMS) {
      problems.add(new Problem(new Span(offset, offset + 1), message(bytes, at, length)));
    }
  }

  private static String message(byte[] bytes, int at, int length) {
    StringBuilder hex = new StringBuilder();
    for (int i = at; i < Math.min(at + length, bytes.length); i++) {
      hex.append(String.format(Locale.ROOT, " %02X", bytes[i]));
    }
    return "These bytes are no text in the file's encoding:"
        + hex
        + ". Save the file as UTF-8; until then the place counts as one unknown character.";
  }
}
