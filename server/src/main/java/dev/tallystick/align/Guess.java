package dev.tallystick.align;

import java.util.ArrayList;
import java.util.List;

/** Where the way through two texts may lead after an edit: where it led before, moved along. */
final class Guess {
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

    /** Whether a stretch of units is as it was, and does not lie around the change. */
    boolean keeps(int start, int end) {
      return end <= from || start >= from + removed;
    }

    /** Where a unit is now that is as it was. */
    int moved(int unit) {
      return unit < from + removed ? unit : unit + shift();
    }
  }

  private Guess() {}

  /** The matches that the changes leave, and all other units left out. */
  static List<Match> of(
      List<Match> before, Change source, Change target, int sources, int targets) {
    List<Match> chain = new ArrayList<>();
    int s = 0;
    int t = 0;
    for (Match match : before) {
      if (match.twoSided()
          && source.keeps(match.sourceFrom(), match.sourceTo())
          && target.keeps(match.targetFrom(), match.targetTo())) {
        int toSource = source.moved(match.sourceFrom());
        int toTarget = target.moved(match.targetFrom());
        leaveOut(chain, s, toSource, t, toTarget);
        s = toSource + match.sources();
        t = toTarget + match.targets();
        chain.add(new Match(toSource, s, toTarget, t, 1));
      }
    }
    leaveOut(chain, s, sources, t, targets);
    return chain;
  }

  private static void leaveOut(List<Match> chain, int s, int sEnd, int t, int tEnd) {
    for (int unit = t; unit < tEnd; unit++) {
      chain.add(new Match(s, s, unit, unit + 1, 1));
    }
    for (int unit = s; unit < sEnd; unit++) {
      chain.add(new Match(unit, unit + 1, tEnd, tEnd, 1));
    }
  }
}
