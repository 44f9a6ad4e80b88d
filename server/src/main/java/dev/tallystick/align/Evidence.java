package dev.tallystick.align;

import java.util.List;

/**
 * What the adaptive model makes of a link: the share of its shape, what the source says about the
 * target's length beyond the general run of lengths, the words both sides have, how the last
 * sentences close, what blocks they stand in, whether block borders agree, and in subtitles whether
 * both are on the screen at the same time ({@link Clock}). A null move has its share only: a
 * dropped sentence is not charged for its length, which is what keeps the published model from ever
 * finding one. A block left out whole costs less than its sentences one by one.
 *
 * <p>The weights were chosen by hand on published translations; words count less than their
 * likelihood ratio says since they are not independent.
 */
final class Evidence implements Scorer {
  /**
   * Degrees of freedom for the lengths of links of several source sentences. Lighter tails than for
   * 1-1: a merge that is far too short is the very picture of a dropped sentence. One sentence that
   * was parted into several often grew on the way.
   */
  private static final double MERGED_FREEDOM = 30;

  /** A link that its shape and lengths make so unlikely is not looked at any closer (nats). */
  private static final double HOPELESS = -20;

  private static final double CLOSING = 0.5;

  /** A link over the border of a block (nats). */
  private static final double BORDER_CROSSED = -2;

  /** If it joins a heading with text, say, this as well (nats). */
  private static final double KINDS_JOINED = -2;

  /** A link whose sides do not both open a block, or both go on with one (nats). */
  private static final double OPENING_DIFFERS = -1;

  /**
   * A unit without a counterpart (nats). Not fitted: where a translation is free, a fitted share
   * grows with every doubtful null it lets through.
   */
  private static final double LOG_NULL = Math.log(0.004);

  /** Each further unit of a whole block without a counterpart (nats). */
  private static final double LOG_NULL_GOES_ON = Math.log(0.03);

  /** Leaving out a fragment of so few letters is less likely than joining it to a neighbour. */
  private static final int FRAGMENT = 6;

  private static final double LOG_NULL_FRAGMENT = LOG_NULL - 1;

  /** Two verbatim blocks with the same content, and two without (nats). */
  private static final double SAME_VERBATIM = 6;

  private static final double OTHER_VERBATIM = 2;

  private final Side source;
  private final Side target;
  private final Background background;
  private final UnitWords shared;
  private final LinkWords words;
  private final Fit fit;
  private final LengthTable lengths;
  private final LengthTable mergedLengths;
  private final Clock clock;
  private final List<Shape> shapes;
  private final int[] right;
  private final int[] down;

  private Evidence(
      Texts texts, Fit fit, LengthTable lengths, LengthTable merged, List<Shape> shapes) {
    this.source = texts.sides().source();
    this.target = texts.sides().target();
    this.background = texts.background();
    this.shared = texts.shared();
    this.words = texts.words();
    this.fit = fit;
    this.lengths = lengths;
    this.mergedLengths = merged;
    this.clock = fit.clock();
    this.shapes = shapes;
    this.right = shapes.stream().mapToInt(Shape::sources).toArray();
    this.down = shapes.stream().mapToInt(Shape::targets).toArray();
  }

  /** With the common shapes only: enough to find the way through two texts. */
  static Evidence coarse(Texts texts, Fit fit) {
    return of(texts, fit, Shape.ADAPTIVE.subList(0, Shape.COMMON));
  }

  /** With all shapes. */
  static Evidence full(Texts texts, Fit fit) {
    return of(texts, fit, Shape.ADAPTIVE);
  }

  private static Evidence of(Texts texts, Fit fit, List<Shape> shapes) {
    return new Evidence(texts, fit, new LengthTable(fit.lengths()), merged(fit.lengths()), shapes);
  }

  /** By what two texts have taught, or an earlier state of them. */
  static Evidence calibrated(Sides sides, Calibration calibration, LinkWords words) {
    Background background = calibration.background().of(sides.target());
    Unit[] source = sides.source().units;
    Unit[] target = sides.target().units;
    UnitWords shared = (s, t) -> calibration.rarity().alike(source[s], target[t]);
    Texts texts = new Texts(sides, background, shared, words);
    return new Evidence(
        texts, calibration.fit(), calibration.lengths(), calibration.merged(), Shape.ADAPTIVE);
  }

  /** The lengths of links of several sentences. */
  static LengthTable merged(LengthModel lengths) {
    return new LengthTable(lengths.withFreedom(MERGED_FREEDOM));
  }

  /** What stays the same while the parameters of a pair are fitted. */
  record Texts(Sides sides, Background background, UnitWords shared, LinkWords words) {
    static Texts of(Sides sides) {
      return of(sides, new SharedWords(sides.source(), sides.target()));
    }

    static Texts of(Sides sides, SharedWords shared) {
      return new Texts(sides, new Background(sides.target()), shared, shared);
    }

