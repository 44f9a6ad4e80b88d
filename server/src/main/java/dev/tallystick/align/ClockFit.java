package dev.tallystick.align;

import java.util.ArrayList;
import java.util.List;

/**
 * Fits a {@link Clock} to links by expectation and maximization: how probable each moment is to be
 * no stray one, the weighted line through all moments, then their spread and the share of strays.
 */
final class ClockFit {
  private static final int STEPS = 10;

  /** How far the scale may stray from one that there is a reason for (standard deviation). */
  private static final double SCALE_DEVIATION = 0.0005;

  /** So many moments of a usual spread (seconds) are mixed in. */
  private static final double PRIOR = 5;

  private static final double USUAL_SPREAD = 0.3;

  /** Whatever the links say (seconds): less is not noticed. Common practice, no source. */
  private static final double LEAST_SPREAD = 0.15;

  /** So many moments with a usual share of strays are mixed in. */
  private static final double STRAY_PRIOR = 20;

  private static final double USUAL_STRAY = 0.05;

  /**
   * Where more begins are stray than this, the clock is none. In a translation cut anew up to a
   * sixth are, where a scene was cut out midway a quarter and more.
   */
  private static final double MOST_STRAY = 0.25;

  private final Sides sides;
  private final List<Link> links = new ArrayList<>();

  /** A probable link: its first target unit and its times (seconds). */
  record Link(
      int target,
      double sourceFrom,
      double sourceTo,
      double targetFrom,
      double targetTo,
      double posterior) {
    /** Where the source starts in the target, if this link is right. */
    double offset(double scale) {
      return targetFrom - scale * sourceFrom;
    }
  }

  ClockFit(Sides sides) {
    this.sides = sides;
  }

  /** Adds a link, if its times are known. */
  void add(int s, int sEnd, int t, int tEnd, double posterior) {
    Timeline source = sides.source().timeline;
    Timeline target = sides.target().timeline;
    Link link =
        new Link(
            t, source.from(s), source.to(sEnd - 1), target.from(t), target.to(tEnd - 1), posterior);
    double sum = link.sourceFrom + link.sourceTo + link.targetFrom + link.targetTo;
    if (!Double.isNaN(sum)) {
      links.add(link);
    }
  }

  /**
   * The clock that suits the links; null if none does.
   *
   * @param before the one that the links were judged by; null if by none
   */
  Clock fit(Clock before) {
    if (links.isEmpty()) {
      return null;
    }
    Clock clock = before == null ? ClockSearch.byLinks(sides, links) : before;
    for (int step = 0; clock != null && step < STEPS; step++) {
      clock = better(clock);
    }
    return clock == null || clock.begins().stray() > MOST_STRAY ? null : clock;
  }

  private Clock better(Clock clock) {
    Line line = new Line(clock);
    Moments begins = new Moments(clock.begins());
    Moments ends = new Moments(clock.ends());
    for (Link link : links) {
      double begin = clock.off(link.sourceFrom, link.targetFrom);
      double end = clock.off(link.sourceTo, link.targetTo);
      line.add(
          link.sourceFrom, begin, link.posterior * clock.begins().share(begin), clock.begins());
      line.add(link.sourceTo, end, link.posterior * clock.ends().share(end), clock.ends());
      begins.add(begin, link.posterior);
      ends.add(end, link.posterior);
    }
    return line.clock(begins.jitter(), ends.jitter());
  }

  /** The line through what is left between a clock and the moments. */
  private static final class Line {
    private final Clock clock;
    private double all;
    private double x;
    private double y;
    private double xx;
    private double xy;

    Line(Clock clock) {
      this.clock = clock;
    }

    void add(double time, double off, double weight, Jitter jitter) {
      double w = weight * jitter.weight(off) / (jitter.spread() * jitter.spread());
      all += w;
      x += w * time;
      y += w * off;
      xx += w * time * time;
      xy += w * time * off;
    }

    Clock clock(Jitter begins, Jitter ends) {
      if (all <= 0) {
        return new Clock(clock.scale(), clock.offset(), begins, ends);
      }
      double mean = x / all;
      double stiff = 1 / (SCALE_DEVIATION * SCALE_DEVIATION);
      double pull = stiff * (ClockSearch.likelyScale(clock.scale()) - clock.scale());
      double slope = (xy - mean * y + pull) / (Math.max(0, xx - mean * x) + stiff);
      double shift = y / all - slope * mean;
      return new Clock(clock.scale() + slope, clock.offset() + shift, begins, ends);
    }
  }

  /** How far the begins, or the ends, lie from where they should. */
  private static final class Moments {
    private final Jitter jitter;
    private double all;
    private double timely;
    private double squares;

    Moments(Jitter jitter) {
      this.jitter = jitter;
    }

    void add(double off, double posterior) {
      double share = posterior * jitter.share(off);
      all += posterior;
      timely += share;
      squares += share * jitter.weight(off) * off * off;
    }

    Jitter jitter() {
      double spread = Math.sqrt((PRIOR * USUAL_SPREAD * USUAL_SPREAD + squares) / (PRIOR + timely));
      double stray = (STRAY_PRIOR * USUAL_STRAY + all - timely) / (STRAY_PRIOR + all);
      return jitter.with(Math.max(LEAST_SPREAD, spread), stray);
    }
  }
}
