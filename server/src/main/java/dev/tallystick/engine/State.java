package dev.tallystick.engine;

import java.util.Locale;

/** How it stands with a sentence. */
public enum State {
  /** It has a counterpart. */
  MATCHED,
  /** It has one at another place than in the source. */
  MOVED,
  /** Its counterpart is the same words still. */
  UNTRANSLATED,
  /** Nobody has got to it yet: nothing stands for it, or its untouched copy. */
  PENDING,
  /** Nothing in the translation stands for it. */
  MISSING,
  /** Nothing in the source stands for it. */
  ADDED;

  /** Whether there is something on the other side that stands for it. */
  boolean matched() {
    return this == MATCHED || this == MOVED || this == UNTRANSLATED;
  }

  /** The name in what clients are told. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }
}
