package dev.tallystick.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class DecodingTest {
  private static final String PROSE = "\u00DCber den Steg, \u6F22\u5B57 \uD83D\uDE00\r\nund zurück";

  @Test
  void utf8IsRead() {
    Decoded decoded = decode(PROSE.getBytes(StandardCharsets.UTF_8));
    assertEquals(PROSE, decoded.text().string());
    assertEquals(List.of(), decoded.problems());
  }

  @Test
  void anEmptyFileIsAnEmptyText() {
    assertEquals("", decode(new byte[0]).text().string());
  }

  @ParameterizedTest
  @ValueSource(strings = {"UTF-8", "UTF-16BE", "UTF-16LE"})
  void aByteOrderMarkTellsTheEncodingAndIsNoText(String charset) {
    Decoded decoded = decode(("\uFEFF" + PROSE).getBytes(Charset.forName(charset)));
    assertEquals(PROSE, decoded.text().string());
    assertEquals(List.of(), decoded.problems());
  }

  /** A byte-order mark counts only at the very start. */
  @Test
  void aSecondByteOrderMarkIsText() {
    Decoded decoded = decode("\uFEFF\uFEFFa".getBytes(StandardCharsets.UTF_8));
    assertEquals("\uFEFFa", decoded.text().string());
  }

  /** Kinds of malformed UTF-8, after the Unicode Standard, section 3.9. */
  @ParameterizedTest
  @CsvSource({
    "80, a lone continuation byte",
    "80 BF 80, several of them",
    "C0 AF, an overlong slash in two bytes",
    "E0 80 AF, in three",
    "F0 80 80 AF, in four",
    "E2 82, a character cut short",
    "F0 9F 98, a longer one cut short",
    "ED A0 80, half of a surrogate pair",
    "F4 90 80 80, beyond the last code point",
    "FF FE FA, bytes that never occur",
    "E4 F6 FC, letters of Latin-1"
  })
  void aRunOfBadBytesIsOneProblemAndTheRestStaysWhole(String bytes, String what) {
    Decoded decoded =
        decode(joined("Gr\u00FC\u00DFe ".getBytes(StandardCharsets.UTF_8), hex(bytes), " \u6F22!"));
    String text = decoded.text().string();
    assertTrue(text.startsWith("Gr\u00FC\u00DFe \uFFFD"), () -> what + ": " + text);
    assertTrue(text.endsWith("\uFFFD \u6F22!"), () -> what + ": " + text);
    assertEquals(1, decoded.problems().size(), what);
    Span bad = new Span(6, text.length() - 3);
    assertEquals(bad, decoded.problems().get(0).span(), what);
    assertEquals("\uFFFD".repeat(bad.length()), bad.of(text), what);
  }

  @Test
  void aCharacterCutShortAtTheEndIsAProblem() {
    Decoded decoded = decode(joined("ab".getBytes(StandardCharsets.UTF_8), hex("E2 82"), ""));
    assertEquals("ab\uFFFD", decoded.text().string());
    assertEquals(new Span(2, 3), decoded.problems().get(0).span());
  }

  @Test
  void theMessageShowsTheBytesAndSaysWhatToDo() {
    String message = decode(hex("61 E9 62")).problems().get(0).message();
    assertTrue(message.contains(" E9."), message);
    assertTrue(message.contains("Save the file as UTF-8"), message);
  }

  @Test
  void bothOrdersOfUtf16AreMendedInPlace() {
    Decoded big = decode(hex("FE FF 00 41 D8 3D 00 42"));
    assertEquals("A\uFFFDB", big.text().string());
    assertEquals(List.of(new Span(1, 2)), spans(big));
    Decoded little = decode(hex("FF FE 41 00 00 DE 42 00 43"));
    assertEquals("A\uFFFDB\uFFFD", little.text().string());
    assertEquals(List.of(new Span(1, 2), new Span(3, 4)), spans(little));
  }

  @ParameterizedTest
  @ValueSource(strings = {"89 50 4E 47 00", "00", "7F 45 4C 46 02 01 01 00 00", "00 41 00 42"})
  void aZeroByteMeansThatItIsNoText(String bytes) {
    assertTrue(Decoding.decode(hex(bytes)).isEmpty());
  }

  @Test
  void aFileFullOfBadBytesHasALimitedNumberOfProblems() {
    byte[] bytes = new byte[4_000];
    for (int i = 0; i < bytes.length; i++) {
      bytes[i] = (byte) (i % 2 == 0 ? 'a' : 0xFF);
    }
    Decoded decoded = decode(bytes);
    assertEquals("a\uFFFD".repeat(2_000), decoded.text().string());
    assertTrue(decoded.problems().size() <= 100);
    assertEquals(new Span(1, 2), decoded.problems().get(0).span());
  }

  @Test
  void anyBytesComeOutAsTextWithProblemsWhereItIsReplaced() {
    Random random = new Random(7);
    for (int i = 0; i < 2_000; i++) {
      byte[] bytes = new byte[random.nextInt(40)];
      random.nextBytes(bytes);
      for (int k = 0; k < bytes.length; k++) {
        bytes[k] = bytes[k] == 0 ? 1 : bytes[k];
      }
      Decoded decoded = decode(bytes);
      String text = decoded.text().string();
      boolean replaced = text.indexOf('\uFFFD') >= 0;
      assertEquals(replaced, !decoded.problems().isEmpty());
      for (Span span : spans(decoded)) {
        assertEquals("\uFFFD".repeat(span.length()), span.of(text));
      }
    }
  }

  private static List<Span> spans(Decoded decoded) {
    return decoded.problems().stream().map(Problem::span).toList();
  }

  private static Decoded decode(byte[] bytes) {
    return Decoding.decode(bytes).orElseThrow();
  }

  private static byte[] joined(byte[] before, byte[] middle, String behind) {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    bytes.writeBytes(before);
    bytes.writeBytes(middle);
    bytes.writeBytes(behind.getBytes(StandardCharsets.UTF_8));
    return bytes.toByteArray();
  }

  private static byte[] hex(String bytes) {
    String[] each = bytes.split(" ");
    byte[] decoded = new byte[each.length];
    for (int i = 0; i < each.length; i++) {
      decoded[i] = (byte) Integer.parseInt(each[i], 16);
    }
    return decoded;
  }
}
