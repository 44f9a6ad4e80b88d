package dev.tallystick.segment;

import dev.tallystick.text.Span;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.regex.PatternSyntaxException;

/**
 * A rule of an SRX file: what stands before a place and behind it, and whether a sentence ends
 * there.
 */
final class SrxRule {
  /** A pattern is given so many steps, and so many more for each character of the text. */
  private static final long STEPS = 100_000;

  private static final long STEPS_EACH = 2_000;

  /** So far back from a place a rule looks, in characters. */
  private static final int REACH = 200;

  private final boolean breaks;
  private final Pattern before;
  private final Pattern after;
  private final Pattern whole;
  private final Span span;

  private SrxRule(boolean breaks, Pattern before, Pattern after, Pattern whole, Span span) {
    this.breaks = breaks;
    this.before = before;
    this.after = after;
    this.whole = whole;
    this.span = span;
  }

  /**
   * A rule from its patterns.
   *
   * @param span where it stands in its file
   * @throws PatternSyntaxException if one is none
   */
  static SrxRule of(boolean breaks, String before, String after, Span span) {
    Pattern behind = Pattern.compile(after);
    return new SrxRule(
        breaks,
        Pattern.compile("(?:" + before + ")\\z"),
        behind,
        Pattern.compile("(?:" + before + ")(?=(?:" + after + "))"),
        span);
  }

  boolean breaks() {
    return breaks;
  }

  /** Where it stands in its file. */
  Span span() {
    return span;
  }

  /** A text that this rule may be matched against. */
  static StepLimit limited(CharSequence text) {
    return new StepLimit(text, STEPS + STEPS_EACH * text.length());
  }

  /** A search for the places that it tells of; one ends where a match does. */
  Matcher places(StepLimit prose) {
    return whole.matcher(prose).useTransparentBounds(true).useAnchoringBounds(false);
  }

  /** Whether it tells of a place. */
  boolean tells(StepLimit prose, int place) {
    Matcher behind = after.matcher(prose).region(place, prose.length());
    behind.useTransparentBounds(true).useAnchoringBounds(false);
    if (!behind.lookingAt()) {
      return false;
    }
    int from = Math.max(0, place - REACH);
    return before.matcher(prose.subSequence(from, place)).find();
  }

  /** Whether it gets to an end over texts on which bad patterns do not. */
  boolean ends() {
    String[] probes = {"a", "A", "1", ".", " ", "ab", "a ", "a.", "1.", "水"};
    try {
      for (String probe : probes) {
        StepLimit text = limited(probe.repeat(60) + "!#" + probe.repeat(60));
        Matcher places = places(text);
        while (places.find()) {
          tells(text, places.end());
        }
        for (int at = 0; at < text.length(); at += 40) {
          tells(text, at);
        }
      }
      return true;
    } catch (StepLimit.Exceeded | StackOverflowError e) {
      return false;
    }
  }
}