    /** The same with words that were learnt. */
    Texts with(LinkWords learnt) {
      return new Texts(sides, background, shared, learnt);
    }
  }

  @Override
  public List<Shape> shapes() {
    return shapes;
  }

  @Override
  public void links(int t, int s, double[] into, int at) {
    double opening = opening(t, s);
    for (int shape = 0; shape < right.length; shape++) {
      into[at + shape] = link(shape, t, s, opening);
    }
  }

  private double link(int shape, int t, int s, double opening) {
    int sEnd = s + right[shape];
    int tEnd = t + down[shape];
    if (sEnd > source.size() || tEnd > target.size()) {
      return Row.NOWHERE;
    }
    if (source.hasVerbatim(s, sEnd) || target.hasVerbatim(t, tEnd)) {
      return verbatim(shape, t, s);
    }
    return opening + prose(shape, t, tEnd, s, sEnd);
  }

  /** Puts in the worth, in parts, of those shapes' links that are not known ({@link Fixed}). */
  void complete(int t, int s, int[] links, int at) {
    double opening = opening(t, s);
    for (int shape = 0; shape < right.length; shape++) {
      if (links[at + shape] == Cells.UNKNOWN) {
        links[at + shape] = Fixed.of(link(shape, t, s, opening));
      }
    }
  }

  private double verbatim(int shape, int t, int s) {
    Unit one = source.units[s];
    Unit other = target.units[t];
    if (shape != 0 || !one.verbatim() || !other.verbatim()) {
      return Row.NOWHERE;
    }
    return one.words()[0].key() == other.words()[0].key() ? SAME_VERBATIM : OTHER_VERBATIM;
  }

  private double opening(int t, int s) {
    if (s >= source.size() || t >= target.size()) {
      return 0;
    }
    Unit one = source.units[s];
    Unit other = target.units[t];
    double opening = opening(one, other);
    return clock == null
        ? opening
        : opening + clock.begins(Timeline.begin(one), Timeline.begin(other));
  }

  /** What the first units say, whatever the shape. */
  private double opening(Unit one, Unit other) {
    double kinds = fit.kinds().logRatio(one.kind(), other.kind());
    return one.opens() == other.opens() ? kinds : kinds + OPENING_DIFFERS;
  }

  private double prose(int shape, int t, int tEnd, int s, int sEnd) {
    double worth = fit.logShare(shape) + length(t, tEnd, s, sEnd);
    if (worth < HOPELESS) {
      return Row.NOWHERE;
    }
    worth += words.worth(s, sEnd, t, tEnd);
    int close = source.units[sEnd - 1].close();
    worth += CLOSING * fit.closes().logRatio(close, target.units[tEnd - 1].close());
    if (clock != null) {
      worth +=
          clock.ends(Timeline.end(source.units[sEnd - 1]), Timeline.end(target.units[tEnd - 1]));
    }
    return worth + crossing(source, s, sEnd) + crossing(target, t, tEnd);
  }

  private static double crossing(Side side, int from, int to) {
    if (!side.crossesBlocks(from, to)) {
      return 0;
    }
    for (int i = from + 1; i < to; i++) {
      if (side.units[i].kind() != side.units[from].kind()) {
        return BORDER_CROSSED + KINDS_JOINED;
      }
    }
    return BORDER_CROSSED;
  }

  /**
   * The log of how much likelier the source makes the target's length. Where that is parted into
   * several sentences, each way of parting is as likely as another.
   */
  private double length(int t, int tEnd, int s, int sEnd) {
    int l1 = source.length(s, sEnd);
    int l2 = target.length(t, tEnd);
    double given = (sEnd - s > 1 ? mergedLengths : lengths).logDensity(l1, l2);
    double parting = (tEnd - t - 1) * LengthTable.log(l2);
    return given - parting - background.logDensity(t, tEnd);
  }

  /**
   * How much likelier two units make each other by their lengths and words alone (nats). A pair too
   * short to teach its common words may still have a name or a number in both.
   */
  double alike(int t, int s) {
    if (source.units[s].verbatim() || target.units[t].verbatim()) {
      return Row.NOWHERE;
    }
    return length(t, t + 1, s, s + 1) + Math.max(shared.alike(s, t), words.alike(s, t));
  }

  @Override
  public double omission(int s) {
    return leftOut(source.units[s]);
  }

  @Override
  public double addition(int t) {
    return leftOut(target.units[t]);
  }

  private static double leftOut(Unit unit) {
    return unit.letters() < FRAGMENT && !unit.verbatim() ? LOG_NULL_FRAGMENT : LOG_NULL;
  }

  @Override
  public double omittedBlock(int units) {
    return LOG_NULL + (units - 1) * LOG_NULL_GOES_ON;
  }

  @Override
  public double addedBlock(int units) {
    return LOG_NULL + (units - 1) * LOG_NULL_GOES_ON;
  }

  @Override
  public double unfinished() {
    return LOG_NULL;
  }
}
