package dev.tallystick.segment;

import java.util.Arrays;

/**
 * Where the prose of a block may end a sentence, and the prose without all that is far from there.
 * UAX #29 ends a sentence behind a stop alone, and looks from it at the character before (SB6, SB7)
 * and as far as the next letter (SB8). So the rest has no say, and ICU need not read it: most of
 * nearly every text.
 */
final class NearStops {
  /** ASCII that ends no sentence; asked for first, as it is nearly all of most texts. */
  private static final boolean[] PLAIN = new boolean[0x80];

  static {
    for (char c = 0; c < PLAIN.length; c++) {
      PLAIN[c] = !mayEnd(c);
    }
  }

  private final StringBuilder string = new StringBuilder();
  private int[] places = new int[8];
  private int count;
  private int[] inProse = new int[4];
  private int[] inString = new int[4];
  private int stretches;
  private int next;
  private boolean thai;

  NearStops(String prose) {
    int behind = 0;
    char[] all = prose.toCharArray(); // a fresh process reads it much faster than a string
    for (int i = 0; i < all.length; i++) {
      char c = all[i];
      if (c < PLAIN.length && PLAIN[c]) {
        continue;
      }
      thai |= isThai(c);
      if (mayEnd(c)) {
        places = count == places.length ? Arrays.copyOf(places, 2 * count) : places;
        places[count++] = i;
        if (i >= behind) {
          int from = base(prose, i, behind);
          behind = letter(prose, i + 1);
          add(prose, from, behind);
        }
      }
    }
  }

  private void add(String prose, int from, int to) {
    if (stretches == inProse.length) {
      inProse = Arrays.copyOf(inProse, 2 * stretches);
      inString = Arrays.copyOf(inString, 2 * stretches);
    }
    inProse[stretches] = from;
    inString[stretches++] = string.length();
    string.append(prose, from, to);
  }

  /** Every stop of UAX #29 in any language, and much that is none. */
  private static boolean mayEnd(char c) {
    if (c < 0x80) {
      return c == '.' || c == '!' || c == '?' || c == ';';
    }
    int type = Character.getType(c);
    return type == Character.OTHER_PUNCTUATION
        || type == Character.UNASSIGNED // by this Java, not by ICU
        || type == Character.SURROGATE;
  }

  /** The place of the character before a stop that counts: marks on it do not (SB5). */
  private static int base(String prose, int stop, int first) {
    int at = stop;
    while (at > first) {
      at--;
      char c = prose.charAt(at);
      if (c < 0x80 || isLetter(c)) {
        return at;
      }
    }
    return at;
  }

  /** The place behind the first letter from a place on. */
  private static int letter(String prose, int from) {
    int at = from;
    while (at < prose.length()) {
      if (isLetter(prose.charAt(at++))) {
        return at;
      }
    }
    return at;
  }

  /** Sound marks of narrow Japanese are letters to Java and marks to UAX #29. */
  private static boolean isLetter(char c) {
    return Character.isLetter(c) && c != '\uFF9E' && c != '\uFF9F';
  }

  /** Whether a letter is Thai, or Lao, which is written the same way. */
  static boolean isThai(char c) {
    return c >= '\u0E00' && c < '\u0F00';
  }

  /** Whether there is Thai, which has no stops. */
  boolean thai() {
    return thai;
  }

  /** How many characters may end a sentence, if only in some language. */
  int count() {
    return count;
  }

  /** The place in the prose of one of them, counted from 0. */
  int place(int index) {
    return places[index];
  }

  /** What is left of the prose, for the iterator; empty if nothing can end a sentence. */
  String string() {
    return string.toString();
  }

  /** The length of that; no sentence ends there, but where the prose ends. */
  int length() {
    return string.length();
  }

  /** The place in the prose of one in the string; to be asked in rising order. */
  int inProse(int place) {
    while (next + 1 < stretches && inString[next + 1] < place) {
      next++;
    }
    return inProse[next] + place - inString[next];
  }
}
