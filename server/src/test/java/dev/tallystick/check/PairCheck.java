package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.align.Aligner;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Text;
import java.util.function.UnaryOperator;

/** Checks that a pair comes out of the whole pipeline as its table says. */
final class PairCheck {
  private final String sourceLanguage;
  private final String targetLanguage;

  private PairCheck(String sourceLanguage, String targetLanguage) {
    this.sourceLanguage = sourceLanguage;
    this.targetLanguage = targetLanguage;
  }

  /** For a pair of languages, BCP 47 tags. */
  static PairCheck of(String sourceLanguage, String targetLanguage) {
    return new PairCheck(sourceLanguage, targetLanguage);
  }

  /** Checks a finished translation; see {@link PairTable} for the notation. */
  void check(String... parts) {
    check(false, String.join("\n", parts));
  }

  /** Checks a translation that is still being written. */
  void draft(String... parts) {
    check(true, String.join("\n", parts));
  }

  /** The result of the texts of a table, whatever the table expects. */
  PairResult result(boolean draft, String... parts) {
    PairTable table = new PairTable(String.join("\n", parts));
    return result(table, draft, UnaryOperator.identity());
  }

  private void check(boolean draft, String notation) {
    PairTable table = new PairTable(notation);
    PairResult plain = result(table, draft, UnaryOperator.identity());
    String print = new PairPrint(table, plain, draft, 0).print();
    assertEquals(table.canonical(), print);
    PairResult marked = result(table, draft, text -> "\uFEFF" + text);
    assertEquals(print, new PairPrint(table, marked, draft, 1).print(), "with a byte-order mark");
    assertSame(plain, result(table, draft, text -> text.replace("\n", "\r\n")));
  }

  /** Line ends of two characters move what stands behind them, and change nothing else. */
  private static void assertSame(PairResult plain, PairResult withCrLf) {
    assertEquals(plain.alignment().matches(), withCrLf.alignment().matches(), "with CR LF");
    assertEquals(messages(plain), messages(withCrLf), "with CR LF");
    assertEquals(plain.progress(), withCrLf.progress(), "with CR LF");
  }

  private static String messages(PairResult result) {
    StringBuilder messages = new StringBuilder();
    for (Finding finding : result.findings()) {
      messages.append(finding.message()).append(finding.counterMessage()).append('\n');
    }
    return messages.toString();
  }

  private PairResult result(PairTable table, boolean draft, UnaryOperator<String> change) {
    return PairResult.of(
        read(change.apply(table.source()), sourceLanguage),
        read(change.apply(table.target()), targetLanguage),
        Aligner.ADAPTIVE,
        draft,
        Cancellation.NONE);
  }

  private static Reading read(String text, String language) {
    return Reading.of(new Text(text), Format.MARKDOWN, language, Cancellation.NONE);
  }
}
