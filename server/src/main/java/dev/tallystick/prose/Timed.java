package dev.tallystick.prose;

import dev.tallystick.text.Span;

/**
 * A stretch of a block, and when the cue that it stands in is on the screen.
 *
 * @param span where it stands in the file
 * @param times those of its cue
 */
public record Timed(Span span, Times times) {}
