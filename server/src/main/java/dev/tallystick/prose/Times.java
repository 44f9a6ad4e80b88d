package dev.tallystick.prose;

/**
 * When something is on the screen, as its file says it; the end may lie before the begin.
 *
 * @param from milliseconds from the start of the film
 * @param to the same for its end
 */
public record Times(long from, long to) {
  /** Longer silence than this parts sentences. Common practice, no source. */
  private static final long LONGEST_PAUSE = 4_000;

  /** Whether a sentence can go on in what is shown then. */
  boolean leadsTo(Times other) {
    return other.from >= from && other.from - to <= LONGEST_PAUSE;
  }

  /** From the earlier begin to the later end. */
  Times cover(Times other) {
    return new Times(Math.min(from, other.from), Math.max(to, other.to));
  }
}
