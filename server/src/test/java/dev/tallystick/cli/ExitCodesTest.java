package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.Writer;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The exit codes that scripts rely on. */
class ExitCodesTest {
  private static final String FAULT = "This is a fault of Tallystick itself: ";

  @TempDir Path folder;

  @Test
  void nothingFoundIsZero() {
    CableCar.pair(folder, CableCar.GERMAN);
    Outcome outcome = Outcome.of("check", folder);
    assertEquals(0, outcome.exit(), outcome::out);
    assertEquals("", outcome.err());
  }

  @Test
  void somethingFoundIsOne() {
    CableCar.pair(folder, CableCar.untranslated());
    assertEquals(1, Outcome.of("check", folder).exit());
    assertEquals(
        1, Outcome.of("check", folder.resolve("guide.md"), folder.resolve("guide.de.md")).exit());
  }

  @Test
  void commandsThatOnlyShowAreZeroWhateverTheyShow() {
    CableCar.pair(folder, CableCar.untranslated());
    Path source = folder.resolve("guide.md");
    assertEquals(0, Outcome.of("align", source, folder.resolve("guide.de.md")).exit());
    assertEquals(0, Outcome.of("segments", source).exit());
    assertEquals(0, Outcome.of("pairs", folder).exit());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "chek",
        "check",
        "align",
        "segments",
        "pairs",
        "check --fail-on",
        "check --no-such-option .",
        "check --format yaml .",
        "align --model guessed a b",
        "align a b c",
        "segments a b",
        "pairs a b",
        "segments --draft a"
      })
  void badUsageIsTwoWithAMessageAndNothingOnStandardOutput(String line) {
    List<String> words = line.isEmpty() ? List.of() : List.of(line.split(" "));
    Outcome outcome = Outcome.of(words.toArray());
    assertEquals(2, outcome.exit(), outcome::err);
    assertEquals("", outcome.out());
    assertTrue(outcome.err().contains("tallystick "), outcome::err);
  }

  @ParameterizedTest
  @ValueSource(strings = {"--help", "check --help", "serve --help", "--version"})
  void helpAndVersionAreZero(String line) {
    Outcome outcome = Outcome.of((Object[]) line.split(" "));
    assertEquals(0, outcome.exit(), outcome::err);
    assertTrue(outcome.out().contains("tallystick"), outcome::out);
  }

  @Test
  void aFaultOfTheProgramIsThree() {
    assertFault(new IllegalStateException("no paper"));
  }

  @Test
  void aFaultThatIsNoExceptionIsThreeToo() {
    assertFault(new StackOverflowError("no stack"));
  }

  /** Runs a check whose output fails, as nothing else can be made to. */
  private void assertFault(Throwable fault) {
    CableCar.pair(folder, CableCar.GERMAN);
    StringWriter err = new StringWriter();
    Console console = new Console(new Broken(fault), new PrintWriter(err), false);
    int exit = Tallystick.run(console, "check", folder.toString());
    assertEquals(3, exit, err::toString);
    assertTrue(err.toString().startsWith(FAULT + fault.getClass().getName()), err::toString);
    assertEquals(2, err.toString().lines().count(), err::toString);
  }

  /** Throws when a line is printed. */
  private static final class Broken extends PrintWriter {
    private final Throwable fault;

    Broken(Throwable fault) {
      super(Writer.nullWriter());
      this.fault = fault;
    }

    @Override
    public void println(String line) {
      if (fault instanceof Error error) {
        throw error;
      }
      throw (RuntimeException) fault;
    }
  }

  /** A full disk must not look like a clean result. */
  @Test
  void resultsThatCannotBeWrittenAreThree() {
    CableCar.pair(folder, CableCar.GERMAN);
    Writer full =
        new Writer() {
          @Override
          public void write(char[] text, int from, int length) throws IOException {
            throw new IOException("no space left");
          }

          @Override
          public void flush() {}

          @Override
          public void close() {}
        };
    StringWriter err = new StringWriter();
    Console console = new Console(new PrintWriter(full), new PrintWriter(err), false);
    assertEquals(3, Tallystick.run(console, "check", folder.toString()));
    assertTrue(err.toString().contains("could not be written"), err::toString);
  }
}
