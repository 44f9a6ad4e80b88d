package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import com.google.gson.JsonObject;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The encoding of a file and its line ends change no result. */
class EncodingsTest {
  private static final String MARK = "\uFEFF";

  @TempDir Path folder;
  private String expected;

  @BeforeEach
  void checkAsUtf8() {
    CableCar.pair(folder, CableCar.withoutBrakes());
    expected = check();
    assertFalse(expected.isEmpty());
  }

  @Test
  void aByteOrderMarkCountsForNothing() {
    write(MARK + CableCar.ENGLISH, MARK + CableCar.withoutBrakes(), StandardCharsets.UTF_8);
    assertEquals(expected, check());
  }

  @Test
  void utf16WithAMarkIsReadInEitherOrder() {
    for (Charset charset : List.of(StandardCharsets.UTF_16BE, StandardCharsets.UTF_16LE)) {
      write(MARK + CableCar.ENGLISH, MARK + CableCar.withoutBrakes(), charset);
      assertEquals(expected, check());
    }
  }

  @Test
  void theTwoSidesMayDiffer() {
    CableCar.write(
        folder.resolve("guide.md"), (MARK + CableCar.ENGLISH).getBytes(StandardCharsets.UTF_16LE));
    assertEquals(expected, check());
  }

  @Test
  void carriageReturnsCountAsUnitsAndChangeNothingElse() {
    String english = CableCar.ENGLISH.replace("\n", "\r\n");
    String german = CableCar.withoutBrakes().replace("\n", "\r\n");
    JsonObject unix = only();
    write(english, german, StandardCharsets.UTF_8);
    JsonObject dos = only();
    for (String name : List.of("code", "line", "column", "message", "confidence")) {
      assertEquals(unix.get(name), dos.get(name));
    }
    assertEquals(CableCar.brakes(), Fields.covered(dos, english));
  }

  @Test
  void aMarkBeforeCarriageReturnsKeepsTheOffsets() {
    String english = CableCar.ENGLISH.replace("\n", "\r\n");
    String german = CableCar.withoutBrakes().replace("\n", "\r\n");
    write(english, german, StandardCharsets.UTF_8);
    String bare = check();
    write(MARK + english, MARK + german, StandardCharsets.UTF_8);
    assertEquals(bare, check());
  }

  private void write(String english, String german, Charset charset) {
    CableCar.write(folder.resolve("guide.md"), english.getBytes(charset));
    CableCar.write(folder.resolve("guide.de.md"), german.getBytes(charset));
  }

  private JsonObject only() {
    List<JsonObject> lines = Outcome.of("check", "--format", "jsonl", folder).json();
    assertEquals(1, lines.size());
    return lines.get(0);
  }

  private String check() {
    return Outcome.of("check", "--format", "jsonl", folder).out();
  }
}
