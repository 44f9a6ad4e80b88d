package dev.tallystick.text;

/**
 * Something wrong with a file that did not keep the rest of it from being read.
 *
 * @param span where it stands
 * @param message what is wrong and what to do, for the translator
 */
public record Problem(Span span, String message) {}
