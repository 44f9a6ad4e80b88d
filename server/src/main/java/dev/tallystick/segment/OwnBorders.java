package dev.tallystick.segment;

import java.util.BitSet;
import java.util.Set;

/** Borders that UAX #29 does not have, or has at another place. */
final class OwnBorders {
  /** Behind these a full-width stop is not the end. */
  private static final String GOING_ON = "、，：；,:;";

  private final Set<String> closers;
  private final Set<String> starters;

  OwnBorders(Usage usage) {
    this.closers = usage.get(Usage.CLOSERS);
    this.starters = closers.isEmpty() ? Set.of() : usage.get(Usage.STARTERS);
  }

  /** The places in a block of prose, {@code raw} with its line ends. */
  BitSet of(String prose, String raw, Marks marks, NearStops near) {
    BitSet borders = new BitSet(prose.length());
    for (int i = 0; i < near.count(); i++) {
      int at = near.place(i);
      char c = prose.charAt(at);
      if (c == '.') {
        addNumberInQuotes(borders, prose, marks, at + 1);
      } else if (c == '…') {
        addEllipsis(borders, prose, marks, at + 1);
      } else if (Marks.isDenseStop(c)) {
        addDense(borders, prose, marks, at + 1);
      }
    }
    if (near.thai()) {
      addThai(borders, prose, raw, marks);
    }
    return borders;
  }

  /**
   * UAX #29 looks for the first letter behind a full stop, and takes a small one for a sign that
   * the sentence goes on, even behind a number. But a number in quotation marks is a name, and says
   * nothing of how its sentence started.
   */
  private static void addNumberInQuotes(BitSet borders, String prose, Marks marks, int stop) {
    if (stop == prose.length() || !Blank.is(prose.charAt(stop)) && !marks.isMark(stop)) {
      return;
    }
    int end = marks.close(stop);
    int next = marks.skip(end);
    if (next > end && next < prose.length() && marks.isMark(next)) {
      boolean quote = Character.getType(prose.charAt(next)) != Character.START_PUNCTUATION;
      int inside = marks.skip(next + 1);
      borders.set(end, quote && inside < prose.length() && Character.isDigit(prose.charAt(inside)));
    }
  }

  /**
   * UAX #29 does not know the ellipsis in one character. It ends a sentence where three full stops
   * would: before a blank and a capital letter.
   */
  private static void addEllipsis(BitSet borders, String prose, Marks marks, int stop) {
    int end = marks.close(stop);
    int next = marks.skip(end);
    if (next > end && next < prose.length() && Character.isUpperCase(prose.codePointAt(next))) {
      borders.set(end);
    }
  }

  /**
   * A full-width stop ends the sentence whatever comes, but for another mark. UAX #29 waits for
   * letters, and so misses the border before ".conf" or "-R".
   */
  private static void addDense(BitSet borders, String prose, Marks marks, int stop) {
    int end = marks.close(stop);
    int next = marks.skip(end);
    if (next < prose.length()) {
      char c = prose.charAt(next);
      if (!Marks.isDenseStop(c) && GOING_ON.indexOf(c) < 0) {
        borders.set(end);
      }
    }
  }

  /**
   * Thai has no stops, and a blank parts clauses, numbers and names as well as sentences. So a
   * blank is a border only where it is a long one, behind a word of courtesy, which closes a
   * sentence, or before a word that opens one. The end of a line is a blank.
   */
  private void addThai(BitSet borders, String prose, String raw, Marks marks) {
    for (int end = 1; end < prose.length(); end++) {
      if (NearStops.isThai(prose.charAt(end - 1)) && Blank.is(prose.charAt(end))) {
        int next = marks.skip(end);
        borders.set(end, next < prose.length() && partsThai(prose, raw, end, next));
      }
    }
  }

  private boolean partsThai(String prose, String raw, int end, int next) {
    boolean line = raw.substring(end, next).chars().anyMatch(c -> c != ' ');
    return next - end > 1 && !line
        || closers.stream().anyMatch(word -> prose.startsWith(word, end - word.length()))
        || starters.stream().anyMatch(word -> prose.startsWith(word, next));
  }
}
