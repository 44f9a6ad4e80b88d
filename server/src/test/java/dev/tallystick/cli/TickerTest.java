package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;

/** Progress, with a clock moved by hand. */
class TickerTest {
  private final StringWriter err = new StringWriter();
  private final StringWriter out = new StringWriter();
  private final AtomicLong now = new AtomicLong(50_000);
  private final Console console =
      new Console(new PrintWriter(out), new PrintWriter(err, true), false);
  private final Ticker ticker = new Ticker(console, 5, now::get);

  @Test
  void aShortRunSaysNothing() {
    for (int i = 0; i < 5; i++) {
      tickAfter(199);
    }
    assertEquals("", err.toString());
  }

  @Test
  void aLongRunSaysOnceASecondHowFarItIs() {
    tickAfter(999);
    assertEquals("", err.toString());
    tickAfter(1);
    tickAfter(500);
    tickAfter(500);
    assertEquals(
        "checked 2 of 5 pairs\nchecked 4 of 5 pairs\n", err.toString().replace("\r\n", "\n"));
    assertEquals("", out.toString());
  }

  @Test
  void theLastPairIsNotAnnounced() {
    for (int i = 0; i < 4; i++) {
      ticker.tick();
    }
    tickAfter(5000);
    assertEquals("", err.toString());
  }

  private void tickAfter(long millis) {
    now.addAndGet(millis);
    ticker.tick();
  }
}
