package dev.tallystick.engine;

/** A file that cannot be read; the message says which, why, and what to do. */
public final class Unreadable extends Exception {
  private static final long serialVersionUID = 1L;

  /** With a message for the translator. */
  public Unreadable(String message) {
    super(message, null, false, false);
  }
}
