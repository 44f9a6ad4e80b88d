package dev.tallystick.check;

import dev.tallystick.align.Match;
import dev.tallystick.prose.Block;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Scripts;
import java.util.Arrays;
import java.util.List;

/**
 * Cells of tables without a counterpart of which that says little, as both cells beside them have
 * one: a word such as "ditto", for which others put a sign or nothing; and any cell where code
 * stands on the other side that nothing stands for, as a name may be marked as code in one text
 * only. A whole row that is missing is another matter.
 */
final class Slight {
  /** The most that a cell of little weight holds: a letter of a dense script counts for two. */
  private static final int MOST = 5;

  private final List<Segment> own;
  private final List<Segment> other;
  private final double[] ownNull;
  private final double[] otherNull;
  private final int[] gaps;

  /** For the sentences of a side. */
  Slight(Subject subject, OnSide side) {
    boolean source = side == OnSide.SOURCE;
    this.own = source ? subject.source() : subject.target();
    this.other = source ? subject.target() : subject.source();
    this.ownNull = source ? subject.alignment().sourceNull() : subject.alignment().targetNull();
    this.otherNull = source ? subject.alignment().targetNull() : subject.alignment().sourceNull();
    this.gaps = new int[own.size()];
    for (Match match : subject.alignment().matches()) {
      if (source) {
        Arrays.fill(gaps, match.sourceFrom(), match.sourceTo(), match.targetFrom());
      } else {
        Arrays.fill(gaps, match.targetFrom(), match.targetTo(), match.sourceFrom());
      }
    }
  }

  /** Whether it says little that nothing stands for a sentence. */
  boolean is(int index) {
    return own.get(index).block().kind() == Block.Kind.CELL
        && own.get(index).opens()
        && (index + 1 == own.size() || own.get(index + 1).opens())
        && !isOpen(own, ownNull, index - 1)
        && !isOpen(own, ownNull, index + 1)
        && (isShort(own.get(index)) || isOpenCode(gaps[index]) || isOpenCode(gaps[index] - 1));
  }

  private static boolean isShort(Segment segment) {
    if (segment.length() > MOST) {
      return false;
    }
    long dense = segment.prose().codePoints().filter(Scripts::isUnspaced).count();
    return segment.length() + dense <= MOST;
  }

  private boolean isOpenCode(int index) {
    return isOpen(other, otherNull, index) && other.get(index).verbatim();
  }

  private static boolean isOpen(List<Segment> segments, double[] none, int index) {
    return index >= 0 && index < segments.size() && none[index] >= Omissions.LEAST;
  }
}
