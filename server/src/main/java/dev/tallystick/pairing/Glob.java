package dev.tallystick.pairing;

import java.util.BitSet;
import java.util.List;
import java.util.Optional;

/**
 * Names of files by wildcards, as the Language Server Protocol has them: {@code *} is any number of
 * characters of one name, {@code ?} is one of them, {@code **} reaches across folders and in {@code
 * **}{@code /} may stand for none, {@code {a,b}} is either, {@code [a-z]} is one of a range and
 * {@code [!a-z]} one outside of it. What matches a folder matches all that is in it.
 *
 * <p>All ways to match are followed at once, character by character, so no wildcards make the time
 * grow faster than the name times the glob.
 */
public final class Glob {
  private final String written;
  private final GlobParser.Step[] steps;
  private final int[][] branches;

  private Glob(String written, List<GlobParser.Step> steps) {
    this.written = written;
    this.steps = steps.toArray(GlobParser.Step[]::new);
    this.branches =
        steps.stream()
            .map(step -> step.branches().stream().mapToInt(Integer::intValue).toArray())
            .toArray(int[][]::new);
  }

  /** Reads a glob; empty if a bracket or brace in it is not closed, or closes nothing. */
  public static Optional<Glob> of(String written) {
    String whole = written.endsWith("/") ? written.substring(0, written.length() - 1) : written;
    return GlobParser.parse(whole).map(steps -> new Glob(written, steps));
  }

  /** Whether a file, or a folder that it is in, has such a name: a path with {@code /}. */
  public boolean matches(String path) {
    BitSet at = new BitSet(steps.length + 1);
    BitSet next = new BitSet(steps.length + 1);
    at.set(0);
    followBranches(at);
    for (int i = 0; i < path.length() && !at.isEmpty(); ) {
      int c = path.codePointAt(i);
      if (c == '/' && i > 0 && at.get(steps.length)) {
        return true;
      }
      step(at, c, next);
      BitSet spare = at;
      at = next;
      next = spare;
      i += Character.charCount(c);
    }
    return at.get(steps.length);
  }

  /** Finds the steps to take next once a character is read. */
  private void step(BitSet at, int c, BitSet next) {
    next.clear();
    for (int i = at.nextSetBit(0); i >= 0 && i < steps.length; i = at.nextSetBit(i + 1)) {
      if (steps[i].takes(c)) {
        next.set(steps[i].repeats() ? i : i + 1);
      }
    }
    followBranches(next);
  }

  /** Branches lead to later steps only, so one pass finds them all. */
  private void followBranches(BitSet at) {
    for (int i = at.nextSetBit(0); i >= 0 && i < steps.length; i = at.nextSetBit(i + 1)) {
      for (int branch : branches[i]) {
        at.set(branch);
      }
    }
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Glob glob && glob.written.equals(written);
  }

  @Override
  public int hashCode() {
    return written.hashCode();
  }

  /** The glob as it was written. */
  @Override
  public String toString() {
    return written;
  }
}
