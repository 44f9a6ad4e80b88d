package dev.tallystick.engine;

import dev.tallystick.align.Unit;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.segment.Segment;
import dev.tallystick.segment.Segmenter;
import dev.tallystick.text.Text;
import java.util.List;

/**
 * One side of a pair, read: its sentences and verbatim blocks, and what the aligner knows of each.
 *
 * @param text the file
 * @param language its language as a BCP 47 tag, {@code und} if unknown
 * @param segments its sentences and verbatim blocks in order
 * @param units the same as the aligner sees them, one for each segment
 */
public record Reading(Text text, String language, List<Segment> segments, List<Unit> units) {
  /** Keeps the lists unchangeable. */
  public Reading {
    segments = List.copyOf(segments);
    units = List.copyOf(units);
  }

  /** Reads a file. */
  public static Reading of(Text text, Format format, String language, Cancellation cancellation) {
    List<Segment> segments =
        Segmenter.of(language).segments(text, format.blocks(text), cancellation);
    List<Unit> units = segments.stream().map(segment -> Units.unit(text, segment)).toList();
    return new Reading(text, language, segments, units);
  }
}
