package dev.tallystick.align;

/** Learns the parameters of a pair from the posteriors of its links. */
final class Refit {
  /** Links less probable than this teach nothing. */
  private static final double LEAST = 0.02;

  /** So many links of the general shares are mixed in. */
  private static final double PRIOR = 15;

  private final Side source;
  private final Side target;
  private final int looked;
  private final double[] shapes = new double[Shape.ADAPTIVE.size()];
  private final double[][] closes = new double[Unit.CLOSES][Unit.CLOSES];
  private final double[][] kinds = new double[Unit.KINDS][Unit.KINDS];
  private final LengthFit lengths;
  private final ClockFit clock;

  private Refit(Lattice lattice, double ratio) {
    this.source = lattice.source();
    this.target = lattice.target();
    this.looked = lattice.scorer().shapes().size();
    this.lengths = new LengthFit(source.size() + target.size(), ratio);
    Sides sides = new Sides(source, target);
    this.clock = sides.timed() ? new ClockFit(sides) : null;
  }

  /** What a lattice teaches. Shapes that it did not look for keep their general share. */
  static Fit from(Posteriors posteriors, Lattice lattice, Fit before) {
    Refit refit = new Refit(lattice, before.lengths().ratio());
    posteriors.links(LEAST, refit::learn);
    return refit.fit(before);
  }

  private void learn(int shape, int t, int s, double posterior) {
    Shape taken = Shape.ADAPTIVE.get(shape);
    int sEnd = s + taken.sources();
    int tEnd = t + taken.targets();
    if (source.units[s].verbatim()) {
      return;
    }
    shapes[shape] += posterior;
    closes[source.units[sEnd - 1].close()][target.units[tEnd - 1].close()] += posterior;
    kinds[source.units[s].kind()][target.units[t].kind()] += posterior;
    if (clock != null) {
      clock.add(s, sEnd, t, tEnd, posterior);
    }
    if (posterior > 0.5) {
      lengths.add(source.length(s, sEnd), target.length(t, tEnd), posterior);
    }
  }

  private Fit fit(Fit before) {
    double all = PRIOR;
    for (double count : shapes) {
      all += count;
    }
    double[] logShares = new double[shapes.length];
    for (int shape = 0; shape < shapes.length; shape++) {
      double share = Shape.ADAPTIVE.get(shape).share();
      boolean known = shape < looked;
      logShares[shape] = Math.log(known ? (PRIOR * share + shapes[shape]) / all : share);
    }
    return new Fit(
        lengths.fit(),
        logShares,
        Affinity.of(closes, Fit.closes(target)),
        Affinity.of(kinds, Fit.kinds(target)),
        clock == null ? null : clock.fit(before.clock()));
  }
}
