package dev.tallystick.pairing;

/**
 * A file without a counterpart.
 *
 * @param file its path
 * @param reason one sentence for the translator
 */
public record Alone(String file, String reason) {}
