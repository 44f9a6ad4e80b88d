package dev.tallystick.segment;

import dev.tallystick.text.Scripts;
import java.util.BitSet;

/**
 * The marks of a block of prose: where a sentence is over once its stop has come. UAX #29 takes
 * every bracket and quotation mark behind a stop for a closing one. Where the next sentence opens
 * with one and no blank parts them, as in Japanese, that mark is the next sentence's.
 */
final class Marks {
  private static final String DENSE = "。．｡！？";
  private static final String DOUBLE = "“”„‟";
  private static final String ANGLE = "«»‹›";
  private static final String NOTES = "†‡⁰¹²³⁴⁵⁶⁷⁸⁹";

  private final String prose;
  private BitSet closing;

  Marks(String prose) {
    this.prose = prose;
  }

  /** Whether a character is a stop of the scripts without blanks; they stand for nothing else. */
  static boolean isDenseStop(char c) {
    return c >= '。' && DENSE.indexOf(c) >= 0;
  }

  /** The first character from a place on that is no white space; the length if there is none. */
  int skip(int from) {
    int at = from;
    while (at < prose.length() && Blank.is(prose.charAt(at))) {
      at++;
    }
    return at;
  }

  /** The place behind the last stop before a border that may have marks and blanks before it. */
  int stopBefore(int border) {
    int at = border;
    while (at > 0
        && (Blank.is(prose.charAt(at - 1))
            || isMark(at - 1)
            || isNote(prose.charAt(at - 1))
            || isPicture(prose.codePointBefore(at)))) {
      at -= Character.charCount(prose.codePointBefore(at));
    }
    return at == 0 ? border : at;
  }

  /** The place behind all that belongs to the sentence whose stop ends at a place. */
  int close(int stop) {
    boolean dense = stop > 0 && isDenseStop(prose.charAt(stop - 1));
    int at = stop;
    while (true) {
      int next = skip(at);
      if (next == prose.length()) {
        return at;
      } else if (!dense && next == at && behindNote(at) > at) {
        at = behindNote(at);
      } else if (next == at && behindPictures(at) > at) {
        at = behindPictures(at);
      } else if (isMark(next) && closes(next)) {
        at = next + 1; // French writes a blank before it
      } else {
        return at;
      }
    }
  }

  private static boolean isNote(char c) {
    return NOTES.indexOf(c) >= 0;
  }

  /** The place behind the sign of a note or its number in brackets, if a blank comes then. */
  private int behindNote(int at) {
    int to = at + 1;
    if (prose.charAt(at) == '[') {
      while (to < prose.length() && Character.isDigit(prose.charAt(to))) {
        to++;
      }
      to = prose.startsWith("]", to) ? to + 1 : at;
    } else if (!isNote(prose.charAt(at))) {
      to = at;
    }
    return to == prose.length() || Blank.is(prose.charAt(to)) ? to : at;
  }

  /** The place behind pictures such as a smiley, if a blank comes then: they end what is said. */
  private int behindPictures(int at) {
    int to = at;
    while (to < prose.length() && isPicture(prose.codePointAt(to))) {
      to += Character.charCount(prose.codePointAt(to));
    }
    return to == prose.length() || Blank.is(prose.charAt(to)) ? to : at;
  }

  /** A picture, or what makes another of it: a shade of skin, a joiner, a choice of its look. */
  private static boolean isPicture(int c) {
    int type = Character.getType(c);
    return c > '\u2000' && (type == Character.OTHER_SYMBOL || type == Character.MODIFIER_SYMBOL)
        || c == '\u200D'
        || c == '\uFE0F';
  }

  /** Whether a bracket or quotation mark stands at a place. */
  boolean isMark(int at) {
    char c = prose.charAt(at);
    return c == '"'
        || c == '\''
        || switch (Character.getType(c)) {
          case Character.START_PUNCTUATION,
              Character.END_PUNCTUATION,
              Character.INITIAL_QUOTE_PUNCTUATION,
              Character.FINAL_QUOTE_PUNCTUATION ->
              true;
          default -> false;
        };
  }

  /**
   * Whether the mark at a place closes. A bracket says so itself. Which quotation marks open
   * differs from language to language, so what counts is on which side of it a blank stands, and
   * where there is one on neither or both sides, its kind and whether the one before it opened.
   */
  boolean closes(int at) {
    char c = prose.charAt(at);
    int type = Character.getType(c);
    if (type == Character.END_PUNCTUATION || type == Character.START_PUNCTUATION) {
      return type == Character.END_PUNCTUATION;
    }
    if (blankBefore(at) != blankBehind(at)) {
      return blankBehind(at);
    }
    if (c == '\'' || c == '‘' || c == '’') {
      // An apostrophe is written the same; no use to count.
      return blankBehind(at) || !Character.isLetterOrDigit(prose.charAt(at + 1));
    }
    return closing().get(at);
  }

  private boolean blankBefore(int at) {
    return at == 0 || Blank.is(prose.charAt(at - 1));
  }

  private boolean blankBehind(int at) {
    return at + 1 == prose.length() || Blank.is(prose.charAt(at + 1));
  }

  /** The double quotation marks that close, none of which has a blank on just one side. */
  private BitSet closing() {
    if (closing == null) {
      closing = new BitSet(prose.length());
      for (String kind : new String[] {"\"", DOUBLE, ANGLE}) {
        char before = ' ';
        boolean open = false;
        for (int i = 0; i < prose.length(); i++) {
          char c = prose.charAt(i);
          if (kind.indexOf(c) >= 0) {
            open = blankBefore(i) == blankBehind(i) ? opens(c, i, before, open) : blankBefore(i);
            closing.set(i, !open);
            before = c;
          }
        }
      }
    }
    return closing;
  }

  /**
   * Whether a mark opens that no blank tells of.
   *
   * @param before the mark of its kind before it
   * @param open whether that one opened
   */
  private boolean opens(char c, int at, char before, boolean open) {
    return switch (c) {
      case '„', '‟' -> true;
      case '”' -> false;
      case '“' -> before != '„'; // as in German and Czech
      default ->
          c != '"' && blankBefore(at)
              ? Character.getType(c) == Character.INITIAL_QUOTE_PUNCTUATION // « as in French »
              : !open;
    };
  }

  /** Whether a letter of a script without blanks, or one of its marks, stands at a place. */
  boolean isDense(int at) {
    char c = prose.charAt(at);
    return c >= '　' && c <= '〿'
        || c >= '！' && c <= '･'
        || Scripts.isUnspaced(prose.codePointAt(at));
  }
}
