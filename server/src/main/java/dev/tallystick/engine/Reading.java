package dev.tallystick.engine;

import dev.tallystick.align.Unit;
import dev.tallystick.pairing.Language;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.segment.Segment;
import dev.tallystick.segment.Segmenter;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/**
 * One side of a pair, read: its sentences and verbatim blocks, and what the aligner knows of each.
 *
 * @param text the file
 * @param format what it was read as
 * @param language its language as a BCP 47 tag, {@code und} if unknown
 * @param segments its sentences and verbatim blocks in order
 * @param units the same as the aligner sees them, one for each segment
 * @param endless the rules of the project that did not come to an end over the text, each at its
 *     place in the file of rules
 */
public record Reading(
    Text text,
    Format format,
    String language,
    List<Segment> segments,
    List<Unit> units,
    List<Problem> endless) {
  /** Keeps the lists unchangeable. */
  public Reading {
    segments = List.copyOf(segments);
    units = List.copyOf(units);
    endless = List.copyOf(endless);
  }

  /** Reads a file in a language, a BCP 47 tag. */
  public static Reading of(Text text, Format format, String language, Cancellation cancellation) {
    return of(text, format, Tongue.of(new Language(language)), TextRules.USUAL, cancellation);
  }

  /** Reads a file as its project wants it. */
  public static Reading of(
      Text text, Format format, Tongue tongue, TextRules rules, Cancellation cancellation) {
    String language = tongue.in(text, format).tag();
    Set<Problem> endless = new LinkedHashSet<>();
    List<Segment> segments =
        Segmenter.of(language, rules.borders())
            .segments(text, format.blocks(text, rules.frontMatter()), endless::add, cancellation);
    List<Unit> units = segments.stream().map(segment -> Units.unit(text, segment)).toList();
    return new Reading(text, format, language, segments, units, List.copyOf(endless));
  }
}
