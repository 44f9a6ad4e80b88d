package dev.tallystick.engine;

/** Whom the loop tells what it knows. Called by the loop's thread, and must return at once. */
public interface Audience {
  /** The findings of a file are now these. */
  void publish(Publication publication);

  /**
   * Many pairs are being examined.
   *
   * @param done so many are examined; all of them at the end
   * @param total of so many
   */
  void pass(int done, int total);

  /** A pair has come so far: told when it is another figure than before. */
  void stands(Standing standing);

  /** All that came of one event is told, and who could be answered is answered. */
  void turned();

  /** Something the user should know; shown once, in full sentences. */
  void say(String message);

  /** Something for whoever looks for a fault. It never contains text of a file. */
  void log(String line);
}
