package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What cannot be read: a message that names the file, exit code 2, and the rest goes on. */
class BadInputTest {
  private static final byte[] BINARY = {(byte) 0x89, 'P', 'N', 'G', 13, 10, 26, 10, 0, 0, 0, 13};

  @TempDir Path folder;
  private Path good;

  @BeforeEach
  void writeAGoodPair() {
    CableCar.pair(folder.resolve("z"), CableCar.untranslated());
    good = folder.resolve("z/guide.md");
  }

  @Test
  void aMissingFile() {
    Path missing = folder.resolve("nowhere.md");
    assertRefused(missing, "check", missing, good);
    assertRefused(missing, "check", missing);
    assertRefused(missing, "align", good, missing);
    assertRefused(missing, "align", missing, good);
    assertRefused(missing, "segments", missing);
    assertRefused(missing, "pairs", missing);
  }

  @Test
  void aFolderInPlaceOfAFile() {
    assertRefused(folder, "align", good, folder);
    assertRefused(folder, "align", folder, good);
    assertRefused(folder, "segments", folder);
    Outcome mixed = Outcome.of("check", good, folder);
    assertEquals(2, mixed.exit());
    assertEquals("Name one folder, or one source file and one translation.\n", lf(mixed.err()));
  }

  @Test
  void aFileInPlaceOfAFolder() {
    Outcome outcome = Outcome.of("pairs", good);
    assertEquals(2, outcome.exit());
    assertEquals("", outcome.out());
    assertFalse(outcome.err().isBlank());
  }

  @Test
  void oneFileOnly() {
    Outcome outcome = Outcome.of("check", good);
    assertEquals(2, outcome.exit());
    assertEquals("Name one folder, or one source file and one translation.\n", lf(outcome.err()));
  }

  @Test
  void aBinaryFile() {
    Path picture = CableCar.write(folder.resolve("picture.md"), BINARY);
    assertRefused(picture, "check", good, picture);
    assertRefused(picture, "align", picture, good);
    assertRefused(picture, "segments", picture);
  }

  @Test
  void aBinaryFileAmongOthersKeepsNothingElseFromBeingChecked() {
    CableCar.write(folder.resolve("a/guide.md"), CableCar.ENGLISH);
    Path picture = CableCar.write(folder.resolve("a/guide.de.md"), BINARY);
    Outcome outcome = Outcome.of("check", "--format", "jsonl", folder);
    assertEquals(2, outcome.exit());
    assertTrue(outcome.err().startsWith(picture + ": this is no text file"), outcome::err);
    assertEquals(List.of("untranslated"), outcome.codes());
    assertEquals(2, Outcome.of("pairs", folder).exit());
  }

  @Test
  void emptyFiles() {
    Path nothing = CableCar.write(folder.resolve("nothing.md"), "");
    Path neither = CableCar.write(folder.resolve("neither.md"), "");
    Outcome both = Outcome.of("check", nothing, neither);
    assertEquals(0, both.exit(), both::out);
    assertEquals(List.of("omission"), codes(good, nothing));
    assertEquals(List.of("addition"), codes(nothing, good));
  }

  @ParameterizedTest
  @ValueSource(strings = {"qqz", "klingonese", "e", "12", "de_", "de--at", ""})
  void anUnknownLanguage(String tag) {
    for (String option : List.of("--source-language", "--target-language")) {
      Outcome outcome = Outcome.of("check", option, tag, folder);
      assertEquals(2, outcome.exit());
      assertTrue(outcome.err().contains("\"" + tag + "\" is no language tag"), outcome::err);
      assertEquals("", outcome.out());
    }
  }

  @Test
  void malformedBytesAreToldWithTheirPlaceAndTheRestIsChecked() throws IOException {
    Path source = good;
    byte[] german =
        CableCar.untranslated().replace("9 Minuten", "9 ?inuten").getBytes(StandardCharsets.UTF_8);
    german[indexOf(german, (byte) '?')] = (byte) 0xFF;
    Path target = Files.write(folder.resolve("z/guide.de.md"), german);
    String place = target + ":3:40: These bytes are no text in the file's encoding: FF.";
    for (Outcome outcome :
        List.of(
            Outcome.of("check", "--format", "jsonl", folder),
            Outcome.of("check", "--format", "jsonl", source, target))) {
      assertEquals(2, outcome.exit());
      assertTrue(outcome.err().startsWith(place), outcome::err);
      assertEquals(List.of("untranslated"), outcome.codes());
    }
    assertToldAndShown(place, Outcome.of("align", source, target));
    assertToldAndShown(place, Outcome.of("segments", target));
    assertToldAndShown(place, Outcome.of("pairs", folder));
  }

  private static void assertToldAndShown(String place, Outcome outcome) {
    assertEquals(2, outcome.exit());
    assertTrue(outcome.err().startsWith(place), outcome::err);
    assertFalse(outcome.out().isBlank());
  }

  private static int indexOf(byte[] bytes, byte sought) {
    int at = 0;
    while (bytes[at] != sought) {
      at++;
    }
    return at;
  }

  /** The file is named first, then what is wrong in a sentence; standard output stays empty. */
  private static void assertRefused(Path file, Object... words) {
    Outcome outcome = Outcome.of(words);
    assertEquals(2, outcome.exit(), outcome::err);
    assertEquals("", outcome.out());
    assertTrue(outcome.err().startsWith(file + ": "), outcome::err);
    assertEquals(1, outcome.err().lines().count(), outcome::err);
  }

  private static List<String> codes(Path source, Path target) {
    return Outcome.of("check", "--format", "jsonl", source, target).codes();
  }

  private static String lf(String text) {
    return text.replace("\r\n", "\n");
  }
}
