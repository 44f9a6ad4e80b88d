package dev.tallystick.align;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Every chain through two tiny texts, one by one: the slow way to what the lattice computes. */
final class AllChains {
  private final Scorer scorer;
  private final Side source;
  private final Side target;
  private final List<Match> taken = new ArrayList<>();
  private final Map<Match, Double> worths = new HashMap<>();
  private final double[] omitted;
  private final double[] added;
  private double total;

  /** The worth of the best chain (nats). */
  double best = Double.NEGATIVE_INFINITY;

  /** For each set of links the worth of the best chain with these. */
  private final Map<List<Match>, Double> bestWith = new HashMap<>();

  AllChains(Scorer scorer, Sides sides) {
    this.scorer = scorer;
    this.source = sides.source();
    this.target = sides.target();
    this.omitted = new double[source.size()];
    this.added = new double[target.size()];
    from(0, 0, 0);
  }

  /** What a chain is worth whose null moves are as good as its links allow. */
  double worth(List<Match> chain) {
    return bestWith.get(links(chain));
  }

  private static List<Match> links(List<Match> chain) {
    return chain.stream().filter(Match::twoSided).toList();
  }

  double link(int sourceFrom, int sourceTo, int targetFrom, int targetTo) {
    Match match = new Match(sourceFrom, sourceTo, targetFrom, targetTo, 1);
    return worths.getOrDefault(match, 0.0) / total;
  }

  double omitted(int unit) {
    return omitted[unit] / total;
  }

  double added(int unit) {
    return added[unit] / total;
  }

  private void from(int s, int t, double worth) {
    boolean free = scorer.unfinished() != Double.NEGATIVE_INFINITY;
    if (t == target.size() && (free || s == source.size())) {
      end(s, worth);
    }
    links(s, t, worth);
    if (s < source.size() && (t < target.size() || !free)) {
      leaveOut(s, s + 1, t, t, worth + scorer.omission(s));
      int end = blockEnd(source, s);
      if (end > s + 1) {
        leaveOut(s, end, t, t, worth + scorer.omittedBlock(end - s));
      }
    }
    if (t < target.size()) {
      leaveOut(s, s, t, t + 1, worth + scorer.addition(t));
      int end = blockEnd(target, t);
      if (end > t + 1) {
        leaveOut(s, s, t, end, worth + scorer.addedBlock(end - t));
      }
    }
  }

  private void links(int s, int t, double worth) {
    List<Shape> shapes = scorer.shapes();
    double[] links = new double[shapes.size()];
    scorer.links(t, s, links, 0);
    for (int shape = 0; shape < links.length; shape++) {
      if (links[shape] != Double.NEGATIVE_INFINITY) {
        int sEnd = s + shapes.get(shape).sources();
        int tEnd = t + shapes.get(shape).targets();
        taken.add(new Match(s, sEnd, t, tEnd, 1));
        from(sEnd, tEnd, worth + links[shape]);
        taken.remove(taken.size() - 1);
      }
    }
  }

  private void leaveOut(int s, int sEnd, int t, int tEnd, double worth) {
    for (int unit = s; unit < sEnd; unit++) {
      taken.add(new Match(unit, unit + 1, t, t, 1));
    }
    for (int unit = t; unit < tEnd; unit++) {
      taken.add(new Match(s, s, unit, unit + 1, 1));
    }
    from(sEnd, tEnd, worth);
    for (int i = sEnd - s + tEnd - t; i > 0; i--) {
      taken.remove(taken.size() - 1);
    }
  }

  /** The end of a block that starts here; the same place if none does. */
  private static int blockEnd(Side side, int from) {
    if (from > 0 && !side.units[from].opens()) {
      return from;
    }
    int end = from + 1;
    while (end < side.size() && !side.units[end].opens()) {
      end++;
    }
    return end;
  }

  private void end(int s, double worth) {
    double ended = s < source.size() ? worth + scorer.unfinished() : worth;
    double share = Math.exp(ended);
    List<Match> chain = new ArrayList<>(taken);
    for (int unit = s; unit < source.size(); unit++) {
      chain.add(new Match(unit, unit + 1, target.size(), target.size(), 1));
    }
    total += share;
    for (Match match : chain) {
      if (match.targets() == 0) {
        omitted[match.sourceFrom()] += share;
      } else if (match.sources() == 0) {
        added[match.targetFrom()] += share;
      } else {
        worths.merge(match, share, Double::sum);
      }
    }
    best = Math.max(best, ended);
    bestWith.merge(links(chain), ended, Math::max);
  }
}
