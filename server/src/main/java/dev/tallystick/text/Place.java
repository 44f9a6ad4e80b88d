package dev.tallystick.text;

/**
 * A place in a text as line and column.
 *
 * @param line counted from 0
 * @param column UTF-16 units from the start of the line, counted from 0
 */
public record Place(int line, int column) {}
