package dev.tallystick.engine;

import dev.tallystick.prose.Format;
import dev.tallystick.text.Text;

/**
 * One state of one file: what workers see of it. However many pairs the file is in, it is read once
 * only, by the worker that needs it first; so an edit on one side costs the reading of that side.
 */
final class Sheet {
  private final Text text;
  private final Format format;
  private final Tongue tongue;
  private final TextRules rules;

  /** What is known of an earlier state of the file; of this one, once it is read. */
  private volatile Reading.Earlier earlier = Reading.Earlier.nothing();

  private Reading reading;
  private volatile boolean outdated;

  /**
   * A text in a language.
   *
   * @param rules by which it is read
   */
  Sheet(Text text, Format format, Tongue tongue, TextRules rules) {
    this.text = text;
    this.format = format;
    this.tongue = tongue;
    this.rules = rules;
  }

  /** The file stands like this now; what is known of it makes reading that quicker. */
  Sheet next(Text now, Format inFormat, TextRules byRules) {
    Sheet next = new Sheet(now, inFormat, tongue, byRules);
    if (format == inFormat && rules.equals(byRules)) {
      next.earlier = earlier.again();
    }
    return next;
  }

  Text text() {
    return text;
  }

  /** Whether this is still the sheet of a text that has come anew. */
  boolean shows(Text current, Format inFormat, TextRules byRules) {
    return format == inFormat && rules.equals(byRules) && text.equals(current);
  }

  /** The text has moved on: whoever still works on this sheet may stop. */
  void outdate() {
    outdated = true;
  }

  boolean outdated() {
    return outdated;
  }

  /**
   * The sentences. A second worker that asks meanwhile waits for the first.
   *
   * @throws dev.tallystick.run.Cancellation.Cancelled if the text has moved on
   */
  synchronized Reading reading() {
    if (reading == null) {
      reading = Reading.of(text, format, tongue, rules, earlier, this::outdated);
      earlier = earlier.next();
    }
    return reading;
  }
}
