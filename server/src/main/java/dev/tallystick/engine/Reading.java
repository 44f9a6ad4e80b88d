package dev.tallystick.engine;

import dev.tallystick.align.Unit;
import dev.tallystick.pairing.Language;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.segment.KnownSentences;
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
    Tongue tongue = Tongue.of(new Language(language));
    return of(text, format, tongue, TextRules.USUAL, Earlier.nothing(), cancellation);
  }

  /** Reads a file as its project wants it. */
  public static Reading of(
      Text text, Format format, Tongue tongue, TextRules rules, Cancellation cancellation) {
    return of(text, format, tongue, rules, Earlier.nothing(), cancellation);
  }

  /**
   * What was found in an earlier state of a file, in the same language and by the same rules.
   *
   * @param sentences where the sentences of its blocks are
   * @param units what the aligner knows of them
   */
  record Earlier(KnownSentences sentences, Units units) {
    static Earlier nothing() {
      return new Earlier(KnownSentences.none(), new Units());
    }

    /** The same again: whoever had it may still be at work. */
    Earlier again() {
      return new Earlier(sentences.again(), units.again());
    }

    /** For the next state of the file, once this one is read. */
    Earlier next() {
      return new Earlier(sentences.next(), units.next());
    }
  }

  /** The same; {@code earlier} makes it quicker and no other, and takes in what is found. */
  static Reading of(
      Text text,
      Format format,
      Tongue tongue,
      TextRules rules,
      Earlier earlier,
      Cancellation cancellation) {
    String language = tongue.in(text, format).tag();
    Set<Problem> endless = new LinkedHashSet<>();
    List<Segment> segments =
        Segmenter.of(language, rules.borders())
            .segments(
                text,
                format.blocks(text, rules.frontMatter()),
                endless::add,
                earlier.sentences(),
                cancellation);
    List<Unit> units =
        segments.stream().map(segment -> earlier.units().unit(text, segment)).toList();
    return new Reading(text, format, language, segments, units, List.copyOf(endless));
  }
}
