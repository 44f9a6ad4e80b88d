package dev.tallystick.segment;

import dev.tallystick.text.Problem;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.function.Consumer;
import java.util.regex.Matcher;

/**
 * Borders by the rules of an SRX file for one language, in one text. If one of the rules says where
 * sentences end, they replace ours; if all say only where none ends, they take borders away from
 * ours. A rule that does not come to an end in a block does not count there, nor in the blocks
 * after it.
 */
final class SrxBorders {
  private final List<SrxRule> alive;
  private final boolean replaces;
  private final Consumer<Problem> endless;
  private SrxRule current;

  /**
   * The borders in one text.
   *
   * @param endless takes each rule that does not come to an end, by its place in its file
   */
  SrxBorders(List<SrxRule> rules, Consumer<Problem> endless) {
    this.alive = new ArrayList<>(rules);
    this.replaces = rules.stream().anyMatch(SrxRule::breaks);
    this.endless = endless;
  }

  /** Whether our own borders do not count. */
  boolean replaces() {
    return replaces;
  }

  /**
   * The borders in the next block of prose.
   *
   * @param own our own borders; they do not count if these replace them
   */
  BitSet of(String prose, BitSet own) {
    while (true) {
      try {
        return borders(prose, replaces ? places(prose) : own);
      } catch (StepLimit.Exceeded | StackOverflowError e) {
        alive.remove(current);
        endless.accept(new Problem(current.span(), SrxReader.ENDLESS));
      }
    }
  }

  /** The places that a rule says a sentence ends at. */
  private BitSet places(String prose) {
    BitSet places = new BitSet(prose.length());
    for (SrxRule rule : alive) {
      current = rule;
      if (rule.breaks()) {
        Matcher matcher = rule.places(SrxRule.limited(prose));
        int from = 0;
        while (from <= prose.length() && matcher.find(from)) {
          places.set(matcher.end());
          from = matcher.start() + 1;
        }
      }
    }
    places.clear(0);
    return places;
  }

  private BitSet borders(String prose, BitSet candidates) {
    List<StepLimit> texts = alive.stream().map(rule -> SrxRule.limited(prose)).toList();
    BitSet borders = new BitSet(prose.length());
    for (int at = candidates.nextSetBit(0); at >= 0; at = candidates.nextSetBit(at + 1)) {
      borders.set(at, ends(texts, at));
    }
    return borders;
  }

  private boolean ends(List<StepLimit> texts, int place) {
    for (int i = 0; i < texts.size(); i++) {
      current = alive.get(i);
      if (current.tells(texts.get(i), place)) {
        return current.breaks();
      }
    }
    return !replaces;
  }
}
