package dev.tallystick.align;

import java.util.ArrayList;
import java.util.List;

/** The best chain of a table, of which an edit makes anew what it has touched. */
final class Matches {
  private final Way way;
  private final Weights weights;
  private List<Match> all = List.of();

  Matches(Table table, Weights weights) {
    this.way = table.way;
    this.weights = weights;
  }

  /** The chain by now, after these changes of the texts. */
  List<Match> update(Change inSource, Change inTarget) {
    if (weights.changed.isEmpty()) {
      return all;
    }
    int row = way.nodeAbove(weights.changed.from - 1);
    int end = way.nodeBelow(Math.min(way.targets, weights.changed.to));
    List<Match> now = new ArrayList<>(all.size() + 16);
    now.addAll(all.subList(0, before(row, way.first[row])));
    while (row < end) {
      leaveOut(now, row, way.first[row], way.last[row]);
      int next = way.nodeBelow(row);
      addMoveDown(now, row, next);
      row = next;
    }
    if (weights.changed.to >= way.targets || end == way.targets) {
      leaveOut(now, way.targets, way.first[way.targets], way.sources);
    } else {
      addBehind(now, end - inTarget.shift(), way.first[end] - inSource.shift(), inSource, inTarget);
    }
    weights.changed.clear();
    all = now;
    return all;
  }

  /** How many of the known matches lie before a node. */
  private int before(int row, int column) {
    int from = 0;
    int to = all.size();
    while (from < to) {
      int middle = (from + to) >>> 1;
      Match match = all.get(middle);
      if (match.targetTo() <= row && match.sourceTo() <= column) {
        from = middle + 1;
      } else {
        to = middle;
      }
    }
    return from;
  }

  /** The known matches behind a node, moved along with their units. */
  private void addBehind(List<Match> now, int row, int column, Change inSource, Change inTarget) {
    List<Match> kept = all.subList(before(row, column), all.size());
    int s = inSource.shift();
    int t = inTarget.shift();
    if (s == 0 && t == 0) {
      now.addAll(kept);
      return;
    }
    for (Match match : kept) {
      now.add(
          new Match(
              match.sourceFrom() + s,
              match.sourceTo() + s,
              match.targetFrom() + t,
              match.targetTo() + t,
              match.confidence()));
    }
  }

  private void addMoveDown(List<Match> now, int row, int next) {
    int column = way.last[row];
    if (way.first[next] > column) {
      now.add(new Match(column, way.first[next], row, next, weights.link(row)));
      return;
    }
    for (int unit = row; unit < next; unit++) {
      now.add(new Match(column, column, unit, unit + 1, weights.added(unit)));
    }
  }

  private void leaveOut(List<Match> now, int row, int from, int to) {
    for (int unit = from; unit < to; unit++) {
      now.add(new Match(unit, unit + 1, row, row, weights.omitted(unit)));
    }
  }
}
