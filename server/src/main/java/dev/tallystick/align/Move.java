package dev.tallystick.align;

/**
 * A unit that stands at another place in the translation than in the source, so that no chain of
 * matches can hold it.
 *
 * @param source index of the source unit
 * @param target index of the target unit
 */
public record Move(int source, int target) {}
