package dev.tallystick.pairing;

/**
 * A source and one translation of it.
 *
 * @param source path of the source
 * @param target path of the translation
 * @param sourceLanguage language of the source, {@link Language#UNKNOWN} if nothing tells it
 * @param targetLanguage language of the translation, {@link Language#UNKNOWN} if nothing tells it
 * @param why how the two were found to belong together
 */
public record Pair(
    String source, String target, Language sourceLanguage, Language targetLanguage, Why why) {}
