package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.OptionalInt;

/** Where an editor broke the lines of a text. */
public final class Margin {
  private Margin() {}

  /** The width in columns that lines were filled to; empty if they were not. */
  public static OptionalInt of(Text text) {
    Wrapping wrapping = Wrapping.of(text.string(), Line.all(text));
    return wrapping.isWrapped() ? OptionalInt.of(wrapping.width()) : OptionalInt.empty();
  }
}
