package dev.tallystick.prose;

import dev.tallystick.text.Span;

/**
 * A footnote in the midst of a block of AsciiDoc.
 *
 * @param whole the macro
 * @param text what stands between its brackets; not empty
 */
record AsciiDocNote(Span whole, Span text) {}
