package dev.tallystick.cli;

/** Input that cannot be worked on; the message says what, where, and what to do. */
final class Refused extends RuntimeException {
  private static final long serialVersionUID = 1L;

  Refused(String message) {
    super(message, null, false, false);
  }
}
