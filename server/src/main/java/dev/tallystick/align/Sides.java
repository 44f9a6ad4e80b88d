package dev.tallystick.align;

/**
 * The two texts of a pair.
 *
 * @param source the text that is translated: the columns of a lattice
 * @param target the translation: its rows
 */
record Sides(Side source, Side target) {}
