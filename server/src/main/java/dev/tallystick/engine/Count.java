package dev.tallystick.engine;

/**
 * The sentences of a file, or of a section of it, in one pair.
 *
 * @param language the English name of the other side's language
 * @param sentences all of them, a section's heading included
 * @param matched those that have a counterpart
 * @param added those of a translation that nothing in the source stands for
 * @param missing sentences of the source that have no counterpart; in a translation those whose
 *     counterpart would stand here
 * @param pending sentences of the source that nobody has got to yet; in a translation those whose
 *     counterpart will stand here, or whose untouched copies do
 */
public record Count(
    String language, int sentences, int matched, int added, int missing, int pending) {}
