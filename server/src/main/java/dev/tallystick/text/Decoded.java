package dev.tallystick.text;

import java.util.List;

/**
 * What became of a file's bytes.
 *
 * @param text the text, without its byte-order mark
 * @param problems the places whose bytes were no text, each shown as U+FFFD
 */
public record Decoded(Text text, List<Problem> problems) {}
