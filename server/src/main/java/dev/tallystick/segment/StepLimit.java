package dev.tallystick.segment;

/**
 * Text for a pattern to be matched against, which gives up when it has been asked for too many
 * characters: some patterns take longer than a lifetime over a short line.
 */
final class StepLimit implements CharSequence {
  private final CharSequence text;
  private final long[] left;

  /** Thrown when the steps are used up. */
  static final class Exceeded extends RuntimeException {
    private static final long serialVersionUID = 1;

    Exceeded() {
      super("too many steps", null, false, false);
    }
  }

  /**
   * A text.
   *
   * @param steps how many characters may be asked for
   */
  StepLimit(CharSequence text, long steps) {
    this(text, new long[] {steps});
  }

  private StepLimit(CharSequence text, long[] left) {
    this.text = text;
    this.left = left;
  }

  @Override
  public char charAt(int index) {
    if (left[0]-- <= 0) {
      throw new Exceeded();
    }
    return text.charAt(index);
  }

  @Override
  public int length() {
    return text.length();
  }

  @Override
  public CharSequence subSequence(int start, int end) {
    return new StepLimit(text.subSequence(start, end), left);
  }

  @Override
  public String toString() {
    return text.toString();
  }
}
