package dev.tallystick.pairing;

import java.util.Optional;

/**
 * Files that a project states to belong together. Where a side has {@link PathPattern#TAG}, the tag
 * names its language, and only files in the language of that side are meant, if it is given.
 *
 * @param source the name of the source
 * @param target the name of the translation
 * @param sourceLanguage the language of the source, if it is given
 * @param targetLanguage the language of the translation, if it is given
 */
public record PairRule(
    PathPattern source,
    PathPattern target,
    Optional<Language> sourceLanguage,
    Optional<Language> targetLanguage) {}
