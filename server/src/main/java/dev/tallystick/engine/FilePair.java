package dev.tallystick.engine;

import dev.tallystick.check.OnSide;
import dev.tallystick.pairing.Language;
import dev.tallystick.pairing.Pair;
import dev.tallystick.pairing.Why;
import java.nio.file.Path;
import java.util.Comparator;

/**
 * Two files of this machine that belong together.
 *
 * @param source the source, absolute
 * @param target its translation, absolute
 * @param sourceLanguage language of the source
 * @param targetLanguage language of the translation
 * @param why how the two were found to belong together
 */
public record FilePair(
    Path source, Path target, Language sourceLanguage, Language targetLanguage, Why why)
    implements Comparable<FilePair> {
  private static final Comparator<FilePair> ORDER =
      Comparator.comparing(FilePair::source)
          .thenComparing(FilePair::targetLanguage)
          .thenComparing(FilePair::target)
          .thenComparing(FilePair::sourceLanguage)
          .thenComparing(FilePair::why);

  /** Two that the user named. */
  public FilePair(Path source, Path target, Language sourceLanguage, Language targetLanguage) {
    this(source, target, sourceLanguage, targetLanguage, Why.ARGUMENT);
  }

  static FilePair of(Listing listing, Pair pair) {
    return new FilePair(
        listing.file(pair.source()),
        listing.file(pair.target()),
        pair.sourceLanguage(),
        pair.targetLanguage(),
        pair.why());
  }

  /** The file on a side. */
  public Path file(OnSide side) {
    return side == OnSide.SOURCE ? source : target;
  }

  /** The language of a side. */
  public Language language(OnSide side) {
    return side == OnSide.SOURCE ? sourceLanguage : targetLanguage;
  }

  /** The same two in the languages that their texts were read in. */
  FilePair as(PairResult read) {
    return new FilePair(
        source, target, read.language(OnSide.SOURCE), read.language(OnSide.TARGET), why);
  }

  /** Whether a file is one of the two. */
  public boolean has(Path file) {
    return source.equals(file) || target.equals(file);
  }

  /** Which of the two a file is. */
  OnSide side(Path file) {
    return source.equals(file) ? OnSide.SOURCE : OnSide.TARGET;
  }

  @Override
  public int compareTo(FilePair other) {
    return ORDER.compare(this, other);
  }
}
