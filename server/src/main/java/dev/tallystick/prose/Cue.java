package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.List;

/**
 * One cue of a subtitle file, or a landmark between cues.
 *
 * @param start offset where its number or name begins, or else its times
 * @param end offset behind its last line
 * @param times when it is shown; null for text that stands in no cue
 * @param place where on the screen, as far as the cue says it; else empty
 * @param lines its text, white space around each line left out; none for a landmark
 */
record Cue(int start, int end, Times times, String place, List<Span> lines) {
  /** Keeps the lines unchangeable. */
  Cue {
    lines = List.copyOf(lines);
  }

  boolean isLandmark() {
    return lines.isEmpty();
  }

  /** Whether a sentence can go on in another cue: soon enough, and at the same place. */
  boolean leadsTo(Cue other) {
    return times != null
        && other.times != null
        && times.leadsTo(other.times)
        && place.equals(other.place);
  }
}
