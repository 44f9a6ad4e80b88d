package dev.tallystick.align;

import java.util.List;

/**
 * What is different in one of two lists: units from {@code from} on.
 *
 * @param from how many units at the start are the same
 * @param removed how many units behind are gone
 * @param added how many came in their place
 */
record Change(int from, int removed, int added) {
  /** The smallest change that makes one list the other. */
  static Change between(List<Unit> before, List<Unit> now) {
    int most = Math.min(before.size(), now.size());
    int from = 0;
    while (from < most && same(before.get(from), now.get(from))) {
      from++;
    }
    int behind = 0;
    while (behind < most - from
        && same(before.get(before.size() - 1 - behind), now.get(now.size() - 1 - behind))) {
      behind++;
    }
    return new Change(from, before.size() - behind - from, now.size() - behind - from);
  }

  private static boolean same(Unit one, Unit other) {
    return one == other || one.same(other);
  }

  int shift() {
    return added - removed;
  }

  boolean isNone() {
    return removed == 0 && added == 0;
  }

  /** Whether some units are as they were. */
  boolean keeps(int start, int end) {
    return end <= from || start >= from + removed;
  }

  /** Where a unit is now that is as it was. */
  int moved(int unit) {
    return unit < from + removed ? unit : unit + shift();
  }

  /** Where a node was; less than 0 if it is one between new units. */
  int before(int node) {
    if (node <= from) {
      return node;
    }
    return node >= from + added ? node - shift() : -1;
  }
}
