/**
 * The aligner. Lengths, word keys, closing marks and block kinds come in; matches with their
 * confidence go out. It sees no text.
 *
 * <p>The route: {@link dev.tallystick.align.Unit} lists of both sides, a {@link
 * dev.tallystick.align.Scorer} that says what one link is worth, a {@link
 * dev.tallystick.align.Lattice} that weighs all chains of links against each other, and a {@link
 * dev.tallystick.align.Alignment} that keeps the best chain and how sure it is.
 */
package dev.tallystick.align;
