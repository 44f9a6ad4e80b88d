/**
 * Texts, positions and edits. A position is a UTF-16 offset into an unchanged string; lines are
 * derived from it and never stored.
 */
package dev.tallystick.text;
