package dev.tallystick.align;

import java.util.Arrays;

/**
 * What the aligner knows of one sentence, or of one verbatim block.
 *
 * @param length how much the sentence says, in letters of an alphabet; what is copied in it counts
 *     for little
 * @param codePoints its characters as Unicode has them, all of them: what the published model takes
 * @param letters how many of these are letters or digits
 * @param opens whether it is the first of its block
 * @param kind a small number, equal for blocks that look alike (a heading of level 2, a cell); from
 *     0 to {@value #KINDS} - 1
 * @param close how it ends: a number from 0 to {@value #CLOSES} - 1
 * @param words the keys of its words in order; equal words have equal keys
 * @param verbatim whether it is no sentence but a block copied as it stands, such as code
 * @param from when it comes on the screen, in milliseconds from the start of the film
 * @param to when it goes; before {@code from} if either is unknown
 */
public record Unit(
    int length,
    int codePoints,
    int letters,
    boolean opens,
    int kind,
    int close,
    Word[] words,
    boolean verbatim,
    long from,
    long to) {

  /** How many kinds of block there are. */
  public static final int KINDS = 12;

  /** How many ways there are to close a sentence. */
  public static final int CLOSES = 5;

  /** One of which nothing says when it is on the screen. */
  public Unit(
      int length,
      int codePoints,
      int letters,
      boolean opens,
      int kind,
      int close,
      Word[] words,
      boolean verbatim) {
    this(length, codePoints, letters, opens, kind, close, words, verbatim, 0, -1);
  }

  /** The same, shown at this time. */
  public Unit shown(long start, long end) {
    return new Unit(length, codePoints, letters, opens, kind, close, words, verbatim, start, end);
  }

  /** Whether another unit is equal to this one; records with arrays are not by themselves. */
  boolean same(Unit other) {
    return length == other.length
        && codePoints == other.codePoints
        && letters == other.letters
        && opens == other.opens
        && kind == other.kind
        && close == other.close
        && verbatim == other.verbatim
        && from == other.from
        && to == other.to
        && Arrays.equals(words, other.words);
  }

  boolean timed() {
    return from <= to;
  }

  /**
   * One word.
   *
   * @param key equal for equal words, and for them only (up to a collision in 64 bits)
   * @param stem equal for words that begin with the same letters, and so may be forms of one
   * @param root equal for words that begin alike, and so may be related in two languages; 0 if the
   *     word is too short for that, or no word
   * @param trust how likely the word is, from 0 to 1, to stand unchanged in a translation, given
   *     that it stands somewhere in the other text
   */
  public record Word(long key, long stem, long root, double trust) {
    private static final double NUMBER = 0.9;
    private static final double WHOLE = 0.5;

    /** A word that has no other forms. */
    public Word(long key, double trust) {
      this(key, key, 0, trust);
    }

    /** Whether it has a digit. */
    boolean number() {
      return trust >= NUMBER;
    }

    /** What the same word on the other side is worth as its translation, from 0 to 1. */
    double likeness() {
      return trust >= WHOLE ? 1 : 2 * trust;
    }
  }
}
