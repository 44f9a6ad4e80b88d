package dev.tallystick.segment;

import com.ibm.icu.text.BreakIterator;
import dev.tallystick.text.Problem;
import java.util.BitSet;
import java.util.List;
import java.util.function.Consumer;

/** Where sentences end in one text: by our own rules, by those of its project, or by both. */
final class TextBorders {
  private final Borders own;
  private final SrxBorders rules;
  private BreakIterator iterator;

  /**
   * The borders in one text.
   *
   * @param rules of the project for the language; may be none
   * @param endless takes each of them that does not come to an end
   */
  TextBorders(Borders own, List<SrxRule> rules, Consumer<Problem> endless) {
    this.own = own;
    this.rules = rules.isEmpty() ? null : new SrxBorders(rules, endless);
  }

  /** Whether only the rules of the project count. */
  boolean replaced() {
    return rules != null && rules.replaces();
  }

  /** The places where a sentence ends in the next block, its end left out or not. */
  BitSet of(BlockProse block) {
    BitSet ours = replaced() ? new BitSet() : ours(block);
    return rules == null ? ours : rules.of(block.string(), ours);
  }

  private BitSet ours(BlockProse block) {
    if (iterator == null) {
      iterator = own.iterator();
    }
    return own.of(iterator, block.plain(), block.raw());
  }
}
