package dev.tallystick.check;

import dev.tallystick.align.Alignment;
import dev.tallystick.segment.Segment;
import java.util.List;

/**
 * An aligned pair, as the checks see it.
 *
 * @param source sentences and verbatim blocks of the source
 * @param target those of the translation
 * @param targetLanguage language of the translation as a BCP 47 tag
 * @param alignment the matches, by the indices of these lists
 * @param draft whether the translation is still being written
 */
public record Subject(
    List<Segment> source,
    List<Segment> target,
    String targetLanguage,
    Alignment alignment,
    boolean draft) {}
